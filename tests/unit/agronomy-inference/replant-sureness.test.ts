import { describe, expect, it } from 'vitest';
import { federalReplantPayment } from '@/lib/agronomy/federal-replant-payment';
import { firstLookAgain } from '@/lib/agronomy/first-look-again';
import { hoeGain } from '@/lib/agronomy/hoe-gain';
import { oneMoreRowSample } from '@/lib/agronomy/inference/one-more-row-sample';
import { ImpossibleInput } from '@/lib/agronomy/outcome';
import { breakEvenStand } from '@/lib/agronomy/replant-break-even';
import { breakEvenStandByTable } from '@/lib/agronomy/replant-break-even-by-table';
import { breakEvenPrice } from '@/lib/agronomy/replant-break-even-price';
import { replantGainByTable } from '@/lib/agronomy/replant-gain-by-table';
import { lastReplantDay } from '@/lib/agronomy/replant-last-day';
import { replantSimulation } from '@/lib/agronomy/replant-simulation';
import { replantSum, type ReplantTerms } from '@/lib/agronomy/replant-sum';
import { iowa2001 } from '@/lib/agronomy/replant-tables/iowa-2001';
import { nafziger1994 } from '@/lib/agronomy/replant-tables/nafziger-1994';
import { wisconsin2003FullSeason } from '@/lib/agronomy/replant-tables/wisconsin-2003';

const day = (month: number, dayOfMonth: number) => ({ month, day: dayOfMonth });

/** The published example: 200 bu, planted 30 April, replanted 25 May at 30,000. Price and costs are this test's own. */
const terms: ReplantTerms = {
  maximumYieldBushelsPerAcre: 200,
  priceDollarsPerBushel: 4,
  plantedOn: day(4, 30),
  gapLossShare: 0,
  unevenLossShare: 0,
  replantOn: day(5, 25),
  replantPlantsPerAcre: 30_000,
  poorSecondStandChance: 0,
  poorSecondStandYieldShare: 0,
  costs: [{ label: 'all', dollarsPerAcre: 50 }],
  extraDryingDollarsPerAcre: 0,
  insurancePaymentDollarsPerAcre: 0,
};
const counted = (plantsPerAcre: number, standardError = 600) => ({
  plantsPerAcre,
  error: { standardErrorPlantsPerAcre: standardError, degreesOfFreedom: 11, lower: plantsPerAcre - 1_300, upper: plantsPerAcre + 1_300 },
});

describe('the gain by a table', () => {
  it('is the sum’s own gain on the grid of Nafziger', () => {
    for (const stand of [6_000, 12_000, 20_000, 27_500, 41_000]) {
      for (const changes of [{}, { poorSecondStandChance: 0.2, poorSecondStandYieldShare: 0.5, gapLossShare: 0.02, unevenLossShare: 0.05, insurancePaymentDollarsPerAcre: 30 }, { replantOn: day(6, 20) }]) {
        const asked = { ...terms, ...changes };
        const own = replantSum(asked, stand);
        const byTable = replantGainByTable(nafziger1994, asked, stand);
        expect(byTable.gainDollarsPerAcre.lower).toBeCloseTo(own.gainDollarsPerAcre.lower, 9);
        expect(byTable.gainDollarsPerAcre.upper).toBeCloseTo(own.gainDollarsPerAcre.upper, 9);
      }
    }
  });

  it('says keep for the published comparison of Iowa and Nebraska 2009: 94 % against 90 %', () => {
    const gain = replantGainByTable(iowa2001, { ...terms, plantedOn: day(5, 1), replantOn: day(5, 28), costs: [] }, 24_000);
    // 4 % of 200 bu at $4.
    expect(gain.gainDollarsPerAcre.upper).toBeCloseTo(-32, 9);
    expect(gain.bounded).toBe(false);
  });
});

