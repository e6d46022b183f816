import { describe, expect, it } from 'vitest';
import { acresToOwn } from '@/lib/agronomy/acres-to-own';
import { adjustmentLabor } from '@/lib/agronomy/adjustment-labor';
import { annualEquipmentCost } from '@/lib/agronomy/annual-equipment-cost';
import { breakEvenBushelsPerAcre } from '@/lib/agronomy/break-even-bushels';
import { capitalRecoveryShare } from '@/lib/agronomy/capital-recovery';
import { equipmentCostPerAcre } from '@/lib/agronomy/equipment-cost-per-acre';
import { latePlantCost } from '@/lib/agronomy/late-plant-cost';
import { moistureShrinkPercent } from '@/lib/agronomy/moisture-shrink';
import { netPresentValueDollars } from '@/lib/agronomy/net-present-value';
import { remainingValue } from '@/lib/agronomy/remaining-value';
import { stripAcres } from '@/lib/agronomy/strip-acres';
import { stripYieldBushelsPerAcre } from '@/lib/agronomy/strip-yield';
import { weightAtMoisturePounds } from '@/lib/agronomy/weight-at-moisture';
import published from '../../reference/published-yield-and-money.json';
import fromR from '../../reference/yield-and-money.json';

const notNumbers = [NaN, Infinity, -Infinity];
const atField = (field: string) => expect.objectContaining({ name: 'ImpossibleInput', field });

function expectWithin(figured: number, expected: number, tolerance: number) {
  expect(Math.abs(figured - expected)).toBeLessThanOrEqual(tolerance);
}

/** Every number of an input, one after the other made impossible, is refused by its own name. */
function refusesEach<Input extends Record<string, number>>(
  figure: (input: Input) => unknown,
  sound: Input,
  bad: Partial<Record<keyof Input, number[]>>,
) {
  expect(() => figure(sound)).not.toThrow();
  for (const field of Object.keys(sound)) {
    for (const each of [...notNumbers, ...(bad[field] ?? [])]) {
      expect(() => figure({ ...sound, [field]: each }), `${field} of ${each}`).toThrow(atField(field));
    }
  }
}

describe('grain at another moisture', () => {
  it.each([published.standardMoisture, published.truckload])('is what is printed: $source', (load) => {
    expectWithin(
      weightAtMoisturePounds(load.weightPounds, load.moisturePercent, load.standardMoisturePercent),
      load.expectedPounds,
      load.tolerancePounds,
    );
  });

  it('is brought to 15.5 % where nothing else is asked, and weighs the same at its own moisture', () => {
    expect(weightAtMoisturePounds(100, 20)).toBe(weightAtMoisturePounds(100, 20, 15.5));
    expect(weightAtMoisturePounds(100, 15.5)).toBe(100);
    expect(weightAtMoisturePounds(84.5, 0)).toBe(100);
    expect(weightAtMoisturePounds(0, 60)).toBe(0);
  });

  it('is refused for weights and moistures that cannot be', () => {
    refusesEach(
      ({ weightPounds, moisturePercent, standardMoisturePercent }) =>
        weightAtMoisturePounds(weightPounds, moisturePercent, standardMoisturePercent),
      { weightPounds: 1, moisturePercent: 60, standardMoisturePercent: 60 },
      { weightPounds: [-1], moisturePercent: [-0.1, 60.1], standardMoisturePercent: [-0.1, 60.1, 100] },
    );
  });

  it('loses by drying what is printed, nothing to its own moisture, and does not gain', () => {
    const { shrink } = published;
    expectWithin(
      moistureShrinkPercent(shrink.moisturePercent, shrink.driedToPercent),
      shrink.expectedPercent,
      shrink.tolerancePercent,
    );
    expect(moistureShrinkPercent(25)).toBe(moistureShrinkPercent(25, 15.5));
    expect(moistureShrinkPercent(20, 20)).toBe(0);
    expect(() => moistureShrinkPercent(14)).toThrow(atField('driedToPercent'));
    expect(() => moistureShrinkPercent(NaN)).toThrow(atField('moisturePercent'));
    expect(() => moistureShrinkPercent(61)).toThrow(atField('moisturePercent'));
  });
});

