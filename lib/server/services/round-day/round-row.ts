import type { RoundRow } from '@/lib/schemas/round-day';
import type { rowSampleFacts } from '../counts/count-facts';
import type { Observations } from '../counts/read-observations';
import type { PlacedRow } from '../counts/row-places';
import type { FieldRecords } from '../field-records/read-field-records';
import { roundRowRecords } from './round-records';

/** One row sample as the phone takes it along, written out field by field. */
export function roundRow({ sample, place }: PlacedRow, facts: ReturnType<typeof rowSampleFacts>, observed: Observations, records: FieldRecords): RoundRow {
  const here = <Each extends { rowSampleId: string }>(rows: readonly Each[]) => rows.filter((each) => each.rowSampleId === sample.id);
  return {
    id: sample.id,
    label: sample.label,
    stripId: sample.stripId,
    stripNumber: place.stripNumber,
    blockNumber: place.blockNumber,
    zoneName: place.zoneName,
    planterRow: place.planterRow,
    length: { typed: sample.lengthTyped, unit: sample.lengthUnit, inches: facts.lengthInches },
    startEnd: sample.startEnd,
    farEnd: sample.farEnd,
    seeds: facts.seeds,
    counts: here(observed.counts).map(({ id, visitId, visitedOn, visitedAt, marker, personId, personName, countedAs, plants, plantsUp, doubtful, used }) => ({
      id, visitId, visitedOn, visitedAt, marker, personId, personName, countedAs, plants, plantsUp, doubtful, used,
    })),
    tapeSheets: here(observed.tapeSheets).map(({ id, visitId, visitedOn, visitedAt, visitMarker, personId, personName, tapeUnit, laid, places }) => ({
      id, visitId, visitedOn, visitedAt, visitMarker, personId, personName, tapeUnit,
      readFrom: laid.readFrom, zeroAt: laid.zeroAt, segmentStarts: [...laid.segmentStarts],
      places: [...places].sort((a, b) => a.order - b.order).map(({ typed, kind, marker, leafStage }) => ({ typed, kind, marker, leafStage })),
    })),
    cover: here(observed.residueReadings).map(({ id, readOn, marksRead, marksCovered }) => ({ id, readOn, marksRead, marksCovered })),
    ...roundRowRecords(sample.id, records),
  };
}
