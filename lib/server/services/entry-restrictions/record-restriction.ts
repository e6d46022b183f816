import 'server-only';
import { recordRestrictionSchema, type RecordRestrictionInput } from '@/lib/schemas/entry-restriction';
import { findEntryRestriction, insertEntryRestriction, listCorrectionsOfEntryRestriction } from '../../data/entry-restriction';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { keepRecord } from '../field-records/keep-record';
import { holdField } from '../fields/hold-field';
import { assertEntryDay } from './assert-entry-day';

async function service(context: WriteContext, body: RecordRestrictionInput): Promise<Written> {
  const { field, farm } = await holdField(context, body.fieldId);
  assertEntryDay(context, farm.timeZone, 'endedOn', body.endedOn);
  return keepRecord(context, {
    find: findEntryRestriction,
    corrections: {
      replacesId: body.replacesId,
      list: listCorrectionsOfEntryRestriction,
      isHere: (row) => row.fieldId === field.id,
      shown: (row) => ({ id: row.id, product: row.product, hours: row.hours, endedOn: row.endedOn, endedAt: row.endedAt, personName: row.personName, recordedAt: row.recordedAt }),
      noSuch: 'There is no such interval of this field to correct. Open the field again.',
    },
    isSame: (row) => Object.entries(body).every(([key, value]) => row[key as keyof RecordRestrictionInput] === value),
    insert: (columns) => insertEntryRestriction(context.tx, { ...columns, ...body, timeZone: farm.timeZone }),
  });
}

export const recordRestriction = defineOperation({ kind: 'entry-restriction.record', version: 1, action: 'observations.write', body: recordRestrictionSchema, service });