describe('a harvested strip', () => {
  it('is as large as its length, rows and spacing', () => {
    // 8 rows of 30 in are 20 ft; 20 × 2,178 ft = 43,560 ft², one acre (definition).
    expect(stripAcres({ lengthFeet: 2178, rowsHarvested: 8, rowSpacingInches: 30 })).toBeCloseTo(1, 12);
    expectWithin(stripAcres({ lengthFeet: 600, rowsHarvested: 8, rowSpacingInches: 30 }), 0.2755, 5e-5);
  });

  it('yields its weight at standard moisture in bushels of 56 lb', () => {
    // 9,467.5 lb (Florida AG442) / 56 = 169.06 bu on one acre, twice that on half of it.
    expectWithin(
      stripYieldBushelsPerAcre({ weightPounds: 10_000, moisturePercent: 20, acres: 1 }),
      169.06,
      0.005,
    );
    expectWithin(
      stripYieldBushelsPerAcre({ weightPounds: 10_000, moisturePercent: 20, acres: 0.5 }),
      338.12,
      0.01,
    );
    // 94,118 lb at 15 % (Purdue) on ten acres.
    expectWithin(
      stripYieldBushelsPerAcre({ weightPounds: 100_000, moisturePercent: 20, acres: 10 }, 15),
      94_118 / 560,
      0.001,
    );
  });

  it('is refused with sizes, weights and moistures that cannot be', () => {
    refusesEach(
      stripAcres,
      { lengthFeet: 600, rowsHarvested: 1, rowSpacingInches: 30 },
      { lengthFeet: [0, -1], rowsHarvested: [0, 1.5], rowSpacingInches: [0] },
    );
    refusesEach(
      stripYieldBushelsPerAcre,
      { weightPounds: 0, moisturePercent: 0, acres: 1 },
      { weightPounds: [-1], moisturePercent: [-1, 61], acres: [0, -1] },
    );
  });
});

describe('what late plants cost', () => {
  const asked = {
    differencePounds: { mean: -0.15, lower: -0.25, upper: 0.05 },
    latePlantsPerAcre: 2000,
    priceDollarsPerBushel: 4.1,
  };

  it('is the grain they lack, at the price of corn', () => {
    // By hand: 0.15 / 56 × 410 = 1.098 cents; 0.15 × 2,000 / 56 = 5.357 bu; × 4.10 = $21.96.
    const cost = latePlantCost(asked);
    expectWithin(cost.centsPerLatePlant.mean, 1.098, 0.0005);
    expectWithin(cost.bushelsPerAcre.mean, 5.357, 0.0005);
    expectWithin(cost.dollarsPerAcre.mean, 21.96, 0.005);
  });

  it('keeps the interval, turned round: the deepest loss is its upper end and a gain is below zero', () => {
    const { bushelsPerAcre } = latePlantCost(asked);
    expect(bushelsPerAcre.lower).toBeCloseTo((-0.05 * 2000) / 56, 12);
    expect(bushelsPerAcre.upper).toBeCloseTo((0.25 * 2000) / 56, 12);
    expect(latePlantCost({ ...asked, latePlantsPerAcre: 0 }).dollarsPerAcre).toEqual({
      mean: 0,
      lower: 0,
      upper: 0,
    });
  });

  it('is refused for an interval without its mean, and for numbers that cannot be', () => {
    expect(() =>
      latePlantCost({ ...asked, differencePounds: { mean: -0.3, lower: -0.2, upper: 0 } }),
    ).toThrow(atField('differencePounds'));
    expect(() => latePlantCost({ ...asked, differencePounds: { mean: 0.3, lower: -0.2, upper: 0 } })).toThrow(
      atField('differencePounds'),
    );
    expect(() => latePlantCost({ ...asked, differencePounds: { mean: 0, lower: NaN, upper: 0 } })).toThrow(
      atField('differencePounds'),
    );
    refusesEach(
      (input) => latePlantCost({ ...asked, ...input }),
      { latePlantsPerAcre: 0, priceDollarsPerBushel: 4 },
      { latePlantsPerAcre: [-1], priceDollarsPerBushel: [0] },
    );
  });
});

