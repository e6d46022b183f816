import { ImpossibleInput } from './outcome';
import { requiredNumber } from './required-number';

/** Where a measured length begins or ends: at a mark set without regard to plants, or at a plant. */
export type RowEnd = 'mark' | 'plant';

export type PlantCount = {
  plantsUp: number;
  /** Of the plants up, those not likely to live. */
  plantsDoubtful: number;
  startEnd: RowEnd;
  farEnd: RowEnd;
  /** Rows counted over the same length, 1 unless given. */
  rowsCounted?: number;
};

/**
 * How many plants does a measured length hold?
 *
 * Takes the plants counted in the length with the plants at its ends (whole, 0 or more), how many of them are
 * doubtful, and what each end is. Returns plants, in halves, never below 0. Never insufficient; throws
 * ImpossibleInput for negative counts or more doubtful plants than plants.
 *
 * Method. A doubtful plant counts one half (Wisconsin W120). An end that is a *mark* falls anywhere in the
 * space between two plants, so plants over length is right as counted. An end that is a *plant* puts half of
 * that plant's own space outside the length: take half a plant off. Evenly spaced plants show it: from a
 * plant to a plant n plants span n − 1 spaces; from a mark to a plant the mark lies on average half a
 * space before the first plant, so n plants span n − 1/2 spaces. The half at one end is our own derivation
 * (exact for even spacing; a clumped stand departs from it by less than half a plant).
 *
 * It does not tell whether the plants will live, nor anything about the field beyond this length.
 * Example: 11 plants from a plant to a plant are 10; from a mark to a mark 11; from a mark to a plant 10.5.
 */
export function plantsHeld(count: PlantCount): number {
  const { plantsUp, plantsDoubtful, startEnd, farEnd, rowsCounted = 1 } = count;
  requiredNumber(plantsUp, 'plantsUp', { atLeast: 0 });
  requiredNumber(plantsDoubtful, 'plantsDoubtful', { atLeast: 0 });
  requiredNumber(rowsCounted, 'rowsCounted', { above: 0 });
  if (plantsDoubtful > plantsUp) {
    throw new ImpossibleInput('There are more doubtful plants than plants.', 'plantsDoubtful');
  }
  const plantEnds = (startEnd === 'plant' ? 1 : 0) + (farEnd === 'plant' ? 1 : 0);
  return Math.max(0, plantsUp - plantsDoubtful / 2 - (plantEnds / 2) * rowsCounted);
}
