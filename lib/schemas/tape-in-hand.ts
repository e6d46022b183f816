import { placeInches, parseTapePlace } from './tape-place';
import type { TapeUnit } from './vocabulary';

const placesLeast = 4;
const inchesPerFoot = 12;
/** With half of their steps this short in inches, plants would touch; read as feet and tenths they stand as in any row. */
const stepInchesMost = 1.5;
/** A place a little beyond the end is a slip of its own. */
const beyondFeet = 0.5;

/**
 * Do these places look like feet and tenths typed as inches? Takes the places as typed, the tape said to be in hand and the
 * length of the row. It can be known from four places on: they go up, most have a decimal of one digit, none lies beyond the
 * row's length in feet, and as inches half of the plants would stand closer than 1.5 in to the one before: the middle step, so that
 * one long gap hides nothing. Limits are common practice, no source. Never says so of another tape than inches.
 * Example: 0.4 1.1 1.6 2.3 in a row of 17 ft 5 in looks so, 4.5 11 16.5 23 does not.
 */
export function looksLikeFeetAndTenths(typed: readonly string[], tapeUnit: TapeUnit, lengthInches: number): boolean {
  if (tapeUnit !== 'in' || typed.length < placesLeast) return false;
  const places = typed.flatMap((each) => {
    const read = parseTapePlace(each, 'in');
    return read.ok ? [placeInches(read.thousandths, 'in')] : [];
  });
  if (places.length < placesLeast) return false;
  const steps = places.slice(1).map((place, index) => place - (places[index] ?? place)).sort((a, b) => a - b);
  const middleStep = steps[Math.floor(steps.length / 2)] ?? stepInchesMost;
  const tenths = typed.filter((each) => /^\d*[.,]\d$/.test(each.trim())).length;
  const farthest = Math.max(...places);
  return tenths * 2 >= typed.length && farthest <= lengthInches / inchesPerFoot + beyondFeet && middleStep < stepInchesMost;
}
