import type { UnitSystem } from '@/lib/schemas/vocabulary';

export type TapeMark = { atInches: number; rank: 'whole' | 'half' | 'minor'; numeral: string | null };

const leastMarkDistance = 3.5;
const inchesPerCentimeter = 1 / 2.54;

/** How the tape is divided: the step of a whole, its halves, and the finer steps to choose from, in its own unit. */
const divisions = {
  us: { inchesPerUnit: 1, whole: 12, half: 6, finer: [1, 3] },
  metric: { inchesPerUnit: inchesPerCentimeter, whole: 100, half: 50, finer: [1, 5, 10] },
} as const;

/**
 * The marks printed on a piece of tape from `fromInches` to `toInches`: a numeral at each foot (in metric each meter),
 * a longer mark at each half, and the finest marks that still stand apart when an inch is drawn `inchSize` long.
 */
export function tapeMarks(
  fromInches: number,
  toInches: number,
  units: UnitSystem,
  inchSize: number,
): TapeMark[] {
  const { inchesPerUnit, whole, half, finer } = divisions[units];
  const step = finer.find((size) => size * inchesPerUnit * inchSize >= leastMarkDistance) ?? half;
  const first = Math.ceil(fromInches / inchesPerUnit / step - 1e-6);
  const last = Math.floor(toInches / inchesPerUnit / step + 1e-6);
  return Array.from({ length: Math.max(0, last - first + 1) }, (_, index) => {
    const at = (first + index) * step;
    const isWhole = at % whole === 0;
    return {
      atInches: at * inchesPerUnit,
      rank: isWhole ? 'whole' : at % half === 0 ? 'half' : 'minor',
      numeral: isWhole && at > 0 ? String(at / whole) : null,
    };
  });
}
