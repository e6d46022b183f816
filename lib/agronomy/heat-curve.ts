import type { EmergenceCurve } from './emergence-curve';
import type { Heat } from './heat-since-planting';
import { ImpossibleInput, value, type Outcome } from './outcome';

/** A curve whose days are °F degree days: every function of a curve reads it, and its answer is in degree days. */
export type HeatCurve = EmergenceCurve & { scale: 'degree-days-f' };

/**
 * How did the plants come up on the scale of heat?
 *
 * Takes a never-falling curve and the heat since planting at each of its visits, in order. Returns the same counts
 * against °F degree days, for emergencePercentile and emergenceSpread. Insufficient with the first visit whose heat is.
 * Throws ImpossibleInput for another number of heats than visits, and for heat that falls.
 * Method: the same interpolation against cumulated heat. Visits without heat between them are joined into the later one,
 * whose count holds for both. Spread within 20 to 25 degree days counts as uniform (Nafziger, Illinois 2013).
 * Example: half up between visits at 100 and 120 degree days with 10 and 20 of 30 plants: 110 degree days.
 */
export function heatCurve(curve: EmergenceCurve, heats: readonly Outcome<Heat>[]): Outcome<HeatCurve> {
  if (heats.length !== curve.points.length) throw new ImpossibleInput('There must be one heat for each visit.', 'heats');
  const points: EmergenceCurve['points'] = [];
  for (const [index, { plantsUp }] of curve.points.entries()) {
    const heat = heats[index] as Outcome<Heat>;
    if (heat.kind === 'insufficient') return heat;
    const { degreeDaysF } = heat.value;
    const before = points[points.length - 1];
    if (before && degreeDaysF < before.days) throw new ImpossibleInput('Heat since planting cannot fall.', 'heats');
    if (before && degreeDaysF === before.days) before.plantsUp = plantsUp;
    else points.push({ days: degreeDaysF, plantsUp });
  }
  return value({ ...curve, points, scale: 'degree-days-f' });
}
