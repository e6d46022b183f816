import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ACRES_PER_HECTARE, CENTIMETERS_PER_INCH } from '@/lib/agronomy/constants';
import { degreeDaysCelsius, degreeDaysFahrenheit } from '@/lib/agronomy/degree-days';
import { emergenceCurve } from '@/lib/agronomy/emergence-curve';
import { standInterval } from '@/lib/agronomy/inference/stand-interval';
import { kachmanSmith } from '@/lib/agronomy/kachman-smith';
import { emergenceSpread } from '@/lib/agronomy/emergence-spread';
import { timingPoints } from '@/lib/agronomy/score';
import { spacingsInches, spacingVariation } from '@/lib/agronomy/spacing';
import { plantsPerAcre, plantsPerHectare, rowAreaAcres } from '@/lib/agronomy/stand';
import { weightAtMoisturePounds } from '@/lib/agronomy/weight-at-moisture';
import { answerOf } from './answer-of';

const runs = { numRuns: 200, seed: 20_260_507 };
const places = fc.array(fc.integer({ min: 0, max: 400 }), { minLength: 3, maxLength: 40 }).map((each) => [...each].map((half) => half / 2).sort((a, b) => a - b)).filter((each) => (each[0] ?? 0) < (each[each.length - 1] ?? 0));
const variationOf = (inches: readonly number[]) => {
  const { spacingInchesMean: mean, spacingInchesSd: sd, spacingCv } = answerOf(spacingVariation(spacingsInches(inches)));
  return { mean, sd, cv: answerOf(spacingCv) };
};

describe('a row of plants', () => {
  it('varies the same wherever the tape begins', () => {
    fc.assert(fc.property(places, fc.integer({ min: 0, max: 500 }), (row, by) => {
      const [here, there] = [variationOf(row), variationOf(row.map((place) => place + by))];
      expect(there.sd).toBeCloseTo(here.sd, 9);
      expect(there.cv).toBeCloseTo(here.cv, 9);
    }), runs);
  });

  it('stretched by k has k times the mean and the SD, and the CV it had', () => {
    fc.assert(fc.property(places, fc.constantFrom(0.5, 2, CENTIMETERS_PER_INCH, 3), (row, k) => {
      const [here, there] = [variationOf(row), variationOf(row.map((place) => place * k))];
      expect(there.mean).toBeCloseTo(k * here.mean, 8);
      expect(there.sd).toBeCloseTo(k * here.sd, 8);
      expect(there.cv).toBeCloseTo(here.cv, 9);
    }), runs);
  });

  it('read from its other end is the same row', () => {
    fc.assert(fc.property(places, fc.integer({ min: 3, max: 12 }), (row, theoreticalSpacingInches) => {
      const end = row[row.length - 1] ?? 0;
      const mirrored = [...row].reverse().map((place) => end - place);
      expect(variationOf(mirrored).sd).toBeCloseTo(variationOf(row).sd, 9);
      const placement = (inches: readonly number[]) => answerOf(kachmanSmith([{ spacingsInches: spacingsInches(inches), theoreticalSpacingInches }])).regions;
      expect(placement(mirrored)).toEqual(placement(row));
    }), runs);
  });

  it('has every spacing in one region, by whichever way of counting', () => {
    fc.assert(fc.property(places, (row) => {
      const { ofSpacings, ofPlaces, regions, spacings } = answerOf(kachmanSmith([{ spacingsInches: spacingsInches(row), theoreticalSpacingInches: 6.15 }]));
      expect(regions.reduce((sum, each) => sum + each, 0)).toBe(spacings);
      for (const shares of [ofSpacings, ofPlaces]) expect(shares.multiplesShare + shares.singlesShare + shares.missesShare).toBeCloseTo(1, 9);
    }), runs);
  });
});

describe('a stand', () => {
  const sample = fc.record({ plantsHeld: fc.integer({ min: 1, max: 60 }), lengthInches: fc.integer({ min: 100, max: 400 }) });

  it('of merged row samples is all their plants over all their ground', () => {
    fc.assert(fc.property(fc.array(sample, { minLength: 2, maxLength: 8 }), (samples) => {
      const units = samples.map(({ plantsHeld, lengthInches }) => ({ plantsHeld, areaAcres: rowAreaAcres(lengthInches, 30) }));
      const plants = samples.reduce((sum, { plantsHeld }) => sum + plantsHeld, 0);
      const length = samples.reduce((sum, { lengthInches }) => sum + lengthInches, 0);
      expect(answerOf(standInterval(units, 'row-samples')).plantsPerAcre).toBeCloseTo(plantsPerAcre({ plantsHeld: plants, lengthInches: length, rowSpacingInches: 30 }), 6);
    }), runs);
  });

  it('comes back the same from other units', () => {
    fc.assert(fc.property(fc.integer({ min: 1, max: 60_000 }), (acre) => {
      expect(plantsPerHectare(acre) / ACRES_PER_HECTARE).toBeCloseTo(acre, 8);
    }), runs);
    fc.assert(fc.property(fc.integer({ min: -10, max: 45 }), fc.integer({ min: 0, max: 20 }), (low, more) => {
      const fahrenheit = (celsius: number) => (celsius * 9) / 5 + 32;
      expect(degreeDaysFahrenheit(fahrenheit(low + more), fahrenheit(low))).toBeCloseTo(1.8 * degreeDaysCelsius(low + more, low), 9);
    }), runs);
    fc.assert(fc.property(fc.double({ min: 1, max: 50_000, noNaN: true }), fc.double({ min: 0, max: 40, noNaN: true }), (pounds, moisture) => {
      expect(weightAtMoisturePounds(weightAtMoisturePounds(pounds, moisture, 15.5), 15.5, moisture)).toBeCloseTo(pounds, 6);
    }), runs);
  });
});

describe('the timing score', () => {
  it('never rises when a plant that came up after half were up comes up later still', () => {
    const fresh = fc.array(fc.integer({ min: 0, max: 9 }), { minLength: 5, maxLength: 12 });
    fc.assert(fc.property(fresh, fc.nat(), fc.nat(), (perVisit, which, later) => {
      const plants = [0, ...perVisit];
      const total = plants.reduce((sum, each) => sum + each, 0);
      const cumulated = (each: readonly number[]) => each.map((_, index) => each.slice(0, index + 1).reduce((sum, more) => sum + more, 0));
      const up = cumulated(plants);
      // Visits by which more than half had been up already, so that their plants came after that.
      const late = plants.flatMap((found, index) => (found > 0 && (up[index - 1] ?? 0) >= total / 2 && index < plants.length - 1 ? [index] : []));
      const from = late[which % Math.max(1, late.length)];
      if (from === undefined) return;
      const to = from + 1 + (later % (plants.length - 1 - from));
      const moved = plants.map((found, index) => found - (index === from ? 1 : 0) + (index === to ? 1 : 0));
      const points = (each: readonly number[]) => {
        const curve = answerOf(emergenceCurve(cumulated(each).map((plantsUp, index) => ({ days: 8 + index, plantsUp }))));
        const spread = emergenceSpread(curve);
        return spread.kind === 'value' ? timingPoints({ amount: spread.value.days, unit: 'days', bound: spread.value.bound }).points : null;
      };
      const [before, after] = [points(plants), points(moved)];
      if (before !== null && after !== null) expect(after).toBeLessThanOrEqual(before + 1e-9);
    }), { ...runs, numRuns: 500 });
  });
});
