export function median(numbers: readonly number[]): number {
  const sorted = [...numbers].sort((a, b) => a - b);
  const middle = sorted.length >> 1;
  return sorted.length % 2 === 1 ? (sorted[middle] ?? Number.NaN) : ((sorted[middle - 1] ?? Number.NaN) + (sorted[middle] ?? Number.NaN)) / 2;
}

/** The ratio of two sides that took turns, round by round: its median, and the range of its rounds. */
export function ratioText(above: readonly number[], below: readonly number[]): string {
  const ratios = above.map((each, round) => each / (below[round] ?? Number.NaN));
  return `${median(ratios).toFixed(2)} (${Math.min(...ratios).toFixed(2)} to ${Math.max(...ratios).toFixed(2)})`;
}
