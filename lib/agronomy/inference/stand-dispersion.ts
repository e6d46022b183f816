import { insufficient, value, type Outcome } from '../outcome';
import { requiredNumber } from '../required-number';
import { chiSquareTails } from './chi-square-tails';
import type { StandUnit } from './stand-interval';

export type StandDispersion = {
  /** Variance over mean: 1 where plants fall at random, below where they are evenly set, above in patches. */
  index: number;
  degreesOfFreedom: number;
  test: Outcome<{ chiSquare: number; pPatchy: number; pEven: number; p: number }>;
};

/** Below this many plants expected in a place the chi-square distribution is a poor guide (Cochran 1954, from memory). */
const EXPECTED_LEAST = 5;

/**
 * Do places differ more, or less, than plants falling at random would make them?
 *
 * Takes places with plants held (0 or more) and area in acres (above 0). Returns the index, and a chi-square test for
 * patchiness, for evenness and both ways. Insufficient below two places or where nothing stands; the test also where a
 * place would hold fewer than 5 plants at the overall stand. Throws ImpossibleInput for what cannot be.
 * Method: Σ (y − R a)² / (R a) on n − 1 degrees of freedom, R = Σy / Σa; the index is that over n − 1, with equal areas
 * the variance over the mean (Fisher's index of dispersion). p both ways is twice the smaller tail, at most 1.
 * What it does not tell: where the patches lie or why. A planter sets plants evenly, so an index well below 1 is usual and an
 * index of 1 already means that places differ. Few places show little either way.
 * Example: 31 28 33 26 30 29 plants in equal lengths: index 0.2, p for evenness 0.037.
 */
export function standDispersion(units: readonly StandUnit[]): Outcome<StandDispersion> {
  let plants = 0;
  let area = 0;
  for (const unit of units) {
    plants += requiredNumber(unit.plantsHeld, 'plantsHeld', { atLeast: 0 });
    area += requiredNumber(unit.areaAcres, 'areaAcres', { above: 0 });
  }
  if (units.length < 2) return insufficient('too-few-places', '2 places', `${units.length}`);
  if (plants === 0) return insufficient('none-standing', '1 plant', 'none');
  const expected = units.map((unit) => (plants * unit.areaAcres) / area);
  const chiSquare = units.reduce((sum, unit, index) => {
    const hoped = expected[index] as number;
    return sum + (unit.plantsHeld - hoped) ** 2 / hoped;
  }, 0);
  const degreesOfFreedom = units.length - 1;
  const least = Math.min(...expected);
  if (least < EXPECTED_LEAST) {
    const test = insufficient('few-plants-a-place', '5 plants expected in every place', 'fewer');
    return value({ index: chiSquare / degreesOfFreedom, degreesOfFreedom, test });
  }
  const { lower, upper } = chiSquareTails(chiSquare, degreesOfFreedom);
  const p = Math.min(1, 2 * Math.min(lower, upper));
  const test = value({ chiSquare, pPatchy: upper, pEven: lower, p });
  return value({ index: chiSquare / degreesOfFreedom, degreesOfFreedom, test });
}
