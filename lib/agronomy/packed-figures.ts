import { SAME_NUMBER } from './constants';
import { isotonicFit } from './isotonic-fit';
import { ImpossibleInput } from './outcome';
import { packedKnown, type PackedFigures, type PackedRows } from './packed-rows';

/** Ratios are rounded to 1e-9 before they are held against a limit; this is the same said without rounding. */
const HALF_A_BILLIONTH = 5e-10;

/**
 * What do the descriptive figures of very many row samples say?
 *
 * Takes row samples packed in typed arrays (see PackedRows: inches, days since planting, plants, acres). Returns one
 * array a figure and, in `known`, which of them each row is sufficient for. A row is insufficient for a figure exactly
 * where its record function is. Throws ImpossibleInput for places or visits out of order, negative or not finite, and
 * for an area or theoretical spacing that is not above 0.
 *
 * Method: as spacingVariation, kachmanSmith, emergenceCurve, emergencePercentile, emergenceSpread and plantsPerAcre,
 * to which a test holds it within 1e-9; the mean spacing is the distance from the first plant to the last over the
 * spaces between. Counts that fall are fitted by isotonicFit. It gives no intervals and no reasons.
 * Example: one row with places 0 2 17 33 38 39 44 52 55 60 68 in and 10 plants held in 68 in of a 30-inch row: mean 6.8,
 * SD 5.116 in, 30,748 plants per acre.
 */
export function packedFigures(rows: PackedRows): PackedFigures {
  const count = rows.plantsHeld.length;
  const column = () => new Float64Array(count);
  const figures: PackedFigures = {
    known: new Uint16Array(count),
    plantsPerAcre: column(),
    spacingInchesMean: column(),
    spacingInchesSd: column(),
    spacingCv: column(),
    multiplesShare: column(),
    singlesShare: column(),
    missesShare: column(),
    daysTo10: column(),
    daysTo50: column(),
    daysTo90: column(),
    spreadDays: column(),
  };
  for (let row = 0; row < count; row += 1) {
    standOfRow(rows, figures, row);
    spacingOfRow(rows, figures, row);
    timingOfRow(rows, figures, row);
  }
  return figures;
}

// Typed arrays hold a number at every place below their length, which the compiler cannot know.
const at = (array: Float64Array | Uint32Array, index: number) => array[index] as number;

function refuse(what: string, field: keyof PackedRows): never {
  throw new ImpossibleInput(what, field);
}

function standOfRow(rows: PackedRows, figures: PackedFigures, row: number): void {
  const area = at(rows.areaAcres, row);
  const held = at(rows.plantsHeld, row);
  if (!(area > 0) || area === Infinity) refuse('The area must be above 0.', 'areaAcres');
  if (!(held >= 0) || held === Infinity) refuse('Plants must be 0 or more.', 'plantsHeld');
  figures.plantsPerAcre[row] = held / area;
}

function spacingOfRow(rows: PackedRows, figures: PackedFigures, row: number): void {
  const { placesInches } = rows;
  const from = at(rows.placesFrom, row);
  const to = at(rows.placesFrom, row + 1);
  const spaces = to - from - 1;
  if (to - from > 0 && !(at(placesInches, from) >= 0)) refuse('Places must be 0 or more.', 'placesInches');
  if (spaces < 1) return;
  const theoretical = at(rows.theoreticalSpacingInches, row);
  if (!(theoretical > 0)) refuse('The theoretical spacing must be above 0.', 'theoreticalSpacingInches');
  const mean = (at(placesInches, to - 1) - at(placesInches, from)) / spaces;
  const multipleBelow = (0.5 + HALF_A_BILLIONTH) * theoretical;
  const singleBelow = (1.5 + HALF_A_BILLIONTH) * theoretical;
  let squares = 0;
  let multiples = 0;
  let singles = 0;
  let before = at(placesInches, from);
  for (let index = from + 1; index < to; index += 1) {
    const place = at(placesInches, index);
    const spacing = place - before;
    if (!(spacing >= 0)) refuse('Places on the tape must ascend.', 'placesInches');
    squares += (spacing - mean) * (spacing - mean);
    if (spacing < multipleBelow) multiples += 1;
    else if (spacing < singleBelow) singles += 1;
    before = place;
  }
  if (before === Infinity) refuse('Places must be finite.', 'placesInches');
  figures.spacingInchesMean[row] = mean;
  figures.multiplesShare[row] = multiples / spaces;
  figures.singlesShare[row] = singles / spaces;
  figures.missesShare[row] = (spaces - multiples - singles) / spaces;
  let known = packedKnown.spacingMean | packedKnown.placement;
  if (spaces > 1) {
    const sd = Math.sqrt(squares / (spaces - 1));
    figures.spacingInchesSd[row] = sd;
    known |= packedKnown.spacingSd;
    if (mean > SAME_NUMBER) {
      figures.spacingCv[row] = sd / mean;
      known |= packedKnown.spacingCv;
    }
  }
  figures.known[row] = bitsOf(figures.known, row) | known;
}

