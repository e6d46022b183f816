import type { FieldProblem, Question } from '@/lib/errors/app-error';
import { countText } from '@/lib/format/count-text';
import { parseTapePlace, placeInches } from '@/lib/schemas/tape-place';
import type { TapeEntryKind, TapeUnit } from '@/lib/schemas/vocabulary';

export type PlaceToCheck = { typed: string; kind: TapeEntryKind; marker: string | null; leafStage: number | null };
/** The row sample, what it can hold, the markers its visits set, and who read a sheet on that day already. */
export type TapedRow = { label: string; lengthInches: number; seeds: number; markers: readonly string[]; tapedBy: string | null };
export type CheckedTapeSheet = { fields: FieldProblem[]; questions: Question[]; thousandths: number[] };

/** A hundredth of an inch is the rounding of a length in other units, no place outside. */
const roundingInches = 0.01;

/** Reads every place of a sheet by the tape in hand and holds the sheet against its row. The same rules serve form and file. */
export function checkTapeSheet(places: readonly PlaceToCheck[], tapeUnit: TapeUnit, row: TapedRow): CheckedTapeSheet {
  const parsed = places.map((place) => parseTapePlace(place.typed, tapeUnit));
  const unread = parsed.flatMap((each, index) => (each.ok ? [] : [{ path: `places.${index}.typed`, message: each.message }]));
  if (unread.length > 0) return { fields: unread, questions: [], thousandths: [] };
  const thousandths = parsed.flatMap((each) => (each.ok ? [each.thousandths] : []));
  const fields = outOfOrder(places, thousandths);
  return { fields, questions: fields.length > 0 ? [] : questionsAbout(places, thousandths, tapeUnit, row), thousandths };
}

/** Each place that lies before one above it, against the farthest so far: after one slip the places that follow are right. */
function outOfOrder(places: readonly PlaceToCheck[], thousandths: readonly number[]): FieldProblem[] {
  const fields: FieldProblem[] = [];
  let farthest = 0;
  thousandths.forEach((place, index) => {
    if (place < (thousandths[farthest] ?? 0)) {
      fields.push({ path: `places.${index}.typed`, message: `${places[index]?.typed} comes after ${places[farthest]?.typed}, and places go up along the tape. Correct one, or put them in order.` });
    } else {
      farthest = index;
    }
  });
  return fields;
}

function questionsAbout(places: readonly PlaceToCheck[], thousandths: readonly number[], tapeUnit: TapeUnit, row: TapedRow): Question[] {
  const known = new Set(row.markers.map((marker) => marker.toLowerCase()));
  const strange = new Set(places.flatMap(({ marker }) => (marker !== null && !known.has(marker.toLowerCase()) ? [marker] : [])));
  return [
    ...(row.tapedBy === null
      ? []
      : [{ rule: 'taped-twice', about: `${row.label}: ${places.length}`, sentence: `${row.label}: ${row.tapedBy} has a tape sheet of this row and day already. Keep both? The newer is used.` }]),
    ...places.flatMap((place, index) => placeQuestions(place, places[index - 1], [thousandths[index] ?? 0, thousandths[index - 1]], tapeUnit, row)),
    ...(places.length > Math.ceil(row.seeds)
      ? [{
          rule: 'more-places-than-seeds',
          about: `${row.label}: ${places.length}`,
          sentence: `${row.label}: ${countText(places.length, 'place')} on the tape, where about ${countText(Math.round(row.seeds), 'seed')} were planted. Were there that many?`,
        }]
      : []),
    ...[...strange].map((marker) => ({
      rule: 'unknown-marker',
      about: `${row.label}: ${marker}`,
      sentence: `${row.label}: no visit of this row has the marker ${marker}, so it tells no day. Keep it all the same?`,
    })),
  ];
}

function placeQuestions(
  place: PlaceToCheck,
  before: PlaceToCheck | undefined,
  [at, atBefore]: [number, number | undefined],
  tapeUnit: TapeUnit,
  row: TapedRow,
): Question[] {
  const questions: Question[] = [];
  if (placeInches(at, tapeUnit) > row.lengthInches + roundingInches) {
    questions.push({ rule: 'place-outside-length', about: `${row.label}: ${place.typed}`, sentence: `${row.label}: ${place.typed} lies beyond the end of the row sample. Is the place right?` });
  }
  // One noted as a double says so already.
  if (before && at === atBefore && place.kind !== 'double' && before.kind !== 'double') {
    const what = place.kind === 'missing' || before.kind === 'missing' ? 'a plant and a missing one are both' : 'two plants stand';
    questions.push({ rule: 'two-at-one-mark', about: `${row.label}: ${place.typed}`, sentence: `${row.label}: ${what} at ${place.typed}. Is that so?` });
  }
  return questions;
}
