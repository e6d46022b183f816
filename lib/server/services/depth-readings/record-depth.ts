import 'server-only';
import { recordDepthSchema, type RecordDepthInput } from '@/lib/schemas/depth-reading';
import { findDepthReading, insertDepthReading, listCorrectionsOfDepthReading } from '../../data/depth-reading';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { holdVisitedRow } from '../field-records/hold-visited-row';
import { keepRecord } from '../field-records/keep-record';

async function service(context: WriteContext, body: RecordDepthInput): Promise<Written> {
  const { rowSample, visitColumns, keepVisit, isSameVisit } = await holdVisitedRow(context, body);
  const { unit, replacesId } = body;
  const depthsTyped = body.depths.map((depth) => depth.typed);
  const depthsThousandths = body.depths.map((depth) => depth.thousandths);
  return keepRecord(context, {
    find: findDepthReading,
    corrections: {
      replacesId,
      list: listCorrectionsOfDepthReading,
      isHere: (row) => row.rowSampleId === rowSample.id,
      shown: (row) => ({ id: row.id, unit: row.unit, depths: row.depthsTyped, personName: row.personName, visitedOn: row.visitedOn, recordedAt: row.recordedAt }),
      noSuch: 'There is no such depth reading of this row to correct. Open the sheet again.',
    },
    isSame: (row) => isSameVisit(row) && row.unit === unit && row.replacesId === replacesId && JSON.stringify(row.depthsTyped) === JSON.stringify(depthsTyped),
    before: keepVisit,
    insert: (columns) => insertDepthReading(context.tx, { ...columns, ...visitColumns, unit, depthsTyped, depthsThousandths, replacesId }),
  });
}

export const recordDepth = defineOperation({ kind: 'depth.record', version: 1, action: 'observations.write', body: recordDepthSchema, service });
