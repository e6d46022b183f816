import type { FieldProblem, Question } from '@/lib/errors/app-error';
import { checkTapeSheet } from '@/lib/schemas/check-tape-sheet';
import type { RoundRow, RoundTapeSheet } from '@/lib/schemas/round-day';
import { usedCounts } from './due-row';
import { sheetBody, type TapeDraft } from './tape-draft';
import type { EntryVisit } from './visit-of-row';

type Me = { id: string; name: string };
export type CheckedSheet = { fields: FieldProblem[]; questions: Question[]; /** That it looks like feet and tenths, asked as soon as it can be known. */ tape: Question | undefined };

/** As much of a draft as its checks need; what is being typed is not among it. */
export type SheetSoFar = Pick<TapeDraft, 'places' | 'unit' | 'readFrom' | 'zeroAt' | 'surelyInches' | 'replacesId'>;

/** The same questions that the server asks, before the sheet is kept. What the scout has said about the tape is not asked again. */
export function checkSheetOfRow(row: RoundRow, draft: SheetSoFar, visit: EntryVisit, me: Me): CheckedSheet {
  const body = sheetBody(draft);
  const markers = [...row.counts.flatMap((count) => count.marker ?? []), ...(visit.marker === null ? [] : [visit.marker])];
  const twin = row.tapeSheets.find((sheet) => sheet.id !== draft.replacesId && sheet.personId === me.id && sheet.visitedOn === visit.visitedOn);
  const taped = { label: row.label, lengthInches: row.length.inches, seeds: row.seeds, markers, tapedBy: twin?.personName ?? null };
  const { fields, questions } = checkTapeSheet(body.places, body.tapeUnit, taped, body);
  const tape = questions.find((question) => question.rule === 'feet-and-tenths');
  return { fields, questions: draft.surelyInches ? questions.filter((question) => question !== tape) : questions, tape };
}

/** The markers to choose from, each with the day it was last set at this row, in the order of the days; others that the sheet has come last. */
export function markersOfSheet(row: RoundRow, places: readonly { marker: string | null }[]): { marker: string; on: string | null }[] {
  const found = new Map<string, { marker: string; on: string | null }>();
  for (const { marker, visitedOn } of usedCounts(row)) if (marker !== null) found.set(marker.toLowerCase(), { marker, on: visitedOn });
  const dated = [...found.values()].sort((a, b) => ((a.on ?? '') < (b.on ?? '') ? -1 : 1));
  const others = places.flatMap(({ marker }) => (marker === null || found.has(marker.toLowerCase()) ? [] : [marker]));
  return [...dated, ...[...new Set(others)].map((marker) => ({ marker, on: null }))];
}

/** The sheet of this person and day, which a newer one corrects. */
export const sheetOfToday = (row: RoundRow, me: Me, today: string): RoundTapeSheet | undefined => row.tapeSheets.findLast((sheet) => sheet.personId === me.id && sheet.visitedOn === today);
