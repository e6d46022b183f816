import { requiredNumber } from '../required-number';
import type { StandInterval } from '../stand-interval-shape';
import { standChiSquareQuantile } from './stand-chi-square';
import type { StandUnit } from './stand-interval';

/**
 * How sure is one count of plants when the seeds in the length are not known?
 *
 * Takes plants held (0 or more) and the area in acres (above 0). Returns a 95 % interval in plants per acre,
 * labeled counting only. Never insufficient: no plants give an interval from 0. Throws ImpossibleInput for
 * negative plants or an area that is not positive.
 * Method: exact Poisson (Garwood 1936), χ²(0.025; 2k)/2 to χ²(0.975; 2k + 2)/2. Halves, from doubtful plants and
 * plant ends, are taken down for the lower and up for the upper end, so that the interval errs on the wide side.
 * Plants in a row are set by a planter and lie closer to their mean than Poisson: it is wider than need be.
 * Example: 31 plants: 21.1 to 44.0.
 */
export function standPoisson(unit: StandUnit): StandInterval {
  requiredNumber(unit.plantsHeld, 'plantsHeld', { atLeast: 0 });
  requiredNumber(unit.areaAcres, 'areaAcres', { above: 0 });
  const plantsDown = Math.floor(unit.plantsHeld);
  const plantsUp = Math.ceil(unit.plantsHeld);
  const lower = plantsDown === 0 ? 0 : standChiSquareQuantile(0.025, 2 * plantsDown) / 2;
  const upper = standChiSquareQuantile(0.975, 2 * plantsUp + 2) / 2;
  return {
    plantsPerAcreLower: lower / unit.areaAcres,
    plantsPerAcreUpper: upper / unit.areaAcres,
    level: 0.95,
    method: 'poisson-exact',
    basis: 'counting-only',
    units: 1,
    student: null,
  };
}
