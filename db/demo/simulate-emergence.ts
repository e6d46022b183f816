import { standardNormalQuantile } from './standard-normal-quantile';

/** What a setting truly does to emergence, as the demo's author chose it: plain shares (1 being all) and days since planting. */
export type TrueEmergence = {
  halfUpDays: number;
  /** From 10 to 90 % of the plants that come up. */
  spreadDays: number;
  /** Of the plants that come up, those more than `lateAfterDays` behind the first flush. */
  lateShare: number;
};

/** How plants come up: a main flush that is normal in time, and late plants evenly between two delays behind the first flush. */
export type EmergencePattern = {
  lateShare: number;
  mainMeanDays: number;
  mainSdDays: number;
  /** When a tenth of all plants are up: the first flush, from which delays are counted. */
  firstFlushDays: number;
};

/**
 * Late plants come up this many days behind the first flush. They are past the planting's limit of 5 days by enough that
 * daily visits, which know a plant's day to half a day, class nearly all of them late; and early enough that the last are
 * up before the visits end on day 19, even where half the stand is up only on day 12.4.
 */
export const lateDelayDays = { least: 5.4, most: 6.8 };

/**
 * Which main flush gives the wanted half-up day and spread, once the late plants are added?
 *
 * With a share m on time, 10, 50 and 90 % of all plants are 0.1/m, 0.5/m and 0.9/m of the main flush, for the late ones
 * come after all three. Two normal quantiles and the wanted spread fix its SD, the third its mean. Throws where a tenth or
 * more are late: nine tenths would then be reached among the late plants.
 */
export function emergencePattern({ halfUpDays, spreadDays, lateShare }: TrueEmergence): EmergencePattern {
  const onTimeShare = 1 - lateShare;
  if (onTimeShare <= 0.9) throw new RangeError('Fewer than a tenth of the plants can be late here.');
  const quantile = (share: number) => standardNormalQuantile(share / onTimeShare);
  const mainSdDays = spreadDays / (quantile(0.9) - quantile(0.1));
  const mainMeanDays = halfUpDays - mainSdDays * quantile(0.5);
  return { lateShare, mainMeanDays, mainSdDays, firstFlushDays: mainMeanDays + mainSdDays * quantile(0.1) };
}
