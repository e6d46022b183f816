import { memo } from 'react';
import { inchesRead } from '@/lib/client/round/tape-draft';
import type { SheetSoFar } from '@/lib/client/round/tape-sheet-of-row';
import { tapePositions } from '@/lib/schemas/tape-positions';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { MissingSeed } from '@/components/tape/missing-seed';
import { plantHeight, plantLook } from '@/components/tape/plant-height';
import { Seedling } from '@/components/tape/seedling';
import { TapeCut } from '@/components/tape/tape-cut';
import { tapeCuts } from '@/components/tape/tape-cuts';
import { tapeDoubles } from '@/components/tape/tape-doubles';
import { tapeMarks } from '@/components/tape/tape-marks';
import type { TapeEnd, TapePlant } from '@/components/tape/tape-plant';
import { tapeTexts } from '@/lib/texts/round-tape-texts';
import type { SheetMarker } from './tape-notes';

type GrowingTapeProps = {
  sheet: SheetSoFar;
  /** The place that is written beside the tape. */
  inHand: number;
  /** The markers of the visits, earliest first. */
  markers: readonly SheetMarker[];
  lengthInches: number;
  startEnd: TapeEnd;
  farEnd: TapeEnd;
};

const width = 136;
const height = 236;
const edge = 8;
const tapeLeft = 62;
const tapeWidth = 28;
const leastHeight = 14;
const mostHeight = 48;
const numeralDistance = 15;
/** How wide a seedling's head is at its full size, so that heads in a full row do not run into each other. */
const headWidth = 12.4;
const sizeMost = 0.7;
const sizeLeast = 0.35;
/** Numerals at every foot or meter that leaves them apart. */
const everyWhole = [1, 2, 5, 10, 20, 50, 100];

/** The earlier a plant's marker, the taller it is drawn; one without a day is the lowest. */
function earlinessOf(marker: string | null, markers: readonly SheetMarker[]): number | null {
  const dated = markers.filter((each) => each.day !== null);
  const at = dated.findIndex((each) => each.marker.toLowerCase() === marker?.toLowerCase());
  if (at === -1) return null;
  return dated.length === 1 ? 1 : 1 - at / (dated.length - 1);
}

/** The row as it grows, from the scout's feet upward, small enough to leave the keys where they are. One place alone is written beside it: the one in hand. Typing does not draw it anew. */
export const GrowingTape = memo(function GrowingTape({ sheet, inHand, markers, lengthInches, startEnd, farEnd }: GrowingTapeProps) {
  const units: UnitSystem = sheet.unit === 'cm' ? 'metric' : 'us';
  const read = inchesRead(sheet).flatMap((inches, index) => (inches === undefined ? [] : [{ inches, index, place: sheet.places[index] }]));
  const segmentStarts = read.flatMap(({ place }, order) => (order > 0 && place?.cutBefore ? [order] : []));
  const laid = tapePositions(read.map(({ inches }) => inches), { readFrom: sheet.readFrom, zeroAt: sheet.zeroAt, segmentStarts }, lengthInches);
  const reach = Math.max(lengthInches, 1, ...laid.map((place) => place.positionInches));
  const inchSize = (height - 2 * edge) / reach;
  const yOf = (inches: number) => height - edge - inches * inchSize;
  const plants = laid.map(({ order, positionInches, segment }) => {
    const { place, index } = read[order] ?? {};
    const plant: TapePlant = {
      positionInches, segment, earliness: earlinessOf(place?.marker ?? null, markers), late: place?.kind === 'late', double: place?.kind === 'double', kind: place?.kind === 'missing' ? 'missing' : 'plant',
    };
    return { plant, index: index ?? 0, typed: place?.typed ?? '' };
  });
  const size = Math.max(sizeLeast, Math.min(sizeMost, (height - 2 * edge) / Math.max(plants.length, 1) / headWidth));
  const chosen = plants.find(({ index }) => index === inHand);
  const marks = tapeMarks(0, lengthInches, units, inchSize);
  const wholeDistance = (units === 'us' ? 12 : 100 / 2.54) * inchSize;
  const every = everyWhole.find((step) => step * wholeDistance >= numeralDistance) ?? 100;
  const pegs = [startEnd === 'mark' ? 0 : null, farEnd === 'mark' ? lengthInches : null];
  return (
    <svg role="img" aria-label={tapeTexts.drawing(sheet.places.length)} viewBox={`0 0 ${width} ${height}`} preserveAspectRatio="xMinYMid meet" className="block h-full max-h-80 min-h-0 w-auto min-w-0 shrink">
      <rect x={tapeLeft} y={yOf(lengthInches)} width={tapeWidth} height={yOf(0) - yOf(lengthInches)} strokeWidth={1.2} className="fill-bone stroke-ink" />
      {marks.map((mark) => (
        <g key={mark.atInches}>
          {mark.rank === 'minor' ? null : <path d={`M${tapeLeft} ${yOf(mark.atInches).toFixed(1)}h${mark.rank === 'whole' ? 10 : 5}`} strokeWidth={mark.rank === 'whole' ? 1.6 : 1} className="stroke-ink" />}
          {mark.numeral && Number(mark.numeral) % every === 0 ? (
            <text x={tapeLeft + tapeWidth - 3} y={Math.min(yOf(0) - 2, Math.max(yOf(lengthInches) + 12, yOf(mark.atInches) + 4.5)).toFixed(1)} textAnchor="end" fontSize={13} className="fill-tape-red font-mono font-bold">
              {mark.numeral}
            </text>
          ) : null}
        </g>
      ))}
      {pegs.map((inches) => (inches === null ? null : <path key={inches} d={`M${tapeLeft - 6} ${yOf(inches).toFixed(1)}h${tapeWidth + 12}`} strokeWidth={4} className="stroke-ink" />))}
      {tapeCuts(plants.map(({ plant }) => plant)).map((cut) => (
        <TapeCut key={cut} x={tapeLeft - 1} y={yOf(cut)} across={tapeWidth + 2} lies="upright" />
      ))}
      {plants.map(({ plant, index }) =>
        plant.kind === 'missing' ? (
          <MissingSeed key={index} x={tapeLeft - 9} y={yOf(plant.positionInches)} size={Math.min(0.9, size * 1.4)} />
        ) : (
          <Seedling key={index} x={tapeLeft} y={yOf(plant.positionInches)} height={plantHeight(plant, leastHeight, mostHeight)} grows="left" look={plantLook(plant)} size={index === inHand ? 1.1 : size} />
        ),
      )}
      {tapeDoubles(plants.map(({ plant }) => plant)).map((double) => (
        <path key={double.fromInches} d={`M${tapeLeft + tapeWidth + 2} ${(yOf(double.toInches) - 2).toFixed(1)}h3V${(yOf(double.fromInches) + 2).toFixed(1)}h-3`} fill="none" strokeWidth={1.4} className="stroke-ink" />
      ))}
      {chosen ? (
        <g>
          <path d={`M${tapeLeft + tapeWidth + 3} ${yOf(chosen.plant.positionInches).toFixed(1)}l7 -5v10Z`} className="fill-ink" />
          <text x={tapeLeft + tapeWidth + 13} y={Math.min(height - 3, Math.max(12, yOf(chosen.plant.positionInches) + 5)).toFixed(1)} fontSize={14} className="fill-ink font-mono font-bold">
            {chosen.typed}
          </text>
        </g>
      ) : null}
    </svg>
  );
});
