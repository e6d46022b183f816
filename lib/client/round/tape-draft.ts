import { leafCollarsMost, tapePlacesMost } from '@/lib/schemas/field-limits';
import { segmentsRead } from '@/lib/schemas/tape-laid';
import { parseTapePlace, placeInches } from '@/lib/schemas/tape-place';
import type { TapeEntryKind, TapeReadFrom, TapeUnit, TapeZero } from '@/lib/schemas/vocabulary';

export type DraftPlace = { typed: string; kind: TapeEntryKind; marker: string | null; leafStage: number | null };
export type TapeStep = 'half' | 'quarter' | 'tenth';

type Sheet = {
  unit: TapeUnit | null;
  step: TapeStep;
  readFrom: TapeReadFrom;
  zeroAt: TapeZero;
  places: DraftPlace[];
  segmentStarts: number[];
  current: DraftPlace;
  /** The place that is being changed; null while the next one is being typed. */
  changing: number | null;
};

/** A tape sheet as it is being read, with the states before the last presses, so that each is undone by one. */
export type TapeDraft = Sheet & { past: Sheet[] };

export type TapePress =
  | { press: 'setup'; setup: Partial<Pick<Sheet, 'unit' | 'step' | 'readFrom' | 'zeroAt'>> }
  | { press: 'key'; text: string }
  | { press: 'fraction' }
  | { press: 'back' }
  | { press: 'next' }
  | { press: 'kind'; kind: TapeEntryKind }
  | { press: 'marker'; marker: string | null }
  | { press: 'leaf'; by: 0.5 | -0.5 }
  | { press: 'select'; index: number }
  | { press: 'delete' }
  | { press: 'cut' }
  | { press: 'undo' };

const emptyPlace: DraftPlace = { typed: '', kind: 'plant', marker: null, leafStage: null };
export const emptyTape: TapeDraft = {
  unit: null, step: 'half', readFrom: 'start', zeroAt: 'mark', places: [], segmentStarts: [], current: emptyPlace, changing: null, past: [],
};

const pastMost = 20;
const lettersMost = 12;
const halves = ['1/2'];
const quarters = ['1/4', '1/2', '3/4'];

/** A newer sheet of the same row begins with the places of the last one, to be gone through. */
export function fromSheet(sheet: { tapeUnit: TapeUnit; readFrom: TapeReadFrom; zeroAt: TapeZero; segmentStarts: readonly number[]; places: readonly DraftPlace[] }, step: TapeStep): TapeDraft {
  return { ...emptyTape, step, unit: sheet.tapeUnit, readFrom: sheet.readFrom, zeroAt: sheet.zeroAt, segmentStarts: [...sheet.segmentStarts], places: sheet.places.map((place) => ({ ...place })) };
}

const sheetOf = ({ past: _past, ...sheet }: TapeDraft): Sheet => sheet;

/** The draft after one press. A press that cannot be leaves it as it was. */
export function afterTapePress(draft: TapeDraft, pressed: TapePress): TapeDraft {
  if (pressed.press === 'undo') {
    const before = draft.past.at(-1);
    return before ? { ...before, past: draft.past.slice(0, -1) } : draft;
  }
  const sheet = sheetOf(draft);
  const next = pressedOn(sheet, pressed);
  return next === sheet ? draft : { ...next, past: [...draft.past, sheet].slice(-pastMost) };
}

function pressedOn(sheet: Sheet, pressed: Exclude<TapePress, { press: 'undo' }>): Sheet {
  const { current } = sheet;
  const put = (part: Partial<DraftPlace>): Sheet => ({ ...sheet, current: { ...current, ...part } });
  switch (pressed.press) {
    case 'setup':
      return { ...sheet, ...pressed.setup };
    case 'key':
      return current.typed.length + pressed.text.length > lettersMost || /\//.test(current.typed) ? sheet : put({ typed: current.typed + pressed.text });
    case 'fraction':
      return put({ typed: withFraction(current.typed, sheet.step === 'quarter' ? quarters : halves) });
    case 'back':
      return current.typed === '' ? sheet : put({ typed: current.typed.replace(/(\s*\d\/\d|.)$/, '') });
    case 'kind':
      return put({ kind: pressed.kind });
    case 'marker':
      return put({ marker: pressed.marker });
    case 'leaf': {
      const leafStage = (current.leafStage ?? 1.5) + pressed.by;
      return leafStage < 0 || leafStage > leafCollarsMost ? sheet : put({ leafStage });
    }
    case 'select': {
      const place = sheet.places[pressed.index];
      if (!place) return sheet;
      return sheet.changing === pressed.index ? { ...sheet, changing: null, current: { ...place, typed: '', kind: 'plant' } } : { ...sheet, changing: pressed.index, current: place };
    }
    case 'delete':
      return sheet.changing === null ? sheet : { ...sheet, ...without(sheet, sheet.changing), changing: null, current: { ...current, typed: '', kind: 'plant' } };
    case 'cut':
      return cut(sheet);
    case 'next':
      return next(sheet);
  }
}

