import { describe, expect, it } from 'vitest';
import { federalReplantPayment } from '@/lib/agronomy/federal-replant-payment';
import { firstLookAgain } from '@/lib/agronomy/first-look-again';
import { gapLossShare } from '@/lib/agronomy/gap-loss-share';
import { hoeGain } from '@/lib/agronomy/hoe-gain';
import { oneMoreRowSample } from '@/lib/agronomy/inference/one-more-row-sample';
import { decideEntries } from '@/lib/agronomy/register/decide-entries';
import type { WorkedExample } from '@/lib/agronomy/register/register-entry';
import { breakEvenStandByTable } from '@/lib/agronomy/replant-break-even-by-table';
import { breakEvenPrice } from '@/lib/agronomy/replant-break-even-price';
import { lastReplantDay } from '@/lib/agronomy/replant-last-day';
import { replantSimulation } from '@/lib/agronomy/replant-simulation';
import type { ReplantTerms } from '@/lib/agronomy/replant-sum';
import { iowa2001 } from '@/lib/agronomy/replant-tables/iowa-2001';
import { minnesotaFullStandPercent } from '@/lib/agronomy/replant-tables/minnesota-full-stand';
import { nafziger1994 } from '@/lib/agronomy/replant-tables/nafziger-1994';
import { wisconsin2003FullSeason, wisconsin2003ShortSeason } from '@/lib/agronomy/replant-tables/wisconsin-2003';
import { tableYieldPercent } from '@/lib/agronomy/stand-date-table';

type Inputs = WorkedExample['inputs'];
const one = (inputs: Inputs, name: string) => inputs[name] as number;
const many = (inputs: Inputs, name: string) => inputs[name] as readonly number[];
const on = (inputs: Inputs, month = 'month', day = 'day') => ({ month: one(inputs, month), day: one(inputs, day) });

const terms: ReplantTerms = {
  maximumYieldBushelsPerAcre: 200, priceDollarsPerBushel: 4, plantedOn: { month: 4, day: 30 }, gapLossShare: 0, unevenLossShare: 0,
  replantOn: { month: 5, day: 25 }, replantPlantsPerAcre: 30_000, poorSecondStandChance: 0, poorSecondStandYieldShare: 0, costs: [],
  extraDryingDollarsPerAcre: 0, insurancePaymentDollarsPerAcre: 0,
};
const costing = (inputs: Inputs) => ({ ...terms, costs: [{ label: 'all', dollarsPerAcre: one(inputs, 'cost') }] });

/** How each worked example is figured again by the code it explains. */
const again: Record<string, (inputs: Inputs) => Record<string, number | undefined>> = {
  'iowa-2001': (inputs) => ({
    keep: tableYieldPercent(iowa2001, on(inputs), one(inputs, 'stand')).percent,
    replant: tableYieldPercent(iowa2001, on(inputs, 'replantMonth', 'replantDay'), one(inputs, 'replantStand')).percent,
  }),
  'wisconsin-2003': (inputs) => ({
    full: tableYieldPercent(wisconsin2003FullSeason, on(inputs), one(inputs, 'stand')).percent,
    short: tableYieldPercent(wisconsin2003ShortSeason, on(inputs), one(inputs, 'stand')).percent,
  }),
  'minnesota-full-stand': (inputs) => ({
    lamberton: minnesotaFullStandPercent('lamberton-1988-2003', on(inputs)).percent,
    threeSites: minnesotaFullStandPercent('three-sites-2009-2011', on(inputs)).percent,
  }),
  'gap-loss': (inputs) => ({ lossShare: gapLossShare(many(inputs, 'gaps')).lossShareUpper }),
  'replant-simulation': (inputs) => ({
    keepWins: replantSimulation({
      terms, stand: { plantsPerAcre: 20_000, error: null }, tables: [nafziger1994, iowa2001], priceDollarsPerBushel: { lower: 4, upper: 4 },
      draws: one(inputs, 'draws'), seed: one(inputs, 'seed'),
    }).keepWinsShare,
  }),
  'break-even-stand-by-table': (inputs) => {
    const even = breakEvenStandByTable(iowa2001, { ...costing(inputs), plantedOn: { month: 5, day: 1 }, replantOn: { month: 5, day: 28 } });
    return { stand: even.kind === 'stand' ? even.plantsPerAcre : NaN };
  },
  'break-even-price': (inputs) => {
    const price = breakEvenPrice(nafziger1994, costing(inputs), one(inputs, 'stand'));
    return { price: price.kind === 'price' ? price.dollarsPerBushel : NaN };
  },
  'last-replant-day': (inputs) => {
    const last = lastReplantDay(nafziger1994, costing(inputs), one(inputs, 'stand'));
    return last.kind === 'day' ? last.day : {};
  },
  'one-more-row-sample': (inputs) => {
    const [zone] = oneMoreRowSample([{ id: 'all', acres: 1, plantsPerAcre: many(inputs, 'counts') }], (mean) => mean > one(inputs, 'turning'));
    return { lower: zone?.fieldMeanLower ?? NaN, couldTurn: zone?.couldTurn ? 1 : 0 };
  },
  'first-look-again': (inputs) => {
    const first = firstLookAgain({ soundSproutsPerAcre: 0, crusted: false, damage: 'hail', daysSinceDamage: one(inputs, 'daysSince') });
    return first.answer === 'wait' ? { from: first.lookAgainInDaysFrom, to: first.lookAgainInDaysTo } : {};
  },
  'hoe-gain': (inputs) => {
    const hoed = hoeGain(nafziger1994, terms, one(inputs, 'stand'), { soundSproutsPerAcre: one(inputs, 'sprouts'), comeThroughShare: 0.75, plantsTakenShare: 0, costDollarsPerAcre: 6, unevenLossShare: 0 });
    return { stand: hoed.standAfterPlantsPerAcre, gain: hoed.gainOverKeepingDollarsPerAcre.lower };
  },
  'federal-replant-payment': (inputs) => {
    const paid = federalReplantPayment({
      guaranteeDollarsPerAcre: one(inputs, 'guarantee'), projectedPriceDollarsPerBushel: one(inputs, 'price'), insuredShare: 1, replantedAcres: 20, unitAcres: 20,
      plantedBeforeEarliestDate: false, paidAlreadyThisYear: false,
    });
    return { payment: paid.kind === 'payable' ? paid.dollarsPerAcre : NaN };
  },
};

describe('the register of decisions', () => {
  it.each(decideEntries.map((entry) => [entry.id, entry] as const))('figures its worked example again: %s', (id, entry) => {
    const figured = again[id]?.(entry.workedExample.inputs) ?? {};
    expect(Object.keys(figured).sort()).toEqual(Object.keys(entry.workedExample.expected).sort());
    for (const [name, expected] of Object.entries(entry.workedExample.expected)) {
      expect(Math.abs((figured[name] ?? NaN) - expected)).toBeLessThanOrEqual(entry.workedExample.tolerance + 1e-12);
    }
  });
});
