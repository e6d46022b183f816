/**
 * From where on does a condition hold that does not hold below?
 *
 * Takes a condition that turns from false to true once as its number grows, a number above 0 at which it is still
 * false, and one above it to begin with. Returns the smallest number at which it holds, to the last digit. Never insufficient; throws nothing;
 * the caller answers for a condition that does turn.
 * Method: the upper end is doubled until the condition holds, then the interval is halved until it no longer moves.
 * Example: x² ≥ 2 from 1 on: 1.414213562.
 */
export function bisected(holds: (candidate: number) => boolean, low: number, high: number): number {
  let from = low;
  let to = high;
  while (!holds(to)) to *= 2;
  for (let middle = (from + to) / 2; middle > from && middle < to; middle = (from + to) / 2) {
    if (holds(middle)) to = middle;
    else from = middle;
  }
  return to;
}
