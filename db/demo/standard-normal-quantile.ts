import { normalCdf } from '@/lib/agronomy/inference/normal-cdf';

const farthest = 8;
const halvings = 60;

/** Below which number does this share (above 0, below 1) of the standard normal distribution lie? By halving an interval. */
export function standardNormalQuantile(share: number): number {
  if (!(share > 0 && share < 1)) throw new RangeError('A share above 0 and below 1 has a quantile.');
  let below = -farthest;
  let above = farthest;
  for (let halving = 0; halving < halvings; halving += 1) {
    const middle = (below + above) / 2;
    if (normalCdf(middle) < share) below = middle;
    else above = middle;
  }
  return (below + above) / 2;
}
