import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { simplePayback } from '@/lib/agronomy/inference/simple-payback';
import { partialBudget } from '@/lib/agronomy/inference/partial-budget';
import { capitalRecoveryShare } from '@/lib/agronomy/capital-recovery';
import { netPresentValueDollars } from '@/lib/agronomy/net-present-value';
import { moistureShrinkPercent } from '@/lib/agronomy/moisture-shrink';
import { replant, type ReplantQuestion } from '@/lib/agronomy/replant';
import { breakEvenStandByTable } from '@/lib/agronomy/replant-break-even-by-table';
import { breakEvenPrice } from '@/lib/agronomy/replant-break-even-price';
import { dayOfYear } from '@/lib/agronomy/replant-date';
import { replantGainByTable } from '@/lib/agronomy/replant-gain-by-table';
import { lastReplantDay } from '@/lib/agronomy/replant-last-day';
import type { ReplantTerms } from '@/lib/agronomy/replant-sum';
import { publishedTables } from '@/lib/agronomy/replant-tables/published-tables';
import { nafziger1994 } from '@/lib/agronomy/replant-tables/nafziger-1994';
import { weightAtMoisturePounds } from '@/lib/agronomy/weight-at-moisture';
import { answerOf } from '../agronomy/answer-of';

const runs = { numRuns: 200, seed: 20_260_507 };
const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });

const terms: fc.Arbitrary<ReplantTerms> = fc.record({
  maximumYieldBushelsPerAcre: number(80, 260),
  priceDollarsPerBushel: number(2, 8),
  plantedOn: fc.integer({ min: 12, max: 30 }).map((day) => ({ month: 4, day })),
  gapLossShare: number(0, 0.1),
  unevenLossShare: number(0, 0.1),
  replantOn: fc.integer({ min: 5, max: 31 }).map((day) => ({ month: 5, day })),
  replantPlantsPerAcre: number(28_000, 34_000),
  poorSecondStandChance: number(0, 0.4),
  poorSecondStandYieldShare: number(0, 0.9),
  costs: number(0, 150).map((dollarsPerAcre) => [{ label: 'all', dollarsPerAcre }]),
  extraDryingDollarsPerAcre: number(0, 20),
  insurancePaymentDollarsPerAcre: number(0, 60),
});
const stand = number(10_000, 34_000);
const costing = (asked: ReplantTerms, more: number) => ({
  ...asked,
  costs: [...asked.costs, { label: 'more', dollarsPerAcre: more }],
});

describe('keep or replant', () => {
  it('gains by a higher price what replanting yields more, so that where it yields at least as much replant never turns into keep', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...publishedTables),
        terms,
        stand,
        number(0, 4),
        (table, asked, plants, more) => {
          const gainAt = (price: number) =>
            replantGainByTable(table, { ...asked, priceDollarsPerBushel: price }, plants);
          const now = gainAt(asked.priceDollarsPerBushel);
          const then = gainAt(asked.priceDollarsPerBushel + more);
          const yieldsMore = now.replantYieldBushelsPerAcre.lower >= now.keepYieldBushelsPerAcre.upper;
          if (yieldsMore)
            expect(then.gainDollarsPerAcre.lower).toBeGreaterThanOrEqual(now.gainDollarsPerAcre.lower - 1e-9);
          if (yieldsMore && now.gainDollarsPerAcre.lower > 0)
            expect(then.gainDollarsPerAcre.upper).toBeGreaterThan(0);
        },
      ),
      runs,
    );
  });

  it('recommends nothing that a higher price alone turns from replant to keep, where replanting does not yield less', () => {
    fc.assert(
      fc.property(terms, stand, number(0, 4), (asked, plants, more) => {
        const question: ReplantQuestion = {
          ...asked,
          stand: { plantsPerAcre: plants, error: null },
          acres: null,
          seed: 1,
        };
        const now = answerOf(replant(question));
        const yieldsMore = now.sum.replantYieldBushelsPerAcre.lower >= now.sum.keepYieldBushelsPerAcre.upper;
        if (!yieldsMore || now.recommendation !== 'replant') return;
        expect(
          answerOf(replant({ ...question, priceDollarsPerBushel: asked.priceDollarsPerBushel + more }))
            .recommendation,
        ).not.toBe('keep');
      }),
      runs,
    );
  });

  it('moves every break-even toward keeping when replanting costs more: a lower stand, a higher price, no later day', () => {
    const standOf = (asked: ReplantTerms) => {
      const even = breakEvenStandByTable(nafziger1994, asked);
      return even.kind === 'stand' ? even.plantsPerAcre : even.kind === 'none-in-table' ? Infinity : 0;
    };
    const dayOf = (asked: ReplantTerms, plants: number) => {
      const last = lastReplantDay(nafziger1994, asked, plants);
      return last.kind === 'day' ? dayOfYear(last.day, 'day') : last.kind === 'never' ? 0 : 400;
    };
    fc.assert(
      fc.property(terms, stand, number(0.01, 100), (asked, plants, more) => {
        const dearer = costing(asked, more);
        expect(standOf(dearer)).toBeLessThanOrEqual(standOf(asked));
        expect(dayOf(dearer, plants)).toBeLessThanOrEqual(dayOf(asked, plants));
        const [price, dearerPrice] = [
          breakEvenPrice(nafziger1994, asked, plants),
          breakEvenPrice(nafziger1994, dearer, plants),
        ];
        if (price.kind === 'price' && dearerPrice.kind === 'price' && price.replantPays === 'above') {
          expect(dearerPrice.dollarsPerBushel).toBeGreaterThanOrEqual(price.dollarsPerBushel);
        }
      }),
      { ...runs, numRuns: 40 },
    );
  });

  it('earns the same either way at its break-even stand and at its break-even price', () => {
    fc.assert(
      fc.property(fc.constantFrom(...publishedTables), terms, stand, (table, asked, plants) => {
        const even = breakEvenStandByTable(table, asked);
        if (even.kind === 'stand' && even.bound === 'exact') {
          expect(replantGainByTable(table, asked, even.plantsPerAcre).gainDollarsPerAcre.lower).toBeCloseTo(
            0,
            6,
          );
        }
        const price = breakEvenPrice(table, asked, plants);
        if (price.kind === 'price') {
          const gain = replantGainByTable(
            table,
            { ...asked, priceDollarsPerBushel: price.dollarsPerBushel },
            plants,
          ).gainDollarsPerAcre;
          expect(Math.abs(gain.lower)).toBeLessThan(1e-6 * Math.max(1, price.dollarsPerBushel));
        }
      }),
      runs,
    );
  });
});

