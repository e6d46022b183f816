import type { RoundPlanting, RoundRow } from '@/lib/schemas/round-day';
import type { FieldRecords } from '../field-records/read-field-records';

/** What was recorded at one row sample beside counts, tape sheets and cover, written out field by field. */
export function roundRowRecords(rowSampleId: string, records: FieldRecords): Pick<RoundRow, 'depths' | 'digs' | 'crusts' | 'markers'> {
  const here = <Each extends { rowSampleId: string }>(rows: readonly Each[]) => rows.filter((each) => each.rowSampleId === rowSampleId);
  return {
    depths: here(records.depthReadings).map(({ id, visitId, visitedOn, unit, depthsTyped, personName }) => ({ id, visitId, visitedOn, unit, depths: depthsTyped, personName })),
    digs: here(records.digs).map(({ id, visitedOn, personName, pairId, plant, dugIn, placeTyped, depthTyped, depthUnit, residue, moisture, crust, found, note }) => ({
      id, visitedOn, personName, pairId, plant, where: dugIn, placeTyped,
      depth: depthTyped === null || depthUnit === null ? null : { typed: depthTyped, unit: depthUnit },
      residue, moisture, crust, found, note,
    })),
    crusts: here(records.crustReadings).map(({ id, visitedOn, sproutsSound, sproutsDead, crust, personName }) => ({ id, visitedOn, sproutsSound, sproutsDead, crust, personName })),
    markers: here(records.markerTallies).map(({ id, event, happenedOn, markers, personName }) => ({ id, event, happenedOn, markers, personName })),
  };
}

/** What was recorded of the planting as a whole, or somewhere in it. */
export function roundPlantingRecords(records: FieldRecords): Pick<RoundPlanting, 'transects' | 'conditions' | 'notes'> {
  return {
    transects: records.transects.map(({ id, stripId, readOn, marksRead, marksCovered, personName }) => ({ id, stripId, readOn, marksRead, marksCovered, personName })),
    conditions: records.conditions.map(({ id, rowSampleId, observedOn, observedAt, growthStage, soilTemperatureTyped, soilTemperatureUnit, soilMoisture, personName }) => ({
      id, rowSampleId, observedOn, observedAt, growthStage,
      soilTemperature: soilTemperatureTyped === null || soilTemperatureUnit === null ? null : { typed: soilTemperatureTyped, unit: soilTemperatureUnit },
      soilMoisture, personName,
    })),
    notes: records.notes.map(({ id, rowSampleId, notedOn, text, personName }) => ({ id, rowSampleId, notedOn, text, personName })),
  };
}
