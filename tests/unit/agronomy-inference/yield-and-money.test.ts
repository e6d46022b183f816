import { describe, expect, it } from 'vitest';
import { chanceAbove } from '@/lib/agronomy/inference/chance-above';
import { latePlantsWeighed } from '@/lib/agronomy/inference/late-plants-weighed';
import { meanInterval } from '@/lib/agronomy/inference/mean-interval';
import { partialBudget } from '@/lib/agronomy/inference/partial-budget';
import { predictedAgainstHarvested } from '@/lib/agronomy/inference/predicted-against-harvested';
import { simplePayback, type PaybackAsked } from '@/lib/agronomy/inference/simple-payback';
import published from '../../reference/published-yield-and-money.json';
import fromR from '../../reference/yield-and-money.json';
import { answerOf, reasonOf } from '../agronomy/answer-of';

const notNumbers = [NaN, Infinity, -Infinity];
const atField = (field: string) => expect.objectContaining({ name: 'ImpossibleInput', field });

function expectClose(figured: number, expected: number, relative = 1e-9) {
  expect(Math.abs(figured - expected)).toBeLessThanOrEqual(relative * Math.max(1, Math.abs(expected)));
}

describe('a mean with its interval', () => {
  it.each(Object.entries(fromR.harvested))('is that of R’s t.test: %s', (_, { blocks, ...expected }) => {
    const figured = answerOf(meanInterval(blocks, 'blocks'));
    for (const key of ['mean', 'standardError', 'degreesOfFreedom', 'lower', 'upper'] as const)
      expectClose(figured[key], expected[key]);
  });

  it('is insufficient with one value, with none, and where all are equal', () => {
    expect(meanInterval([], 'blocks')).toEqual({
      kind: 'insufficient',
      reason: 'too-few-units',
      needed: '2 blocks',
      had: '0',
    });
    expect(meanInterval([4], 'pairs')).toEqual({
      kind: 'insufficient',
      reason: 'too-few-units',
      needed: '2 pairs',
      had: '1',
    });
    expect(meanInterval([0.1, 0.1, 0.1], 'pairs')).toEqual({
      kind: 'insufficient',
      reason: 'no-spread',
      needed: 'pairs that differ',
      had: 'all equal',
    });
    expect(reasonOf(meanInterval([0, 0], 'pairs'))).toBe('no-spread');
  });

  it.each(notNumbers)('is refused with %d among its values', (bad) => {
    expect(() => meanInterval([1, bad], 'blocks')).toThrow(atField('1'));
  });
});

describe('the chance that a difference is above a limit', () => {
  it('is a half at the mean, and the two tails about it are alike', () => {
    const difference = { mean: 3, standardError: 2, degreesOfFreedom: 5 };
    expect(chanceAbove(difference, 3)).toBe(0.5);
    expectClose(chanceAbove(difference, 1) + chanceAbove(difference, 5), 1, 1e-14);
    expect(chanceAbove(difference, 1)).toBeGreaterThan(0.5);
  });

  it('is refused without an error above zero, degrees of freedom or finite numbers', () => {
    const sound = { mean: 1, standardError: 1, degreesOfFreedom: 1 };
    for (const bad of [...notNumbers, 0, -1]) {
      expect(() => chanceAbove({ ...sound, standardError: bad }, 0)).toThrow(atField('standardError'));
      expect(() => chanceAbove({ ...sound, degreesOfFreedom: bad }, 0)).toThrow(atField('degreesOfFreedom'));
    }
    for (const bad of notNumbers) {
      expect(() => chanceAbove({ ...sound, mean: bad }, 0)).toThrow(atField('mean'));
      expect(() => chanceAbove(sound, bad)).toThrow(atField('limit'));
    }
  });
});

