import { v7 } from 'uuid';
import { z } from 'zod';
import type { OperationInput } from '@/lib/client/use-operation';
import { parseTapePlace, placeInches } from '@/lib/schemas/tape-place';
import { tapeEntryKinds, tapeUnits, type TapeUnit } from '@/lib/schemas/vocabulary';
import type { SheetCount, SheetTape } from '../count/row-sheet-types';

export const placeDraftSchema = z.object({ typed: z.string(), kind: z.enum(tapeEntryKinds), marker: z.string(), leafStage: z.string() });
export type PlaceDraft = z.infer<typeof placeDraftSchema>;

/** A tape sheet being typed in, every field as it was typed. */
export const tapeSheetDraftSchema = z.object({
  sheetId: z.string(),
  /** The standing visit it was read at; empty where it is a visit of its own. */
  visitId: z.string(),
  date: z.string(),
  personId: z.string(),
  tapeUnit: z.enum(tapeUnits),
  places: z.array(placeDraftSchema),
  /** The sheet that this one corrects. */
  replaces: z.object({ id: z.string(), date: z.string(), visit: z.object({ id: z.string(), on: z.string(), at: z.string().nullable(), marker: z.string().nullable(), personId: z.string() }) }).nullable(),
});
export type TapeSheetDraft = z.infer<typeof tapeSheetDraftSchema>;

type Setting = { counts: readonly SheetCount[]; today: string; me: string; tapeUnit: TapeUnit };

/** A sheet is read at the last visit as a rule; without one, today. */
export function emptyTapeSheet({ counts, today, me, tapeUnit }: Setting): TapeSheetDraft {
  return { sheetId: v7(), visitId: counts.findLast((count) => count.used)?.visitId ?? '', date: today, personId: me, tapeUnit, places: [], replaces: null };
}

export function correctingTapeSheet(sheet: SheetTape): TapeSheetDraft {
  return {
    sheetId: v7(),
    visitId: sheet.visitId,
    date: sheet.visitedOn,
    personId: sheet.personId,
    tapeUnit: sheet.tapeUnit,
    places: sheet.places.map((place) => ({
      typed: place.typed,
      kind: place.kind,
      marker: place.marker ?? '',
      leafStage: place.leafStage === null ? '' : String(place.leafStage),
    })),
    replaces: {
      id: sheet.id,
      date: sheet.visitedOn,
      visit: { id: sheet.visitId, on: sheet.visitedOn, at: sheet.visitedAt, marker: sheet.visitMarker, personId: sheet.personId },
    },
  };
}

/** Each place with where it lies, as far as the tape in hand lets it be read. */
export function readPlaces(draft: TapeSheetDraft): (PlaceDraft & { positionInches: number | null })[] {
  return draft.places.map((place) => {
    const read = parseTapePlace(place.typed, draft.tapeUnit);
    return { ...place, positionInches: read.ok ? placeInches(read.thousandths, draft.tapeUnit) : null };
  });
}

export function isInOrder(draft: TapeSheetDraft): boolean {
  const positions = readPlaces(draft).flatMap((place) => place.positionInches ?? []);
  return positions.every((position, index) => position >= (positions[index - 1] ?? 0));
}

/** In the order of the tape; what cannot be read stays at the end. */
export function inTapeOrder(draft: TapeSheetDraft): TapeSheetDraft {
  const places = readPlaces(draft)
    .sort((a, b) => (a.positionInches ?? Number.MAX_VALUE) - (b.positionInches ?? Number.MAX_VALUE))
    .map(({ typed, kind, marker, leafStage }) => ({ typed, kind, marker, leafStage }));
  return { ...draft, places };
}

/** A leaf stage as a number; otherwise as typed, for the server to say what is wrong with it. */
function leafStageOf(typed: string): number | string | null {
  const text = typed.trim().replace(',', '.');
  if (text === '') return null;
  return /^\d{1,2}(\.\d)?$/.test(text) ? Number(text) : typed;
}

/** The write that a draft becomes, at a standing visit or at one of its own. */
export function tapeSheetOperation(draft: TapeSheetDraft, rowSampleId: string, counts: readonly SheetCount[]): OperationInput {
  const standing = counts.find((count) => count.visitId === draft.visitId);
  const replaced = draft.replaces?.visit.id === draft.visitId ? draft.replaces.visit : undefined;
  const visit = standing
    ? { id: standing.visitId, personId: standing.personId, visitedOn: standing.visitedOn, visitedAt: standing.visitedAt, marker: standing.marker }
    : replaced
      ? { id: replaced.id, personId: replaced.personId, visitedOn: replaced.on, visitedAt: replaced.at, marker: replaced.marker }
      : { id: draft.sheetId, personId: draft.personId, visitedOn: draft.date, visitedAt: null, marker: null };
  return {
    noun: 'tape-sheets',
    kind: 'tape-sheet.record',
    thingId: draft.sheetId,
    body: {
      rowSampleId,
      visit,
      tapeUnit: draft.tapeUnit,
      places: draft.places.map((place) => ({
        typed: place.typed.trim(),
        kind: place.kind,
        marker: place.marker.trim() === '' ? null : place.marker.trim(),
        leafStage: leafStageOf(place.leafStage),
      })),
      replacesId: draft.replaces?.id ?? null,
    },
  };
}
