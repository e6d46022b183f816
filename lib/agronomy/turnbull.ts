import { SAME_NUMBER } from './constants';
import { ImpossibleInput, insufficient, value, type Outcome } from './outcome';
import { requiredNumber } from './required-number';

/** So many plants came up after `afterDays` and by `byDays`; `byDays` null is a seed that had not come when counting ended. */
export type SeenBetween = { afterDays: number; byDays: number | null; plants: number };

/** All of `share` came somewhere in this stretch; where in it, the counts do not say. `byDays` null is never or later. */
export type ShareBetween = { afterDays: number; byDays: number | null; share: number };

/**
 * What share had come up by when, assuming no shape of curve, when rows were visited on days of their own?
 *
 * Takes intervals in days since planting with plants in each (0 or more), of any number of row samples. Returns the
 * stretches of time on which the data put any share, in order, adding up to 1. Insufficient without plants. Throws
 * ImpossibleInput for negative days or plants and for an interval that ends before it begins.
 * Method: non-parametric maximum likelihood (Turnbull 1976) by the self-consistency steps of expectation and
 * maximization until no share moves by more than 1e-12. Where all calendars agree it is the share of new plants at each
 * visit. A maximum may not be single: with wide overlapping intervals other splits can fit as well.
 * Plants of one row are not independent, so it carries no interval.
 * Example: 4 in (4, 5], 17 in (5, 6], 10 in (6, 7], 7 in (7, 8], 1 in (8, 9] and 1 in (10, 11] give 0.1 0.425 0.25 0.175
 * 0.025 0.025.
 */
export function turnbull(seen: readonly SeenBetween[]): Outcome<ShareBetween[]> {
  for (const { afterDays, byDays, plants } of seen) {
    requiredNumber(afterDays, 'afterDays', { atLeast: 0 });
    requiredNumber(plants, 'plants', { atLeast: 0 });
    if (byDays !== null) requiredNumber(byDays, 'byDays', { above: afterDays });
  }
  const intervals = seen.filter(({ plants }) => plants > 0);
  const total = intervals.reduce((sum, { plants }) => sum + plants, 0);
  if (total === 0) return insufficient('nothing-up', '1 plant up', '0 plants up');
  const stretches = innermostStretches(intervals);
  const within = intervals.map((each) => stretches.map((stretch) => covers(each, stretch)));
  let shares: number[] = stretches.map(() => 1 / stretches.length);
  for (let step = 0; step < 20_000; step += 1) {
    const next = stretches.map(() => 0);
    intervals.forEach(({ plants }, row) => {
      const inside = shares.map((share, at) => (within[row]?.[at] ? share : 0));
      const sum = inside.reduce((all, share) => all + share, 0);
      inside.forEach((share, at) => {
        next[at] = (next[at] ?? 0) + (plants * share) / sum / total;
      });
    });
    const moved = Math.max(...next.map((share, at) => Math.abs(share - (shares[at] ?? 0))));
    shares = next;
    if (moved < 1e-12) break;
  }
  return value(stretches.map((stretch, at) => ({ ...stretch, share: shares[at] ?? 0 })).filter(({ share }) => share > SAME_NUMBER));
}

type Stretch = { afterDays: number; byDays: number | null };

const end = (byDays: number | null) => byDays ?? Number.POSITIVE_INFINITY;

const covers = (outer: Stretch, inner: Stretch) => outer.afterDays <= inner.afterDays && end(inner.byDays) <= end(outer.byDays);

/** From a beginning to the next end without another beginning between: only there can the likelihood put a share. */
function innermostStretches(intervals: readonly SeenBetween[]): Stretch[] {
  const beginnings = [...new Set(intervals.map(({ afterDays }) => afterDays))].sort((a, b) => a - b);
  const ends = [...new Set(intervals.map(({ byDays }) => end(byDays)))].sort((a, b) => a - b);
  return beginnings.flatMap((afterDays, index) => {
    const byDays = ends.find((each) => each > afterDays);
    const nextBeginning = beginnings[index + 1];
    if (byDays === undefined) throw new ImpossibleInput('An interval ends before it begins.', 'byDays');
    if (nextBeginning !== undefined && nextBeginning < byDays) return [];
    return [{ afterDays, byDays: byDays === Number.POSITIVE_INFINITY ? null : byDays }];
  });
}
