import type {
  CrustThickness, DepthUnit, DigFinding, DigPlace, DigPlant, DigResidue, GrowthStage, MarkerEvent, ReadingUnit, SoilMoisture, TemperatureUnit,
} from '@/lib/schemas/vocabulary';

export type DepthRecord = {
  id: string; visitedOn: string; personName: string; unit: DepthUnit; typed: readonly string[];
  plants: number; mean: number; shallowest: number; deepest: number;
};
export type DigRecord = {
  id: string; visitedOn: string; personName: string; plant: DigPlant; dugIn: DigPlace; placeTyped: string | null; depth: { typed: string; unit: ReadingUnit } | null;
  residue: DigResidue | null; moisture: SoilMoisture | null; crust: CrustThickness | null; found: readonly DigFinding[]; note: string | null;
};
export type CrustRecord = { id: string; visitedOn: string; personName: string; sproutsSound: number; sproutsDead: number; crust: CrustThickness };
export type MarkerRecord = { id: string; happenedOn: string; personName: string; event: MarkerEvent; markers: number };
export type ConditionRecord = {
  id: string; observedOn: string; observedAt: string | null; personName: string; growthStage: GrowthStage | null;
  soilTemperature: { typed: string; unit: TemperatureUnit } | null; soilMoisture: SoilMoisture | null;
};
export type NoteRecord = { id: string; notedOn: string; notedAt: string | null; personName: string; text: string };
export type TransectRecord = { id: string; readOn: string; personName: string; marksRead: number; marksCovered: number; stripNumber: number | null };
export type RowLabel = { id: string; label: string } | null;

/** What was recorded at one row sample beside counts, tape sheets and cover. */
export type RowRecordsData = {
  plantedOn: string;
  mayWrite: boolean;
  depths: readonly DepthRecord[];
  digPairs: readonly { pairId: string; digs: readonly DigRecord[] }[];
  crusts: readonly CrustRecord[];
  markers: { set: number | null; takenUp: number | null; left: number; tallies: readonly MarkerRecord[] };
  conditions: readonly ConditionRecord[];
  notes: readonly NoteRecord[];
};

/** What was recorded of a planting as a whole. */
export type PlantingRecordsData = {
  plantedOn: string;
  mayWrite: boolean;
  transects: readonly TransectRecord[];
  conditions: readonly (ConditionRecord & { row: RowLabel })[];
  notes: readonly (NoteRecord & { row: RowLabel })[];
  markersOut: readonly { id: string; label: string; left: number }[];
};
