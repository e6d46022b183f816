import 'server-only';
import { v7 } from 'uuid';
import { checkTapeSheet } from '@/lib/schemas/check-tape-sheet';
import { inOrder } from '@/lib/schemas/import-counts';
import type { ImportProblem } from '@/lib/schemas/import-table';
import { readImportTapeSheets, type TapeSheetLines } from '@/lib/schemas/import-tape-sheets';
import { insertTapeSheets } from '../../data/tape-sheet';
import { insertVisits } from '../../data/visit';
import type { WriteContext } from '../../operations/context';
import { originColumns } from '../../operations/origin-columns';
import { checkVisit } from '../counts/check-visit';
import { rowSampleFacts } from '../counts/count-facts';
import { markersOfRow } from '../tape-sheets/markers-of-row';
import { tapedByOn } from '../tape-sheets/taped-by-on';
import { tapeSheetColumns } from '../tape-sheets/tape-sheet-columns';
import type { LineQuestion } from './import-questions';
import { unknownRowSample, type ImportSetting } from './import-setting';
import type { ReadyImport } from './ready-import';

type Sheet = TapeSheetLines & { rowSampleId: string; thousandths: number[] };

/** Reads a file of tape sheets against its planting: what is wrong, what is asked about, and how it is stored once neither is left. */
export function readyTapeSheets(context: WriteContext, setting: ImportSetting, text: string): ReadyImport {
  const read = readImportTapeSheets(text);
  const problems: ImportProblem[] = [...read.problems];
  const questions: LineQuestion[] = [];
  const sheets: Sheet[] = [];
  // A place that cannot be read is named already; the sheet around it is held against its row once all can be.
  const readable = read.problems.length === 0;
  for (const sheet of read.sheets) {
    const visit = { visitedOn: sheet.date, visitedAt: null };
    problems.push(...checkVisit(visit, setting.visits, 'date').map(({ message }) => ({ line: sheet.line, column: 'date', message })));
    const sample = setting.rowSampleOf(sheet.rowSample);
    if (!sample) {
      problems.push(unknownRowSample(sheet.line, sheet.rowSample));
      continue;
    }
    if (!readable) continue;
    const { counts, tapeSheets } = setting.observations;
    const checked = checkTapeSheet(sheet.places, sheet.tapeUnit, {
      label: sample.label,
      markers: markersOfRow(counts, sample.id),
      tapedBy: tapedByOn(tapeSheets, { rowSampleId: sample.id, personId: context.actor.personId, visitedOn: sheet.date }),
      ...rowSampleFacts(setting.planting, sample),
    });
    problems.push(...checked.fields.map(({ path, message }) => ({ line: sheet.places[Number(path.split('.')[1])]?.line ?? sheet.line, column: 'place', message })));
    questions.push(...checked.questions.map((question) => ({ ...question, line: sheet.line })));
    sheets.push({ ...sheet, rowSampleId: sample.id, thousandths: checked.thousandths });
  }
  return {
    problems: inOrder(problems),
    questions,
    lines: read.sheets.reduce((lines, sheet) => lines + sheet.places.length, 0),
    records: sheets.length,
    rowSamples: new Set(sheets.map((sheet) => sheet.rowSampleId)).size,
    store: (importId) => store(context, setting.timeZone, sheets, importId),
  };
}

async function store(context: WriteContext, timeZone: string, sheets: readonly Sheet[], importId: string) {
  const { tx, actor } = context;
  const origin = originColumns(context, importId);
  const withVisits = sheets.map((sheet) => ({ sheet, visitId: v7() }));
  await insertVisits(
    tx,
    withVisits.map(({ sheet, visitId }) => ({
      id: visitId, rowSampleId: sheet.rowSampleId, personId: actor.personId, visitedOn: sheet.date, visitedAt: null, timeZone, marker: null, ...origin,
    })),
  );
  await insertTapeSheets(
    tx,
    withVisits.map(({ sheet, visitId }) => ({
      id: v7(), rowSampleId: sheet.rowSampleId, visitId, ...tapeSheetColumns(sheet.places, sheet.tapeUnit, sheet.thousandths), ...origin,
    })),
  );
}
