import { SAME_NUMBER } from './constants';
import { ImpossibleInput } from './outcome';
import { requiredNumber } from './required-number';

/** A known point of a piecewise linear line. */
export type Anchor = { at: number; result: number };

/**
 * What does a line through known points say at one place?
 *
 * Takes anchors with strictly ascending `at`, and the place. Returns the linear reading between the two
 * neighboring anchors; at or beyond an end it returns that end's value, so a caller that must not read
 * past the ends has to ask first. Throws ImpossibleInput for no anchors, or anchors out of order.
 * Method: straight lines between anchors. It says nothing about the shape of the truth between them.
 * Example: anchors (2, 100) and (7, 0) read at 4.5 give 50.
 */
export function interpolate(anchors: readonly Anchor[], at: number): number {
  requiredNumber(at, 'at');
  const first = anchors[0];
  const last = anchors[anchors.length - 1];
  if (!first || !last) throw new ImpossibleInput('There are no anchors to read between.', 'anchors');
  if (at <= first.at) return first.result;
  if (at >= last.at) return last.result;
  for (let index = 1; index < anchors.length; index += 1) {
    const left = anchors[index - 1] as Anchor;
    const right = anchors[index] as Anchor;
    if (right.at <= left.at) throw new ImpossibleInput('Anchors must ascend.', 'anchors');
    if (at <= right.at) {
      return left.result + ((at - left.at) / (right.at - left.at)) * (right.result - left.result);
    }
  }
  return last.result;
}

/** Whether a place falls on an anchor, so that the reading there was measured and not interpolated. */
export function isAnchor(anchors: readonly Anchor[], at: number): boolean {
  return anchors.some((anchor) => Math.abs(anchor.at - at) <= SAME_NUMBER);
}
