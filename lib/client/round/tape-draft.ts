import { leafCollarsMost, tapePlacesMost } from '@/lib/schemas/field-limits';
import type { RoundTapeSheet } from '@/lib/schemas/round-day';
import { parseTapePlace, placeInches } from '@/lib/schemas/tape-place';
import type { TapeEntryKind, TapeReadFrom, TapeUnit, TapeZero } from '@/lib/schemas/vocabulary';

/** One place being read. A cut before it says that the tape was laid anew there. */
export type DraftPlace = { typed: string; kind: TapeEntryKind; marker: string | null; leafStage: number | null; cutBefore: boolean };
export const tapeSteps = ['half', 'quarter', 'tenth'] as const;
export type TapeStep = (typeof tapeSteps)[number];
/** The tape in hand and how it lies. */
export type TapeHand = { unit: TapeUnit; step: TapeStep; zeroAt: TapeZero; readFrom: TapeReadFrom };

type Sheet = TapeHand & {
  places: readonly DraftPlace[];
  /** The place in the entry line, and what it is: the next one, one to be put before another, or one that stands. */
  current: DraftPlace;
  at: { put: 'end' } | { put: 'before' | 'change'; index: number };
  /** The next key begins the number anew instead of going on with it. */
  fresh: boolean;
  /** So many places at the end came from an earlier sheet and have not been gone through. */
  toGo: number;
  /** The sheet that this one corrects. */
  replacesId: string | null;
  /** Whether the scout has said that what looks like feet and tenths is in inches. */
  surelyInches: boolean;
  /** Why Next did not take what is typed: it cannot be read, or it is not in the order of the tape. */
  refused: 'unread' | 'order' | null;
};

type Past = { from: number; removed: readonly DraftPlace[]; added: number; rest: Omit<Sheet, 'places'> };

const restOf = ({ unit, step, zeroAt, readFrom, current, at, fresh, toGo, replacesId, surelyInches, refused }: Sheet): Past['rest'] => ({
  unit, step, zeroAt, readFrom, current, at, fresh, toGo, replacesId, surelyInches, refused,
});

/** A tape sheet as it is being read, with what the last presses changed, so that each is undone by one. Plain data, as it is stored. */
export type TapeDraft = Sheet & { past: readonly Past[] };

export type TapePress =
  | { press: 'key'; text: string }
  | { press: 'fraction'; text: '¼' | '½' | '¾' }
  | { press: 'back' }
  | { press: 'next' }
  | { press: 'in-order' }
  | { press: 'insert' }
  | { press: 'remove' }
  | { press: 'cut' }
  | { press: 'surely-inches' }
  | { press: 'undo' }
  | { press: 'kind'; kind: TapeEntryKind }
  | { press: 'marker'; marker: string | null }
  | { press: 'leaf'; by: 0.5 | -0.5 }
  | { press: 'select'; index: number }
  | { press: 'hand'; hand: Partial<TapeHand> };

const pastMost = 40;
const lettersMost = 12;
const leafUsual = 2;
const fractionAtEnd = /[¼½¾]$/;
const noPlace: DraftPlace = { typed: '', kind: 'plant', marker: null, leafStage: null, cutBefore: false };

/** An empty sheet. Laid from a plant, that plant stands at 0 and waits for its marker. */
export function beginTape(hand: TapeHand): TapeDraft {
  const fromPlant = hand.zeroAt === 'plant';
  return {
    ...hand, places: [], current: { ...noPlace, typed: fromPlant ? '0' : '' }, at: { put: 'end' }, fresh: fromPlant, toGo: 0, replacesId: null, surelyInches: false, refused: null, past: [],
  };
}

/** A newer sheet begins with the places of the last one, each to be gone through; leaves have grown since and are read anew. */
export function goThrough(sheet: RoundTapeSheet, hand: TapeHand): TapeDraft {
  const places = placesOf(sheet).map((place) => ({ ...place, leafStage: null }));
  return homeward({ ...beginTape({ ...hand, ...laidAs(sheet) }), places, toGo: places.length });
}

