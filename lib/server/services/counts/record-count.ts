import 'server-only';
import { AppError, badField } from '@/lib/errors/app-error';
import { checkCounts, type CountOfRow } from '@/lib/schemas/check-counts';
import { recordCountSchema, type RecordCountInput } from '@/lib/schemas/observation';
import { insertCounts, listCounts, type CountRow } from '../../data/count';
import { lockRowSamples } from '../../data/row-sample';
import { askAbout } from '../../operations/ask-about';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { originColumns } from '../../operations/origin-columns';
import { standingInstead } from '../field-records/standing-instead';
import { findSeenRowSample } from '../row-samples/find-seen-row-sample';
import { checkVisit } from './check-visit';
import { rowSampleFacts } from './count-facts';
import { keepVisit } from './keep-visit';
import { readObservations, type ObservedCount } from './read-observations';
import { visitFacts } from './visit-facts';

async function service(context: WriteContext, body: RecordCountInput): Promise<Written> {
  const { tx, actor, operation } = context;
  const { organisationId } = actor;
  const { rowSample, planting, farm } = await findSeenRowSample(context, body.rowSampleId);
  const visitProblems = checkVisit(body.visit, visitFacts(context, planting, farm.timeZone), 'visit.visitedOn');
  if (visitProblems.length > 0) throw new AppError('bad-input', { fields: visitProblems });
  await lockRowSamples(tx, { organisationId, rowSampleIds: [rowSample.id] });
  if (await stands(context, planting.id, body)) return { version: 1 };
  const { counts: standing } = await readObservations(tx, { organisationId, plantingId: planting.id, rowSampleId: rowSample.id });
  if (body.replacesId !== null) await assertReplaceable(context, planting.id, rowSample.id, body.replacesId, standing);
  const entered: CountOfRow = {
    id: operation.thingId,
    personId: body.visit.personId ?? actor.personId,
    personName: actor.name,
    visitedOn: body.visit.visitedOn,
    visitedAt: body.visit.visitedAt,
    countedAs: body.countedAs,
    plants: body.plants,
    doubtful: body.doubtful,
  };
  const [checked] = checkCounts(
    { label: rowSample.label, seeds: rowSampleFacts(planting, rowSample).seeds },
    withEntered(standing, entered, body.replacesId),
    new Set([entered.id]),
  );
  if (!checked) throw new AppError('unexpected');
  if (checked.fields.length > 0) throw new AppError('bad-input', { fields: checked.fields });
  askAbout(checked.questions, operation.confirmations);
  await keepVisit(context, rowSample.id, body.visit, farm.timeZone);
  const { countedAs, plants, doubtful, replacesId } = body;
  const values = { id: entered.id, rowSampleId: rowSample.id, visitId: body.visit.id, countedAs, plants, doubtful, replacesId, ...originColumns(context) };
  if ((await insertCounts(tx, [values])) === 0) throw new AppError('operation-reused');
  return { version: 1, result: { plantsUp: checked.plantsUp } };
}

/** The series with the new count in it; a correction where the count it corrects stood. */
function withEntered(standing: readonly ObservedCount[], entered: CountOfRow, replacesId: string | null): CountOfRow[] {
  return replacesId === null ? [...standing, entered] : standing.map((count) => (count.id === replacesId ? entered : count));
}

/** Whether this very count was taken before under another operation, as when the answer to it got lost; another content under its id is refused. */
async function stands({ tx, actor, operation }: WriteContext, plantingId: string, body: RecordCountInput): Promise<boolean> {
  const recorded = await listCounts(tx, { organisationId: actor.organisationId, plantingId, rowSampleId: body.rowSampleId });
  const found = recorded.find((count) => count.id === operation.thingId);
  if (!found) return false;
  const same =
    found.rowSampleId === body.rowSampleId && found.visitId === body.visit.id && found.countedAs === body.countedAs &&
    found.plants === body.plants && found.doubtful === body.doubtful && found.replacesId === body.replacesId &&
    found.visitedOn === body.visit.visitedOn && found.visitedAt === body.visit.visitedAt && found.marker === body.visit.marker;
  if (!same) throw new AppError('operation-reused');
  return true;
}

/** A correction names a count of the same row that stands; one that somebody else corrected or took back meanwhile has lost. */
async function assertReplaceable(context: WriteContext, plantingId: string, rowSampleId: string, replacesId: string, standing: readonly ObservedCount[]) {
  if (standing.some((count) => count.id === replacesId)) return;
  const recorded = await listCounts(context.tx, { organisationId: context.actor.organisationId, plantingId, rowSampleId });
  if (recorded.some((count) => count.id === replacesId)) {
    const instead = standingInstead(recorded, new Set(standing.map((count) => count.id)), replacesId);
    throw new AppError('conflict', { standing: instead && shownCount(instead) });
  }
  throw badField('replacesId', 'There is no such count of this row to correct. Open the sheet again.');
}

/** What a sender whose correction lost is shown of the count that stands. */
function shownCount({ id, plants, doubtful, countedAs, personName, visitedOn, recordedAt }: CountRow): Record<string, unknown> {
  return { id, plants, doubtful, countedAs, personName, visitedOn, recordedAt };
}

export const recordCount = defineOperation({ kind: 'count.record', version: 1, action: 'observations.write', body: recordCountSchema, service });
