import type { RandomStream } from '@/lib/agronomy/random';

/** One draw from the normal distribution (Box and Muller 1958, Annals of Mathematical Statistics 29:610; the sine is thrown away so that one draw takes two numbers of the stream). */
export function normalDraw(stream: RandomStream, { mean, sd }: { mean: number; sd: number }): number {
  // The stream may give 0, whose logarithm does not exist; its mirror image never does.
  const radius = Math.sqrt(-2 * Math.log(1 - stream.nextUnit()));
  return mean + sd * radius * Math.cos(2 * Math.PI * stream.nextUnit());
}
