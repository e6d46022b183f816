import { memo } from 'react';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { MissingSeed } from './missing-seed';
import { plantHeight, plantLook } from './plant-height';
import { Seedling } from './seedling';
import { TapeCut } from './tape-cut';
import { tapeCuts } from './tape-cuts';
import { tapeDoubles } from './tape-doubles';
import { tapeMarks } from './tape-marks';
import type { TapeEnd, TapePlant } from './tape-plant';

/** A place with its number in the order read, and as it was typed. */
export type GrownPlant = TapePlant & { index: number; typed: string };

type GrowingTapeProps = {
  plants: readonly GrownPlant[];
  /** The number of the place that is written beside the tape. */
  inHand: number;
  lengthInches: number;
  startEnd: TapeEnd;
  farEnd: TapeEnd;
  units: UnitSystem;
  label: string;
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

/** The row as it grows, from the scout's feet upward, small enough to leave a keypad where it is. One place alone is written beside it: the one in hand. */
export const GrowingTape = memo(function GrowingTape({ plants, inHand, lengthInches, startEnd, farEnd, units, label }: GrowingTapeProps) {
  const reach = Math.max(lengthInches, 1, ...plants.map((plant) => plant.positionInches));
  const inchSize = (height - 2 * edge) / reach;
  const yOf = (inches: number) => height - edge - inches * inchSize;
  const size = Math.max(sizeLeast, Math.min(sizeMost, (height - 2 * edge) / Math.max(plants.length, 1) / headWidth));
  const chosen = plants.find(({ index }) => index === inHand);
  const marks = tapeMarks(0, lengthInches, units, inchSize);
  const wholeDistance = (units === 'us' ? 12 : 100 / 2.54) * inchSize;
  const every = everyWhole.find((step) => step * wholeDistance >= numeralDistance) ?? 100;
  const pegs = [startEnd === 'mark' ? 0 : null, farEnd === 'mark' ? lengthInches : null];
  return (
    <svg role="img" aria-label={label} viewBox={`0 0 ${width} ${height}`} preserveAspectRatio="xMinYMid meet" className="block h-full max-h-80 min-h-0 w-auto min-w-0 shrink">
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
      {tapeCuts(plants).map((cut) => (
        <TapeCut key={cut} x={tapeLeft - 1} y={yOf(cut)} across={tapeWidth + 2} lies="upright" />
      ))}
      {plants.map((plant) =>
        plant.kind === 'missing' ? (
          <MissingSeed key={plant.index} x={tapeLeft - 9} y={yOf(plant.positionInches)} size={Math.min(0.9, size * 1.4)} />
        ) : (
          <Seedling key={plant.index} x={tapeLeft} y={yOf(plant.positionInches)} height={plantHeight(plant, leastHeight, mostHeight)} grows="left" look={plantLook(plant)} size={plant.index === inHand ? 1.1 : size} />
        ),
      )}
      {tapeDoubles(plants).map((double) => (
        <path key={double.fromInches} d={`M${tapeLeft + tapeWidth + 2} ${(yOf(double.toInches) - 2).toFixed(1)}h3V${(yOf(double.fromInches) + 2).toFixed(1)}h-3`} fill="none" strokeWidth={1.4} className="stroke-ink" />
      ))}
      {chosen ? (
        <g>
          <path d={`M${tapeLeft + tapeWidth + 3} ${yOf(chosen.positionInches).toFixed(1)}l7 -5v10Z`} className="fill-ink" />
          <text x={tapeLeft + tapeWidth + 13} y={Math.min(height - 3, Math.max(12, yOf(chosen.positionInches) + 5)).toFixed(1)} fontSize={14} className="fill-ink font-mono font-bold">
            {chosen.typed}
          </text>
        </g>
      ) : null}
    </svg>
  );
});
