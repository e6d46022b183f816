/**
 * Moves labels apart along one line so that none overlap, each as little as can be. Takes wished centers in any
 * order and the size each label takes along the line, its clearance included; gives the centers back in that order.
 * They stay within `from` and `to` as long as all the labels fit there. Method: neighbors that overlap are pooled
 * and their block centered on the mean wish, as in isotonic regression.
 * For example `spreadLabels([10, 11], [4, 4], 0, 100)` is `[8.5, 12.5]`.
 */
export function spreadLabels(
  wishes: readonly number[],
  sizes: readonly number[],
  from: number,
  to: number,
): number[] {
  const order = wishes.map((_, index) => index).sort((a, b) => (wishes[a] ?? 0) - (wishes[b] ?? 0));
  const sizeAt = (rank: number) => sizes[order[rank] ?? 0] ?? 0;
  // How far a label's center lies behind the first one's when all of them touch.
  const offsets: number[] = [];
  order.forEach((_, rank) => {
    const before = offsets[rank - 1];
    offsets.push(before === undefined ? 0 : before + (sizeAt(rank - 1) + sizeAt(rank)) / 2);
  });
  // Without its offset, a wish only has to be no smaller than the one before it.
  const blocks: { sum: number; count: number }[] = [];
  const mean = (block: { sum: number; count: number }) => block.sum / block.count;
  order.forEach((index, rank) => {
    blocks.push({ sum: (wishes[index] ?? 0) - (offsets[rank] ?? 0), count: 1 });
    for (;;) {
      const last = blocks.at(-1);
      const before = blocks.at(-2);
      if (!last || !before || mean(before) <= mean(last)) break;
      blocks.splice(-2, 2, { sum: before.sum + last.sum, count: before.count + last.count });
    }
  });
  const free = blocks.flatMap((block) => Array.from({ length: block.count }, () => mean(block)));
  const lastRank = wishes.length - 1;
  const lowest = from + sizeAt(0) / 2;
  const highest = Math.max(lowest, to - sizeAt(lastRank) / 2 - (offsets[lastRank] ?? 0));
  const places: number[] = new Array<number>(wishes.length).fill(0);
  order.forEach((index, rank) => {
    places[index] = Math.min(highest, Math.max(lowest, free[rank] ?? 0)) + (offsets[rank] ?? 0);
  });
  return places;
}
