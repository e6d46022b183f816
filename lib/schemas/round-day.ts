import type { CountKind, Crop, ReadingUnit, Role, RowEnd, TapeEntryKind, TapeUnit, UnitSystem } from './vocabulary';

/**
 * What a phone takes along into the field for one organisation: places, and what was seen there before. It holds no
 * setting, planned or planted, so that whoever counts cannot know it. Plain types, because the phone checks the mark
 * `what` and its version and nothing deeper; a page of a hotel's network carries neither.
 */
export type RoundDay = {
  what: typeof roundDayMark;
  version: typeof roundDayVersion;
  organisation: { id: string; name: string; timeZone: string; demoToday: string | null };
  person: { id: string; name: string; role: Role };
  /** When the server made it, as an instant. */
  readAt: string;
  farms: RoundFarm[];
  fields: RoundField[];
  plantings: RoundPlanting[];
};
export const roundDayMark = 'rowrise-round-day';
export const roundDayVersion = 1;

export type RoundFarm = { id: string; name: string; timeZone: string };
export type RoundField = { id: string; farmId: string; name: string; restrictions: RoundRestriction[] };

/** Who is signed in on this phone and where they belong: what the phone asks first. */
export type RoundPerson = {
  what: typeof roundPersonMark;
  version: typeof roundDayVersion;
  person: { id: string; name: string; units: UnitSystem };
  organisations: { id: string; name: string; role: Role }[];
};
export const roundPersonMark = 'rowrise-round-person';

/** The newest word on a spraying, corrected ones left out, with the exceptions recorded under it. */
export type RoundRestriction = {
  id: string;
  product: string;
  /** When the application ended, by the farm's clocks. */
  endedOn: string;
  endedAt: string;
  hours: number;
  personName: string;
  exceptions: { id: string; personId: string; enteredOn: string; exception: string; equipment: string }[];
};

export type RoundPlanting = {
  id: string;
  fieldId: string;
  plantedOn: string;
  plantedAt: string | null;
  crop: Crop;
  rowSpacingInches: number;
  seedsPerAcre: number;
  /** Whether row samples lie in the strips of a trial: then nobody counts a free place as part of it. */
  hasTrial: boolean;
  strips: { id: string; number: number; blockNumber: number; /** Lost at planting: nobody walks there. */ lost: boolean }[];
  transects: { id: string; stripId: string | null; readOn: string; marksRead: number; marksCovered: number; personName: string }[];
  conditions: { id: string; rowSampleId: string | null; observedOn: string; observedAt: string | null; growthStage: string | null; soilTemperature: { typed: string; unit: 'F' | 'C' } | null; soilMoisture: string | null; personName: string }[];
  notes: { id: string; rowSampleId: string | null; notedOn: string; text: string; personName: string }[];
  rows: RoundRow[];
};

export type RoundRow = {
  id: string;
  label: string;
  stripId: string | null;
  stripNumber: number | null;
  blockNumber: number | null;
  zoneName: string | null;
  planterRow: number | null;
  length: { typed: string; unit: ReadingUnit; inches: number };
  startEnd: RowEnd;
  farEnd: RowEnd;
  /** How many seeds the length should hold by the seeding rate. */
  seeds: number;
  counts: RoundCount[];
  tapeSheets: RoundTapeSheet[];
  depths: { id: string; visitId: string; visitedOn: string; unit: 'in' | 'cm'; depths: string[]; personName: string }[];
  cover: { id: string; readOn: string; marksRead: number; marksCovered: number }[];
  digs: RoundDig[];
  crusts: { id: string; visitedOn: string; sproutsSound: number; sproutsDead: number; crust: string; personName: string }[];
  markers: { id: string; event: 'set' | 'taken-up'; happenedOn: string; markers: number; personName: string }[];
};

export type RoundCount = {
  id: string;
  visitId: string;
  visitedOn: string;
  visitedAt: string | null;
  marker: string | null;
  personId: string;
  personName: string;
  countedAs: CountKind;
  plants: number;
  plantsUp: number;
  doubtful: number;
  used: boolean;
};

export type RoundTapeSheet = {
  id: string;
  visitId: string;
  visitedOn: string;
  visitedAt: string | null;
  visitMarker: string | null;
  personId: string;
  personName: string;
  tapeUnit: TapeUnit;
  readFrom: 'start' | 'far-end';
  zeroAt: 'mark' | 'plant';
  /** Indices of the places at which the tape was laid anew after a cut; never 0. */
  segmentStarts: number[];
  places: { typed: string; kind: TapeEntryKind; marker: string | null; leafStage: number | null }[];
};

export type RoundDig = {
  id: string;
  visitedOn: string;
  personName: string;
  pairId: string;
  plant: string;
  where: string;
  placeTyped: string | null;
  depth: { typed: string; unit: ReadingUnit } | null;
  residue: string | null;
  moisture: string | null;
  crust: string | null;
  found: string[];
  note: string | null;
};
