import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { cutRow } from '../../../lib/agronomy/cut-row';
import { rowSamplesNeeded } from '../../../lib/agronomy/inference/row-samples-needed';
import { standDispersion } from '../../../lib/agronomy/inference/stand-dispersion';
import { standInterval } from '../../../lib/agronomy/inference/stand-interval';
import { studentQuantile } from '../../../lib/agronomy/inference/student-t';
import { plantsPerAcre } from '../../../lib/agronomy/stand';
import { answerOf } from '../agronomy/answer-of';

const counts = fc.array(fc.integer({ min: 20, max: 60 }), { minLength: 2, maxLength: 12 });
const unitsOf = (plants: readonly number[], areaAcres = 0.001) =>
  plants.map((plantsHeld) => ({ plantsHeld, areaAcres }));

describe('whatever was counted', () => {
  test('a cut row has the stand it would have had uncut between marks', () => {
    const pieces = fc.array(fc.tuple(fc.integer({ min: 1, max: 400 }), fc.nat(60)), {
      minLength: 1,
      maxLength: 8,
    });
    fc.assert(
      fc.property(pieces, (each) => {
        const segments = each.map(([lengthInches, plantsUp]) => ({
          lengthInches,
          plantsUp,
          plantsDoubtful: 0,
          startEnd: 'mark' as const,
          farEnd: 'mark' as const,
        }));
        const whole = {
          lengthInches: each.reduce((sum, [length]) => sum + length, 0),
          plantsHeld: each.reduce((sum, [, up]) => sum + up, 0),
          rowSpacingInches: 30,
        };
        const cut = plantsPerAcre({ ...answerOf(cutRow(segments)), rowSpacingInches: 30 });
        expect(cut).toBeCloseTo(plantsPerAcre(whole), 6);
      }),
    );
  });

  test('a dispersion has a p of 0 to 1, and does not ask in which order places were counted', () => {
    fc.assert(
      fc.property(counts, (plants) => {
        const forward = answerOf(standDispersion(unitsOf(plants)));
        const backward = answerOf(standDispersion(unitsOf([...plants].reverse())));
        const { p } = answerOf(forward.test);
        expect(p).toBeGreaterThanOrEqual(0);
        expect(p).toBeLessThanOrEqual(1);
        expect(backward.index).toBeCloseTo(forward.index, 9);
      }),
      { numRuns: 50 },
    );
  });

  test('a stand on half the area is twice as dense, and so is its interval', () => {
    fc.assert(
      fc.property(counts, (plants) => {
        const wide = answerOf(standInterval(unitsOf(plants, 0.001), 'row-samples'));
        const narrow = answerOf(standInterval(unitsOf(plants, 0.0005), 'row-samples'));
        expect(narrow.plantsPerAcre).toBeCloseTo(2 * wide.plantsPerAcre, 5);
        expect(answerOf(narrow.interval).plantsPerAcreUpper).toBeCloseTo(
          2 * answerOf(wide.interval).plantsPerAcreUpper,
          5,
        );
      }),
      { numRuns: 50 },
    );
  });

  test('the row samples needed are the smallest number that does', () => {
    const does = (count: number, cv: number, within: number) =>
      count >= ((studentQuantile(0.975, count - 1) * cv) / within) ** 2;
    fc.assert(
      fc.property(
        fc.double({ min: 0.01, max: 0.8, noNaN: true }),
        fc.double({ min: 0.03, max: 0.5, noNaN: true }),
        (cv, within) => {
          const needed = rowSamplesNeeded(cv, within);
          expect(does(needed, cv, within)).toBe(true);
          expect(needed === 2 || !does(needed - 1, cv, within)).toBe(true);
        },
      ),
      { numRuns: 60 },
    );
  });
});
