import 'server-only';
import { v7 } from 'uuid';
import { inOrder, readImportCounts, type CountLine } from '@/lib/schemas/import-counts';
import type { ImportProblem } from '@/lib/schemas/import-table';
import { insertCounts } from '../../data/count';
import { insertVisits } from '../../data/visit';
import type { WriteContext } from '../../operations/context';
import { originColumns } from '../../operations/origin-columns';
import { checkCounts } from '@/lib/schemas/check-counts';
import { checkVisit } from '../counts/check-visit';
import { rowSampleFacts } from '../counts/count-facts';
import { groupByRowSample } from '../counts/group-by-row-sample';
import type { LineQuestion } from './import-questions';
import { unknownRowSample, type ImportSetting } from './import-setting';
import type { ReadyImport } from './ready-import';

type Entry = CountLine & { id: string; rowSampleId: string; personId: string; personName: string; visitedOn: string; visitedAt: string | null };

/** Reads a file of counts against its planting: what is wrong, what is asked about, and how it is stored once neither is left. */
export function readyCounts(context: WriteContext, setting: ImportSetting, text: string): ReadyImport {
  const { actor } = context;
  const read = readImportCounts(text);
  const problems: ImportProblem[] = [...read.problems];
  const entries: Entry[] = [];
  for (const line of read.lines) {
    const sample = setting.rowSampleOf(line.rowSample);
    const visit = { visitedOn: line.date, visitedAt: line.time };
    problems.push(...checkVisit(visit, setting.visits, 'date').map(({ message }) => ({ line: line.line, column: 'date', message })));
    if (sample) entries.push({ ...line, ...visit, id: v7(), rowSampleId: sample.id, personId: actor.personId, personName: actor.name });
    else problems.push(unknownRowSample(line.line, line.rowSample));
  }
  const held = heldAgainstRows(setting, entries);
  return {
    problems: inOrder([...problems, ...held.problems]),
    questions: held.questions,
    lines: read.lines.length,
    records: entries.length,
    rowSamples: new Set(entries.map((entry) => entry.rowSampleId)).size,
    store: (importId) => store(context, setting.timeZone, entries, importId),
  };
}

function heldAgainstRows({ planting, rowSampleOf, observations }: ImportSetting, entries: readonly Entry[]) {
  const problems: ImportProblem[] = [];
  const questions: LineQuestion[] = [];
  const byRow = groupByRowSample(entries);
  const standingByRow = groupByRowSample(observations.counts);
  for (const [rowSampleId, ofRow] of byRow) {
    const sample = rowSampleOf(ofRow[0]?.rowSample ?? '');
    if (!sample) continue;
    const row = { label: sample.label, seeds: rowSampleFacts(planting, sample).seeds };
    const byId = new Map(ofRow.map((entry) => [entry.id, entry]));
    for (const checked of checkCounts(row, [...(standingByRow.get(rowSampleId) ?? []), ...ofRow], new Set(byId.keys()))) {
      const entry = byId.get(checked.id);
      if (!entry) continue;
      const counted = entry.countedAs === 'new' ? 'new' : 'so_far';
      problems.push(...checked.fields.map(({ path, message }) => ({ line: entry.line, column: path === 'plants' ? counted : path, message })));
      questions.push(...checked.questions.map((question) => ({ ...question, line: entry.line })));
    }
  }
  return { problems, questions };
}

async function store(context: WriteContext, timeZone: string, entries: readonly Entry[], importId: string) {
  const origin = originColumns(context, importId);
  const withVisits = entries.map((entry) => ({ entry, visitId: v7() }));
  await insertVisits(
    context.tx,
    withVisits.map(({ entry, visitId }) => ({
      id: visitId, rowSampleId: entry.rowSampleId, personId: entry.personId, visitedOn: entry.visitedOn, visitedAt: entry.visitedAt, timeZone, marker: entry.marker, ...origin,
    })),
  );
  await insertCounts(
    context.tx,
    withVisits.map(({ entry, visitId }) => ({
      id: entry.id, rowSampleId: entry.rowSampleId, visitId, countedAs: entry.countedAs, plants: entry.plants, doubtful: entry.doubtful, ...origin,
    })),
  );
}
