import { insufficient, value, type Outcome } from '@/lib/agronomy/outcome';
import type { ObservedResidue } from '../counts/read-observations';

/**
 * The share of marks over residue along the seed row, all marks read in these row samples taken together. It is of the row,
 * not of the field: a diagonal transect hardly sees what a row cleaner does.
 */
export function inRowCover(readings: readonly ObservedResidue[], rowSampleIds: readonly string[]): Outcome<number> {
  const own = readings.filter((reading) => rowSampleIds.includes(reading.rowSampleId));
  const marksRead = own.reduce((sum, reading) => sum + reading.marksRead, 0);
  if (marksRead === 0) return insufficient('no-residue-reading', '1 reading of in-row cover', 'none');
  return value(own.reduce((sum, reading) => sum + reading.marksCovered, 0) / marksRead);
}