const bitsOf = (array: Uint16Array, index: number) => array[index] as number;

function timingOfRow(rows: PackedRows, figures: PackedFigures, row: number): void {
  const { visitDays, plantsUp } = rows;
  const from = at(rows.visitsFrom, row);
  const to = at(rows.visitsFrom, row + 1);
  if (to === from) return;
  let falls = false;
  for (let index = from; index < to; index += 1) {
    const up = at(plantsUp, index);
    const day = at(visitDays, index);
    if (!(up >= 0) || up === Infinity) refuse('Plants must be 0 or more.', 'plantsUp');
    if (!(day >= 0) || day === Infinity) refuse('Days must be 0 or more.', 'visitDays');
    if (index > from) {
      if (!(day > at(visitDays, index - 1))) refuse('Visits must follow one another.', 'visitDays');
      if (up < at(plantsUp, index - 1)) falls = true;
    }
  }
  const curve = falls ? Float64Array.from(isotonicFit([...plantsUp.subarray(from, to)])) : plantsUp;
  const start = falls ? 0 : from;
  const emerged = at(curve, start + to - from - 1);
  if (emerged <= 0) return;
  const visits = to - from;
  const early = reachedAt(curve, start, visits, 0.1 * emerged, emerged);
  const half = reachedAt(curve, start, visits, 0.5 * emerged, emerged);
  const late = reachedAt(curve, start, visits, 0.9 * emerged, emerged);
  const ten = dayOf(curve, start, visitDays, from, early, 0.1 * emerged, emerged);
  const ninety = dayOf(curve, start, visitDays, from, late, 0.9 * emerged, emerged);
  figures.daysTo10[row] = ten;
  figures.daysTo50[row] = dayOf(curve, start, visitDays, from, half, 0.5 * emerged, emerged);
  figures.daysTo90[row] = ninety;
  let known: number = packedKnown.days;
  if (early === 0) known |= packedKnown.daysTo10AtLatest;
  if (half === 0) known |= packedKnown.daysTo50AtLatest;
  if (late === 0) known |= packedKnown.daysTo90AtLatest;
  else {
    figures.spreadDays[row] = ninety - ten;
    known |= packedKnown.spread;
  }
  figures.known[row] = bitsOf(figures.known, row) | known;
}

/** The first visit, from 0, at which so many plants were up. */
function reachedAt(curve: Float64Array, start: number, visits: number, target: number, emerged: number): number {
  const needed = target - SAME_NUMBER * Math.max(1, emerged);
  let visit = 0;
  while (visit < visits - 1 && at(curve, start + visit) < needed) visit += 1;
  return visit;
}

function dayOf(curve: Float64Array, start: number, days: Float64Array, from: number, visit: number, target: number, emerged: number): number {
  const day = at(days, from + visit);
  if (visit === 0) return day;
  const up = at(curve, start + visit);
  if (Math.abs(up - target) <= SAME_NUMBER * Math.max(1, emerged)) return day;
  const upBefore = at(curve, start + visit - 1);
  const dayBefore = at(days, from + visit - 1);
  return dayBefore + ((target - upBefore) / (up - upBefore)) * (day - dayBefore);
}
