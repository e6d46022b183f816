import 'server-only';
import { AppError, badField } from '@/lib/errors/app-error';
import { checkTapeSheet } from '@/lib/schemas/check-tape-sheet';
import { recordLaidTapeSheetSchema, recordTapeSheetSchema, type RecordLaidTapeSheetInput } from '@/lib/schemas/observation';
import { laidOnce } from '@/lib/schemas/tape-laid';
import { insertTapeSheets, listTapeSheets, type TapeSheetRow } from '../../data/tape-sheet';
import { lockRowSamples } from '../../data/row-sample';
import { askAbout } from '../../operations/ask-about';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { originColumns } from '../../operations/origin-columns';
import { checkVisit } from '../counts/check-visit';
import { rowSampleFacts } from '../counts/count-facts';
import { keepVisit } from '../counts/keep-visit';
import { readObservations } from '../counts/read-observations';
import { visitFacts } from '../counts/visit-facts';
import { standingInstead } from '../field-records/standing-instead';
import { findSeenRowSample } from '../row-samples/find-seen-row-sample';
import { markersOfRow } from './markers-of-row';
import { tapedByOn } from './taped-by-on';
import { leafStageTenths, tapeSheetColumns } from './tape-sheet-columns';

async function service(context: WriteContext, body: RecordLaidTapeSheetInput): Promise<Written> {
  const { tx, actor, operation } = context;
  const { organisationId } = actor;
  const { rowSample, planting, farm } = await findSeenRowSample(context, body.rowSampleId);
  await lockRowSamples(tx, { organisationId, rowSampleIds: [rowSample.id] });
  const recorded = await listTapeSheets(tx, { organisationId, plantingId: planting.id, rowSampleId: rowSample.id });
  const twin = recorded.find((sheet) => sheet.id === operation.thingId);
  if (twin) return assertSame(twin, body);
  const { counts, tapeSheets } = await readObservations(tx, { organisationId, plantingId: planting.id, rowSampleId: rowSample.id });
  const markers = [...markersOfRow(counts, rowSample.id), ...(body.visit.marker === null ? [] : [body.visit.marker])];
  const personId = body.visit.personId ?? actor.personId;
  const tapedBy = tapedByOn(tapeSheets.filter((sheet) => sheet.id !== body.replacesId), { rowSampleId: rowSample.id, personId, visitedOn: body.visit.visitedOn });
  const checked = checkTapeSheet(body.places, body.tapeUnit, { label: rowSample.label, markers, tapedBy, ...rowSampleFacts(planting, rowSample) }, body);
  const fields = [...checkVisit(body.visit, visitFacts(context, planting, farm.timeZone), 'visit.visitedOn'), ...checked.fields];
  if (fields.length > 0) throw new AppError('bad-input', { fields });
  const { replacesId } = body;
  if (replacesId !== null && !tapeSheets.some((sheet) => sheet.id === replacesId && sheet.rowSampleId === rowSample.id)) {
    // Somebody else corrected it or took it back meanwhile.
    if (recorded.some((sheet) => sheet.id === replacesId && sheet.rowSampleId === rowSample.id)) {
      const instead = standingInstead(recorded, new Set(tapeSheets.map((sheet) => sheet.id)), replacesId);
      throw new AppError('conflict', { standing: instead && shownTapeSheet(instead) });
    }
    throw badField('replacesId', 'There is no such sheet of this row to correct. Open the page again.');
  }
  askAbout(checked.questions, operation.confirmations);
  await keepVisit(context, rowSample.id, body.visit, farm.timeZone);
  const columns = tapeSheetColumns(body.places, body.tapeUnit, checked.thousandths, body);
  const values = { id: operation.thingId, rowSampleId: rowSample.id, visitId: body.visit.id, replacesId, ...columns, ...originColumns(context) };
  if ((await insertTapeSheets(tx, [values])) === 0) throw new AppError('operation-reused');
  return { version: 1 };
}

/** What a sender whose correction lost is shown of the sheet that stands. */
function shownTapeSheet({ id, kinds, personName, visitedOn, recordedAt }: TapeSheetRow): Record<string, unknown> {
  return { id, plants: kinds.filter((kind) => kind !== 'missing').length, personName, visitedOn, recordedAt };
}

/** The same sheet sent again, as when the answer got lost, is answered as it was; another content under its id is refused. */
function assertSame(twin: TapeSheetRow, body: RecordLaidTapeSheetInput): Written {
  const same =
    twin.rowSampleId === body.rowSampleId && twin.visitId === body.visit.id && twin.tapeUnit === body.tapeUnit &&
    twin.replacesId === body.replacesId && twin.readFrom === body.readFrom && twin.zeroAt === body.zeroAt &&
    twin.segmentStarts.join() === body.segmentStarts.join() && twin.placesTyped.length === body.places.length &&
    body.places.every((place, index) => twin.placesTyped[index] === place.typed && twin.kinds[index] === place.kind && twin.markers[index] === (place.marker ?? '') && twin.leafStageTenths[index] === leafStageTenths(place.leafStage));
  if (!same) throw new AppError('operation-reused');
  return { version: 1 };
}

/** The first version knew tapes laid once, from the start mark. */
export const recordTapeSheet = defineOperation({
  kind: 'tape-sheet.record',
  version: 1,
  action: 'observations.write',
  body: recordTapeSheetSchema,
  service: (context, body) => service(context, { ...body, ...laidOnce, segmentStarts: [] }),
});
export const recordLaidTapeSheet = defineOperation({ kind: 'tape-sheet.record', version: 2, action: 'observations.write', body: recordLaidTapeSheetSchema, service });
