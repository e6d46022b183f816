import 'server-only';
import { AppError, badField } from '@/lib/errors/app-error';
import { dateText } from '@/lib/format/date-text';
import { recordExceptionSchema, type RecordExceptionInput } from '@/lib/schemas/entry-restriction';
import { findEntryException, insertEntryException } from '../../data/entry-exception';
import { findEntryRestriction } from '../../data/entry-restriction';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { keepRecord } from '../field-records/keep-record';
import { holdField } from '../fields/hold-field';
import { assertEntryDay } from './assert-entry-day';

/** Kept although the interval was corrected meanwhile: the person went in under what they had read. */
async function service(context: WriteContext, body: RecordExceptionInput): Promise<Written> {
  const { tx, actor } = context;
  const restriction = await findEntryRestriction(tx, { organisationId: actor.organisationId, id: body.restrictionId });
  if (!restriction) throw new AppError('not-found');
  const { farm } = await holdField(context, restriction.fieldId);
  assertEntryDay(context, farm.timeZone, 'enteredOn', body.enteredOn);
  if (body.enteredOn < restriction.endedOn) throw badField('enteredOn', `This is before the application ended, ${dateText(restriction.endedOn)}. Check the date.`);
  return keepRecord(context, {
    find: findEntryException,
    corrections: null,
    isSame: (row) => Object.entries(body).every(([key, value]) => row[key as keyof RecordExceptionInput] === value),
    insert: (columns) => insertEntryException(tx, { ...columns, ...body }),
  });
}

export const recordException = defineOperation({ kind: 'entry-exception.record', version: 1, action: 'observations.write', body: recordExceptionSchema, service });