describe('late plants weighed against their neighbors', () => {
  const pairsOf = ({ late, neighbor }: { late: number[]; neighbor: number[] }) =>
    late.map((latePounds, index) => ({ latePounds, neighborPounds: neighbor[index] as number }));

  it.each(Object.entries(fromR.paired))('are R’s paired t.test, a barren plant among them: %s', (_, pair) => {
    const figured = answerOf(latePlantsWeighed(pairsOf(pair)));
    expect(figured.pairs).toBe(pair.late.length);
    for (const key of ['mean', 'standardError', 'degreesOfFreedom', 'lower', 'upper'] as const)
      expectClose(figured.differencePounds[key], pair[key]);
    expectClose(figured.lateShareOfNeighbor, pair.share);
    expectClose(figured.latePoundsMean - figured.neighborPoundsMean, pair.mean);
  });

  it('are insufficient with one pair, none, pairs that all differ alike, and neighbors without grain', () => {
    const pair = { latePounds: 0.2, neighborPounds: 0.4 };
    expect(reasonOf(latePlantsWeighed([]))).toBe('too-few-units');
    expect(reasonOf(latePlantsWeighed([{ latePounds: 0.1, neighborPounds: 0 }]))).toBe('too-few-units');
    expect(latePlantsWeighed([pair])).toEqual({
      kind: 'insufficient',
      reason: 'too-few-units',
      needed: '2 pairs',
      had: '1',
    });
    expect(reasonOf(latePlantsWeighed([pair, pair]))).toBe('no-spread');
    expect(
      reasonOf(
        latePlantsWeighed([
          { latePounds: 0.1, neighborPounds: 0 },
          { latePounds: 0.2, neighborPounds: 0 },
        ]),
      ),
    ).toBe('no-grain-beside');
  });

  it.each([...notNumbers, -0.01])('are refused with a weight of %d', (bad) => {
    expect(() => latePlantsWeighed([{ latePounds: bad, neighborPounds: 1 }])).toThrow(
      atField('0.latePounds'),
    );
    expect(() => latePlantsWeighed([{ latePounds: 1, neighborPounds: bad }])).toThrow(
      atField('0.neighborPounds'),
    );
  });
});

describe('a prediction held against the harvest', () => {
  const { three, five } = fromR.harvested;

  it('agrees where the harvested interval reaches it, and says how far they are apart', () => {
    const figured = answerOf(predictedAgainstHarvested({ lower: 5, upper: 6 }, three.blocks));
    expect(figured.agrees).toBe(true);
    expect(figured.alsoAgreesWithNone).toBe(false);
    expect(figured.difference.meanLower).toBeCloseTo(0, 12);
    expect(figured.difference.meanUpper).toBeCloseTo(1, 12);
    expectClose(figured.difference.lower, three.lower - 6);
    expectClose(figured.difference.upper, three.upper - 5);
  });

  it('agrees up to the ends of the interval and no further', () => {
    const at = (lower: number, upper: number) =>
      answerOf(predictedAgainstHarvested({ lower, upper }, three.blocks)).agrees;
    const { lower, upper } = answerOf(meanInterval(three.blocks, 'blocks'));
    expect([at(0, lower), at(upper, 20), at(0, lower - 1e-9), at(upper + 1e-9, 20)]).toEqual([
      true,
      true,
      false,
      false,
    ]);
  });

  it('says where agreeing proves nothing, since no difference would agree too', () => {
    expect(answerOf(predictedAgainstHarvested({ lower: 5, upper: 6 }, five.blocks))).toMatchObject({
      agrees: true,
      alsoAgreesWithNone: true,
    });
    expect(answerOf(predictedAgainstHarvested({ lower: 12, upper: 12 }, five.blocks))).toMatchObject({
      agrees: false,
      alsoAgreesWithNone: false,
    });
    expect(
      answerOf(
        predictedAgainstHarvested(
          { lower: -6, upper: -5 },
          five.blocks.map((each) => -each),
        ),
      ),
    ).toMatchObject({ agrees: true, alsoAgreesWithNone: true });
    expect(
      answerOf(
        predictedAgainstHarvested(
          { lower: -6, upper: -5 },
          three.blocks.map((each) => -each),
        ),
      ),
    ).toMatchObject({ agrees: true, alsoAgreesWithNone: false });
  });

  it('is insufficient with one block, and refused with a span that cannot be', () => {
    expect(reasonOf(predictedAgainstHarvested({ lower: 1, upper: 2 }, [3]))).toBe('too-few-units');
    expect(() => predictedAgainstHarvested({ lower: 2, upper: 1 }, [3, 4])).toThrow(atField('predicted'));
    for (const bad of notNumbers) {
      expect(() => predictedAgainstHarvested({ lower: bad, upper: 1 }, [3, 4])).toThrow(atField('predicted'));
      expect(() => predictedAgainstHarvested({ lower: 1, upper: bad }, [3, 4])).toThrow(atField('predicted'));
    }
  });
});