/** Pressed again, the next fraction stands in the place of the one before, and after the last one none. */
function withFraction(typed: string, fractions: readonly string[]): string {
  const found = /\s*(\d\/\d)$/.exec(typed);
  const whole = typed.replace(/\s*\d\/\d$/, '');
  const following = fractions[fractions.indexOf(found?.[1] ?? '') + 1];
  return following === undefined ? whole : whole === '' || whole.endsWith("'") ? `${whole}${following}` : `${whole} ${following}`;
}

const inchesOf = (typed: string, unit: TapeUnit) => {
  const parsed = parseTapePlace(typed, unit);
  return parsed.ok ? placeInches(parsed.thousandths, unit) : undefined;
};

/**
 * Takes the place that was typed. One that lies before the last is put where it belongs on its piece of the tape; the
 * marker and the leaf stage stay for the next plant.
 */
function next(sheet: Sheet): Sheet {
  const { unit, current, places, changing } = sheet;
  if (unit === null) return sheet;
  const inches = inchesOf(current.typed, unit);
  if (inches === undefined || (changing === null && places.length >= tapePlacesMost)) return sheet;
  const rest = changing === null ? sheet : { ...sheet, ...without(sheet, changing) };
  const segments = segmentsRead(rest.places.length, rest.segmentStarts);
  const segment = changing === null ? (segments.at(-1) ?? 0) + (rest.segmentStarts.includes(rest.places.length) ? 1 : 0) : (segmentsRead(places.length, sheet.segmentStarts)[changing] ?? 0);
  let at = segments.filter((each) => each <= segment).length;
  while (at > 0 && segments[at - 1] === segment && (inchesOf(rest.places[at - 1]?.typed ?? '', unit) ?? 0) > inches) at -= 1;
  const starts = rest.segmentStarts.map((start, index) => (start > at || (start === at && index + 1 > segment) ? start + 1 : start));
  return {
    ...rest,
    places: [...rest.places.slice(0, at), { ...current, typed: current.typed.trim() }, ...rest.places.slice(at)],
    segmentStarts: starts,
    changing: null,
    current: { ...current, typed: '', kind: 'plant' },
  };
}

/** The places without one, and the cuts moved along. A piece without places is no piece. */
function without(sheet: Sheet, index: number): Pick<Sheet, 'places' | 'segmentStarts'> {
  const places = sheet.places.filter((_, each) => each !== index);
  const moved = sheet.segmentStarts.map((start) => (start > index ? start - 1 : start)).filter((start) => start > 0 && start < places.length);
  return { places, segmentStarts: [...new Set(moved)] };
}

/** Lays the tape anew from here on: before the place that is selected, else before the next one. Pressed again, the cut goes. */
function cut(sheet: Sheet): Sheet {
  const at = sheet.changing ?? sheet.places.length;
  if (at === 0) return sheet;
  const starts = sheet.segmentStarts.includes(at) ? sheet.segmentStarts.filter((start) => start !== at) : [...sheet.segmentStarts, at].sort((a, b) => a - b);
  return { ...sheet, segmentStarts: starts };
}

/** What is wrong with the place being typed; undefined where nothing is, or nothing has been typed. */
export function placeProblem(draft: TapeDraft): string | undefined {
  if (draft.unit === null || draft.current.typed === '') return undefined;
  const parsed = parseTapePlace(draft.current.typed, draft.unit);
  return parsed.ok ? undefined : parsed.message;
}

/** The sheet as it is kept; a cut behind the last place is none. */
export function sheetBody(draft: TapeDraft) {
  return {
    tapeUnit: draft.unit ?? 'in',
    readFrom: draft.readFrom,
    zeroAt: draft.zeroAt,
    segmentStarts: draft.segmentStarts.filter((start) => start < draft.places.length),
    places: draft.places,
  };
}
