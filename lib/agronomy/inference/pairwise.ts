import { ImpossibleInput } from '../outcome';
import type { BlockAnalysis, SettingDifference } from './block-analysis';
import { holm } from './holm';
import { studentQuantile, studentTwoSidedP } from './student-t';
import { studentizedRangeQuantile, studentizedRangeUpperTail } from './studentized-range';

/** Below or at this adjusted p two settings are told apart. */
export const TOLD_APART_P = 0.05;

export type ComparedPair = SettingDifference & {
  pUnadjusted: number;
  /** Adjusted as planned: by Tukey over all pairs, or by Holm over the comparisons with the reference. */
  p: number;
  lower: number;
  upper: number;
  /** Whether the adjusted p tells the two apart at 5 %. */
  toldApart: boolean;
};

/**
 * Which settings differ, when every pair is looked at?
 *
 * Takes a block analysis. Returns every pair with its difference, the p adjusted for looking at all of them, and a
 * 95 % interval that holds for all pairs at once, in the figure's unit. Never insufficient: the analysis was not.
 * Method: Tukey's studentized range; where strips are missing in the form of Kramer 1956, Biometrics 12:307, with
 * each difference's own standard error (q = √2 |difference| / SE).
 * What it does not tell: that settings which are not told apart are equal.
 * Example: Trebi less Svansota in Immer's trial: 25.4, interval 10.0 to 40.7, p 0.019.
 */
export function tukeyPairs(analysis: BlockAnalysis): ComparedPair[] {
  const { errorDegreesOfFreedom } = analysis;
  return analysis.differences.map((pair) => tukeyPair(pair, analysis.means.length, errorDegreesOfFreedom));
}

/** One pair among so many settings, apart so that it can be held against analyses that have no blocks. */
export function tukeyPair(
  pair: SettingDifference,
  settings: number,
  errorDegreesOfFreedom: number,
): ComparedPair {
  const t = pair.difference / pair.standardError;
  const p = studentizedRangeUpperTail(Math.SQRT2 * Math.abs(t), settings, errorDegreesOfFreedom);
  const reach =
    (studentizedRangeQuantile(0.05, settings, errorDegreesOfFreedom) / Math.SQRT2) * pair.standardError;
  return {
    ...pair,
    pUnadjusted: studentTwoSidedP(t, errorDegreesOfFreedom),
    p,
    lower: pair.difference - reach,
    upper: pair.difference + reach,
    toldApart: p <= TOLD_APART_P,
  };
}

/**
 * Which settings differ from the reference?
 *
 * Takes a block analysis and the name of the reference. Returns each other setting less the reference with its p
 * adjusted by Holm over these comparisons and a 95 % t interval, which is each comparison's own: it is not widened
 * for the others, so that only `toldApart` decides. Never insufficient; throws ImpossibleInput when the reference
 * is not among the analyzed settings.
 * Example: three settings, two comparisons; p of 0.02 and 0.03 become 0.04 and 0.04.
 */
export function holmAgainstReference(analysis: BlockAnalysis, reference: string): ComparedPair[] {
  const pairs = analysis.means
    .filter((mean) => mean.setting !== reference)
    .map((mean) => differenceFrom(analysis, mean.setting, reference));
  const { errorDegreesOfFreedom } = analysis;
  const reach = studentQuantile(0.975, errorDegreesOfFreedom);
  const unadjusted = pairs.map((pair) =>
    studentTwoSidedP(pair.difference / pair.standardError, errorDegreesOfFreedom),
  );
  const adjusted = holm(unadjusted);
  return pairs.map((pair, index) => ({
    ...pair,
    pUnadjusted: unadjusted[index] as number,
    p: adjusted[index] as number,
    lower: pair.difference - reach * pair.standardError,
    upper: pair.difference + reach * pair.standardError,
    toldApart: (adjusted[index] as number) <= TOLD_APART_P,
  }));
}

function differenceFrom(analysis: BlockAnalysis, setting: string, reference: string): SettingDifference {
  const pair = analysis.differences.find(
    ({ first, second }) =>
      (first === setting && second === reference) || (first === reference && second === setting),
  );
  if (!pair) throw new ImpossibleInput(`${reference} is not among the analyzed settings.`, 'reference');
  const sign = pair.first === setting ? 1 : -1;
  return { ...pair, first: setting, second: reference, difference: sign * pair.difference };
}
