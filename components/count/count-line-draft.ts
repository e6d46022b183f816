import { v7 } from 'uuid';
import { z } from 'zod';
import type { OperationInput } from '@/lib/client/use-operation';
import { countKinds } from '@/lib/schemas/vocabulary';
import type { SheetCount } from './row-sheet-types';

/** One visit being typed in, every field as it was typed. */
export const countLineSchema = z.object({
  /** Also the id of the count it becomes. */
  countId: z.string(),
  date: z.string(),
  time: z.string(),
  marker: z.string(),
  countedAs: z.enum(countKinds),
  plants: z.string(),
  doubtful: z.string(),
  /** The standing count that this line corrects, with its visit as it stands. */
  corrects: z
    .object({ id: z.string(), visitId: z.string(), date: z.string(), time: z.string(), marker: z.string(), personId: z.string(), said: z.string() })
    .nullable(),
});
export type CountLine = z.infer<typeof countLineSchema>;

export const countSheetSchema = z.object({ personId: z.string(), lines: z.array(countLineSchema) });
export type CountSheet = z.infer<typeof countSheetSchema>;

const millisecondsPerDay = 86_400_000;

/** The day after, for the next line of a sheet, as long as it has come already. */
function dayAfter(date: string, today: string): string {
  const next = /^\d{4}-\d{2}-\d{2}$/.test(date) ? new Date(Date.parse(`${date}T00:00:00Z`) + millisecondsPerDay).toISOString().slice(0, 10) : today;
  return next < today ? next : today;
}

export function emptyLine(today: string, above: CountLine | undefined): CountLine {
  return {
    countId: v7(),
    date: above ? dayAfter(above.date, today) : today,
    time: above?.time ?? '',
    marker: '',
    countedAs: above?.countedAs ?? 'so-far',
    plants: '',
    doubtful: '',
    corrects: null,
  };
}

export function correctingLine(count: SheetCount, said: string): CountLine {
  const visit = { date: count.visitedOn, time: count.visitedAt ?? '', marker: count.marker ?? '' };
  return {
    countId: v7(),
    ...visit,
    countedAs: count.countedAs,
    plants: String(count.plants),
    doubtful: count.doubtful === 0 ? '' : String(count.doubtful),
    corrects: { id: count.id, visitId: count.visitId, ...visit, personId: count.personId, said },
  };
}

/** A number where one was typed; otherwise the text itself, for the server to say what is wrong with it. */
const wholeOrTyped = (text: string) => (/^\s*\d{1,9}\s*$/.test(text) ? Number(text) : text);

/** The write that a line becomes. A correction that leaves the visit as it was names that visit again. */
export function countOperation(line: CountLine, rowSampleId: string, sheetPersonId: string): OperationInput {
  const { corrects } = line;
  // A correction keeps who was at the row; the choice above the lines is for new ones.
  const personId = corrects?.personId ?? sheetPersonId;
  const sameVisit = corrects !== null && corrects.date === line.date && corrects.time === line.time && corrects.marker === line.marker.trim();
  return {
    noun: 'counts',
    kind: 'count.record',
    thingId: line.countId,
    body: {
      rowSampleId,
      visit: {
        id: sameVisit ? corrects.visitId : visitIdOf(line.countId),
        personId,
        visitedOn: line.date,
        visitedAt: line.time === '' ? null : line.time,
        marker: line.marker.trim() === '' ? null : line.marker.trim(),
      },
      countedAs: line.countedAs,
      plants: wholeOrTyped(line.plants),
      doubtful: line.doubtful.trim() === '' ? 0 : wholeOrTyped(line.doubtful),
      replacesId: corrects?.id ?? null,
    },
  };
}

/** A visit made by this line carries the line's own id, so that the same line sent again names the same visit. */
const visitIdOf = (countId: string) => countId;