describe('the simulation', () => {
  const asked = { terms, stand: counted(20_000), tables: [nafziger1994, iowa2001], priceDollarsPerBushel: { lower: 4, upper: 4 }, draws: 4_000, seed: 7 };

  it('draws between tables: where they disagree and nothing else is uncertain, keeping wins in about half the draws', () => {
    // Planted 30 April at 20,000: Nafziger 92 % against 87 %, Iowa 81 % against 91.3 %. Without costs one keeps, the other replants.
    const split = replantSimulation({ ...asked, terms: { ...terms, costs: [] }, stand: { plantsPerAcre: 20_000, error: null } });
    expect(split.tables.map(({ answer }) => answer)).toEqual(['keep', 'replant']);
    expect(split.tablesDisagree).toBe(true);
    expect(split.keepWinsShare).toBeGreaterThan(0.46);
    expect(split.keepWinsShare).toBeLessThan(0.54);
    expect(split.keepWinsShare + split.replantWinsShare).toBe(1);
  });

  it('is the same for the same seed and another for another', () => {
    expect(replantSimulation(asked)).toEqual(replantSimulation(asked));
    expect(replantSimulation({ ...asked, seed: 8 })).not.toEqual(replantSimulation(asked));
  });

  it('is sure where every table, count and price says the same', () => {
    const sure = replantSimulation({ ...asked, stand: counted(28_000), priceDollarsPerBushel: { lower: 3, upper: 6 } });
    expect(sure.keepWinsShare).toBe(1);
    expect(sure.tablesDisagree).toBe(false);
    expect(sure.gainDollarsPerAcre?.ninetyFifth).toBeLessThan(0);
    expect(sure.gainDollarsPerAcre?.fifth).toBeLessThanOrEqual(sure.gainDollarsPerAcre?.median ?? NaN);
  });

  it('draws a poor second stand as a chance, not as an average', () => {
    // At 10,000 replanting gains $26 with a good second stand and loses with a poor one, so it wins in four of five draws.
    const chancy = replantSimulation({ ...asked, tables: [nafziger1994], stand: { plantsPerAcre: 10_000, error: null }, terms: { ...terms, poorSecondStandChance: 0.2, poorSecondStandYieldShare: 0.3 } });
    expect(chancy.replantWinsShare).toBeGreaterThan(0.77);
    expect(chancy.replantWinsShare).toBeLessThan(0.83);
  });

  it('draws the chance and the yield of a poor second stand from their spans, and stays as it was where both are points', () => {
    const chancy = { ...asked, tables: [nafziger1994], stand: { plantsPerAcre: 10_000, error: null }, terms: { ...terms, poorSecondStandChance: 1, poorSecondStandYieldShare: 0.3 } };
    // The chance is even from 0 to 0.4, so 0.2 on the average; replanting wins with a good second stand alone.
    const spread = replantSimulation({ ...chancy, poorSecondStandChance: { lower: 0, upper: 0.4 } });
    expect(spread.replantWinsShare).toBeGreaterThan(0.77);
    expect(spread.replantWinsShare).toBeLessThan(0.83);
    // Keeping makes 68 %; with $50 at $4 a second stand must make 74.25 %, the middle of the span.
    const yields = replantSimulation({ ...chancy, poorSecondStandYieldShare: { lower: 0.6925, upper: 0.7925 } });
    expect(yields.replantWinsShare).toBeGreaterThan(0.46);
    expect(yields.replantWinsShare).toBeLessThan(0.54);
    const points = replantSimulation({ ...chancy, poorSecondStandChance: { lower: 1, upper: 1 }, poorSecondStandYieldShare: { lower: 0.3, upper: 0.3 } });
    expect(points.keepWinsShare).toBe(1);
  });

  it('leaves draws open where a table gives only a bound', () => {
    const open = replantSimulation({ ...asked, tables: [wisconsin2003FullSeason], stand: { plantsPerAcre: 12_000, error: null } });
    expect(open).toMatchObject({ openShare: 1, keepWinsShare: 0, gainDollarsPerAcre: null, tablesDisagree: false });
    expect(open.tables[0]?.answer).toBe('open');
  });

  it('wins for keeping as often as the count’s own distribution says', () => {
    // Break-even by Nafziger, $50 and $4: (174 − 12.5) / 200 = 80.75 %: between 14,000 (79) and 16,000 (84) at 14,700.
    // A count of 14,700 lies exactly there, so half of its draws lie above.
    const even = replantSimulation({ ...asked, tables: [nafziger1994], stand: counted(14_700), draws: 20_000 });
    expect(even.keepWinsShare).toBeGreaterThan(0.485);
    expect(even.keepWinsShare).toBeLessThan(0.515);
  });

  it.each([
    ['no table', { tables: [] }],
    ['a price of nothing', { priceDollarsPerBushel: { lower: 0, upper: 4 } }],
    ['prices out of order', { priceDollarsPerBushel: { lower: 5, upper: 4 } }],
    ['a chance below nothing', { poorSecondStandChance: { lower: -0.1, upper: 0.2 } }],
    ['chances out of order', { poorSecondStandChance: { lower: 0.3, upper: 0.2 } }],
    ['a poor yield above all', { poorSecondStandYieldShare: { lower: 0.3, upper: 1.1 } }],
    ['too few draws', { draws: 10 }],
    ['too many draws', { draws: 1e6 }],
    ['no such seed', { seed: -1 }],
  ])('refuses %s', (_, changes) => {
    expect(() => replantSimulation({ ...asked, ...changes })).toThrow(ImpossibleInput);
  });
});