describe('payback', () => {
  const asked = fc.record({
    costDollars: number(500, 50_000),
    acresPerYear: number(50, 5000),
    priceDollarsPerBushel: number(2, 8),
    upkeepDollarsPerAcre: number(0, 3),
    savingDollarsPerYear: fc.constant(0),
    gainBushelsPerAcre: fc.record({
      mean: number(-4, 12),
      standardError: number(0.1, 4),
      degreesOfFreedom: fc.integer({ min: 1, max: 30 }),
    }),
    withinYears: number(1, 10),
  });

  it('names years only where the interval of the gain lies above zero bushels, and then a finite number with its limits in order', () => {
    fc.assert(
      fc.property(asked, (each) => {
        const payback = answerOf(simplePayback(each));
        const gain = partialBudget(each.gainBushelsPerAcre, 1, 0).returnDollarsPerAcre;
        if (gain.lower <= 0) expect(payback.kind).toBe('may-never-pay');
        if (payback.kind === 'years') {
          expect(gain.lower).toBeGreaterThan(0);
          expect(payback.yearsLower).toBeLessThanOrEqual(payback.years);
          expect(payback.years).toBeLessThanOrEqual(payback.yearsUpper);
          expect(Number.isFinite(payback.yearsUpper)).toBe(true);
          // The lower end of a 95 % interval lies above nothing exactly where the chance of never is under one in forty.
          expect(payback.chanceNever).toBeLessThan(0.025 + 1e-9);
        } else expect(payback.chanceNever).toBeGreaterThanOrEqual(0.025 - 1e-9);
        expect(payback.chanceNever + payback.chanceWithinYears).toBeLessThanOrEqual(1 + 1e-9);
      }),
      runs,
    );
  });

  it('takes no longer on more acres or at a higher price, and no less time when it costs more', () => {
    fc.assert(
      fc.property(asked, number(1, 3), (each, factor) => {
        const payback = answerOf(simplePayback(each));
        if (payback.kind !== 'years') return;
        const yearsOf = (changes: Partial<typeof each>) => {
          const changed = answerOf(simplePayback({ ...each, ...changes }));
          return changed.kind === 'years' ? changed.years : Infinity;
        };
        expect(yearsOf({ acresPerYear: each.acresPerYear * factor })).toBeLessThanOrEqual(
          payback.years * (1 + 1e-12),
        );
        expect(yearsOf({ priceDollarsPerBushel: each.priceDollarsPerBushel * factor })).toBeLessThanOrEqual(
          payback.years * (1 + 1e-12),
        );
        expect(yearsOf({ costDollars: each.costDollars * factor })).toBeGreaterThanOrEqual(
          payback.years * (1 - 1e-12),
        );
      }),
      runs,
    );
  });
});

describe('money over years and grain over moistures', () => {
  it('is recovered by more a year at more interest and less a year over more years, and never by less than the plain share', () => {
    fc.assert(
      fc.property(
        number(0, 0.5),
        number(0, 0.4),
        fc.integer({ min: 1, max: 60 }),
        (interest, more, years) => {
          const share = capitalRecoveryShare(interest, years);
          expect(share).toBeGreaterThanOrEqual(1 / years - 1e-12);
          expect(capitalRecoveryShare(interest + more, years)).toBeGreaterThanOrEqual(share - 1e-12);
          expect(capitalRecoveryShare(interest, years + 1)).toBeLessThanOrEqual(share);
          const worth = netPresentValueDollars({
            costDollars: 1000,
            returnDollarsPerYear: 1000 * share,
            remainingValueDollars: 0,
            years,
            interestShare: interest,
          });
          expect(worth).toBeCloseTo(0, 6);
        },
      ),
      runs,
    );
  });

  it('weighs the same when it is brought to another moisture and back, and shrinks by what it then lacks', () => {
    fc.assert(
      fc.property(number(1, 100_000), number(0, 60), number(0, 60), (pounds, moisture, other) => {
        const there = weightAtMoisturePounds(pounds, moisture, other);
        expect(weightAtMoisturePounds(there, other, moisture) / pounds).toBeCloseTo(1, 10);
        if (other <= moisture)
          expect(1 - there / pounds).toBeCloseTo(moistureShrinkPercent(moisture, other) / 100, 10);
      }),
      runs,
    );
  });
});
