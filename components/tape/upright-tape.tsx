import { useId } from 'react';
import { spreadLabels } from '@/components/ui/spread-labels';
import { lengthText } from '@/lib/format/length-text';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { MissingSeed } from './missing-seed';
import { plantHeight, plantLook } from './plant-height';
import { Seedling } from './seedling';
import { TapeCut } from './tape-cut';
import { tapeCuts } from './tape-cuts';
import { tapeDoubles } from './tape-doubles';
import { tapeGaps } from './tape-gaps';
import { tapeMarks } from './tape-marks';
import type { TapeEnd, TapePlant } from './tape-plant';
import { UprightNotes } from './upright-notes';

type UprightTapeProps = {
  lengthInches: number;
  plants: readonly TapePlant[];
  units: UnitSystem;
  startEnd: TapeEnd;
  farEnd: TapeEnd;
  namedGapInches: number | undefined;
  label: string;
  description: string;
};

const width = 360;
const tapeLeft = 168;
const tapeWidth = 52;
const leastHeight = 20;
const mostHeight = 62;
const labelRight = 62;
const labelDistance = 15;
const edge = 16;

/** The row from the scout's feet upward, for a phone: every place is written beside its plant. */
export function UprightTape({
  lengthInches,
  plants,
  units,
  startEnd,
  farEnd,
  namedGapInches,
  label,
  description,
}: UprightTapeProps) {
  const id = useId();
  // As long as the labels need to stand apart, and never so short that an inch cannot be seen.
  const inchSize = Math.max(3.2, (plants.length * labelDistance) / lengthInches);
  const height = lengthInches * inchSize + 2 * edge;
  const yOf = (inches: number) => height - edge - inches * inchSize;
  const standing = plants.filter((plant) => plant.kind === 'plant');
  const labelYs = spreadLabels(
    standing.map((plant) => yOf(plant.positionInches)),
    standing.map(() => labelDistance),
    0,
    height,
  );
  const [top, bottom] = [yOf(lengthInches), yOf(0)];
  const pegs = [startEnd === 'mark' ? bottom : null, farEnd === 'mark' ? top : null];
  return (
    <svg
      role="img"
      aria-labelledby={`${id}title ${id}desc`}
      viewBox={`0 0 ${width} ${height.toFixed(1)}`}
      className="mx-auto block h-auto w-full max-w-md"
    >
      <title id={`${id}title`}>{label}</title>
      <desc id={`${id}desc`}>{description}</desc>
      <rect
        x={tapeLeft}
        y={top.toFixed(1)}
        width={tapeWidth}
        height={(bottom - top).toFixed(1)}
        strokeWidth={1.2}
        className="fill-bone stroke-ink"
      />
      {tapeMarks(0, lengthInches, units, inchSize).map((mark) => {
        const y = yOf(mark.atInches);
        const length = { whole: 26, half: 16, minor: 8 }[mark.rank];
        return (
          <g key={mark.atInches}>
            <path
              d={`M${tapeLeft} ${y.toFixed(1)}h${length}`}
              fill="none"
              strokeWidth={mark.rank === 'whole' ? 2 : 1}
              className="stroke-ink"
            />
            {mark.numeral ? (
              <text
                x={tapeLeft + tapeWidth - 5}
                // Level with its mark, but never across an end of the tape.
                y={Math.min(bottom - 3, Math.max(top + 14, y + 5.5)).toFixed(1)}
                textAnchor="end"
                fontSize={16}
                className="fill-tape-red font-mono font-bold"
              >
                {mark.numeral}
              </text>
            ) : null}
          </g>
        );
      })}
      {tapeCuts(plants).map((cut) => (
        <TapeCut key={cut} x={tapeLeft - 1} y={yOf(cut)} across={tapeWidth + 2} lies="upright" />
      ))}
      {pegs.map((y) =>
        y === null ? null : (
          <path
            key={y}
            d={`M${tapeLeft - 10} ${y.toFixed(1)}h${tapeWidth + 14}`}
            fill="none"
            strokeWidth={5}
            className="stroke-ink"
          />
        ),
      )}
      {plants.map((plant, index) => {
        const y = yOf(plant.positionInches);
        return plant.kind === 'missing' ? (
          <MissingSeed key={index} x={tapeLeft - 12} y={y} size={1.5} />
        ) : (
          <Seedling
            key={index}
            x={tapeLeft}
            y={y}
            height={plantHeight(plant, leastHeight, mostHeight)}
            grows="left"
            look={plantLook(plant)}
            size={1.25}
          />
        );
      })}
      {standing.map((plant, index) => {
        const from = labelYs[index] ?? 0;
        const to = yOf(plant.positionInches);
        const stemEnd = tapeLeft - plantHeight(plant, leastHeight, mostHeight) - 8;
        return (
          <g key={index}>
            <text
              x={labelRight}
              y={(from + 4.5).toFixed(1)}
              textAnchor="end"
              fontSize={14}
              className="fill-ink font-mono"
            >
              {lengthText(plant.positionInches, units, { withUnit: false })}
            </text>
            <path
              d={`M${labelRight + 4} ${from.toFixed(1)}L${labelRight + 16} ${to.toFixed(1)}H${stemEnd.toFixed(1)}`}
              fill="none"
              strokeWidth={0.8}
              strokeDasharray="1.5 3"
              className="stroke-ink"
            />
          </g>
        );
      })}
      <UprightNotes
        x={tapeLeft + tapeWidth}
        yOf={yOf}
        height={height}
        gaps={tapeGaps(plants, namedGapInches)}
        doubles={tapeDoubles(plants)}
        units={units}
      />
    </svg>
  );
}