describe('the break-even stand by a table', () => {
  it('is the grid’s own on the grid of Nafziger', () => {
    for (const changes of [{}, { plantedOn: day(4, 1) }, { replantOn: day(6, 20) }, { plantedOn: day(4, 1), replantOn: day(6, 20) }, { costs: [{ label: 'all', dollarsPerAcre: 400 }] }, { insurancePaymentDollarsPerAcre: 400 }, { gapLossShare: 0.05, unevenLossShare: 0.05 }, { plantedOn: day(4, 1), costs: [{ label: 'all', dollarsPerAcre: 400 }] }]) {
      const asked = { ...terms, ...changes };
      const own = breakEvenStand(asked);
      expect(breakEvenStandByTable(nafziger1994, asked)).toEqual(own.kind === 'stand' ? { ...own, plantsPerAcre: expect.closeTo(own.plantsPerAcre, 6) } : own);
    }
  });

  it('is read on the table asked: Iowa holds a stand cheaper to lose than Nafziger does', () => {
    // By hand: 90 % of 200 bu less $50 / $4 = 167.5 bu, 83.75 %; between 20,000 (81) and 24,000 (94): 20,000 + 4,000 × 2.75 / 13.
    const asked = { ...terms, plantedOn: day(5, 1), replantOn: day(5, 28) };
    expect(breakEvenStandByTable(iowa2001, asked)).toEqual({ kind: 'stand', plantsPerAcre: expect.closeTo(20_846.15, 2), bound: 'exact' });
  });

  it('is a printed stand where the need is exactly its percent', () => {
    // 90 % of 200 bu less $36 / $2 is 162 bu, 81 %, printed for 20,000; 148 bu, 74 %, for 16,000; 136 bu, 68 %, for 12,000, its lowest.
    const costing = (dollarsPerAcre: number) => ({ ...terms, priceDollarsPerBushel: 2, plantedOn: day(5, 1), replantOn: day(5, 28), costs: [{ label: 'all', dollarsPerAcre }] });
    for (const [cost, stand] of [[36, 20_000], [64, 16_000], [88, 12_000]] as const) {
      expect(breakEvenStandByTable(iowa2001, costing(cost))).toEqual({ kind: 'stand', plantsPerAcre: expect.closeTo(stand, 6), bound: 'exact' });
    }
  });

  it('is below a table that prints full stands only, and none where even those earn less', () => {
    const asked = { ...terms, plantedOn: day(5, 1), replantOn: day(6, 1) };
    expect(breakEvenStandByTable(wisconsin2003FullSeason, asked)).toEqual({ kind: 'below-table', plantsPerAcre: 28_000 });
    expect(breakEvenStandByTable(wisconsin2003FullSeason, { ...asked, insurancePaymentDollarsPerAcre: 500 })).toEqual({ kind: 'none-in-table' });
    expect(breakEvenStandByTable(wisconsin2003FullSeason, { ...asked, replantOn: day(6, 25), insurancePaymentDollarsPerAcre: 900 })).toEqual({ kind: 'cannot-tell' });
    expect(breakEvenStandByTable(wisconsin2003FullSeason, { ...asked, plantedOn: day(4, 1) })).toEqual({ kind: 'cannot-tell' });
  });
});

describe('the break-even price', () => {
  it('is what the costs divided by the bushels gained are', () => {
    // At 10,000 plants Nafziger says 68 %, 136 bu; 174 after replanting: 38 bu for $50.
    expect(breakEvenPrice(nafziger1994, terms, 10_000)).toEqual({ kind: 'price', dollarsPerBushel: expect.closeTo(50 / 38, 9), replantPays: 'above' });
  });

  it('is none where replanting yields less and costs, or yields more and is paid for', () => {
    expect(breakEvenPrice(nafziger1994, terms, 20_000)).toEqual({ kind: 'never' });
    expect(breakEvenPrice(nafziger1994, { ...terms, insurancePaymentDollarsPerAcre: 60 }, 10_000)).toEqual({ kind: 'always' });
  });

  it('favors replanting below it where the payment exceeds the costs and the yield falls', () => {
    // 184 against 174 bu, and $10 more than the costs.
    expect(breakEvenPrice(nafziger1994, { ...terms, insurancePaymentDollarsPerAcre: 60 }, 20_000)).toEqual({ kind: 'price', dollarsPerBushel: expect.closeTo(1, 9), replantPays: 'below' });
  });

  it('cannot be told from a bound, and is never at equal yields that cost', () => {
    expect(breakEvenPrice(nafziger1994, terms, 8_000)).toEqual({ kind: 'cannot-tell' });
    const even = { ...terms, replantOn: day(5, 1), replantPlantsPerAcre: 30_000, plantedOn: day(4, 30) };
    const same = { ...even, poorSecondStandChance: 1, poorSecondStandYieldShare: 1 };
    expect(breakEvenPrice(nafziger1994, same, 30_000)).toEqual({ kind: 'never' });
    expect(breakEvenPrice(nafziger1994, { ...same, insurancePaymentDollarsPerAcre: 60 }, 30_000)).toEqual({ kind: 'always' });
  });
});

