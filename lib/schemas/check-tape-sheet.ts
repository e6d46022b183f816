import type { FieldProblem, Question } from '@/lib/errors/app-error';
import { countText } from '@/lib/format/count-text';
import { looksLikeFeetAndTenths } from './tape-in-hand';
import { laidOnce, segmentsRead, type TapeLaid } from './tape-laid';
import { parseTapePlace, placeInches } from './tape-place';
import type { TapeEntryKind, TapeUnit } from './vocabulary';

export type PlaceToCheck = { typed: string; kind: TapeEntryKind; marker: string | null; leafStage: number | null };
/** The row sample, what it can hold, the markers its visits set, and who read a sheet on that day already. */
export type TapedRow = { label: string; lengthInches: number; seeds: number; markers: readonly string[]; tapedBy: string | null };
export type CheckedTapeSheet = { fields: FieldProblem[]; questions: Question[]; thousandths: number[] };

/** A hundredth of an inch is the rounding of a length in other units, no place outside. */
const roundingInches = 0.01;

/**
 * Reads every place of a sheet by the tape in hand and holds the sheet against its row. The same rules serve form, file and
 * phone; what a phone has asked carries the same words, so that its answer holds here.
 */
export function checkTapeSheet(places: readonly PlaceToCheck[], tapeUnit: TapeUnit, row: TapedRow, laid: TapeLaid = laidOnce): CheckedTapeSheet {
  const parsed = places.map((place) => parseTapePlace(place.typed, tapeUnit));
  const unread = parsed.flatMap((each, index) => (each.ok ? [] : [{ path: `places.${index}.typed`, message: each.message }]));
  if (unread.length > 0) return { fields: unread, questions: [], thousandths: [] };
  const thousandths = parsed.flatMap((each) => (each.ok ? [each.thousandths] : []));
  const wrongCut = laid.segmentStarts.some((start, index) => start >= places.length || start <= (laid.segmentStarts[index - 1] ?? 0));
  if (wrongCut) return { fields: [{ path: 'segmentStarts', message: 'A cut lies between two places of the sheet. Set it anew.' }], questions: [], thousandths };
  const segments = segmentsRead(places.length, laid.segmentStarts);
  const fields = [...zeroProblems(places, thousandths, laid), ...outOfOrder(places, thousandths, segments)];
  return { fields, questions: fields.length > 0 ? [] : questionsAbout({ places, thousandths, segments, tapeUnit, row }), thousandths };
}

/** A tape laid from a plant has that plant at its zero. */
function zeroProblems(places: readonly PlaceToCheck[], thousandths: readonly number[], laid: TapeLaid): FieldProblem[] {
  const [first] = places;
  if (laid.zeroAt === 'mark' || !first) return [];
  const right = thousandths[0] === 0 && first.kind !== 'missing';
  return right ? [] : [{ path: 'places.0.typed', message: 'The tape begins at a plant, so the first place is a plant at 0. Add it, or say that the tape begins at the peg.' }];
}

/** Each place that lies before one above it on the same piece, against the farthest so far: after one slip the places that follow are right. */
function outOfOrder(places: readonly PlaceToCheck[], thousandths: readonly number[], segments: readonly number[]): FieldProblem[] {
  const fields: FieldProblem[] = [];
  let farthest = 0;
  thousandths.forEach((place, index) => {
    if (segments[index] === segments[farthest] && place < (thousandths[farthest] ?? 0)) {
      fields.push({ path: `places.${index}.typed`, message: `${places[index]?.typed} comes after ${places[farthest]?.typed}, and places go up along the tape. Correct one, or put them in order.` });
    } else {
      farthest = index;
    }
  });
  return fields;
}

type ReadSheet = { places: readonly PlaceToCheck[]; thousandths: readonly number[]; segments: readonly number[]; tapeUnit: TapeUnit; row: TapedRow };

function questionsAbout(sheet: ReadSheet): Question[] {
  const { places, row } = sheet;
  const known = new Set(row.markers.map((marker) => marker.toLowerCase()));
  const strange = new Set(places.flatMap(({ marker }) => (marker !== null && !known.has(marker.toLowerCase()) ? [marker] : [])));
  return [
    ...(row.tapedBy === null
      ? []
      : [{ rule: 'taped-twice', about: `${row.label}: ${places.length}`, sentence: `${row.label}: ${row.tapedBy} has a tape sheet of this row and day already. Keep both? The newer is used.` }]),
    ...tapeQuestions(sheet),
    ...places.flatMap((_, index) => placeQuestions(sheet, index)),
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

function tapeQuestions({ places, tapeUnit, row, segments }: ReadSheet): Question[] {
  const oneTape = places.filter((_, index) => segments[index] === 0).map((place) => place.typed);
  if (!looksLikeFeetAndTenths(oneTape, tapeUnit, row.lengthInches)) return [];
  return [{
    rule: 'feet-and-tenths',
    about: `${row.label}: ${oneTape[0]} to ${oneTape.at(-1)}`,
    sentence: `${row.label}: ${oneTape[0]} to ${oneTape.at(-1)} look like feet and tenths, and the tape is given in inches. Are they inches?`,
  }];
}

function placeQuestions({ places, thousandths, segments, tapeUnit, row }: ReadSheet, index: number): Question[] {
  const questions: Question[] = [];
  const [place, before] = [places[index], places[index - 1]];
  if (!place) return questions;
  const inchesAt = (each: number) => placeInches(thousandths[each] ?? 0, tapeUnit);
  // What the pieces before reached already is behind this one.
  const behind = thousandths.reduce((sum, _, each) => (each < index && segments[each] !== segments[index] && segments[each + 1] !== segments[each] ? sum + inchesAt(each) : sum), 0);
  if (behind + inchesAt(index) > row.lengthInches + roundingInches) {
    questions.push({ rule: 'place-outside-length', about: `${row.label}: ${place.typed}`, sentence: `${row.label}: ${place.typed} lies beyond the end of the row sample. Is the place right?` });
  }
  // One noted as a double says so already.
  const together = before && segments[index] === segments[index - 1] && thousandths[index] === thousandths[index - 1];
  if (together && place.kind !== 'double' && before.kind !== 'double') {
    const what = place.kind === 'missing' || before.kind === 'missing' ? 'a plant and a missing one are both' : 'two plants stand';
    questions.push({ rule: 'two-at-one-mark', about: `${row.label}: ${place.typed}`, sentence: `${row.label}: ${what} at ${place.typed}. Is that so?` });
  }
  return questions;
}
