import 'server-only';
import { recordMarkersSchema, type RecordMarkersInput } from '@/lib/schemas/marker-tally';
import { findMarkerTally, insertMarkerTally, listCorrectionsOfMarkerTally } from '../../data/marker-tally';
import { lockRowSamples } from '../../data/row-sample';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { assertSeasonDay } from '../field-records/assert-season-day';
import { keepRecord } from '../field-records/keep-record';
import { findSeenRowSample } from '../row-samples/find-seen-row-sample';

async function service(context: WriteContext, body: RecordMarkersInput): Promise<Written> {
  const { tx, actor } = context;
  const seen = await findSeenRowSample(context, body.rowSampleId);
  assertSeasonDay(context, seen, 'happenedOn', body.happenedOn);
  await lockRowSamples(tx, { organisationId: actor.organisationId, rowSampleIds: [seen.rowSample.id] });
  return keepRecord(context, {
    find: findMarkerTally,
    corrections: {
      replacesId: body.replacesId,
      list: listCorrectionsOfMarkerTally,
      isHere: (row) => row.rowSampleId === body.rowSampleId,
      shown: (row) => ({ id: row.id, event: row.event, markers: row.markers, personName: row.personName, happenedOn: row.happenedOn, recordedAt: row.recordedAt }),
      noSuch: 'There is no such number of markers of this row to correct. Open the sheet again.',
    },
    isSame: (row) => Object.entries(body).every(([key, value]) => row[key as keyof RecordMarkersInput] === value),
    insert: (columns) => insertMarkerTally(tx, { ...columns, ...body }),
  });
}

export const recordMarkers = defineOperation({ kind: 'markers.record', version: 1, action: 'observations.write', body: recordMarkersSchema, service });
