import { ImportCells } from './import-cells';
import { inOrder } from './import-counts';
import { readImportTable, type ImportProblem } from './import-table';
import { leafCollarsMost, tapePlacesMost } from './observation';
import { parseTapePlace } from './tape-place';
import { tapeEntryKinds, tapeUnits, type TapeEntryKind, type TapeUnit } from './vocabulary';

export type TapePlaceLine = { line: number; typed: string; kind: TapeEntryKind; marker: string | null; leafStage: number | null };
/** The lines of one row sample and date: one tape sheet. */
export type TapeSheetLines = { line: number; rowSample: string; date: string; tapeUnit: TapeUnit; places: TapePlaceLine[] };

export const tapeSheetColumns = [
  { name: 'row_sample', required: true },
  { name: 'date', required: true },
  { name: 'tape', required: true },
  { name: 'place', required: true },
  { name: 'marker', required: false },
  { name: 'kind', required: false },
  { name: 'leaf_stage', required: false },
] as const;

function leafStageOf(cells: ImportCells): number | null | undefined {
  const text = cells.text('leaf_stage');
  if (text === '') return null;
  const collars = /^\d{1,2}([.,]\d)?$/.test(text) ? Number(text.replace(',', '.')) : undefined;
  if (collars === undefined || collars > leafCollarsMost) return cells.wrong('leaf_stage', `Write the leaf collars from 0 to ${leafCollarsMost}, such as 2 or 2.5, or leave it empty.`);
  return collars;
}

function wordOf<Word extends string>(cells: ImportCells, column: string, words: readonly Word[], whenEmpty?: Word): Word | undefined {
  const text = cells.text(column).toLowerCase();
  if (text === '' && whenEmpty) return whenEmpty;
  return words.find((word) => word === text) ?? cells.wrong(column, `Write one of ${words.join(', ')}${whenEmpty ? `, or leave it empty for ${whenEmpty}` : ''}.`);
}

/** Reads a file of tape sheets, one line a place: the sheets, and every problem of every line. */
export function readImportTapeSheets(text: string): { sheets: TapeSheetLines[]; problems: ImportProblem[] } {
  const table = readImportTable(text, tapeSheetColumns);
  const problems = [...table.problems];
  const sheets = new Map<string, TapeSheetLines>();
  for (const source of table.lines) {
    const cells = new ImportCells(source);
    const rowSample = cells.required('row_sample', 'the label of the row sample', 20);
    const date = cells.date('date');
    const tapeUnit = wordOf(cells, 'tape', tapeUnits);
    const typed = cells.required('place', 'the place on the tape', 30);
    const kind = wordOf(cells, 'kind', tapeEntryKinds, 'plant');
    const marker = cells.optional('marker', 20);
    const leafStage = leafStageOf(cells);
    const place = typed !== undefined && tapeUnit !== undefined ? parseTapePlace(typed, tapeUnit) : undefined;
    if (place && !place.ok) cells.wrong('place', place.message);
    if (rowSample !== undefined && date !== undefined && tapeUnit !== undefined) {
      const key = `${rowSample.toLowerCase()} ${date}`;
      const sheet = sheets.get(key) ?? { line: source.line, rowSample, date, tapeUnit, places: [] };
      sheets.set(key, sheet);
      if (sheet.tapeUnit !== tapeUnit) cells.wrong('tape', `Line ${sheet.line} gives this sheet in ${sheet.tapeUnit}. One sheet is read off one tape.`);
      if (sheet.places.length === tapePlacesMost) cells.wrong('place', `More than ${tapePlacesMost.toLocaleString('en-US')} places on one sheet cannot be right.`);
      if (typed !== undefined && kind !== undefined && marker !== undefined && leafStage !== undefined) {
        sheet.places.push({ line: source.line, typed, kind, marker, leafStage });
      }
    }
    problems.push(...cells.problems);
  }
  return { sheets: [...sheets.values()], problems: inOrder(problems) };
}
