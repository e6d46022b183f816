import { placeLabels } from '@/components/ui/place-labels';
import { lengthText } from '@/lib/format/length-text';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { MissingSeed } from './missing-seed';
import { plantHeight, plantLook } from './plant-height';
import { Seedling } from './seedling';
import { TapeCut } from './tape-cut';
import type { TapeDouble } from './tape-doubles';
import type { TapeGap } from './tape-gaps';
import { tapeMarks } from './tape-marks';
import type { TapeEnd, TapePlant } from './tape-plant';

export const pieceHeight = 104;

const groundY = 56;
const tapeHeight = 24;
const leastHeight = 11;
const mostHeight = 38;
const labelSize = 11;
const labelCharWidth = 6.8;
const edge = 8;

type LyingPieceProps = {
  plants: readonly TapePlant[];
  gaps: readonly TapeGap[];
  doubles: readonly TapeDouble[];
  /** Where the tape was laid anew. */
  cuts: readonly number[];
  fromInches: number;
  toInches: number;
  inchSize: number;
  /** The width of the whole drawing, within which labels have to stay. */
  width: number;
  units: UnitSystem;
  isFirst: boolean;
  isLast: boolean;
  startEnd: TapeEnd;
  farEnd: TapeEnd;
};

/** One piece of a lying tape with what stands on it; a long row is drawn as several pieces below each other. */
export function LyingPiece({
  plants,
  gaps,
  doubles,
  cuts,
  fromInches,
  toInches,
  inchSize,
  width,
  units,
  isFirst,
  isLast,
  startEnd,
  farEnd,
}: LyingPieceProps) {
  const xOf = (inches: number) =>
    edge + (Math.min(toInches, Math.max(fromInches, inches)) - fromInches) * inchSize;
  const tapeEnd = xOf(toInches);
  const isHere = (inches: number) =>
    inches >= fromInches - 1e-6 && (inches < toInches - 1e-6 || (isLast && inches <= toInches + 1e-6));
  // A thick end is a mark in the ground; where the length ends at a plant, the plant itself is the end.
  const pegs = [isFirst && startEnd === 'mark' ? edge : null, isLast && farEnd === 'mark' ? tapeEnd : null];
  const gapsHere = gaps.filter((gap) => gap.fromInches < toInches && gap.toInches > fromInches);
  const gapTexts = gapsHere.map((gap) => lengthText(gap.toInches - gap.fromInches, units));
  const labelPlaces = placeLabels(
    gapsHere.map((gap, index) => ({
      center: (xOf(gap.fromInches) + xOf(gap.toInches)) / 2,
      width: (gapTexts[index] ?? '').length * labelCharWidth,
    })),
    0,
    width,
    6,
    26,
  );
  return (
    <g>
      <rect
        x={edge}
        y={groundY}
        width={tapeEnd - edge}
        height={tapeHeight}
        strokeWidth={1}
        className="fill-bone stroke-ink"
      />
      {tapeMarks(fromInches, toInches, units, inchSize).map((mark) => {
        const x = xOf(mark.atInches);
        const length = { whole: 9, half: 6.5, minor: 3.5 }[mark.rank];
        const halfWidth = ((mark.numeral?.length ?? 0) * 7.2) / 2 + 2;
        return (
          <g key={mark.atInches}>
            <path
              d={`M${x.toFixed(1)} ${groundY}v${length}`}
              fill="none"
              strokeWidth={mark.rank === 'whole' ? 1.8 : 0.8}
              className="stroke-ink"
            />
            {mark.numeral ? (
              <text
                // Under its mark, but never across an end of the tape.
                x={Math.min(tapeEnd - halfWidth, Math.max(edge + halfWidth, x)).toFixed(1)}
                y={groundY + tapeHeight - 4}
                textAnchor="middle"
                fontSize={12}
                className="fill-tape-red font-mono font-bold"
              >
                {mark.numeral}
              </text>
            ) : null}
          </g>
        );
      })}
      {cuts.filter(isHere).map((cut) => (
        <TapeCut key={cut} x={xOf(cut)} y={groundY - 1} across={tapeHeight + 2} lies="along" />
      ))}
      {pegs.map((x) =>
        x === null ? null : (
          <path
            key={x}
            d={`M${x.toFixed(1)} ${groundY - 8}V${groundY + tapeHeight + 4}`}
            fill="none"
            strokeWidth={4}
            className="stroke-ink"
          />
        ),
      )}
      {plants
        .filter((plant) => isHere(plant.positionInches))
        .map((plant, index) =>
          plant.kind === 'missing' ? (
            <MissingSeed key={index} x={xOf(plant.positionInches)} y={groundY - 7} />
          ) : (
            <Seedling
              key={index}
              x={xOf(plant.positionInches)}
              y={groundY}
              height={plantHeight(plant, leastHeight, mostHeight)}
              grows="up"
              look={plantLook(plant)}
            />
          ),
        )}
      {doubles
        .filter((double) => isHere(double.fromInches))
        .map((double) => {
          const left = xOf(double.fromInches) - 4;
          const right = xOf(double.toInches) + 4;
          return (
            <path
              key={double.fromInches}
              d={`M${left.toFixed(1)} 10v-5H${right.toFixed(1)}v5`}
              fill="none"
              strokeWidth={1.4}
              className="stroke-ink"
            />
          );
        })}
      {gapsHere.map((gap, index) => {
        const y = groundY + tapeHeight + 8;
        const at = labelPlaces[index];
        return (
          <g key={gap.fromInches}>
            <path
              d={`M${(xOf(gap.fromInches) + 1).toFixed(1)} ${y - 3}v6m0-3H${(xOf(gap.toInches) - 1).toFixed(1)}m0-3v6`}
              fill="none"
              strokeWidth={1}
              className="stroke-ink"
            />
            {at === null || at === undefined ? null : (
              <text
                x={at.toFixed(1)}
                y={y + 13}
                textAnchor="middle"
                fontSize={labelSize}
                className="fill-ink font-mono"
              >
                {gapTexts[index]}
              </text>
            )}
          </g>
        );
      })}
    </g>
  );
}