describe('a partial budget', () => {
  it.each(Object.entries({ printed: published.partialBudget, ...fromR.budget }))(
    'is what R figures: %s',
    (_, each) => {
      const { standardError, degreesOfFreedom } = each;
      const figured = partialBudget(
        { mean: each.gain, standardError, degreesOfFreedom },
        each.price,
        each.cost,
      );
      for (const key of ['mean', 'lower', 'upper'] as const)
        expectClose(figured.returnDollarsPerAcre[key], each[key]);
      expectClose(figured.returnDollarsPerAcre.standardError, standardError * each.price);
      expectClose(figured.breakEvenBushelsPerAcre, each.breakEvenBushels);
      expectClose(figured.chanceOfGain, each.chanceOfGain);
      if (each.gain > 0) expectClose(figured.breakEvenPriceDollarsPerBushel as number, each.breakEvenPrice);
      else expect(figured.breakEvenPriceDollarsPerBushel).toBeNull();
    },
  );

  it('has no break-even price without a gain', () => {
    expect(
      partialBudget({ mean: 0, standardError: 1, degreesOfFreedom: 3 }, 4, 0).breakEvenPriceDollarsPerBushel,
    ).toBeNull();
  });

  it('is refused with numbers that cannot be', () => {
    const gain = { mean: 1, standardError: 1, degreesOfFreedom: 3 };
    for (const bad of notNumbers)
      expect(() => partialBudget({ ...gain, mean: bad }, 4, 1)).toThrow(atField('mean'));
    for (const bad of [...notNumbers, 0, -1]) {
      expect(() => partialBudget(gain, bad, 1)).toThrow(atField('priceDollarsPerBushel'));
      expect(() => partialBudget({ ...gain, standardError: bad }, 4, 1)).toThrow(atField('standardError'));
    }
    for (const bad of [...notNumbers, -1])
      expect(() => partialBudget(gain, 4, bad)).toThrow(atField('addedCostDollarsPerAcre'));
  });
});

/** 12 rows at $6,900 on 620 acres and $4.10 corn. */
const asked: PaybackAsked = {
  costDollars: 6900,
  acresPerYear: 620,
  priceDollarsPerBushel: 4.1,
  upkeepDollarsPerAcre: 0,
  savingDollarsPerYear: 0,
  gainBushelsPerAcre: { mean: 3, standardError: 0.5, degreesOfFreedom: 9 },
  withinYears: 2,
};
const askedOf = (each: (typeof fromR.payback)['perhaps']): PaybackAsked => ({
  costDollars: each.cost,
  acresPerYear: each.acres,
  priceDollarsPerBushel: each.price,
  upkeepDollarsPerAcre: each.upkeep,
  savingDollarsPerYear: each.saving,
  gainBushelsPerAcre: {
    mean: each.gain,
    standardError: each.standardError,
    degreesOfFreedom: each.degreesOfFreedom,
  },
  withinYears: each.within,
});

