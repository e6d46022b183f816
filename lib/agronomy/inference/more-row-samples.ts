import { chainOutcome, insufficient, value, type Outcome } from '../outcome';
import { requiredNumber } from '../required-number';
import { rowSamplesNeeded } from './row-samples-needed';
import { standInterval, type StandUnit } from './stand-interval';

export type MoreRowSamples = {
  more: number;
  needed: number;
  had: number;
  cv: number;
  /** Half width of the interval now, as a share of the stand. */
  withinShareNow: number;
};

/**
 * How many more row samples bring the stand within a wanted share, seeing how those counted differ?
 *
 * Takes the places counted, as standInterval does, and the wanted half width as a share (above 0). Returns how many more,
 * how many in all, and the precision reached. Insufficient below two places or where nothing stands. Throws
 * ImpossibleInput as standInterval does.
 * Method: CV = standard error × √n / stand, which is SD over mean for equal lengths and the ratio estimator's for
 * others; then rowSamplesNeeded. More is 0 where those counted already do.
 * From few places the CV is itself rough: seen in 5, the true one may be 0.6 to 2.9 times as large (chi-square on 4).
 * It holds for places chosen at random and of like length. Example: 31 28 33 26 30 29 plants, within 5 %: 13 in all.
 */
export function moreRowSamples(units: readonly StandUnit[], withinShare: number): Outcome<MoreRowSamples> {
  requiredNumber(withinShare, 'withinShare', { above: 0 });
  return chainOutcome(standInterval(units, 'row-samples'), ({ plantsPerAcre, interval }) =>
    chainOutcome(interval, ({ student, plantsPerAcreUpper }) => {
      if (student === null || plantsPerAcre === 0) {
        return insufficient('none-standing', '1 plant', 'none');
      }
      const had = units.length;
      const cv = (student.standardErrorPlantsPerAcre * Math.sqrt(had)) / plantsPerAcre;
      const needed = rowSamplesNeeded(cv, withinShare);
      const withinShareNow = plantsPerAcreUpper / plantsPerAcre - 1;
      return value({ more: Math.max(0, needed - had), needed, had, cv, withinShareNow });
    }),
  );
}
