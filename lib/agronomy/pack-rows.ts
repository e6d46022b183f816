import type { PackedRows } from './packed-rows';

/** One row sample as its record holds it, ends, doubtful plants and two counts of one moment already settled. */
export type RowToPack = {
  placesInches: readonly number[];
  visits: readonly { days: number; plantsUp: number }[];
  plantsHeld: number;
  areaAcres: number;
  theoreticalSpacingInches: number;
};

/**
 * How do records of row samples become the packed arrays that packedFigures reads?
 *
 * Takes any number of rows; returns them one after another in typed arrays, in the order given. Never insufficient: a
 * row without places or visits takes none. Throws nothing itself; packedFigures refuses what cannot be.
 * Method: one pass to measure, one to copy. Example: two rows of 11 and 3 places give `placesFrom` 0 11 14.
 */
export function packRows(rows: readonly RowToPack[]): PackedRows {
  let places = 0;
  let visits = 0;
  for (const row of rows) {
    places += row.placesInches.length;
    visits += row.visits.length;
  }
  const packed: PackedRows = {
    placesInches: new Float64Array(places),
    placesFrom: new Uint32Array(rows.length + 1),
    visitDays: new Float64Array(visits),
    plantsUp: new Float64Array(visits),
    visitsFrom: new Uint32Array(rows.length + 1),
    plantsHeld: new Float64Array(rows.length),
    areaAcres: new Float64Array(rows.length),
    theoreticalSpacingInches: new Float64Array(rows.length),
  };
  let place = 0;
  let visit = 0;
  // Counted loops: over a hundred thousand rows an iterator costs more than the copy.
  for (let index = 0; index < rows.length; index += 1) {
    const row = rows[index] as RowToPack;
    const { placesInches: inches, visits: seen } = row;
    for (let each = 0; each < inches.length; each += 1) packed.placesInches[place + each] = inches[each] as number;
    for (let each = 0; each < seen.length; each += 1) {
      const { days, plantsUp } = seen[each] as RowToPack['visits'][number];
      packed.visitDays[visit + each] = days;
      packed.plantsUp[visit + each] = plantsUp;
    }
    place += inches.length;
    visit += seen.length;
    packed.placesFrom[index + 1] = place;
    packed.visitsFrom[index + 1] = visit;
    packed.plantsHeld[index] = row.plantsHeld;
    packed.areaAcres[index] = row.areaAcres;
    packed.theoreticalSpacingInches[index] = row.theoreticalSpacingInches;
  }
  return packed;
}
