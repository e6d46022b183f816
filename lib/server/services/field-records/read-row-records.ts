import 'server-only';
import { can } from '@/lib/access/can';
import type { DigRow } from '../../data/dig';
import type { ReadContext } from '../../operations/context';
import { findSeenPlanting } from '../plantings/find-seen-planting';
import { depthSummary } from './depth-summary';
import { markerBalance } from './marker-balance';
import { readFieldRecords } from './read-field-records';
import { shownCondition, shownNote } from './shown-records';

/** What was recorded at one row sample beside counts, tape sheets and in-row cover. */
export async function readRowRecords(context: ReadContext, plantingId: string, rowSampleId: string) {
  const { planting } = await findSeenPlanting(context, plantingId);
  const records = await readFieldRecords(context.tx, { organisationId: context.actor.organisationId, plantingId: planting.id });
  const here = <Each extends { rowSampleId: string | null }>(rows: readonly Each[]) => rows.filter((each) => each.rowSampleId === rowSampleId);
  const tallies = here(records.markerTallies);
  return {
    plantedOn: planting.plantedOn,
    mayWrite: can(context.actor, 'observations.write'),
    depths: here(records.depthReadings).map((row) => ({ id: row.id, visitedOn: row.visitedOn, unit: row.unit, typed: row.depthsTyped, personName: row.personName, ...depthSummary(row) })),
    digPairs: inPairs(here(records.digs)),
    crusts: here(records.crustReadings).map(({ id, visitedOn, sproutsSound, sproutsDead, crust, personName }) => ({ id, visitedOn, sproutsSound, sproutsDead, crust, personName })),
    markers: { ...markerBalance(tallies), tallies: tallies.map(({ id, event, happenedOn, markers, personName }) => ({ id, event, happenedOn, markers, personName })) },
    conditions: here(records.conditions).map(shownCondition),
    notes: here(records.notes).map(shownNote),
  };
}
export type RowRecords = Awaited<ReturnType<typeof readRowRecords>>;

const shownDig = ({ id, visitedOn, personName, plant, dugIn, placeTyped, depthTyped, depthUnit, residue, moisture, crust, found, note }: DigRow) => ({
  id, visitedOn, personName, plant, dugIn, placeTyped, residue, moisture, crust, found, note,
  depth: depthTyped === null || depthUnit === null ? null : { typed: depthTyped, unit: depthUnit },
});

/** A late plant stands before its neighbor, and pairs in the order they were begun. */
function inPairs(digs: readonly DigRow[]) {
  const pairs = new Map<string, DigRow[]>();
  for (const dig of digs) pairs.set(dig.pairId, [...(pairs.get(dig.pairId) ?? []), dig]);
  return [...pairs].map(([pairId, pair]) => ({
    pairId,
    digs: [...pair].sort((a, b) => Number(a.plant === 'neighbor') - Number(b.plant === 'neighbor')).map(shownDig),
  }));
}
