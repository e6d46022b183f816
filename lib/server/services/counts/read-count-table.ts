import 'server-only';
import { can } from '@/lib/access/can';
import type { ReadContext } from '../../operations/context';
import { findSeenPlanting } from '../plantings/find-seen-planting';
import { groupByRowSample, readObservations, type ObservedCount } from './read-observations';
import { rowFindings } from './row-findings';
import { readPlacedRows } from './row-places';

const shownCount = ({ id, visitedOn, visitedAt, plantsUp, doubtful, used, personName }: ObservedCount) => ({
  id, visitedOn, visitedAt, plantsUp, doubtful, used, personName,
});

/** All row samples of a planting with their counts by visit, and what is to be seen in them. */
export async function readCountTable(context: ReadContext, plantingId: string) {
  const { planting, farm } = await findSeenPlanting(context, plantingId);
  const placed = await readPlacedRows(context, plantingId);
  const observations = await readObservations(context.tx, { organisationId: context.actor.organisationId, plantingId });
  const counts = groupByRowSample(observations.counts);
  const sheets = new Map(observations.tapeSheets.filter((sheet) => sheet.used).map((sheet) => [sheet.rowSampleId, sheet]));
  const today = context.clock.today(farm.timeZone);
  const planted = { on: planting.plantedOn, at: planting.plantedAt };
  return {
    plantedOn: planting.plantedOn,
    visitDays: [...new Set(observations.counts.map((count) => count.visitedOn))].sort(),
    mayImport: can(context.actor, 'imports.write'),
    mayPlan: can(context.actor, 'plantings.write'),
    rows: placed.map(({ sample, place }) => ({
      id: sample.id,
      label: sample.label,
      place,
      counts: (counts.get(sample.id) ?? []).map(shownCount),
      findings: rowFindings(planted, counts.get(sample.id) ?? [], sheets.get(sample.id), today),
    })),
  };
}
export type CountTable = Awaited<ReturnType<typeof readCountTable>>;
export type CountTableRow = CountTable['rows'][number];
