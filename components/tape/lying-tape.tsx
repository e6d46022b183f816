import { useId } from 'react';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { LyingPiece, pieceHeight } from './lying-piece';
import { tapeCuts } from './tape-cuts';
import { tapeDoubles } from './tape-doubles';
import { tapeGaps } from './tape-gaps';
import type { TapeEnd, TapePlant } from './tape-plant';

type LyingTapeProps = {
  lengthInches: number;
  plants: readonly TapePlant[];
  units: UnitSystem;
  startEnd: TapeEnd;
  farEnd: TapeEnd;
  width: number;
  /** The most inches of row on one piece before the tape goes on below. */
  pieceInchesMost: number;
  namedGapInches: number | undefined;
  label: string;
  description: string;
};

const edges = 16;
const inchesPerFoot = 12;

/** The row from left to right, for a desk: one piece of tape, or a few below each other where it would get too fine. */
export function LyingTape({
  lengthInches,
  plants,
  units,
  startEnd,
  farEnd,
  width,
  pieceInchesMost,
  namedGapInches,
  label,
  description,
}: LyingTapeProps) {
  const id = useId();
  const count = Math.ceil(lengthInches / pieceInchesMost);
  // A piece ends at a whole foot, so that the next one opens with a mark.
  const pieceInches =
    count === 1 ? lengthInches : Math.ceil(lengthInches / count / inchesPerFoot) * inchesPerFoot;
  const pieces = Array.from({ length: Math.ceil(lengthInches / pieceInches) }, (_, index) => index);
  const gaps = tapeGaps(plants, namedGapInches);
  const doubles = tapeDoubles(plants);
  const cuts = tapeCuts(plants);
  return (
    <svg
      role="img"
      aria-labelledby={`${id}title ${id}desc`}
      viewBox={`0 0 ${width} ${pieces.length * pieceHeight}`}
      className="block h-auto w-full"
    >
      <title id={`${id}title`}>{label}</title>
      <desc id={`${id}desc`}>{description}</desc>
      {pieces.map((piece) => (
        <g key={piece} transform={`translate(0 ${piece * pieceHeight})`}>
          <LyingPiece
            plants={plants}
            gaps={gaps}
            doubles={doubles}
            cuts={cuts}
            fromInches={piece * pieceInches}
            toInches={Math.min(lengthInches, (piece + 1) * pieceInches)}
            inchSize={(width - edges) / pieceInches}
            width={width}
            units={units}
            isFirst={piece === 0}
            isLast={piece === pieces.length - 1}
            startEnd={startEnd}
            farEnd={farEnd}
          />
        </g>
      ))}
    </svg>
  );
}