/** A sheet that stands, to be corrected: what was read holds until it is changed. */
export function correctTape(sheet: RoundTapeSheet, hand: TapeHand): TapeDraft {
  return homeward({ ...beginTape({ ...hand, ...laidAs(sheet) }), places: placesOf(sheet), replacesId: sheet.id });
}

const laidAs = ({ tapeUnit, zeroAt, readFrom }: RoundTapeSheet) => ({ unit: tapeUnit, zeroAt, readFrom });
const placesOf = (sheet: RoundTapeSheet): DraftPlace[] => sheet.places.map((place, index) => ({ ...place, cutBefore: sheet.segmentStarts.includes(index) }));

/** The draft after one press. A press that cannot be leaves it as it was. */
export function afterTapePress(draft: TapeDraft, pressed: TapePress): TapeDraft {
  if (pressed.press === 'undo') return undone(draft);
  const next = pressedOn(draft, pressed);
  return next === draft ? draft : { ...next, past: [...draft.past, whatChanged(draft, next)].slice(-pastMost) };
}

/** Kept as the difference alone: a whole sheet for each press would make every press slower than the one before. */
function whatChanged(before: TapeDraft, after: TapeDraft): Past {
  const [was, is] = [before.places, after.places];
  const least = Math.min(was.length, is.length);
  let from = 0;
  while (from < least && was[from] === is[from]) from += 1;
  let same = 0;
  while (same < least - from && was[was.length - 1 - same] === is[is.length - 1 - same]) same += 1;
  return { from, removed: was.slice(from, was.length - same), added: is.length - same - from, rest: restOf(before) };
}

function undone(draft: TapeDraft): TapeDraft {
  const last = draft.past.at(-1);
  if (!last) return draft;
  const places = [...draft.places.slice(0, last.from), ...last.removed, ...draft.places.slice(last.from + last.added)];
  return { ...last.rest, places, past: draft.past.slice(0, -1) };
}

function pressedOn(draft: TapeDraft, pressed: Exclude<TapePress, { press: 'undo' }>): TapeDraft {
  switch (pressed.press) {
    case 'key':
    case 'fraction':
    case 'back':
      return typedOn(draft, pressed);
    case 'next':
      return taken(draft);
    case 'in-order':
      return inOrder(draft);
    case 'kind':
      return noted(draft, { kind: draft.current.kind === pressed.kind ? 'plant' : pressed.kind });
    case 'marker':
      return noted(draft, { marker: pressed.marker });
    case 'leaf':
      return noted(draft, { leafStage: leafAfter(draft, pressed.by) });
    case 'select':
      return selected(draft, pressed.index);
    case 'insert':
      return draft.at.put === 'change' ? { ...draft, at: { put: 'before', index: draft.at.index }, current: nextPlace(draft, draft.at.index), fresh: false, refused: null } : draft;
    case 'remove':
      return draft.at.put === 'change' ? homeward(without(draft, draft.at.index)) : draft;
    case 'cut':
      return cut(draft);
    case 'surely-inches':
      return { ...draft, surelyInches: true };
    case 'hand':
      return { ...draft, ...pressed.hand, refused: null };
  }
}

