import type { ObservedTapeSheet } from '../counts/read-observations';

/** The name of the person, where a sheet of theirs of this row and day stands already; null where none does. */
export function tapedByOn(standing: readonly ObservedTapeSheet[], sheet: { rowSampleId: string; personId: string; visitedOn: string }): string | null {
  const twin = standing.find((other) => other.rowSampleId === sheet.rowSampleId && other.personId === sheet.personId && other.visitedOn === sheet.visitedOn);
  return twin?.personName ?? null;
}