describe('the last day on which replanting pays', () => {
  it('is the day before the table’s yield falls under what keeping and the costs come to', () => {
    // At 12,000 planted 30 April: 74 %, 148 bu; with $50 at $4 it takes 160.5 bu, 80.25 %. 81 on 30 May, 75 on 4 June: 1.2 a day.
    expect(lastReplantDay(nafziger1994, terms, 12_000)).toEqual({ kind: 'day', day: day(5, 30) });
  });

  it('is never for a stand worth keeping, and beyond the table for none at all', () => {
    expect(lastReplantDay(nafziger1994, terms, 26_000)).toEqual({ kind: 'never' });
    expect(lastReplantDay(nafziger1994, terms, 0)).toEqual({ kind: 'beyond-table' });
  });

  it('cannot be told for a stand of which there is only a bound', () => {
    expect(lastReplantDay(nafziger1994, { ...terms, costs: [] }, 9_000)).toEqual({ kind: 'cannot-tell' });
  });
});

describe('one more row sample', () => {
  it('could turn the answer where the mean may come to lie on the other side', () => {
    // Two counts: t(1) 12.706 × 1,414 × √1.5 reaches below zero, so the mean of three may fall to 14,000.
    const [zone] = oneMoreRowSample([{ id: 'all', acres: 40, plantsPerAcre: [20_000, 22_000] }], (mean) => mean > 15_000);
    expect(zone).toMatchObject({ couldTurn: true, fieldMeanLower: expect.closeTo(14_000, 6) });
    expect(zone?.fieldMeanUpper).toBeGreaterThan(28_000);
  });

  it('could not where no likely count reaches that far, and says so for each zone', () => {
    const counts = [20_000, 20_400, 19_800, 20_200, 20_100, 19_900];
    const zones = oneMoreRowSample([{ id: 'high', acres: 44, plantsPerAcre: counts }, { id: 'low', acres: 18, plantsPerAcre: [9_000, 15_000, 12_000] }, { id: 'new', acres: 1, plantsPerAcre: [12_000] }], (mean) => mean > 15_000);
    expect(zones.map(({ zoneId, couldTurn }) => [zoneId, couldTurn])).toEqual([['high', false], ['low', false], ['new', null]]);
    expect(zones[2]).toMatchObject({ fieldMeanLower: null, fieldMeanUpper: null });
  });

  it('refuses no zone, no acres, and counts that cannot be', () => {
    for (const zones of [[], [{ id: 'a', acres: 0, plantsPerAcre: [1] }], [{ id: 'a', acres: 1, plantsPerAcre: [] }], [{ id: 'a', acres: 1, plantsPerAcre: [-1] }], [{ id: 'a', acres: 1, plantsPerAcre: [NaN] }]]) {
      expect(() => oneMoreRowSample(zones, () => true)).toThrow(ImpossibleInput);
    }
  });
});

