import { insufficient, value } from '../outcome';
import type { Outcome } from '../outcome';
import { requiredNumber } from '../required-number';
import { studentQuantile, studentTwoSidedP } from './student-t';

/** One strip: residue left along its seed row, 0 to 100 %, and its timing (days to half up, spread), in days. */
export type ResidueAndTiming = { block: string; inRowCoverPercent: number; timingDays: number };

export type ResidueAgainstTiming = {
  /** Days later (above 0) or earlier for every ten points more of in-row cover. */
  daysPerTenPoints: number;
  standardError: number;
  lower: number;
  upper: number;
  p: number;
  errorDegreesOfFreedom: number;
  /** Strips in blocks of two or more; a strip alone in its block says nothing once blocks are taken out. */
  strips: number;
  blocks: number;
  /** The line holds between these, and is not drawn beyond. */
  coverPercentLeast: number;
  coverPercentMost: number;
};

/**
 * Do strips with more residue in the row come up later?
 *
 * Takes per strip its block, in-row cover (0 to 100 %) and timing in days (finite). Returns the slope in days for every
 * ten points of cover, with a 95 % t interval and p. Insufficient: fewer than two strips in one block; cover
 * that does not vary within blocks; no degrees of freedom for error; strips on one line. Throws ImpossibleInput for a cover
 * out of range or a timing that is no number.
 * Equation: timing = block + slope × cover + error, by least squares: b = Σ (x − x̄)(y − ȳ) / Σ (x − x̄)² with means of
 * the strip's own block, on strips − blocks − 1 degrees of freedom; as lm(timing ~ block + cover) in R.
 * What it does not tell: that residue is the cause. Settings change more than cover, and cover read with error draws
 * the slope toward zero. Example: Orange trees as blocks, size on age: 21.4 for every ten, interval 19.2 to 23.5.
 */
export function residueAgainstTiming(strips: readonly ResidueAndTiming[]): Outcome<ResidueAgainstTiming> {
  for (const { inRowCoverPercent, timingDays } of strips) {
    requiredNumber(inRowCoverPercent, 'inRowCoverPercent', { atLeast: 0, atMost: 100 });
    requiredNumber(timingDays, 'timingDays');
  }
  const blocks = [...new Set(strips.map((strip) => strip.block))]
    .map((block) => strips.filter((strip) => strip.block === block))
    .filter((block) => block.length > 1);
  if (blocks.length === 0) return insufficient('single-strips', '2 strips in one block', 'none');
  const used = blocks.flat();
  const errorDegreesOfFreedom = used.length - blocks.length - 1;
  if (errorDegreesOfFreedom < 1) {
    return insufficient(
      'no-error-degrees-of-freedom',
      '1 degree of freedom for error',
      `${errorDegreesOfFreedom}`,
    );
  }
  const covers = blocks.flatMap((block) => lessMean(block.map((strip) => strip.inRowCoverPercent)));
  const days = blocks.flatMap((block) => lessMean(block.map((strip) => strip.timingDays)));
  const coverSquares = product(covers, covers);
  if (coverSquares <= used.length * 1e-18) {
    return insufficient(
      'cover-does-not-vary',
      'in-row cover that differs within a block',
      'one cover a block',
    );
  }
  const slope = product(covers, days) / coverSquares;
  const residuals = days.map((each, index) => each - slope * (covers[index] as number));
  const residualSquares = product(residuals, residuals);
  const largest = Math.max(...used.map((strip) => Math.abs(strip.timingDays)));
  if (residualSquares <= errorDegreesOfFreedom * (1e-10 * largest) ** 2) {
    return insufficient('no-variation', 'strips that vary about the line', 'all strips on one line');
  }
  const standardError = Math.sqrt(residualSquares / errorDegreesOfFreedom / coverSquares);
  const reach = studentQuantile(0.975, errorDegreesOfFreedom) * standardError;
  return value({
    daysPerTenPoints: 10 * slope,
    standardError: 10 * standardError,
    lower: 10 * (slope - reach),
    upper: 10 * (slope + reach),
    p: studentTwoSidedP(slope / standardError, errorDegreesOfFreedom),
    errorDegreesOfFreedom,
    strips: used.length,
    blocks: blocks.length,
    coverPercentLeast: Math.min(...used.map((strip) => strip.inRowCoverPercent)),
    coverPercentMost: Math.max(...used.map((strip) => strip.inRowCoverPercent)),
  });
}

function lessMean(numbers: readonly number[]): number[] {
  const mean = numbers.reduce((sum, each) => sum + each, 0) / numbers.length;
  return numbers.map((each) => each - mean);
}

function product(first: readonly number[], second: readonly number[]): number {
  return first.reduce((sum, entry, index) => sum + entry * (second[index] as number), 0);
}
