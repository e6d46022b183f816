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
  /** Stands that the source prints as one, such as 28,000 to 32,000; within it a cell is printed and not read between. */
  fullStandBand?: { from: number; to: number };
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
  const band = table.fullStandBand;
  if (band && requiredNumber(band.from, 'fullStandBand', { atLeast: 0 }) >= requiredNumber(band.to, 'fullStandBand')) {
    throw new ImpossibleInput('A band of stands ends before it begins.', 'fullStandBand');
  }
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
  return tableOnDay(table, planted, field)(plantsPerAcre);
}

/** The same with the day read once, for many stands of one planting. */
export function tableOnDay(table: StandDateTable, planted: MonthDay, field = 'plantedOn'): (plantsPerAcre: number) => StandDateReading {
  const day = dayOfYear(planted, field);
  const bands = table.rows.map((row) => ({ from: dayOfYear(row.from, 'rows'), to: dayOfYear(row.to, 'rows') }));
  const lastDay = Math.max(...bands.map(({ to }) => to));
  const lastMeasured = Math.max(...table.rows.map((row, index) => (row.extrapolatedInSource ? 0 : (bands[index] as { to: number }).to)));
  const extrapolatedInSource = lastMeasured < lastDay && day > lastMeasured;
  const dayPrinted = bands.some(({ from, to }) => day >= from && day <= to);
  const line = tableLineOnDay(table, planted, field);
  const dateEnd = tableDateEnd(table, planted, field);
  const [lowest, highest] = [table.stands[0] as number, table.stands[table.stands.length - 1] as number];
  const full = table.fullStandBand;
  return (plantsPerAcre) => {
    requiredNumber(plantsPerAcre, 'plantsPerAcre', { atLeast: 0 });
    if (plantsPerAcre === 0) return { kind: 'value', percent: 0, basis: 'no-plants', extrapolatedInSource: false };
    const percent = interpolate(line, plantsPerAcre);
    const beyond: TableEnd[] = [];
    if (plantsPerAcre < lowest) beyond.push('stand-below');
    if (plantsPerAcre > highest) beyond.push('stand-above');
    if (dateEnd) beyond.push(dateEnd);
    if (beyond.length > 0) return { kind: 'at-most', percent, beyond, extrapolatedInSource };
    const isFull = full !== undefined && plantsPerAcre >= full.from && plantsPerAcre <= full.to;
    const printed = dayPrinted && (isFull || isAnchor(line, plantsPerAcre));
    return { kind: 'value', percent, basis: printed ? 'printed' : 'interpolated', extrapolatedInSource };
  };
}

/** The table's line of percents over stand on one day, read between its dates; the edge row beyond them. */
export function tableLineOnDay(table: StandDateTable, planted: MonthDay, field = 'plantedOn'): { at: number; result: number }[] {
  const day = dayOfYear(planted, field);
  const bands = table.rows.map((row) => ({ row, from: dayOfYear(row.from, 'rows'), to: dayOfYear(row.to, 'rows') }));
  return table.stands.map((stand, column) => {
    const anchors = bands.flatMap(({ row, from, to }) => {
      const result = row.percents[column] as number;
      return to > from ? [{ at: from, result }, { at: to, result }] : [{ at: from, result }];
    });
    return { at: stand, result: interpolate(anchors, day) };
  });
}

/** Whether a day lies before the table's first date, after its last, or within. */
export function tableDateEnd(table: StandDateTable, planted: MonthDay, field = 'plantedOn'): 'date-before' | 'date-after' | null {
  const day = dayOfYear(planted, field);
  if (day < dayOfYear((table.rows[0] as DateBand).from, 'rows')) return 'date-before';
  return day > dayOfYear((table.rows[table.rows.length - 1] as DateBand).to, 'rows') ? 'date-after' : null;
}