describe('what to do before deciding', () => {
  const plain = { soundSproutsPerAcre: 0, crusted: false, damage: null, daysSinceDamage: null };
  it.each([
    [plain, { answer: 'decide-now' }],
    [{ ...plain, crusted: true }, { answer: 'decide-now' }],
    [{ ...plain, soundSproutsPerAcre: 6_000, crusted: true }, { answer: 'hoe', because: 'sound-sprouts-under-crust' }],
    [{ ...plain, soundSproutsPerAcre: 6_000 }, { answer: 'wait', because: 'sound-sprouts-coming', lookAgainInDaysFrom: 3, lookAgainInDaysTo: 5 }],
    [{ ...plain, damage: 'hail' as const, daysSinceDamage: 1 }, { answer: 'wait', because: 'damage-too-fresh', lookAgainInDaysFrom: 2, lookAgainInDaysTo: 4 }],
    [{ ...plain, damage: 'frost' as const, daysSinceDamage: null }, { answer: 'wait', because: 'damage-too-fresh', lookAgainInDaysFrom: 3, lookAgainInDaysTo: 5 }],
    [{ ...plain, damage: 'water' as const, daysSinceDamage: 3 }, { answer: 'decide-now' }],
  ])('%j: %j', (condition, expected) => {
    expect(firstLookAgain(condition)).toEqual(expected);
  });

  it('refuses negative sprouts and days', () => {
    expect(() => firstLookAgain({ ...plain, soundSproutsPerAcre: -1 })).toThrow(ImpossibleInput);
    expect(() => firstLookAgain({ ...plain, damage: 'hail', daysSinceDamage: -1 })).toThrow(ImpossibleInput);
  });
});

describe('a pass with the rotary hoe', () => {
  const pass = { soundSproutsPerAcre: 8_000, comeThroughShare: 0.75, plantsTakenShare: 0, costDollarsPerAcre: 6, unevenLossShare: 0 };

  it('gains what the thicker stand makes, less its cost', () => {
    // 16,000 to 22,000 planted 30 April: 84 to 95 % of 200 bu at $4, less $6.
    expect(hoeGain(nafziger1994, terms, 16_000, pass)).toEqual({ standAfterPlantsPerAcre: 22_000, gainOverKeepingDollarsPerAcre: { lower: expect.closeTo(82, 9), upper: expect.closeTo(82, 9) }, bounded: false });
  });

  it('charges what the late ones cost and the plants it takes, and keeps a bound a bound', () => {
    const charged = hoeGain(nafziger1994, terms, 16_000, { ...pass, plantsTakenShare: 0.125, unevenLossShare: 0.05 });
    expect(charged.standAfterPlantsPerAcre).toBe(20_000);
    // 92 % less a twentieth against 84 %.
    expect(charged.gainOverKeepingDollarsPerAcre.lower).toBeCloseTo((184 * 0.95 - 168) * 4 - 6, 9);
    expect(hoeGain(nafziger1994, terms, 8_000, pass).bounded).toBe(true);
  });

  it.each([[{ comeThroughShare: 1.1 }], [{ plantsTakenShare: -0.1 }], [{ unevenLossShare: NaN }], [{ soundSproutsPerAcre: -1 }], [{ costDollarsPerAcre: -1 }]])('refuses %j', (changes) => {
    expect(() => hoeGain(nafziger1994, terms, 16_000, { ...pass, ...changes })).toThrow(ImpossibleInput);
  });
});

describe('the federal replant payment', () => {
  const insured = { guaranteeDollarsPerAcre: 600, projectedPriceDollarsPerBushel: 4.5, insuredShare: 1, replantedAcres: 18, unitAcres: 62, plantedBeforeEarliestDate: false, paidAlreadyThisYear: false };
  it.each([
    [{}, { kind: 'payable', dollarsPerAcre: 36, limitedBy: 'bushels' }],
    [{ guaranteeDollarsPerAcre: 150 }, { kind: 'payable', dollarsPerAcre: 30, limitedBy: 'guarantee' }],
    [{ insuredShare: 0.5 }, { kind: 'payable', dollarsPerAcre: 18, limitedBy: 'bushels' }],
    [{ replantedAcres: 10 }, { kind: 'not-payable', because: 'area-too-small' }],
    [{ replantedAcres: 20, unitAcres: 500 }, { kind: 'payable', dollarsPerAcre: 36, limitedBy: 'bushels' }],
    [{ replantedAcres: 12.4 }, { kind: 'payable', dollarsPerAcre: 36, limitedBy: 'bushels' }],
    [{ plantedBeforeEarliestDate: true }, { kind: 'not-payable', because: 'planted-too-early' }],
    [{ paidAlreadyThisYear: true }, { kind: 'not-payable', because: 'paid-already' }],
  ])('%j: %j', (changes, expected) => {
    expect(federalReplantPayment({ ...insured, ...changes })).toEqual(expected);
  });

  it.each([[{ guaranteeDollarsPerAcre: 0 }], [{ projectedPriceDollarsPerBushel: -1 }], [{ insuredShare: 1.2 }], [{ replantedAcres: 63 }], [{ unitAcres: NaN }], [{ insuredShare: 0 }]])('refuses %j', (changes) => {
    expect(() => federalReplantPayment({ ...insured, ...changes })).toThrow(ImpossibleInput);
  });
});
