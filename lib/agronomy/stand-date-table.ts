import { interpolate, isAnchor } from './interpolate';
import { ImpossibleInput } from './outcome';
import { dayOfYear, type MonthDay } from './replant-date';
import type { StandDateReading, TableEnd } from './replant-table-nafziger';
import { requiredNumber } from './required-number';

/** Days of planting that the source prints under one row: a single day, or a band of days. */
export type DateBand = { from: MonthDay; to: MonthDay };

/** A published or uploaded table: percent of maximum yield by planting date and surviving stand. */
export type StandDateTable = {
  id: string;
  name: string;
  source: string;
  /** Where and when it was measured, as printed beside every answer. */
  age: string;
  /** Plants per acre, ascending. */
  stands: readonly number[];
  rows: readonly (DateBand & { percents: readonly number[]; extrapolatedInSource?: boolean })[];
};

export const TABLE_PERCENT_MOST = 110;

/**
 * Is this a table that can be read?
 *
 * Takes a table of one's own and returns the same. Never insufficient. Throws ImpossibleInput, naming the place, for
 * fewer than two stands or rows, stands or dates that do not ascend, rows of another length than the stands, percents
 * outside 0 to 110, and a table without its source. Example: 2 stands by 2 dates with a source are enough.
 */
export function checkedTable(table: StandDateTable): StandDateTable {
  if (table.source.trim() === '') throw new ImpossibleInput('Name where the table comes from.', 'source');
  if (table.stands.length < 2) throw new ImpossibleInput('A table needs at least two stands.', 'stands');
  if (table.rows.length < 2) throw new ImpossibleInput('A table needs at least two planting dates.', 'rows');
  table.stands.forEach((stand, index) => {
    requiredNumber(stand, `stands.${index}`, index === 0 ? { atLeast: 0 } : { above: table.stands[index - 1] as number });
  });
  table.rows.forEach((row, index) => {
    const from = dayOfYear(row.from, `rows.${index}.from`);
    const before = table.rows[index - 1];
    if (before && from <= dayOfYear(before.to, `rows.${index}.from`)) throw new ImpossibleInput('Planting dates must ascend.', `rows.${index}.from`);
    if (dayOfYear(row.to, `rows.${index}.to`) < from) throw new ImpossibleInput('A band of days ends before it begins.', `rows.${index}.to`);
    if (row.percents.length !== table.stands.length) throw new ImpossibleInput('Each row needs one percent for each stand.', `rows.${index}.percents`);
    row.percents.forEach((percent, column) => requiredNumber(percent, `rows.${index}.percents.${column}`, { atLeast: 0, atMost: TABLE_PERCENT_MOST }));
  });
  return table;
}

/**
 * What share of the maximum yield does a stand of this size, planted on this day, make by this table?
 *
 * Takes a table, the planting day and plants per acre (0 or more). Returns a percent, printed or read between cells, or a
 * bound beyond an edge. Never insufficient; throws ImpossibleInput for a negative stand or a day in no calendar.
 * Method: straight lines between neighboring stands and neighboring dates; within a band of days the band's own row. Beyond
 * the table nothing is extrapolated: the nearest edge value is an upper bound, as in nafzigerYieldPercent. No plants make
 * no yield. It tells nothing of places, years and hybrids other than the source's.
 * Example: Iowa 2001, planted 1 May, 24,000 plants: 94 %, printed.
 */
export function tableYieldPercent(table: StandDateTable, planted: MonthDay, plantsPerAcre: number, field = 'plantedOn'): StandDateReading {
  requiredNumber(plantsPerAcre, 'plantsPerAcre', { atLeast: 0 });
  const day = dayOfYear(planted, field);
  const bands = table.rows.map((row) => ({ from: dayOfYear(row.from, 'rows'), to: dayOfYear(row.to, 'rows') }));
  const first = bands[0] as { from: number };
  const last = bands[bands.length - 1] as { to: number };
  const lastMeasured = Math.max(...table.rows.map((row, index) => (row.extrapolatedInSource ? 0 : (bands[index] as { to: number }).to)));
  const extrapolatedInSource = lastMeasured < last.to && day > lastMeasured;
  if (plantsPerAcre === 0) return { kind: 'value', percent: 0, basis: 'no-plants', extrapolatedInSource: false };
  const line = lineOnDay(table, bands, day);
  const percent = interpolate(line, plantsPerAcre);
  const beyond: TableEnd[] = [];
  if (plantsPerAcre < (table.stands[0] as number)) beyond.push('stand-below');
  if (plantsPerAcre > (table.stands[table.stands.length - 1] as number)) beyond.push('stand-above');
  if (day < first.from) beyond.push('date-before');
  if (day > last.to) beyond.push('date-after');
  if (beyond.length > 0) return { kind: 'at-most', percent, beyond, extrapolatedInSource };
  const printed = isAnchor(line, plantsPerAcre) && bands.some(({ from, to }) => day >= from && day <= to);
  return { kind: 'value', percent, basis: printed ? 'printed' : 'interpolated', extrapolatedInSource };
}

function lineOnDay(table: StandDateTable, bands: readonly { from: number; to: number }[], day: number) {
  return table.stands.map((stand, column) => {
    const anchors = table.rows.flatMap((row, index) => {
      const { from, to } = bands[index] as { from: number; to: number };
      const result = row.percents[column] as number;
      return to > from ? [{ at: from, result }, { at: to, result }] : [{ at: from, result }];
    });
    return { at: stand, result: interpolate(anchors, day) };
  });
}
