import 'server-only';
import { recordNoteSchema, type RecordNoteInput } from '@/lib/schemas/note';
import { findNote, insertNote } from '../../data/note';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { assertSeasonDay } from '../field-records/assert-season-day';
import { holdPlace } from '../field-records/hold-place';
import { keepRecord } from '../field-records/keep-record';

async function service(context: WriteContext, body: RecordNoteInput): Promise<Written> {
  const seen = await holdPlace(context, body);
  assertSeasonDay(context, seen, 'notedOn', body.notedOn);
  return keepRecord(context, {
    find: findNote,
    corrections: null,
    isSame: (row) => Object.entries(body).every(([key, value]) => row[key as keyof RecordNoteInput] === value),
    insert: (columns) => insertNote(context.tx, { ...columns, ...body, timeZone: seen.farm.timeZone }),
  });
}

export const recordNote = defineOperation({ kind: 'note.record', version: 1, action: 'observations.write', body: recordNoteSchema, service });
