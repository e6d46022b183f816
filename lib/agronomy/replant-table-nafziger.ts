import { interpolate, isAnchor } from './interpolate';
import { dayOfYear } from './replant-date';
import type { MonthDay } from './replant-date';
import { requiredNumber } from './required-number';

/** Where a table of stand and date ends, and which way the case lies beyond it. */
export type TableEnd = 'stand-below' | 'stand-above' | 'date-before' | 'date-after';

/**
 * What the table says. `percent` is of the field's maximum yield. `at-most` is a bound: the case lies beyond the
 * table's edge, where the nearest edge value cannot be exceeded and nothing more is claimed.
 */
export type StandDateReading =
  | {
      kind: 'value';
      percent: number;
      basis: 'printed' | 'interpolated' | 'no-plants';
      extrapolatedInSource: boolean;
    }
  | { kind: 'at-most'; percent: number; beyond: TableEnd[]; extrapolatedInSource: boolean };

export const NAFZIGER_STANDS = [
  10_000, 12_000, 14_000, 16_000, 18_000, 20_000, 22_000, 24_000, 26_000, 28_000, 30_000, 32_000, 34_000,
  36_000,
] as const;

export const NAFZIGER_STAND_LOWEST = NAFZIGER_STANDS[0];
export const NAFZIGER_STAND_HIGHEST = NAFZIGER_STANDS[NAFZIGER_STANDS.length - 1] as number;

type GridRow = { planted: MonthDay; percents: readonly number[] };

/** One copy of 2006 misprints 15 April as 7 at 14,000 and 8 at 18,000; the values here are those of the others. */
export const NAFZIGER_ROWS: readonly GridRow[] = [
  { planted: { month: 4, day: 10 }, percents: [62, 68, 73, 78, 82, 85, 88, 91, 92, 93, 94, 94, 93, 91] },
  { planted: { month: 4, day: 15 }, percents: [65, 71, 76, 81, 85, 88, 91, 94, 95, 96, 97, 96, 96, 94] },
  { planted: { month: 4, day: 20 }, percents: [67, 73, 78, 83, 87, 90, 93, 96, 97, 98, 99, 98, 98, 96] },
  { planted: { month: 4, day: 25 }, percents: [68, 74, 79, 84, 88, 92, 94, 97, 98, 99, 100, 100, 99, 97] },
  { planted: { month: 4, day: 30 }, percents: [68, 74, 79, 84, 88, 92, 95, 97, 99, 100, 100, 100, 99, 97] },
  { planted: { month: 5, day: 5 }, percents: [67, 73, 79, 83, 87, 91, 94, 96, 98, 99, 99, 99, 98, 97] },
  { planted: { month: 5, day: 10 }, percents: [65, 71, 77, 82, 86, 89, 92, 94, 96, 97, 97, 97, 96, 95] },
  { planted: { month: 5, day: 15 }, percents: [63, 69, 74, 79, 83, 87, 89, 92, 93, 94, 95, 95, 94, 92] },
  { planted: { month: 5, day: 20 }, percents: [59, 65, 71, 75, 80, 83, 86, 88, 90, 91, 91, 91, 90, 89] },
  { planted: { month: 5, day: 25 }, percents: [55, 61, 66, 71, 75, 79, 81, 84, 85, 86, 87, 87, 86, 84] },
  { planted: { month: 5, day: 30 }, percents: [49, 55, 61, 65, 70, 73, 76, 78, 80, 81, 81, 81, 80, 79] },
  { planted: { month: 6, day: 4 }, percents: [43, 49, 54, 59, 63, 67, 70, 72, 74, 75, 75, 75, 74, 73] },
  { planted: { month: 6, day: 9 }, percents: [36, 42, 47, 52, 56, 60, 62, 65, 66, 67, 68, 68, 67, 65] },
];

const ROW_DAYS = NAFZIGER_ROWS.map((row) => dayOfYear(row.planted, 'planted'));
const FIRST_DAY = ROW_DAYS[0] as number;
const LAST_DAY = ROW_DAYS[ROW_DAYS.length - 1] as number;
const LAST_MEASURED_DAY = dayOfYear({ month: 5, day: 25 }, 'planted');

const COLUMNS = NAFZIGER_STANDS.map((stand, column) => ({
  stand,
  anchors: NAFZIGER_ROWS.map((row, index) => ({
    at: ROW_DAYS[index] as number,
    result: row.percents[column] as number,
  })),
}));

/** The grid's line of percents over stand on one day, interpolated between rows; the edge row beyond the grid. */
export function nafzigerLineOnDay(planted: MonthDay, field = 'plantedOn'): { at: number; result: number }[] {
  const day = dayOfYear(planted, field);
  return COLUMNS.map(({ stand, anchors }) => ({ at: stand, result: interpolate(anchors, day) }));
}

/** Whether a day lies before the grid's first row, after its last, or within. */
export function nafzigerDateEnd(planted: MonthDay, field = 'plantedOn'): 'date-before' | 'date-after' | null {
  const day = dayOfYear(planted, field);
  if (day < FIRST_DAY) return 'date-before';
  return day > LAST_DAY ? 'date-after' : null;
}

/**
 * What share of the field's maximum yield does a stand of this size, planted on this day, make?
 *
 * Takes the planting day and the stand in plants per acre (0 or more). Returns a percent, printed in the grid or
 * read between its cells, or a bound where the grid ends. Never insufficient; throws ImpossibleInput for a
 * negative stand or a day that is in no calendar.
 * Method: Nafziger 1994, Journal of Production Agriculture 7:59, as printed by Purdue; straight lines between
 * neighboring stands and between neighboring days. Beyond the grid nothing is extrapolated: below 10,000 the
 * stand makes at most what 10,000 makes, above 36,000 at most what 36,000 makes (the line already falls there),
 * before 10 April at most the first row (the rows still rise there), after 9 June at most the last. No plants
 * make no yield. Rows after 25 May were extrapolated by the source and are marked so.
 * What it does not tell: anything of fields under about 100 bu/ac, which do not respond above about 24,000, or of
 * today's hybrids: the table rests on those of the 1980s and 1990s in the central Corn Belt.
 * Example: planted 30 April, 20,000 plants per acre: 92 %, printed.
 */
export function nafzigerYieldPercent(
  planted: MonthDay,
  plantsPerAcre: number,
  field = 'plantedOn',
): StandDateReading {
  requiredNumber(plantsPerAcre, 'plantsPerAcre', { atLeast: 0 });
  const day = dayOfYear(planted, field);
  const extrapolatedInSource = day > LAST_MEASURED_DAY;
  if (plantsPerAcre === 0)
    return { kind: 'value', percent: 0, basis: 'no-plants', extrapolatedInSource: false };

  const line = nafzigerLineOnDay(planted, field);
  const percent = interpolate(line, plantsPerAcre);
  const beyond: TableEnd[] = [];
  if (plantsPerAcre < NAFZIGER_STAND_LOWEST) beyond.push('stand-below');
  if (plantsPerAcre > NAFZIGER_STAND_HIGHEST) beyond.push('stand-above');
  const dateEnd = nafzigerDateEnd(planted, field);
  if (dateEnd) beyond.push(dateEnd);
  if (beyond.length > 0) return { kind: 'at-most', percent, beyond, extrapolatedInSource };

  const printed = isAnchor(line, plantsPerAcre) && ROW_DAYS.includes(day);
  return { kind: 'value', percent, basis: printed ? 'printed' : 'interpolated', extrapolatedInSource };
}
