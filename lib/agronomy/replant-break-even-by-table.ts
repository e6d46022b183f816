import type { BreakEvenStand } from './replant-break-even';
import { replantGainByTable } from './replant-gain-by-table';
import type { ReplantTerms } from './replant-sum';
import { tableDateEnd, tableLineOnDay, type StandDateTable } from './stand-date-table';

/**
 * Down to which stand does keeping still pay, by this table?
 *
 * Takes a table and the terms of replantSum. Returns the lowest stand, in plants per acre, at which keeping earns as much as
 * replanting, exact or as a bound where a figure lies beyond the table; or that the table holds no such stand. Never
 * insufficient; throws as replantGainByTable.
 * Equation: the stand whose percent on the planting day is
 * [replant yield + (insurance payment − costs − extra drying) / price] / [Ymax × (1 − gap) × (1 − uneven)].
 * The line rises to about 30,000 and falls after; the crossing on the rise is meant. A test holds it to breakEvenStand on
 * the grid of Nafziger. Example: Iowa 2001, 200 bu/ac, $4.00, $50 an acre, planted 1 May, replanted 28 May at 30,000: the
 * stand must make 83.75 %: 20,846 plants per acre.
 */
export function breakEvenStandByTable(table: StandDateTable, terms: ReplantTerms): BreakEvenStand {
  const keepFactor = terms.maximumYieldBushelsPerAcre * (1 - terms.gapLossShare) * (1 - terms.unevenLossShare);
  // With no plants the gain is the replanted side alone, so that the break-even and the gain cannot drift apart.
  const withoutStand = replantGainByTable(table, terms, 0);
  const neededPercent = (withoutStand.gainDollarsPerAcre.upper / terms.priceDollarsPerBushel / keepFactor) * 100;
  const replantIsBound = withoutStand.bounded;
  const keepIsBound = tableDateEnd(table, terms.plantedOn) !== null;
  const line = tableLineOnDay(table, terms.plantedOn);
  const reached = line.findIndex(({ result }) => result >= neededPercent);
  if (reached === -1) return { kind: replantIsBound ? 'cannot-tell' : 'none-in-table' };
  const at = line[reached] as { at: number; result: number };
  const before = line[reached - 1];
  if (!before && at.result > neededPercent) {
    return keepIsBound ? { kind: 'cannot-tell' } : { kind: 'below-table', plantsPerAcre: at.at };
  }
  if (keepIsBound && replantIsBound) return { kind: 'cannot-tell' };
  const part = before ? (neededPercent - before.result) / (at.result - before.result) : 1;
  const plantsPerAcre = before ? before.at + part * (at.at - before.at) : at.at;
  return { kind: 'stand', plantsPerAcre, bound: keepIsBound ? 'at-least' : replantIsBound ? 'at-most' : 'exact' };
}