describe('payback', () => {
  it('is worked by hand for 12 rows at $6,900, 620 acres, $4.10 corn and 3 bushels', () => {
    // 3 × 4.10 = $12.30 an acre; × 620 = $7,626 a year; 6,900 / 7,626 = 0.905 years.
    // t(0.975; 9) = 2.2622 (printed in any table): 3 ± 1.1311, so 1.8689 to 4.1311 bu, $4,750.8 to $10,501.2, 1.452 to 0.657 years.
    const figured = answerOf(simplePayback(asked));
    expect(figured.kind).toBe('years');
    if (figured.kind !== 'years') return;
    expect(figured.years).toBeCloseTo(0.905, 3);
    expect(figured.yearsLower).toBeCloseTo(0.657, 3);
    expect(figured.yearsUpper).toBeCloseTo(1.452, 3);
    expect(figured.returnDollarsPerYear.mean).toBeCloseTo(7626, 9);
  });

  it.each(['pays', 'saves'] as const)(
    'is a number of years with its interval where even the low end pays: %s',
    (name) => {
      const each = fromR.payback[name];
      const figured = answerOf(simplePayback(askedOf(each)));
      expect(figured.kind).toBe('years');
      if (figured.kind !== 'years') return;
      expectClose(figured.years, each.years);
      expectClose(figured.yearsLower, each.yearsLower);
      expectClose(figured.yearsUpper, each.yearsUpper);
    },
  );

  it.each(Object.entries(fromR.payback))('has the chances that R figures from dollars: %s', (_, each) => {
    const figured = answerOf(simplePayback(askedOf(each)));
    expectClose(figured.chanceNever, each.chanceNever);
    expectClose(figured.chanceWithinYears, each.chanceWithin);
    expectClose(figured.returnDollarsPerYear.mean, each.returnMean);
    expectClose(figured.returnDollarsPerYear.lower, each.returnLower);
    expectClose(figured.returnDollarsPerYear.upper, each.returnUpper);
  });

  it('may never come where the interval reaches zero, and then names no years at all', () => {
    const figured = answerOf(simplePayback(askedOf(fromR.payback.perhaps)));
    expect(Object.keys(figured).sort()).toEqual([
      'chanceNever',
      'chanceWithinYears',
      'kind',
      'returnDollarsPerYear',
    ]);
    expect(figured.kind).toBe('may-never-pay');
  });

  it('may never come for any interval that holds zero bushels, where nothing else is saved', () => {
    for (const mean of [-4, -0.5, 0, 0.5, 1.13]) {
      expect(
        answerOf(
          simplePayback({ ...asked, gainBushelsPerAcre: { mean, standardError: 0.5, degreesOfFreedom: 9 } }),
        ).kind,
      ).toBe('may-never-pay');
    }
    expect(
      answerOf(
        simplePayback({ ...asked, gainBushelsPerAcre: { mean: 0, standardError: 0.5, degreesOfFreedom: 9 } }),
      ).chanceNever,
    ).toBe(0.5);
    expect(
      answerOf(
        simplePayback({
          ...asked,
          gainBushelsPerAcre: { mean: 1.14, standardError: 0.5, degreesOfFreedom: 9 },
        }),
      ).kind,
    ).toBe('years');
  });

  it('is insufficient from a gain without an error, as one block gives it', () => {
    expect(simplePayback({ ...asked, gainBushelsPerAcre: null })).toEqual({
      kind: 'insufficient',
      reason: 'gain-without-error',
      needed: 'a yield gain with its interval',
      had: 'no interval',
    });
  });

  it('is refused with numbers that cannot be', () => {
    for (const bad of [...notNumbers, -1]) {
      for (const field of [
        'costDollars',
        'acresPerYear',
        'priceDollarsPerBushel',
        'upkeepDollarsPerAcre',
        'savingDollarsPerYear',
        'withinYears',
      ]) {
        expect(() => simplePayback({ ...asked, [field]: bad })).toThrow(atField(field));
      }
      expect(() =>
        simplePayback({ ...asked, gainBushelsPerAcre: { mean: 1, standardError: bad, degreesOfFreedom: 3 } }),
      ).toThrow(atField('standardError'));
    }
    for (const field of ['costDollars', 'acresPerYear', 'priceDollarsPerBushel', 'withinYears']) {
      expect(() => simplePayback({ ...asked, [field]: 0 })).toThrow(atField(field));
    }
  });
});