function typedOn(draft: TapeDraft, pressed: Extract<TapePress, { press: 'key' | 'fraction' | 'back' }>): TapeDraft {
  const typed = draft.fresh ? '' : draft.current.typed;
  const put = (text: string): TapeDraft => (text.length > lettersMost ? draft : { ...draft, current: { ...draft.current, typed: text }, fresh: false, refused: null });
  if (pressed.press === 'back') return draft.current.typed === '' ? draft : put(draft.fresh ? '' : typed.slice(0, -1));
  if (pressed.press === 'fraction') {
    const whole = typed.replace(fractionAtEnd, '');
    return /[.,]/.test(whole) ? draft : put(typed.endsWith(pressed.text) ? whole : whole + pressed.text);
  }
  // Nothing follows a fraction, and a point or the mark of feet stands once.
  if (fractionAtEnd.test(typed) || (/[.,']/.test(pressed.text) && typed.includes(pressed.text)) || (pressed.text === "'" && !/^\d+$/.test(typed))) return draft;
  return put(typed + pressed.text);
}

/** What is noted of the place in the entry line holds at once where that place stands already. */
function noted(draft: TapeDraft, part: Partial<DraftPlace>): TapeDraft {
  const { at } = draft;
  const current = { ...draft.current, ...part };
  if (at.put !== 'change') return { ...draft, current };
  return { ...draft, current, places: draft.places.map((place, index) => (index === at.index ? { ...place, ...part } : place)) };
}

/** The first press notes what the plant before had; a half less than none is not read. */
function leafAfter({ current, places, at }: TapeDraft, by: number): number | null {
  if (current.leafStage === null) return places.slice(0, at.put === 'end' ? places.length : at.index).findLast((place) => place.leafStage !== null)?.leafStage ?? leafUsual;
  const leafStage = current.leafStage + by;
  return leafStage < 0 ? null : Math.min(leafStage, leafCollarsMost);
}

/** The empty place that follows, with the marker of the one before it. */
const nextPlace = ({ places }: Pick<Sheet, 'places'>, index: number): DraftPlace => ({ ...noPlace, marker: places[index - 1]?.marker ?? null });

/** Back to where reading goes on: the first place not gone through, else the end. */
function homeward(draft: TapeDraft): TapeDraft {
  const index = draft.places.length - draft.toGo;
  const place = draft.places[index];
  if (draft.toGo > 0 && place) return { ...draft, at: { put: 'change', index }, current: place, fresh: true, refused: null };
  return { ...draft, at: { put: 'end' }, current: nextPlace(draft, draft.places.length), fresh: false, refused: null };
}

const inchesOf = (place: DraftPlace | undefined, unit: TapeUnit): number | undefined => {
  const parsed = place && parseTapePlace(place.typed, unit);
  return parsed?.ok ? placeInches(parsed.thousandths, unit) : undefined;
};

/** What was typed and not yet taken. */
export const isPending = ({ at, current, fresh, places }: TapeDraft) =>
  !fresh && current.typed !== '' && (at.put !== 'change' || current.typed !== places[at.index]?.typed);

/** Takes the place in the entry line, where it can be read and lies in the order of the tape. */
function taken(draft: TapeDraft): TapeDraft {
  const { at, current, places, unit } = draft;
  const inches = inchesOf(current, unit);
  if (inches === undefined) return { ...draft, refused: 'unread' };
  if (at.put !== 'change' && places.length >= tapePlacesMost) return draft;
  const index = at.put === 'end' ? places.length : at.index;
  const after = at.put === 'change' ? places[index + 1] : at.put === 'before' ? places[index] : undefined;
  const cutHere = at.put === 'before' ? (places[index]?.cutBefore ?? false) : current.cutBefore;
  const tooNear = !cutHere && inches < (inchesOf(places[index - 1], unit) ?? 0);
  const tooFar = after !== undefined && !(at.put === 'change' && after.cutBefore) && inches > (inchesOf(after, unit) ?? Infinity);
  if (tooNear || tooFar) return { ...draft, refused: 'order' };
  return homeward(withPlace(draft, index, { ...current, cutBefore: cutHere }));
}

function withPlace(draft: TapeDraft, index: number, place: DraftPlace): TapeDraft {
  const { at, places, toGo } = draft;
  if (at.put === 'change') {
    const gone = toGo > 0 && index === places.length - toGo;
    return { ...draft, places: places.map((each, other) => (other === index ? place : each)), toGo: gone ? toGo - 1 : toGo };
  }
  // A cut that lay before the next place lies before this one now.
  const behind = places.slice(index).map((each, other) => (other === 0 && place.cutBefore ? { ...each, cutBefore: false } : each));
  return { ...draft, places: [...places.slice(0, index), place, ...behind], toGo: index > places.length - toGo ? toGo + 1 : toGo };
}

function without(draft: TapeDraft, index: number): TapeDraft {
  const { places, toGo } = draft;
  const cutBefore = places[index]?.cutBefore ?? false;
  const rest = places.flatMap((place, other) => (other === index ? [] : [other === index + 1 && cutBefore ? { ...place, cutBefore } : place]));
  return { ...draft, places: rest, toGo: index >= places.length - toGo ? toGo - 1 : toGo };
}

/** Puts a place that was typed out of order where it belongs on its piece of the tape. */
function inOrder(draft: TapeDraft): TapeDraft {
  const { at, current, unit } = draft;
  const inches = inchesOf(current, unit);
  if (draft.refused !== 'order' || inches === undefined) return draft;
  const rest = at.put === 'change' ? without(draft, at.index) : draft;
  const near = Math.max(0, at.put === 'end' ? rest.places.length - 1 : Math.min(at.index, rest.places.length - 1));
  let begin = near;
  while (begin > 0 && !rest.places[begin]?.cutBefore) begin -= 1;
  let end = begin + 1;
  while (end < rest.places.length && !rest.places[end]?.cutBefore) end += 1;
  let index = begin;
  while (index < end && (inchesOf(rest.places[index], unit) ?? 0) <= inches) index += 1;
  const cutBefore = index === begin && (rest.places[begin]?.cutBefore ?? false);
  return homeward(withPlace({ ...rest, at: { put: 'before', index } }, index, { ...current, cutBefore }));
}

/** Goes to a place that stands; what is typed is taken first. Pressed again, back to where reading goes on. */
function selected(draft: TapeDraft, index: number): TapeDraft {
  if (draft.at.put === 'change' && draft.at.index === index && !isPending(draft)) return homeward(draft);
  const before = draft.places.length;
  const settled = isPending(draft) ? taken(draft) : draft;
  if (settled.refused) return settled;
  const moved = settled.places.length > before && draft.at.put === 'before' && index >= draft.at.index ? index + 1 : index;
  const place = settled.places[moved];
  return place ? { ...settled, at: { put: 'change', index: moved }, current: place, fresh: true, refused: null } : draft;
}

/** Lays the tape anew before the place in the entry line; pressed again, the cut goes. */
function cut(draft: TapeDraft): TapeDraft {
  const index = draft.at.put === 'end' ? draft.places.length : draft.at.index;
  if (index === 0 || draft.at.put === 'before') return draft;
  return { ...noted(draft, { cutBefore: !draft.current.cutBefore }), refused: null };
}

/** How far the place in the entry line lies from the one before it on its piece, in inches; undefined where that cannot be said. */
export function inchesFromLast(draft: TapeDraft): number | undefined {
  const { at, current, places, unit } = draft;
  const before = places[(at.put === 'end' ? places.length : at.index) - 1];
  const [here, there] = [inchesOf(current, unit), inchesOf(before, unit)];
  return here === undefined || there === undefined || current.cutBefore ? undefined : here - there;
}

/** Each place in inches of its piece; undefined where the tape in hand cannot read it. */
export const inchesRead = ({ places, unit }: Pick<Sheet, 'places' | 'unit'>) => places.map((place) => inchesOf(place, unit));

/** The sheet as it is kept. */
export function sheetBody({ unit, readFrom, zeroAt, places }: Pick<TapeDraft, 'unit' | 'readFrom' | 'zeroAt' | 'places'>) {
  return {
    tapeUnit: unit,
    readFrom,
    zeroAt,
    segmentStarts: places.flatMap((place, index) => (index > 0 && place.cutBefore ? [index] : [])),
    places: places.map(({ typed, kind, marker, leafStage }) => ({ typed, kind, marker, leafStage })),
  };
}
