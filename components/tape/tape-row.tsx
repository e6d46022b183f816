import { rowLengthText } from '@/lib/format/row-length-text';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { interfaceTexts } from '@/lib/texts/interface-texts';
import { LyingTape } from './lying-tape';
import { tapeDoubles } from './tape-doubles';
import type { TapeEnd, TapePlant } from './tape-plant';
import { UprightTape } from './upright-tape';

export type { TapeEnd, TapePlant };

type TapeRowProps = {
  lengthInches: number;
  plants: readonly TapePlant[];
  units: UnitSystem;
  startEnd: TapeEnd;
  farEnd: TapeEnd;
  orientation: 'horizontal' | 'upright';
  /** Which row this is, for who cannot see it. */
  label: string;
  /** The least gap that is named; without it, one and three quarters of the row's median spacing. */
  namedGapInches?: number;
};

/**
 * A row as it stands, on the tape that lies along it. Height says how early a plant came up, an open head is late,
 * a cross is a seed that never came, a bracket joins a double, a gap names its length.
 */
export function TapeRow({ orientation, ...row }: TapeRowProps) {
  const standing = row.plants.filter((plant) => plant.kind === 'plant');
  const description = interfaceTexts.tape.summary({
    length: rowLengthText(row.lengthInches, row.units),
    plants: standing.length,
    late: standing.filter((plant) => plant.late).length,
    doubles: tapeDoubles(row.plants).length,
    missing: row.plants.length - standing.length,
  });
  const drawing = {
    lengthInches: row.lengthInches,
    plants: row.plants,
    units: row.units,
    startEnd: row.startEnd,
    farEnd: row.farEnd,
    namedGapInches: row.namedGapInches,
    label: row.label,
    description,
  };
  if (orientation === 'upright') return <UprightTape {...drawing} />;
  // Two drawings, of which the width of the place shows one: scaled down, the numerals of the wide one are too small.
  return (
    <div className="@container w-full">
      <div className="hidden @3xl:block">
        <LyingTape {...drawing} width={960} pieceInchesMost={280} />
      </div>
      <div className="max-w-xl @3xl:hidden">
        <LyingTape {...drawing} width={390} pieceInchesMost={112} />
      </div>
    </div>
  );
}
