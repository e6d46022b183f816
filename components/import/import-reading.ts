import { readImportCounts, type CountLine } from '@/lib/schemas/import-counts';
import type { ImportProblem } from '@/lib/schemas/import-table';
import { readImportTapeSheets, type TapeSheetLines } from '@/lib/schemas/import-tape-sheets';
import type { ImportKind } from '@/lib/schemas/vocabulary';

/** What the browser understands of a file before it is sent, by the same reader as the server's. */
export type ImportReading = {
  problems: ImportProblem[];
  rowSamples: string[];
  days: string[];
  read: { kind: 'counts'; lines: CountLine[] } | { kind: 'tape-sheets'; sheets: TapeSheetLines[] };
};

const distinct = (texts: readonly string[]) => [...new Set(texts)];

export function readImport(kind: ImportKind, text: string): ImportReading {
  if (kind === 'counts') {
    const { lines, problems } = readImportCounts(text);
    return { problems, rowSamples: distinct(lines.map((line) => line.rowSample)), days: distinct(lines.map((line) => line.date)).sort(), read: { kind, lines } };
  }
  const { sheets, problems } = readImportTapeSheets(text);
  return { problems, rowSamples: distinct(sheets.map((sheet) => sheet.rowSample)), days: distinct(sheets.map((sheet) => sheet.date)).sort(), read: { kind, sheets } };
}
