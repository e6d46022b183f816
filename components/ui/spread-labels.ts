/**
 * Moves labels apart along one line so that no two centers are nearer than `leastDistance`, each as little as can be.
 * Takes wished centers in any order and gives the places back in that order; places stay within `from` and `to`
 * as long as all the labels fit there. Method: neighbors that overlap are pooled and their block centered on the
 * mean wish, as in isotonic regression. For example `spreadLabels([10, 11], 4, 0, 100)` is `[8.5, 12.5]`.
 */
export function spreadLabels(
  wishes: readonly number[],
  leastDistance: number,
  from: number,
  to: number,
): number[] {
  const order = wishes.map((_, index) => index).sort((a, b) => (wishes[a] ?? 0) - (wishes[b] ?? 0));
  // Without its rank times the distance, a wish only has to be no smaller than the one before it.
  const blocks: { sum: number; count: number }[] = [];
  const mean = (block: { sum: number; count: number }) => block.sum / block.count;
  order.forEach((index, rank) => {
    blocks.push({ sum: (wishes[index] ?? 0) - rank * leastDistance, count: 1 });
    for (;;) {
      const last = blocks.at(-1);
      const before = blocks.at(-2);
      if (!last || !before || mean(before) <= mean(last)) break;
      blocks.splice(-2, 2, { sum: before.sum + last.sum, count: before.count + last.count });
    }
  });
  const free = blocks.flatMap((block) => Array.from({ length: block.count }, () => mean(block)));
  const last = wishes.length - 1;
  const places: number[] = new Array<number>(wishes.length).fill(0);
  order.forEach((index, rank) => {
    const lowest = from;
    const highest = Math.max(lowest, to - last * leastDistance);
    places[index] = Math.min(highest, Math.max(lowest, free[rank] ?? 0)) + rank * leastDistance;
  });
  return places;
}
