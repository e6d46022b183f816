import { ImpossibleInput } from './outcome';
import { randomStream } from './random';
import { studentDraw, type StandCount } from './replant-draws';
import { replantGainByTable } from './replant-gain-by-table';
import type { ReplantTerms, Span } from './replant-sum';
import { requiredNumber } from './required-number';
import type { StandDateTable } from './stand-date-table';

export type SimulatedReplant = {
  draws: number;
  seed: number;
  keepWinsShare: number;
  replantWinsShare: number;
  /** Draws in which the drawn table gives only a bound that leaves the answer open. */
  openShare: number;
  /** Of the draws that are not open, in dollars per acre; null where all are. */
  gainDollarsPerAcre: { fifth: number; median: number; ninetyFifth: number } | null;
  /** The answer of each table at the count itself; open where its bound leaves it so. */
  tables: { id: string; gainDollarsPerAcre: Span; answer: 'keep' | 'replant' | 'open' }[];
  tablesDisagree: boolean;
};

type SimulationAsked = {
  terms: ReplantTerms;
  stand: StandCount;
  /** Each as likely as the next; a table of one's own may stand among them. */
  tables: readonly StandDateTable[];
  /** The lowest and highest price thought possible, $ a bushel; equal where the price is fixed by contract. */
  priceDollarsPerBushel: Span;
  draws: number;
  seed: number;
};

/**
 * How sure is keep or replant, when the count, the table, the price and the second stand may all be otherwise?
 *
 * Takes the terms of replantSum, the count with its error, at least one table, a span of prices, how many draws (100 to
 * 100,000) and a seed. Returns in what share of draws keeping wins, the middle nine tenths of the gain, and what each
 * table says at the count itself. Never insufficient: without the count's error the count stands still, which the caller
 * sees in `stand.error`. Throws ImpossibleInput for no table, prices that are not above 0 or out of order, and draws or a
 * seed out of range.
 * Method: each draw takes one table for both yields (they differ by 5 to 10 points at one cell, so uncertainty is drawn
 * between tables and not as a few points around one), a stand = count + standard error × t, a price even between the two,
 * and a second stand that is poor with its chance: a chance is drawn, not averaged. A draw is won when the whole span of
 * the gain lies on one side of zero.
 * Equal weights for tables are a convention of ours: no source says how likely each is right here. It does not draw the
 * yield at full stand, costs or dates.
 * Example: where two tables disagree and nothing else is uncertain, keeping wins in about half the draws.
 */
export function replantSimulation(asked: SimulationAsked): SimulatedReplant {
  const { terms, stand, tables, priceDollarsPerBushel: price, draws, seed } = asked;
  requiredNumber(price.lower, 'priceDollarsPerBushel', { above: 0 });
  requiredNumber(price.upper, 'priceDollarsPerBushel', { atLeast: price.lower });
  requiredNumber(draws, 'draws', { atLeast: 100, atMost: 100_000 });
  if (tables.length === 0) throw new ImpossibleInput('At least one table is needed.', 'tables');
  const stream = randomStream(seed);
  const gains: number[] = [];
  let keepWins = 0;
  let replantWins = 0;
  for (let draw = 0; draw < draws; draw += 1) {
    const table = tables[stream.nextBelow(tables.length)] as StandDateTable;
    const error = stand.error;
    const plants = error ? stand.plantsPerAcre + error.standardErrorPlantsPerAcre * studentDraw(stream, error.degreesOfFreedom) : stand.plantsPerAcre;
    const poor = stream.nextUnit() < terms.poorSecondStandChance;
    const drawn = { ...terms, poorSecondStandChance: poor ? 1 : 0, priceDollarsPerBushel: price.lower + stream.nextUnit() * (price.upper - price.lower) };
    const { gainDollarsPerAcre: gain } = replantGainByTable(table, drawn, Math.max(0, plants));
    if (gain.upper < 0) keepWins += 1;
    else if (gain.lower > 0) replantWins += 1;
    if (gain.lower === gain.upper) gains.push(gain.lower);
  }
  const answers = tables.map((table) => {
    const { gainDollarsPerAcre } = replantGainByTable(table, terms, stand.plantsPerAcre);
    return { id: table.id, gainDollarsPerAcre, answer: gainDollarsPerAcre.upper < 0 ? ('keep' as const) : gainDollarsPerAcre.lower > 0 ? ('replant' as const) : ('open' as const) };
  });
  return {
    draws,
    seed,
    keepWinsShare: keepWins / draws,
    replantWinsShare: replantWins / draws,
    openShare: (draws - keepWins - replantWins) / draws,
    gainDollarsPerAcre: quantiles(gains),
    tables: answers,
    tablesDisagree: answers.some(({ answer }) => answer === 'keep') && answers.some(({ answer }) => answer === 'replant'),
  };
}

function quantiles(gains: number[]): SimulatedReplant['gainDollarsPerAcre'] {
  if (gains.length === 0) return null;
  const sorted = gains.sort((a, b) => a - b);
  const at = (share: number) => sorted[Math.min(sorted.length - 1, Math.floor(share * sorted.length))] as number;
  return { fifth: at(0.05), median: at(0.5), ninetyFifth: at(0.95) };
}
