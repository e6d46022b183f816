import { v7 } from 'uuid';
import { z } from 'zod';
import type { OperationInput } from '@/lib/client/use-operation';
import type { TapeLaid } from '@/lib/schemas/tape-laid';
import { parseTapePlace, placeInches } from '@/lib/schemas/tape-place';
import { tapePositions } from '@/lib/schemas/tape-positions';
import { tapeEntryKinds, tapeReadFroms, tapeUnits, tapeZeros, type TapeUnit } from '@/lib/schemas/vocabulary';
import type { SheetCount, SheetTape } from '../count/row-sheet-types';

export const placeDraftSchema = z.object({ typed: z.string(), kind: z.enum(tapeEntryKinds), marker: z.string(), leafStage: z.string(), cutBefore: z.boolean().optional() });
export type PlaceDraft = z.infer<typeof placeDraftSchema>;

/** A tape sheet being typed in, every field as it was typed. */
export const tapeSheetDraftSchema = z.object({
  sheetId: z.string(),
  /** The standing visit it was read at; empty where it is a visit of its own. */
  visitId: z.string(),
  date: z.string(),
  personId: z.string(),
  tapeUnit: z.enum(tapeUnits),
  /** How the tape of the sheet being corrected lay; from the start mark where not given. */
  readFrom: z.enum(tapeReadFroms).optional(),
  zeroAt: z.enum(tapeZeros).optional(),
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
    readFrom: sheet.laid.readFrom,
    zeroAt: sheet.laid.zeroAt,
    places: [...sheet.places]
      .sort((a, b) => a.order - b.order)
      .map((place) => ({
        typed: place.typed,
        kind: place.kind,
        marker: place.marker ?? '',
        leafStage: place.leafStage === null ? '' : String(place.leafStage),
        cutBefore: sheet.laid.segmentStarts.includes(place.order),
      })),
    replaces: {
      id: sheet.id,
      date: sheet.visitedOn,
      visit: { id: sheet.visitId, on: sheet.visitedOn, at: sheet.visitedAt, marker: sheet.visitMarker, personId: sheet.personId },
    },
  };
}

function laidOf({ readFrom, zeroAt }: TapeSheetDraft, places: readonly PlaceDraft[]): TapeLaid {
  const segmentStarts = places.flatMap((place, index) => (place.cutBefore && index > 0 ? [index] : []));
  return { readFrom: readFrom ?? 'start', zeroAt: zeroAt ?? 'mark', segmentStarts };
}

type ReadPlace = PlaceDraft & { inches: number };

/** Each place with what the tape says there; what it cannot be read as is told on saving. */
function inchesOf(draft: TapeSheetDraft, place: PlaceDraft): number | null {
  const read = parseTapePlace(place.typed, draft.tapeUnit);
  return read.ok ? placeInches(read.thousandths, draft.tapeUnit) : null;
}

function readPlaces(draft: TapeSheetDraft): ReadPlace[] {
  return draft.places.flatMap((place) => {
    const inches = inchesOf(draft, place);
    return inches === null ? [] : [{ ...place, inches }];
  });
}

/** The places that can be read, where they lie in the row. */
export function laidPlaces(draft: TapeSheetDraft, lengthInches: number): (PlaceDraft & { positionInches: number; segment: number })[] {
  const read = readPlaces(draft);
  const laid = tapePositions(read.map((place) => place.inches), laidOf(draft, read), lengthInches);
  return laid.flatMap(({ order, positionInches, segment }) => {
    const place = read[order];
    return place ? [{ ...place, positionInches, segment }] : [];
  });
}

export function isInOrder(draft: TapeSheetDraft): boolean {
  const read = readPlaces(draft);
  return read.every((place, index) => index === 0 || place.cutBefore || place.inches >= (read[index - 1]?.inches ?? 0));
}

/** Each piece in the order of the tape; what cannot be read stays at its end. */
export function inTapeOrder(draft: TapeSheetDraft): TapeSheetDraft {
  const pieces: PlaceDraft[][] = [];
  draft.places.forEach((place, index) => (index > 0 && !place.cutBefore ? pieces.at(-1)?.push(place) : pieces.push([place])));
  const farOf = (place: PlaceDraft) => inchesOf(draft, place) ?? Number.MAX_VALUE;
  const sorted = pieces.map((piece, at) => [...piece].sort((a, b) => farOf(a) - farOf(b)).map((place, index) => ({ ...place, cutBefore: at > 0 && index === 0 })));
  return { ...draft, places: sorted.flat() };
}

/** The places without one of them; the next takes over a cut that lay before it. */
export function withoutPlace(places: readonly PlaceDraft[], at: number): PlaceDraft[] {
  const cutBefore = places[at]?.cutBefore;
  return places.flatMap((place, index) => (index === at ? [] : [index === at + 1 && cutBefore ? { ...place, cutBefore } : place]));
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
    version: 2,
    thingId: draft.sheetId,
    body: {
      rowSampleId,
      visit,
      tapeUnit: draft.tapeUnit,
      ...laidOf(draft, draft.places),
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
