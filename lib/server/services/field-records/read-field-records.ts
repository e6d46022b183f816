import 'server-only';
import type { Transaction } from '@/db/connection';
import { listConditions, type ConditionRow } from '../../data/condition';
import { listCrustReadings, type CrustReadingRow } from '../../data/crust-reading';
import { listDepthReadings, type DepthReadingRow } from '../../data/depth-reading';
import { listDigs, type DigRow } from '../../data/dig';
import { listFieldTransects, type FieldTransectRow } from '../../data/field-transect';
import { listMarkerTallies, type MarkerTallyRow } from '../../data/marker-tally';
import { listNotes, type NoteRow } from '../../data/note';
import { listWithdrawnIds } from '../../data/withdrawal';
import { standingRecords } from './standing-records';

/** What stands of everything recorded in a planting beside counts, tape sheets and in-row cover. */
export type FieldRecords = {
  depthReadings: DepthReadingRow[];
  digs: DigRow[];
  crustReadings: CrustReadingRow[];
  markerTallies: MarkerTallyRow[];
  transects: FieldTransectRow[];
  conditions: ConditionRow[];
  notes: NoteRow[];
};

export async function readFieldRecords(tx: Transaction, params: { organisationId: string; plantingId: string }): Promise<FieldRecords> {
  const withdrawn = await listWithdrawnIds(tx, params);
  return {
    depthReadings: standingRecords(await listDepthReadings(tx, params), withdrawn),
    digs: standingRecords(await listDigs(tx, params), withdrawn),
    crustReadings: standingRecords(await listCrustReadings(tx, params), withdrawn),
    markerTallies: standingRecords(await listMarkerTallies(tx, params), withdrawn),
    transects: standingRecords(await listFieldTransects(tx, params), withdrawn),
    conditions: standingRecords(await listConditions(tx, params), withdrawn),
    notes: standingRecords(await listNotes(tx, params), withdrawn),
  };
}
