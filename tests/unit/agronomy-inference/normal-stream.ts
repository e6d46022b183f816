import { randomStream } from '../../../lib/agronomy/random';

/** Standard normal numbers that belong to a seed, by Box and Muller. */
export function normalStream(seed: number): () => number {
  const stream = randomStream(seed);
  return () => Math.sqrt(-2 * Math.log(1 - stream.nextUnit())) * Math.cos(2 * Math.PI * stream.nextUnit());
}
