import { insufficient, value, type Outcome } from './outcome';
import { plantsHeld, type RowEnd } from './plants-held';
import { requiredNumber } from './required-number';

/** One piece of a row that was measured in pieces, because a wheel track or a washout lies between. */
export type RowSegment = {
  lengthInches: number;
  plantsUp: number;
  plantsDoubtful: number;
  startEnd: RowEnd;
  farEnd: RowEnd;
};

export type CutRow = { plantsHeld: number; lengthInches: number; segments: number };

/**
 * What do the pieces of a row that had to be cut hold together?
 *
 * Takes the pieces, each with its length in inches (above 0), its plants (0 or more, of which doubtful) and what each
 * of its ends is. Returns plants held and length, both added, as plantsPerAcre and standInterval take them: one place.
 * Insufficient without a piece. Throws ImpossibleInput as plantsHeld does and for a length that is not positive.
 * Method: plants over the length measured, the ends of every piece settled by themselves; a cut is a mark unless the
 * piece ends at a plant. Common practice, no source.
 * What it does not tell: what stands in the part left out. No spacing runs over a cut.
 * Example: 18 plants in 120 in and 12 in 89.088 in, all ends marks: 30 in 209.088 in.
 */
export function cutRow(segments: readonly RowSegment[]): Outcome<CutRow> {
  if (segments.length === 0) return insufficient('no-segments', '1 piece of row', 'none');
  const whole = { plantsHeld: 0, lengthInches: 0, segments: segments.length };
  for (const segment of segments) {
    whole.lengthInches += requiredNumber(segment.lengthInches, 'lengthInches', { above: 0 });
    whole.plantsHeld += plantsHeld(segment);
  }
  return value(whole);
}
