import 'server-only';
import type { Transaction } from '@/db/connection';
import { momentOf, resolveCounts } from '@/lib/schemas/resolve-counts';
import { readingIn } from '@/lib/schemas/reading';
import type { TapeLaid } from '@/lib/schemas/tape-laid';
import { placeInches } from '@/lib/schemas/tape-place';
import { tapePositions } from '@/lib/schemas/tape-positions';
import type { TapeEntryKind, TapeUnit } from '@/lib/schemas/vocabulary';
import { listCounts } from '../../data/count';
import { listResidueReadings } from '../../data/residue-reading';
import { listTapeSheets, type TapeSheetRow } from '../../data/tape-sheet';
import { listWithdrawnIds } from '../../data/withdrawal';
import { standingRecords } from '../field-records/standing-records';
import { groupByRowSample } from './group-by-row-sample';
import type { ObservedCount } from './observed-count';

export { groupByRowSample } from './group-by-row-sample';
export type { ObservedCount } from './observed-count';

export type ObservedPlace = {
  typed: string;
  /** Its number on the sheet in the order read, from 0. */
  order: number;
  /** Which piece of the tape it lies on, counted from the row's start; 0 throughout where the tape was laid once. */
  segment: number;
  /** From the row's start. */
  positionInches: number;
  kind: TapeEntryKind;
  marker: string | null;
  leafStage: number | null;
  /** Between which visits the plant came up, by its marker; null where the marker tells nothing. */
  firstSeen: { after: { on: string; at: string | null } | null; by: { on: string; at: string | null } } | null;
};

export type ObservedTapeSheet = {
  id: string;
  rowSampleId: string;
  visitId: string;
  visitedOn: string;
  visitedAt: string | null;
  visitMarker: string | null;
  personId: string;
  personName: string;
  recordedAt: string;
  tapeUnit: TapeUnit;
  laid: TapeLaid;
  /** The sheet of the newest visit to its row sample, and of two of one visit the one recorded last. */
  used: boolean;
  /** In the order of the row, from its start; a sheet read from the far end is turned around. */
  places: ObservedPlace[];
};

export type ObservedResidue = { id: string; rowSampleId: string; readOn: string; marksRead: number; marksCovered: number };

export type Observations = { counts: ObservedCount[]; tapeSheets: ObservedTapeSheet[]; residueReadings: ObservedResidue[] };

/** What stands of everything observed in a planting, or at one of its rows: corrections in the place of what they replaced, withdrawn ones left out. */
export async function readObservations(tx: Transaction, params: { organisationId: string; plantingId: string; rowSampleId?: string }): Promise<Observations> {
  const withdrawn = await listWithdrawnIds(tx, params);
  const standing = <Row extends { id: string; importId: string | null; replacesId?: string | null }>(rows: readonly Row[]) => standingRecords(rows, withdrawn);
  const countRows = standing(await listCounts(tx, params));
  const counts = [...groupByRowSample(countRows).values()].flatMap((rows) =>
    resolveCounts(rows).map(({ replacesId: _replaces, importId: _import, ...count }) => count),
  );
  const countsByRow = groupByRowSample(counts);
  const sheetRows = standing(await listTapeSheets(tx, params)).sort((a, b) => (momentOf(a) < momentOf(b) ? -1 : momentOf(a) > momentOf(b) ? 1 : 0));
  const tapeSheets = [...groupByRowSample(sheetRows).values()].flatMap((rows) =>
    rows.map((row, index) => observedTapeSheet(row, index === rows.length - 1, countsByRow.get(row.rowSampleId) ?? [])),
  );
  const residueReadings = standing(await listResidueReadings(tx, params)).map(({ importId: _import, ...reading }) => reading);
  return { counts, tapeSheets, residueReadings };
}

function observedTapeSheet(row: TapeSheetRow, used: boolean, counts: readonly ObservedCount[]): ObservedTapeSheet {
  const visits = counts.filter((count) => count.used).sort((a, b) => (momentOf(a) < momentOf(b) ? -1 : 1));
  const laid = { readFrom: row.readFrom, zeroAt: row.zeroAt, segmentStarts: row.segmentStarts };
  const inchesRead = row.placesThousandths.map((thousandths) => placeInches(thousandths, row.tapeUnit));
  const lengthInches = readingIn({ unit: row.lengthUnit, thousandths: row.lengthThousandths }, 'in');
  const places = tapePositions(inchesRead, laid, lengthInches).map(({ order, segment, positionInches }): ObservedPlace => {
    const marker = row.markers[order] || null;
    const leafTenths = row.leafStageTenths[order] ?? -1;
    return {
      typed: row.placesTyped[order] ?? '',
      order,
      segment,
      positionInches,
      kind: (row.kinds[order] ?? 'plant') as TapeEntryKind,
      marker,
      leafStage: leafTenths < 0 ? null : leafTenths / 10,
      firstSeen: firstSeenBy(marker, visits),
    };
  });
  const { id, rowSampleId, visitId, visitedOn, visitedAt, visitMarker, personId, personName, recordedAt, tapeUnit } = row;
  return { id, rowSampleId, visitId, visitedOn, visitedAt, visitMarker, personId, personName, recordedAt, tapeUnit, laid, used, places };
}

/** A marker set at several visits says only that the plant came up by the last of them, after the visit before the first. */
function firstSeenBy(marker: string | null, visits: readonly ObservedCount[]): ObservedPlace['firstSeen'] {
  if (marker === null) return null;
  const carries = (visit: ObservedCount) => visit.marker?.toLowerCase() === marker.toLowerCase();
  const first = visits.findIndex(carries);
  const by = visits.findLast(carries);
  if (!by) return null;
  const after = visits[first - 1];
  return { after: after ? { on: after.visitedOn, at: after.visitedAt } : null, by: { on: by.visitedOn, at: by.visitedAt } };
}
