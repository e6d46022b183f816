import type { ReactNode } from 'react';

export type TableColumn = {
  key: string;
  head: string;
  /** Numbers stand in the mono face and to the right. Text is the default. */
  align?: 'text' | 'number';
  /** True unless said otherwise. */
  sortable?: boolean;
};

export type TableCellData = {
  /** What is shown, filtered and downloaded. */
  text: string;
  /** What it is sorted by when the text does not sort by itself; null for what is missing, which goes last. */
  sort?: number | string | null;
  /** A second, smaller line. */
  detail?: string;
  href?: string;
  /** Shown instead of the text, for instance a number that opens; the text still goes into the file. */
  node?: ReactNode;
};

export type TableRow = {
  id: string;
  cells: Readonly<Record<string, TableCellData | undefined>>;
  /** The one row that the page speaks of. */
  highlighted?: boolean;
};

export type TableSort = { key: string; direction: 'ascending' | 'descending' };

const inOrder = new Intl.Collator('en-US', { numeric: true, sensitivity: 'base' });

function sortValue(row: TableRow, key: string): number | string | null {
  const cell = row.cells[key];
  if (cell === undefined) return null;
  return cell.sort === undefined ? cell.text : cell.sort;
}

/** The rows that have every typed word, in the chosen order. Missing values go last in both directions. */
export function shownRows(
  rows: readonly TableRow[],
  columns: readonly TableColumn[],
  words: string,
  sort: TableSort | undefined,
): TableRow[] {
  const wanted = words.toLowerCase().split(/\s+/).filter(Boolean);
  const kept = rows.filter((row) => {
    const text = columns
      .map((column) => `${row.cells[column.key]?.text ?? ''} ${row.cells[column.key]?.detail ?? ''}`)
      .join(' ')
      .toLowerCase();
    return wanted.every((word) => text.includes(word));
  });
  if (!sort) return kept;
  const sign = sort.direction === 'ascending' ? 1 : -1;
  return kept.sort((a, b) => {
    const [left, right] = [sortValue(a, sort.key), sortValue(b, sort.key)];
    if (left === null || right === null) return left === right ? 0 : left === null ? 1 : -1;
    if (typeof left === 'number' && typeof right === 'number') return sign * (left - right);
    return sign * inOrder.compare(String(left), String(right));
  });
}
