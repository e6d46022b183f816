import { requiredNumber } from './required-number';

/**
 * Which never-falling line lies closest to these readings?
 *
 * Takes readings in order and, if wanted, how much each weighs (1 unless given). Returns as many fitted
 * readings. Never insufficient (no readings give none); throws ImpossibleInput for a reading that is not
 * finite or a weight that is not above 0.
 * Method: pooled adjacent violators, the least-squares isotonic regression (Barlow et al. 1972); agrees with
 * R's isoreg. It smooths a fall into its neighbors and does not tell why the count fell.
 * Example: 2 9 17 16 24 becomes 2 9 16.5 16.5 24.
 */
export function isotonicFit(readings: readonly number[], weights?: readonly number[]): number[] {
  const blocks: { mean: number; weight: number; size: number }[] = [];
  readings.forEach((reading, index) => {
    requiredNumber(reading, 'readings');
    const weight = requiredNumber(weights?.[index] ?? 1, 'weights', { above: 0 });
    let block = { mean: reading, weight, size: 1 };
    let before = blocks[blocks.length - 1];
    while (before && before.mean > block.mean) {
      blocks.pop();
      const joined = before.weight + block.weight;
      block = {
        mean: (before.mean * before.weight + block.mean * block.weight) / joined,
        weight: joined,
        size: before.size + block.size,
      };
      before = blocks[blocks.length - 1];
    }
    blocks.push(block);
  });
  return blocks.flatMap((block) => Array.from({ length: block.size }, () => block.mean));
}
