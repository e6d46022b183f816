import { replantGainByTable } from './replant-gain-by-table';
import type { ReplantTerms } from './replant-sum';
import type { StandDateTable } from './stand-date-table';

/** `always` and `never` are of replanting, at any price above 0. */
export type BreakEvenPrice = { kind: 'price'; dollarsPerBushel: number; replantPays: 'above' | 'below' } | { kind: 'always' } | { kind: 'never' } | { kind: 'cannot-tell' };

/**
 * At which price of corn do keeping and replanting earn the same?
 *
 * Takes a table, the terms of replantSum (their own price is not read) and the stand in plants per acre. Returns the price
 * and on which side of it replanting pays, or that it always or never does. Never insufficient: where the table gives only
 * a bound the answer is `cannot-tell`. Throws as replantGainByTable.
 * Equation: price = (costs + extra drying − insurance payment) / (replant yield − keep yield).
 * With a yield gain a higher price favors replanting; when the payment exceeds the costs and replanting yields less, a
 * lower price does. Example: 10 bu/ac more for $50 an acre: above $5.00.
 */
export function breakEvenPrice(table: StandDateTable, terms: ReplantTerms, plantsPerAcre: number): BreakEvenPrice {
  const one = replantGainByTable(table, { ...terms, priceDollarsPerBushel: 1 }, plantsPerAcre);
  if (one.bounded) return { kind: 'cannot-tell' };
  const bushels = one.replantYieldBushelsPerAcre.lower - one.keepYieldBushelsPerAcre.lower;
  const paid = bushels - one.gainDollarsPerAcre.lower;
  if (bushels > 0) return paid > 0 ? { kind: 'price', dollarsPerBushel: paid / bushels, replantPays: 'above' } : { kind: 'always' };
  if (bushels < 0 && paid < 0) return { kind: 'price', dollarsPerBushel: paid / bushels, replantPays: 'below' };
  return bushels === 0 && paid < 0 ? { kind: 'always' } : { kind: 'never' };
}
