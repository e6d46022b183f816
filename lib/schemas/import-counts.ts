import { ImportCells } from './import-cells';
import { readImportTable, type ImportProblem } from './import-table';
import { plantsMost } from './observation';
import type { CountKind } from './vocabulary';

/** One count as a line of a file says it. */
export type CountLine = {
  line: number;
  rowSample: string;
  date: string;
  time: string | null;
  countedAs: CountKind;
  plants: number;
  doubtful: number;
  marker: string | null;
};

export const countColumns = [
  { name: 'row_sample', required: true },
  { name: 'date', required: true },
  { name: 'time', required: false },
  { name: 'doubtful', required: false },
  { name: 'marker', required: false },
] as const;
/** A file gives one of the two: all plants up so far, or those new since the visit before. */
export const countedColumns = ['so_far', 'new'] as const;

/** Reads a file of counts: what each good line says, and every problem of every other line. */
export function readImportCounts(text: string): { lines: CountLine[]; problems: ImportProblem[] } {
  const table = readImportTable(text, countColumns, countedColumns);
  const counted = table.columns.includes('new') ? 'new' : 'so_far';
  const lines: CountLine[] = [];
  const problems = [...table.problems];
  const seen = new Map<string, number>();
  for (const source of table.lines) {
    const cells = new ImportCells(source);
    const rowSample = cells.required('row_sample', 'the label of the row sample', 20);
    const date = cells.date('date');
    const time = cells.time('time');
    const plants = cells.wholeNumber(counted, 'the plants', plantsMost);
    const doubtful = cells.wholeNumber('doubtful', 'the doubtful plants', plantsMost, 0);
    const marker = cells.optional('marker', 20);
    const visit = `${rowSample?.toLowerCase()} ${date} ${time ?? ''}`;
    const first = seen.get(visit);
    if (first !== undefined && cells.problems.length === 0) cells.wrong('row_sample', `Line ${first} has this row sample, date and time already. Leave one of the two out, or give each its time.`);
    seen.set(visit, first ?? source.line);
    problems.push(...cells.problems);
    if (rowSample === undefined || date === undefined || time === undefined || plants === undefined || doubtful === undefined || marker === undefined) continue;
    lines.push({ line: source.line, rowSample, date, time, countedAs: counted === 'new' ? 'new' : 'so-far', plants, doubtful, marker });
  }
  return { lines, problems: inOrder(problems) };
}

export const inOrder = (problems: readonly ImportProblem[]) => [...problems].sort((a, b) => (a.line ?? 0) - (b.line ?? 0));
