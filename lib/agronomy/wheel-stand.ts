import { insufficient, value, type Outcome } from './outcome';
import { plantsHeld, type RowEnd } from './plants-held';
import { requiredCount } from './required-count';
import { plantsPerAcre, rowAreaAcres } from './stand';

export type WheelCount = {
  /** Plants passed, those at the two ends with them. */
  plantsPassed: number;
  distanceInches: number;
  rowSpacingInches: number;
  startEnd: RowEnd;
  farEnd: RowEnd;
};

export type WheelStand = { plantsPerAcre: number; plantsHeld: number; areaAcres: number };

/**
 * What stand do plants counted along a measuring wheel make?
 *
 * Takes the plants passed (whole), the distance the wheel shows and the row spacing in inches (above 0), and what the
 * wheel was set down and lifted at. Returns plants per acre with the plants held and the area. Insufficient with fewer
 * plants than ends that are plants. Throws ImpossibleInput for counts that are not whole or lengths not positive.
 * Method: from a plant to a plant n plants span n − 1 spaces, so the distance holds n − 1; ends as in plantsHeld.
 * What it does not tell: a wheel slips in loose soil and rides over clods; no printed error was found. One row.
 * Example: 150 plants from the first to the last over 87 ft of a 30-inch row: 149 held, 29,841 per acre.
 */
export function wheelStand(wheel: WheelCount): Outcome<WheelStand> {
  const { plantsPassed, startEnd, farEnd, distanceInches, rowSpacingInches } = wheel;
  requiredCount(plantsPassed, 'plantsPassed', { atLeast: 0 });
  const areaAcres = rowAreaAcres(distanceInches, rowSpacingInches);
  const plantEnds = [startEnd, farEnd].filter((end) => end === 'plant').length;
  if (plantsPassed < plantEnds) {
    return insufficient('too-few-plants', `a plant at each end that is one: ${plantEnds}`, `${plantsPassed}`);
  }
  const held = plantsHeld({ plantsUp: plantsPassed, plantsDoubtful: 0, startEnd, farEnd });
  return value({
    plantsPerAcre: plantsPerAcre({ plantsHeld: held, lengthInches: distanceInches, rowSpacingInches }),
    plantsHeld: held,
    areaAcres,
  });
}
