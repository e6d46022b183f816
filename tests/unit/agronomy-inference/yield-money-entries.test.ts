import { describe, expect, it } from 'vitest';
import { acresToOwn } from '@/lib/agronomy/acres-to-own';
import { adjustmentLabor } from '@/lib/agronomy/adjustment-labor';
import { annualEquipmentCost } from '@/lib/agronomy/annual-equipment-cost';
import { breakEvenBushelsPerAcre } from '@/lib/agronomy/break-even-bushels';
import { capitalRecoveryShare } from '@/lib/agronomy/capital-recovery';
import { equipmentCostPerAcre } from '@/lib/agronomy/equipment-cost-per-acre';
import { latePlantsWeighed } from '@/lib/agronomy/inference/late-plants-weighed';
import { partialBudget } from '@/lib/agronomy/inference/partial-budget';
import { predictedAgainstHarvested } from '@/lib/agronomy/inference/predicted-against-harvested';
import { simplePayback } from '@/lib/agronomy/inference/simple-payback';
import { latePlantCost } from '@/lib/agronomy/late-plant-cost';
import { moistureShrinkPercent } from '@/lib/agronomy/moisture-shrink';
import { netPresentValueDollars } from '@/lib/agronomy/net-present-value';
import { illinois2014 } from '@/lib/agronomy/penalty/illinois-2014';
import { nafziger1996SkipMadeUp } from '@/lib/agronomy/penalty/nafziger-1996';
import { ohioReplantGain } from '@/lib/agronomy/penalty/ohio-replant-gain';
import { moneyEntries } from '@/lib/agronomy/register/money-entries';
import type { WorkedExample } from '@/lib/agronomy/register/register-entry';
import { restatedPenaltyEntries } from '@/lib/agronomy/register/restated-penalty-entries';
import { yieldEntries } from '@/lib/agronomy/register/yield-entries';
import { remainingValue } from '@/lib/agronomy/remaining-value';
import { stripAcres } from '@/lib/agronomy/strip-acres';
import { stripYieldBushelsPerAcre } from '@/lib/agronomy/strip-yield';
import { weightAtMoisturePounds } from '@/lib/agronomy/weight-at-moisture';
import { answerOf } from '../agronomy/answer-of';

type Inputs = WorkedExample['inputs'];
const entries = [...yieldEntries, ...moneyEntries, ...restatedPenaltyEntries];
const one = (inputs: Inputs, name: string) => inputs[name] as number;
const many = (inputs: Inputs, name: string) => inputs[name] as readonly number[];
const late = (inputs: Inputs) => ({
  lateShare: one(inputs, 'lateShare'),
  delayDays: one(inputs, 'delayDays'),
});
const gain = (inputs: Inputs) => ({
  mean: one(inputs, 'gain'),
  standardError: one(inputs, 'standardError'),
  degreesOfFreedom: one(inputs, 'degreesOfFreedom'),
});

