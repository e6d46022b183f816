import type { TapeLaid } from '@/lib/schemas/tape-laid';
import type { CountKind, OriginKind, ReadingUnit, RowEnd, TapeEntryKind, TapeUnit } from '@/lib/schemas/vocabulary';
import type { Findings } from './finding-texts';
import type { RowPlaceFacts } from './row-place-text';

export type SheetCount = {
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
  originKind: OriginKind;
  used: boolean;
  alsoCountedBy: string | null;
};

export type FieldMoment = { on: string; at: string | null };

export type SheetPlace = {
  typed: string;
  /** Its number in the order read, from 0. */
  order: number;
  segment: number;
  positionInches: number;
  kind: TapeEntryKind;
  marker: string | null;
  leafStage: number | null;
  firstSeen: { after: FieldMoment | null; by: FieldMoment } | null;
};

export type SheetTape = {
  id: string;
  visitId: string;
  visitedOn: string;
  visitedAt: string | null;
  visitMarker: string | null;
  personId: string;
  personName: string;
  tapeUnit: TapeUnit;
  laid: TapeLaid;
  used: boolean;
  /** In the order of the row, from its start. */
  places: readonly SheetPlace[];
};

export type SheetCover = { id: string; readOn: string; marksRead: number; marksCovered: number };

export type SheetRow = {
  id: string;
  label: string;
  place: RowPlaceFacts;
  length: { typed: string; unit: ReadingUnit };
  lengthInches: number;
  startEnd: RowEnd;
  farEnd: RowEnd;
  seeds: number;
};

type Neighbor = { id: string; label: string } | null;

/** One row sample with all that stands of it, as its page shows it. */
export type RowSheetData = {
  plantingId: string;
  plantedOn: string;
  today: string;
  row: SheetRow;
  counts: readonly SheetCount[];
  tapeSheets: readonly SheetTape[];
  residueReadings: readonly SheetCover[];
  findings: Findings;
  people: readonly { id: string; name: string }[];
  me: string;
  previous: Neighbor;
  next: Neighbor;
  mayWrite: boolean;
};
