import { rowLengthFeet, rowLengthMeters } from '@/lib/agronomy/row-length';
import { rowLengthText } from '@/lib/format/row-length-text';
import { readingIn } from '@/lib/schemas/reading';
import type { ReadingUnit, RowEnd, UnitSystem } from '@/lib/schemas/vocabulary';

export type Ends = `${RowEnd}-${RowEnd}`;

/** The length that holds 1/1000 acre (or hectare), as one would type it. */
export function suggestedLength(rowSpacing: { unit: ReadingUnit; thousandths: number }, units: UnitSystem): string {
  return units === 'us'
    ? rowLengthText(rowLengthFeet(readingIn(rowSpacing, 'in')) * 12, 'us')
    : rowLengthText((rowLengthMeters(readingIn(rowSpacing, 'm')) * 100) / 2.54, 'metric');
}

export const endsBody = (ends: Ends): { startEnd: RowEnd; farEnd: RowEnd } => {
  const [startEnd, farEnd] = ends.split('-') as [RowEnd, RowEnd];
  return { startEnd, farEnd };
};

/** "3, 5, 6" as numbers; empty where nothing was typed, undefined where it is no list of numbers. */
export function planterRowsOf(text: string): number[] | undefined {
  if (text.trim() === '') return [];
  const parts = text.split(/[\s,;]+/).filter((part) => part !== '');
  return parts.every((part) => /^\d+$/.test(part)) ? parts.map(Number) : undefined;
}

/** The first whole number that no label with this prefix uses yet, so that new ones follow on. */
export function nextNumber(labels: readonly string[], prefix: string): number {
  const used = labels
    .filter((label) => label.startsWith(prefix))
    .map((label) => Number(label.slice(prefix.length)))
    .filter(Number.isInteger);
  return Math.max(0, ...used) + 1;
}