/** How each worked example is figured again by the code it explains. */
const again: Record<string, (inputs: Inputs) => Record<string, number | undefined>> = {
  'weight-at-moisture': (inputs) => ({
    pounds: weightAtMoisturePounds(one(inputs, 'pounds'), one(inputs, 'moisture')),
  }),
  'moisture-shrink': (inputs) => ({
    percent: moistureShrinkPercent(one(inputs, 'moisture'), one(inputs, 'to')),
  }),
  'strip-acres': (inputs) => ({
    acres: stripAcres({
      lengthFeet: one(inputs, 'feet'),
      rowsHarvested: one(inputs, 'rows'),
      rowSpacingInches: one(inputs, 'inches'),
    }),
  }),
  'strip-yield': (inputs) => ({
    bushels: stripYieldBushelsPerAcre({
      weightPounds: one(inputs, 'pounds'),
      moisturePercent: one(inputs, 'moisture'),
      acres: one(inputs, 'acres'),
    }),
  }),
  'late-plants-weighed': (inputs) => {
    const neighbors = many(inputs, 'neighbors');
    const { mean, lower, upper } = answerOf(
      latePlantsWeighed(
        many(inputs, 'late').map((latePounds, index) => ({
          latePounds,
          neighborPounds: neighbors[index] as number,
        })),
      ),
    ).differencePounds;
    return { mean, lower, upper };
  },
  'late-plant-cost': (inputs) => {
    const mean = -one(inputs, 'pounds');
    const cost = latePlantCost({
      differencePounds: { mean, lower: mean, upper: mean },
      latePlantsPerAcre: one(inputs, 'plants'),
      priceDollarsPerBushel: one(inputs, 'price'),
    });
    return {
      cents: cost.centsPerLatePlant.mean,
      bushels: cost.bushelsPerAcre.mean,
      dollars: cost.dollarsPerAcre.mean,
    };
  },
  'predicted-against-harvested': (inputs) => {
    const { harvested, agrees } = answerOf(
      predictedAgainstHarvested(
        { lower: one(inputs, 'predictedLower'), upper: one(inputs, 'predictedUpper') },
        many(inputs, 'blocks'),
      ),
    );
    return { mean: harvested.mean, lower: harvested.lower, upper: harvested.upper, agrees: agrees ? 1 : 0 };
  },
  'equipment-cost-per-acre': (inputs) => ({
    dollars: equipmentCostPerAcre(one(inputs, 'cost'), one(inputs, 'acres')),
  }),
  'break-even-bushels': (inputs) => ({
    bushels: breakEvenBushelsPerAcre(one(inputs, 'cost'), one(inputs, 'price')),
  }),
  'partial-budget': (inputs) => {
    const {
      returnDollarsPerAcre,
      chanceOfGain,
      breakEvenBushelsPerAcre: breakEven,
    } = partialBudget(gain(inputs), one(inputs, 'price'), one(inputs, 'cost'));
    return {
      mean: returnDollarsPerAcre.mean,
      lower: returnDollarsPerAcre.lower,
      upper: returnDollarsPerAcre.upper,
      chance: chanceOfGain,
      breakEven,
    };
  },
  'simple-payback': (inputs) => {
    const payback = answerOf(
      simplePayback({
        costDollars: one(inputs, 'cost'),
        acresPerYear: one(inputs, 'acres'),
        priceDollarsPerBushel: one(inputs, 'price'),
        upkeepDollarsPerAcre: 0,
        savingDollarsPerYear: 0,
        gainBushelsPerAcre: gain(inputs),
        withinYears: 1,
      }),
    );
    return payback.kind === 'years'
      ? { years: payback.years, lower: payback.yearsLower, upper: payback.yearsUpper }
      : {};
  },
  'capital-recovery': (inputs) => ({
    share: capitalRecoveryShare(one(inputs, 'interest'), one(inputs, 'years')),
  }),
  'annual-equipment-cost': (inputs) => {
    const cost = annualEquipmentCost({
      priceDollars: one(inputs, 'price'),
      remainingValueDollars: one(inputs, 'remaining'),
      years: one(inputs, 'years'),
      interestShare: one(inputs, 'interest'),
      acresPerYear: one(inputs, 'acres'),
      upkeepDollarsPerAcre: one(inputs, 'upkeep'),
    });
    return { year: cost.dollarsPerYear, acre: cost.dollarsPerAcre };
  },
  'acres-to-own': (inputs) => {
    const acres = acresToOwn(one(inputs, 'year'), one(inputs, 'upkeep'), one(inputs, 'against'));
    return { acres: acres.kind === 'acres' ? acres.acresPerYear : NaN };
  },
  'net-present-value': (inputs) => ({
    dollars: netPresentValueDollars({
      costDollars: one(inputs, 'cost'),
      returnDollarsPerYear: one(inputs, 'yearly'),
      remainingValueDollars: one(inputs, 'remaining'),
      years: one(inputs, 'years'),
      interestShare: one(inputs, 'interest'),
    }),
  }),
  'remaining-value': (inputs) => {
    const value = remainingValue(one(inputs, 'list'), one(inputs, 'paid'), one(inputs, 'share'));
    return { remaining: value.remainingDollars, lost: value.lostDollars };
  },
  'adjustment-labor': (inputs) => {
    const { rowByRow, fromCab, saved } = adjustmentLabor({
      rowUnits: one(inputs, 'rows'),
      minutesPerRowUnit: one(inputs, 'minutes'),
      minutesPerChangeFromCab: one(inputs, 'cabMinutes'),
      changesPerYear: one(inputs, 'changes'),
      wageDollarsPerHour: one(inputs, 'wage'),
      people: one(inputs, 'people'),
    });
    return {
      rowHours: rowByRow.hoursPerYear,
      rowDollars: rowByRow.dollarsPerYear,
      cabHours: fromCab.hoursPerYear,
      cabDollars: fromCab.dollarsPerYear,
      savedDollars: saved.dollarsPerYear,
    };
  },
  'illinois-2014': (inputs) => {
    const { lossLow, lossHigh } = answerOf(illinois2014(late(inputs)));
    return { low: lossLow, high: lossHigh };
  },
  'ohio-replant-gain': (inputs) => ({ most: answerOf(ohioReplantGain(late(inputs))).gainPercentMost }),
  'nafziger-1996': (inputs) => ({
    share: answerOf(nafziger1996SkipMadeUp(one(inputs, 'stand'))).madeUpShare,
  }),
};

describe('the register of yield and money', () => {
  it.each(entries.map((entry) => [entry.id, entry] as const))(
    'figures its worked example again: %s',
    (id, entry) => {
      const figured = again[id]?.(entry.workedExample.inputs) ?? {};
      expect(Object.keys(figured).sort()).toEqual(Object.keys(entry.workedExample.expected).sort());
      for (const [name, expected] of Object.entries(entry.workedExample.expected)) {
        expect(Math.abs((figured[name] ?? NaN) - expected)).toBeLessThanOrEqual(
          entry.workedExample.tolerance + 1e-12,
        );
      }
    },
  );

  it('names every entry once', () => {
    expect(new Set(entries.map(({ id }) => id)).size).toBe(entries.length);
  });
});
