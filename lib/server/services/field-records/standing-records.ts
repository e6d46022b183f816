type Recorded = { id: string; importId: string | null; replacesId?: string | null };

/**
 * What stands of appended records, without what was taken back by itself or with its import. A correction takes the place of
 * what it corrects in the order recorded, so that the same one of two people's counts stays in use.
 */
export function standingRecords<Row extends Recorded>(rows: readonly Row[], withdrawn: ReadonlySet<string>): Row[] {
  const present = rows.filter((row) => !withdrawn.has(row.id) && !(row.importId && withdrawn.has(row.importId)));
  // A correction that was itself taken back no longer replaces anything.
  const replaced = new Set(present.map((row) => row.replacesId));
  const place = new Map<string, number>();
  rows.forEach((row, index) => place.set(row.id, (row.replacesId ? place.get(row.replacesId) : undefined) ?? index));
  return present.filter((row) => !replaced.has(row.id)).sort((a, b) => (place.get(a.id) ?? 0) - (place.get(b.id) ?? 0));
}
