import 'server-only';
import { can } from '@/lib/access/can';
import { listStrips } from '../../data/strip';
import { findTrialOfPlanting } from '../../data/trial';
import type { ReadContext } from '../../operations/context';
import { readPlacedRows } from '../counts/row-places';
import { findSeenPlanting } from '../plantings/find-seen-planting';
import { markerBalance } from './marker-balance';
import { readFieldRecords } from './read-field-records';
import { shownCondition, shownNote, shownTransect } from './shown-records';

/** What was recorded of a planting as a whole: field cover, its state, notes, and the markers still out. */
export async function readPlantingRecords(context: ReadContext, plantingId: string) {
  const { organisationId } = context.actor;
  const { planting } = await findSeenPlanting(context, plantingId);
  const placed = await readPlacedRows(context, plantingId);
  const records = await readFieldRecords(context.tx, { organisationId, plantingId });
  const rowOf = (rowSampleId: string | null) => {
    const found = placed.find(({ sample }) => sample.id === rowSampleId);
    return found ? { id: found.sample.id, label: found.sample.label } : null;
  };
  const trial = await findTrialOfPlanting(context.tx, { organisationId, plantingId });
  const strips = trial ? await listStrips(context.tx, { organisationId, trialId: trial.id }) : [];
  return {
    plantedOn: planting.plantedOn,
    mayWrite: can(context.actor, 'observations.write'),
    transects: records.transects.map((row) => ({ ...shownTransect(row), stripNumber: strips.find((strip) => strip.id === row.stripId)?.number ?? null })),
    conditions: records.conditions.map((row) => ({ ...shownCondition(row), row: rowOf(row.rowSampleId) })),
    notes: records.notes.map((row) => ({ ...shownNote(row), row: rowOf(row.rowSampleId) })),
    markersOut: placed
      .map(({ sample }) => ({ id: sample.id, label: sample.label, ...markerBalance(records.markerTallies.filter((tally) => tally.rowSampleId === sample.id)) }))
      .filter(({ left }) => left > 0)
      .map(({ id, label, left }) => ({ id, label, left })),
  };
}
export type PlantingRecords = Awaited<ReturnType<typeof readPlantingRecords>>;
