import 'server-only';
import { recordCrustSchema, type RecordCrustInput } from '@/lib/schemas/crust-reading';
import { findCrustReading, insertCrustReading, listCorrectionsOfCrustReading } from '../../data/crust-reading';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { holdVisitedRow } from '../field-records/hold-visited-row';
import { keepRecord } from '../field-records/keep-record';

async function service(context: WriteContext, body: RecordCrustInput): Promise<Written> {
  const { rowSample, visitColumns, keepVisit, isSameVisit } = await holdVisitedRow(context, body);
  const { sproutsSound, sproutsDead, crust, replacesId } = body;
  return keepRecord(context, {
    find: findCrustReading,
    corrections: {
      replacesId,
      list: listCorrectionsOfCrustReading,
      isHere: (row) => row.rowSampleId === rowSample.id,
      shown: (row) => ({ id: row.id, sproutsSound: row.sproutsSound, sproutsDead: row.sproutsDead, crust: row.crust, personName: row.personName, visitedOn: row.visitedOn, recordedAt: row.recordedAt }),
      noSuch: 'There is no such crust reading of this row to correct. Open the sheet again.',
    },
    isSame: (row) => isSameVisit(row) && row.sproutsSound === sproutsSound && row.sproutsDead === sproutsDead && row.crust === crust && row.replacesId === replacesId,
    before: keepVisit,
    insert: (columns) => insertCrustReading(context.tx, { ...columns, ...visitColumns, sproutsSound, sproutsDead, crust, replacesId }),
  });
}

export const recordCrust = defineOperation({ kind: 'crust.record', version: 1, action: 'observations.write', body: recordCrustSchema, service });
