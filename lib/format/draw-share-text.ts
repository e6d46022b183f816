import { percentText } from './percent-text';

/** A share of draws, which never says all or none where a few were otherwise: `drawShareText(0.9992)` is "more than 99 %". */
export function drawShareText(share: number): string {
  if (share > 0 && share < 0.01) return `less than ${percentText(0.01)}`;
  if (share < 1 && share > 0.99) return `more than ${percentText(0.99)}`;
  return percentText(share);
}