describe('the cost of equipment', () => {
  it('is 11.13 dollars an acre and 2.71 bushels for 12 rows at $6,900, 620 acres and $4.10', () => {
    // By hand: 6,900 / 620 = 11.129; / 4.10 = 2.7144.
    const perAcre = equipmentCostPerAcre(6900, 620);
    expectWithin(perAcre, 11.129, 0.0005);
    expectWithin(breakEvenBushelsPerAcre(perAcre, 4.1), 2.7144, 0.00005);
    expect(breakEvenBushelsPerAcre(0, 4.1)).toBe(0);
  });

  it.each(Object.entries(fromR.recovery))(
    'is paid off by the share that pays a dollar down year by year: %s',
    (_, { interest, years, share }) => {
      expectWithin(capitalRecoveryShare(interest, years), share, 1e-10);
    },
  );

  it('is paid off without a jump where interest vanishes', () => {
    expect(capitalRecoveryShare(0, 8)).toBe(0.125);
    expectWithin(capitalRecoveryShare(1e-12, 8), 0.125, 1e-12);
  });

  it('of each year is what is lost and the interest on what is left, as in ASABE EP496', () => {
    const { annualCost: cost } = published;
    const figured = annualEquipmentCost(cost);
    expect(capitalRecoveryShare(cost.interestShare, cost.years) / cost.expectedShare).toBeCloseTo(1, 10);
    expect(figured.dollarsPerYear / cost.expectedDollarsPerYear).toBeCloseTo(1, 10);
    expect(figured.dollarsPerAcre / cost.expectedDollarsPerAcre).toBeCloseTo(1, 10);
    const acres = acresToOwn(figured.dollarsPerYear, cost.upkeepDollarsPerAcre, cost.againstDollarsPerAcre);
    expect(acres).toEqual({ kind: 'acres', acresPerYear: expect.closeTo(cost.expectedAcres, 6) });
  });

  it('is not earned back on any acres where upkeep costs as much as hiring', () => {
    expect(acresToOwn(2000, 3, 3)).toEqual({ kind: 'none' });
    expect(acresToOwn(2000, 4, 3)).toEqual({ kind: 'none' });
  });

  it('leaves the share of the list price that is printed, and loses the rest of the price paid', () => {
    const { remainingValue: printed } = published;
    const figured = remainingValue(printed.listDollars, printed.paidDollars, printed.remainingShare);
    expectWithin(figured.remainingDollars, printed.expectedRemainingDollars, printed.toleranceDollars);
    expectWithin(figured.lostDollars, printed.expectedLostDollars, printed.toleranceDollars);
    expect(remainingValue(100, 10, 0.5)).toEqual({ remainingDollars: 50, lostDollars: -40 });
  });

  it('is refused with numbers that cannot be', () => {
    refusesEach(
      ({ costDollars, acresPerYear }) => equipmentCostPerAcre(costDollars, acresPerYear),
      { costDollars: 0, acresPerYear: 1 },
      { costDollars: [-1], acresPerYear: [0] },
    );
    refusesEach(
      ({ costDollarsPerAcre, priceDollarsPerBushel }) =>
        breakEvenBushelsPerAcre(costDollarsPerAcre, priceDollarsPerBushel),
      { costDollarsPerAcre: 0, priceDollarsPerBushel: 1 },
      { costDollarsPerAcre: [-1], priceDollarsPerBushel: [0] },
    );
    refusesEach(
      ({ interestShare, years }) => capitalRecoveryShare(interestShare, years),
      { interestShare: 1, years: 100 },
      { interestShare: [-0.01, 1.01], years: [0, 1.5, 101] },
    );
    refusesEach(
      annualEquipmentCost,
      {
        priceDollars: 100,
        remainingValueDollars: 100,
        years: 1,
        interestShare: 0,
        acresPerYear: 1,
        upkeepDollarsPerAcre: 0,
      },
      {
        priceDollars: [-1],
        remainingValueDollars: [-1, 101],
        acresPerYear: [0],
        upkeepDollarsPerAcre: [-1],
        years: [0],
        interestShare: [2],
      },
    );
    refusesEach(
      ({ dollarsPerYear, upkeepDollarsPerAcre, againstDollarsPerAcre }) =>
        acresToOwn(dollarsPerYear, upkeepDollarsPerAcre, againstDollarsPerAcre),
      { dollarsPerYear: 0, upkeepDollarsPerAcre: 0, againstDollarsPerAcre: 1 },
      { dollarsPerYear: [-1], upkeepDollarsPerAcre: [-1], againstDollarsPerAcre: [0] },
    );
    refusesEach(
      ({ listDollars, paidDollars, remainingShare }) =>
        remainingValue(listDollars, paidDollars, remainingShare),
      { listDollars: 1, paidDollars: 1, remainingShare: 1 },
      { listDollars: [0], paidDollars: [0], remainingShare: [-0.1, 1.1] },
    );
  });
});

