import { describe, expect, it } from 'vitest';
import { shownRows, type TableRow } from '@/components/ui/shown-rows';

const columns = [
  { key: 'name', head: 'Strip' },
  { key: 'plants', head: 'Plants', align: 'number' as const },
];
const rows: TableRow[] = [
  { id: '1', cells: { name: { text: 'Strip 10' }, plants: { text: '9,000', sort: 9000 } } },
  {
    id: '2',
    cells: { name: { text: 'Strip 2', detail: 'raised' }, plants: { text: '31,300', sort: 31300 } },
  },
  { id: '3', cells: { name: { text: 'Strip 1' }, plants: { text: 'not enough yet', sort: null } } },
];
const ids = (shown: TableRow[]) => shown.map((row) => row.id).join('');

describe('the rows a table shows', () => {
  it('keeps the given order until one is asked for', () => {
    expect(ids(shownRows(rows, columns, '', undefined))).toBe('123');
  });

  it('sorts numbers by size and names by the number in them', () => {
    expect(ids(shownRows(rows, columns, '', { key: 'plants', direction: 'ascending' }))).toBe('123');
    expect(ids(shownRows(rows, columns, '', { key: 'name', direction: 'ascending' }))).toBe('321');
  });

  it('puts what is missing last in both directions', () => {
    expect(ids(shownRows(rows, columns, '', { key: 'plants', direction: 'descending' }))).toBe('213');
  });

  it('shows rows that have every typed word, also in the smaller line', () => {
    expect(ids(shownRows(rows, columns, 'RAISED strip', undefined))).toBe('2');
    expect(shownRows(rows, columns, 'cotton', undefined)).toEqual([]);
  });

  it('leaves the given rows as they were', () => {
    const frozen = Object.freeze([...rows]);
    shownRows(frozen, columns, '', { key: 'name', direction: 'ascending' });
    expect(frozen.map((row) => row.id)).toEqual(['1', '2', '3']);
  });
});
