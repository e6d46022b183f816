import { parse } from 'csv-parse/browser/esm/sync';
import { importLinesMost } from './observation';

/** One thing wrong with a file: on which line, in which column, and what to do. Line and column are null where it is the whole file. */
export type ImportProblem = { line: number | null; column: string | null; message: string };

export type ImportColumn = { name: string; required: boolean };
/** A data line: its number in the file, and its cells by column; a column that the file leaves out is empty. */
export type ImportLine = { line: number; cells: Record<string, string> };
export type ImportTable = { columns: string[]; lines: ImportLine[]; problems: ImportProblem[] };

const delimiterNames = { ',': 'comma', ';': 'semicolon', '\t': 'tab' } as const;
type Delimiter = keyof typeof delimiterNames;

const wholeFile = (message: string): ImportTable => ({ columns: [], lines: [], problems: [{ line: null, column: null, message }] });

/** A header names columns with plain words, so whichever separator stands in it is the file's. */
function delimiterOf(header: string): Delimiter | undefined {
  const found = (Object.keys(delimiterNames) as Delimiter[]).filter((each) => header.includes(each));
  return found.length > 1 ? undefined : (found[0] ?? ',');
}

type Row = { cells: string[]; line: number };

function rowsOf(text: string, delimiter: Delimiter): Row[] | ImportProblem {
  try {
    const records = parse(text, { delimiter, info: true, trim: true, relax_column_count: true, relax_quotes: true, skip_empty_lines: true, max_record_size: 10_000 }) as unknown as {
      record: string[];
      info: { lines: number };
    }[];
    // A spreadsheet saves emptied lines as separators alone.
    return records.map(({ record, info }) => ({ cells: record, line: info.lines })).filter((row) => row.cells.some((cell) => cell !== ''));
  } catch (error) {
    // The parser names the line where the quotation opened only in its message.
    const line = error instanceof Error ? /line (\d+)/.exec(error.message)?.[1] : undefined;
    return { line: line === undefined ? null : Number(line), column: null, message: 'A quotation mark opens a cell here and no other closes it. Remove it, or close the cell with one.' };
  }
}

function headerProblem(header: readonly string[], columns: readonly ImportColumn[], oneOf: readonly string[]): string | undefined {
  const known = [...columns.map((column) => column.name), ...oneOf];
  const strange = header.filter((name) => !known.includes(name));
  const missing = columns.filter((column) => column.required && !header.includes(column.name)).map((column) => column.name);
  const twice = header.filter((name, index) => header.indexOf(name) !== index);
  const chosen = oneOf.filter((name) => header.includes(name));
  const wrong = [
    strange.length > 0 ? `It has ${strange.map((name) => (name === '' ? 'a column without a name' : `"${name.slice(0, 30)}"`)).join(', ')}, which no column is called.` : '',
    missing.length > 0 ? `It lacks ${missing.join(', ')}.` : '',
    twice.length > 0 ? `It names ${twice.join(', ')} twice.` : '',
    oneOf.length > 0 && chosen.length !== 1 ? `It must have ${oneOf.join(' or ')}, one of the two.` : '',
  ].filter(Boolean);
  if (wrong.length === 0) return undefined;
  const optional = columns.filter((column) => !column.required).map((column) => column.name);
  const required = [...columns.filter((column) => column.required).map((column) => column.name), ...(oneOf.length > 0 ? [oneOf.join(' or ')] : [])];
  return `The first line names the columns ${required.join(', ')}${optional.length > 0 ? `, and where wanted ${optional.join(', ')}` : ''}. ${wrong.join(' ')}`;
}

/**
 * Reads a pasted or uploaded table: commas, semicolons or tabs, whichever the header uses, with or without a byte-order
 * mark. Says every line that has other columns than the header; the cells themselves are the caller's to read.
 */
export function readImportTable(text: string, columns: readonly ImportColumn[], oneOf: readonly string[] = []): ImportTable {
  const plain = text.replace(/^\uFEFF/, '');
  if (/[\0\uFFFD]/.test(plain)) return wholeFile('This is no plain text file. Save the sheet as CSV (UTF-8) and take that file.');
  if (plain.trim() === '') return wholeFile('The file is empty.');
  const delimiter = delimiterOf(plain.trimStart().split(/\r?\n|\r/, 1)[0] ?? '');
  if (!delimiter) return wholeFile('The first line has more than one kind of separator. Use commas throughout, or semicolons throughout.');
  const rows = rowsOf(plain, delimiter);
  if (!Array.isArray(rows)) return { columns: [], lines: [], problems: [rows] };
  const [header, ...data] = rows;
  const names = header?.cells ?? [];
  const problem = headerProblem(names, columns, oneOf);
  if (problem) return { columns: names, lines: [], problems: [{ line: header?.line ?? 1, column: null, message: problem }] };
  if (data.length === 0) return { ...wholeFile('There is no line below the column names.'), columns: names };
  if (data.length > importLinesMost) {
    return { ...wholeFile(`The file has ${data.length.toLocaleString('en-US')} lines; at most ${importLinesMost.toLocaleString('en-US')} are taken at once. Split it.`), columns: names };
  }
  const uneven = data.filter((row) => row.cells.length !== names.length);
  return {
    columns: names,
    lines: data
      .filter((row) => row.cells.length === names.length)
      .map((row) => ({ line: row.line, cells: Object.fromEntries(names.map((name, index) => [name, row.cells[index] ?? ''])) })),
    problems: uneven.map((row) => ({
      line: row.line,
      column: null,
      message: `This line has ${row.cells.length} cells where the first line names ${names.length}. Check the ${delimiterNames[delimiter]}s; a cell that holds one stands in quotation marks.`,
    })),
  };
}
