import { nafzigerDateEnd, nafzigerLineOnDay, NAFZIGER_STAND_LOWEST } from './replant-table-nafziger';
import { replantSum } from './replant-sum';
import type { ReplantTerms } from './replant-sum';

/**
 * Where keeping and replanting earn the same. `below-table`: keeping earns more down to the table's lowest stand.
 * `none-in-table`: replanting earns more at every stand of the table. `cannot-tell`: the table's bounds leave it open.
 */
export type BreakEvenStand =
  | { kind: 'stand'; plantsPerAcre: number; bound: 'exact' | 'at-most' | 'at-least' }
  | { kind: 'below-table'; plantsPerAcre: number }
  | { kind: 'none-in-table' }
  | { kind: 'cannot-tell' };

/**
 * Down to which stand does keeping still pay?
 *
 * Takes the terms of the sum. Returns the lowest stand, in plants per acre, at which keeping earns as much as
 * replanting, exact or as a bound when a date lies beyond the table; or that the table holds no such stand.
 * Never insufficient; throws what the table throws.
 * Equation: the stand whose percent on the planting day is
 * [replant yield + (insurance payment − costs − extra drying) / price] / [Ymax × (1 − gap) × (1 − uneven)].
 * The planting day's line rises to about 30,000 and falls after; the crossing on the rise is meant.
 * What it does not tell: how sure the count is.
 * Example: 170 bu/ac, $2.00, $10 an acre, planted 30 April, replanted 1 June at 30,000: 12,665 plants per acre.
 */
export function breakEvenStand(terms: ReplantTerms): BreakEvenStand {
  const keepFactor =
    terms.maximumYieldBushelsPerAcre * (1 - terms.gapLossShare) * (1 - terms.unevenLossShare);
  // With no plants the sum is the replanted side alone, so that the break-even and the sum cannot drift apart.
  const withoutStand = replantSum(terms, 0);
  const neededYield = withoutStand.gainDollarsPerAcre.upper / terms.priceDollarsPerBushel;
  const replantIsBound = withoutStand.replantReading.kind === 'at-most';
  const keepIsBound = nafzigerDateEnd(terms.plantedOn) !== null;

  const crossing = lowestStandReaching(terms, (neededYield / keepFactor) * 100);
  if (crossing === 'below-table') {
    return keepIsBound
      ? { kind: 'cannot-tell' }
      : { kind: 'below-table', plantsPerAcre: NAFZIGER_STAND_LOWEST };
  }
  if (crossing === 'none-in-table') return { kind: replantIsBound ? 'cannot-tell' : 'none-in-table' };
  if (keepIsBound && replantIsBound) return { kind: 'cannot-tell' };
  const bound = keepIsBound ? 'at-least' : replantIsBound ? 'at-most' : 'exact';
  return { kind: 'stand', plantsPerAcre: crossing, bound };
}

function lowestStandReaching(
  terms: ReplantTerms,
  neededPercent: number,
): number | 'below-table' | 'none-in-table' {
  const line = nafzigerLineOnDay(terms.plantedOn);
  let previous: { at: number; result: number } | null = null;
  for (const point of line) {
    if (point.result >= neededPercent) {
      if (!previous) return point.result > neededPercent ? 'below-table' : point.at;
      const part = (neededPercent - previous.result) / (point.result - previous.result);
      return previous.at + part * (point.at - previous.at);
    }
    previous = point;
  }
  return 'none-in-table';
}
