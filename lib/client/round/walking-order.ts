import type { RoundRow } from '@/lib/schemas/round-day';

const byLabel = new Intl.Collator('en-US', { numeric: true });

/**
 * Row samples in the order that saves steps. Samples of a trial lie on lines across the strips: the first of every strip
 * on the near line, the second on the next. One walks along the near line and back along the next one, to and fro. Free
 * places come after them by their labels.
 */
export function walkingOrder(rows: readonly RoundRow[]): RoundRow[] {
  const strips = new Map<number, RoundRow[]>();
  const free: RoundRow[] = [];
  for (const row of rows) {
    if (row.stripNumber === null) free.push(row);
    else strips.set(row.stripNumber, [...(strips.get(row.stripNumber) ?? []), row]);
  }
  const lines: RoundRow[][] = [];
  for (const strip of [...strips.keys()].sort((a, b) => a - b)) {
    const own = [...(strips.get(strip) ?? [])].sort((a, b) => byLabel.compare(a.label, b.label));
    own.forEach((row, line) => (lines[line] = [...(lines[line] ?? []), row]));
  }
  return [...lines.flatMap((line, index) => (index % 2 === 0 ? line : [...line].reverse())), ...free.sort((a, b) => byLabel.compare(a.label, b.label))];
}
