import { ImpossibleInput } from './outcome';
import { randomStream, type RandomStream } from './random';
import { studentDraw, type StandCount } from './replant-draws';
import { gainOfReadings, replantGainByTable } from './replant-gain-by-table';
import type { ReplantTerms, Span } from './replant-sum';
import { requiredNumber } from './required-number';
import { tableOnDay, tableYieldPercent, type StandDateTable } from './stand-date-table';

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
  /** The lowest and highest chance of a poor second stand, 0 to 1; without it the one of the terms. */
  poorSecondStandChance?: Span;
  /** The least and most a poor second stand would make, 0 to 1 of the full yield; without it the one of the terms. */
  poorSecondStandYieldShare?: Span;
  draws: number;
  seed: number;
};

/**
 * How sure is keep or replant, when the count, the table, the price and the second stand may all be otherwise?
 *
 * Takes the terms of replantSum, the count with its error, at least one table, a span of prices, spans of the chance and the
 * yield of a poor second stand where they too are in doubt, how many draws (100 to 100,000) and a seed. Returns in what share of draws keeping wins, the middle nine tenths of the gain, and what each
 * table says at the count itself. Never insufficient: without the count's error the count stands still, which the caller
 * sees in `stand.error`. Throws ImpossibleInput for no table, prices that are not above 0 or out of order, shares
 * outside 0 to 1 or out of order, and draws or a seed out of range.
 * Method: each draw takes one table for both yields (they differ by 5 to 10 points at one cell, so uncertainty is drawn
 * between tables and not as a few points around one), a stand = count + standard error × t, a price even between the two,
 * and a second stand that is poor with its chance, drawn like its yield evenly from its span: a chance is drawn, not averaged. A draw is won when the whole span of
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
  const poorChance = requiredShares(asked.poorSecondStandChance, 'poorSecondStandChance');
  const poorShare = requiredShares(asked.poorSecondStandYieldShare, 'poorSecondStandYieldShare');
  if (tables.length === 0) throw new ImpossibleInput('At least one table is needed.', 'tables');
  const stream = randomStream(seed);
  const gains: number[] = [];
  let keepWins = 0;
  let replantWins = 0;
  // What does not change from draw to draw is read once: each table's line on the planting day, and its second stand.
  const read = tables.map((table) => ({
    kept: tableOnDay(table, terms.plantedOn, 'plantedOn'),
    second: tableYieldPercent(table, terms.replantOn, terms.replantPlantsPerAcre, 'replantOn'),
  }));
  for (let draw = 0; draw < draws; draw += 1) {
    const { kept, second } = read[stream.nextBelow(tables.length)] as (typeof read)[number];
    const error = stand.error;
    const plants = error ? stand.plantsPerAcre + error.standardErrorPlantsPerAcre * studentDraw(stream, error.degreesOfFreedom) : stand.plantsPerAcre;
    const chance = poorChance ? evenlyFrom(poorChance, stream) : terms.poorSecondStandChance;
    const poor = stream.nextUnit() < chance;
    const drawn = { ...terms, poorSecondStandChance: poor ? 1 : 0, priceDollarsPerBushel: evenlyFrom(price, stream) };
    if (poorShare) drawn.poorSecondStandYieldShare = evenlyFrom(poorShare, stream);
    const { gainDollarsPerAcre: gain } = gainOfReadings(drawn, kept(Math.max(0, plants)), second);
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

/** A span of shares that can be drawn from, or none where none was given. */
function requiredShares(span: Span | undefined, field: string): Span | undefined {
  if (!span) return undefined;
  const lower = requiredNumber(span.lower, field, { atLeast: 0 });
  return { lower, upper: requiredNumber(span.upper, field, { atLeast: lower, atMost: 1 }) };
}

function evenlyFrom(span: Span, stream: RandomStream): number {
  return span.lower + stream.nextUnit() * (span.upper - span.lower);
}

function quantiles(gains: number[]): SimulatedReplant['gainDollarsPerAcre'] {
  if (gains.length === 0) return null;
  const sorted = gains.sort((a, b) => a - b);
  const at = (share: number) => sorted[Math.min(sorted.length - 1, Math.floor(share * sorted.length))] as number;
  return { fifth: at(0.05), median: at(0.5), ninetyFifth: at(0.95) };
}