describe('what an investment is worth today', () => {
  it.each(Object.entries(fromR.worth))(
    'is every payment discounted on its own: %s',
    (_, { cost, yearly, left, years, interest, value }) => {
      const figured = netPresentValueDollars({
        costDollars: cost,
        returnDollarsPerYear: yearly,
        remainingValueDollars: left,
        years,
        interestShare: interest,
      });
      expectWithin(figured, value, 1e-7);
    },
  );

  it('is nothing where the yearly return is the cost paid off with interest', () => {
    const worth = netPresentValueDollars({
      costDollars: 1000,
      returnDollarsPerYear: 1000 * capitalRecoveryShare(0.06, 10),
      remainingValueDollars: 0,
      years: 10,
      interestShare: 0.06,
    });
    expectWithin(worth, 0, 1e-9);
  });

  it('is refused with numbers that cannot be', () => {
    refusesEach(
      netPresentValueDollars,
      { costDollars: 0, returnDollarsPerYear: -5, remainingValueDollars: 0, years: 1, interestShare: 1 },
      { costDollars: [-1], remainingValueDollars: [-1], years: [0, 2.5, 101], interestShare: [-0.1, 1.1] },
    );
  });
});

describe('adjusting row by row', () => {
  const asked = {
    rowUnits: 12,
    minutesPerRowUnit: 4,
    minutesPerChangeFromCab: 2,
    changesPerYear: 6,
    wageDollarsPerHour: 22,
    people: 1,
  };

  it('takes minutes for every row unit at every change, and from the cab for every change', () => {
    // By hand: 12 × 4 × 6 = 288 min, 4.8 h, $105.60; 2 × 6 = 12 min, 0.2 h, $4.40.
    const labor = adjustmentLabor(asked);
    expect(labor.rowByRow.hoursPerYear).toBeCloseTo(4.8, 12);
    expect(labor.rowByRow.dollarsPerYear).toBeCloseTo(105.6, 10);
    expect(labor.fromCab.hoursPerYear).toBeCloseTo(0.2, 12);
    expect(labor.fromCab.dollarsPerYear).toBeCloseTo(4.4, 10);
    expect(labor.saved.hoursPerYear).toBeCloseTo(4.6, 12);
    expect(labor.saved.dollarsPerYear).toBeCloseTo(101.2, 10);
  });

  it('pays everyone who works on it for the same hours, and saves nothing where the cab is slower', () => {
    const two = adjustmentLabor({ ...asked, people: 2 });
    expect(two.rowByRow).toEqual({
      hoursPerYear: expect.closeTo(4.8, 12),
      dollarsPerYear: expect.closeTo(211.2, 10),
    });
    expect(adjustmentLabor({ ...asked, minutesPerChangeFromCab: 60 }).saved.hoursPerYear).toBeCloseTo(
      -1.2,
      12,
    );
    expect(adjustmentLabor({ ...asked, changesPerYear: 0 }).saved).toEqual({
      hoursPerYear: 0,
      dollarsPerYear: 0,
    });
  });

  it('is refused with numbers that cannot be', () => {
    refusesEach(adjustmentLabor, asked, {
      rowUnits: [0, 1.5],
      minutesPerRowUnit: [-1],
      minutesPerChangeFromCab: [-1],
      changesPerYear: [-1, 0.5],
      wageDollarsPerHour: [-1],
      people: [0, 1.5],
    });
    expect(() =>
      adjustmentLabor({
        rowUnits: 1,
        minutesPerRowUnit: 0,
        minutesPerChangeFromCab: 0,
        changesPerYear: 0,
        wageDollarsPerHour: 0,
        people: 1,
      }),
    ).not.toThrow();
  });
});
