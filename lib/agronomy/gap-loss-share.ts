import { requiredNumber } from './required-number';

export type GapLoss = { lossShareLower: number; lossShareUpper: number };

/**
 * What do the gaps in a kept stand cost beyond its thinness?
 *
 * Takes the lengths of the gaps on the tape in feet (0 or more). Returns a share of yield, 0 to 1, as a span. Never
 * insufficient; throws ImpossibleInput for a length that is not a number or negative.
 * Method: Iowa State 1996, 2004 and 2006: small gaps of 1 to 3 ft 2 %, many large ones of 4 to 6 ft 4 to 6 %. Under 1 ft
 * there is none. Between 3 and 4 ft the editions differ, so that range stands from 2 to 6 %. *Many* is not said; here a
 * quarter of the gaps or more (common practice, no source).
 * Above 6 ft nothing was printed: the span then has no more than its lower end to stand on. The stand table charges the
 * missing plants already. Example: gaps of 1.5, 2 and 2.5 ft cost 2 %.
 */
export function gapLossShare(gapsFeet: readonly number[]): GapLoss {
  const gaps = gapsFeet.map((feet) => requiredNumber(feet, 'gapsFeet', { atLeast: 0 })).filter((feet) => feet >= 1);
  if (gaps.length === 0) return { lossShareLower: 0, lossShareUpper: 0 };
  if (gaps.filter((feet) => feet >= 4).length * 4 >= gaps.length) return { lossShareLower: 0.04, lossShareUpper: 0.06 };
  return { lossShareLower: 0.02, lossShareUpper: gaps.some((feet) => feet > 3) ? 0.06 : 0.02 };
}
