import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { emergenceFit } from '@/lib/agronomy/inference/emergence-fit';
import { emergenceLikelihood } from '@/lib/agronomy/inference/emergence-likelihood';
import { emergenceShapes } from '@/lib/agronomy/inference/emergence-shape';
import { seenBetween } from '@/lib/agronomy/seen-between';

const counts = fc
  .tuple(fc.integer({ min: 4, max: 12 }), fc.array(fc.integer({ min: 0, max: 12 }), { minLength: 3, maxLength: 10 }))
  .map(([first, fresh]) => fresh.map((_, index) => ({ days: first + index, plantsUp: fresh.slice(0, index + 1).reduce((sum, each) => sum + each, 0) })));

describe('a smooth curve', () => {
  it('settles on whatever was counted, or says that it does not; it never runs away', () => {
    fc.assert(
      fc.property(counts, fc.constantFrom(...emergenceShapes), fc.constantFrom('emerged', 'emerged-by-last-visit', 'seeds', 'seeds-with-final-share'), (visits, shape, basis) => {
        const seen = seenBetween(visits, 60);
        if (seen.kind === 'insufficient') return;
        const fit = emergenceFit(seen.value, shape, basis as 'emerged');
        if (fit.kind === 'insufficient') {
          expect(['too-few-intervals', 'fit-does-not-settle']).toContain(fit.reason);
          return;
        }
        const { daysTo10, daysTo50, daysTo90 } = fit.value;
        expect(daysTo10.estimate).toBeLessThan(daysTo50.estimate);
        expect(daysTo50.estimate).toBeLessThan(daysTo90.estimate);
        for (const each of [daysTo10, daysTo50, daysTo90, fit.value.spreadDays]) expect(Number.isFinite(each.estimate) && each.standardError > 0).toBe(true);
      }),
      { numRuns: 80, seed: 20_260_507 },
    );
  });

  const few = fc.array(fc.integer({ min: 1, max: 30 }), { minLength: 4, maxLength: 8 }).map((plants) => plants.map((each, index) => ({ afterDays: 5 + index, byDays: 6 + index, plants: each })));

  it('keeps its place and narrows its errors by the root when every count is multiplied', () => {
    fc.assert(
      fc.property(few, fc.constantFrom(...emergenceShapes), fc.integer({ min: 2, max: 5000 }), (seen, shape, times) => {
        const one = emergenceFit(seen, shape);
        const many = emergenceFit(seen.map((each) => ({ ...each, plants: each.plants * times })), shape);
        if (one.kind === 'insufficient' || many.kind === 'insufficient') return expect(one.kind).toBe('insufficient');
        expect(many.value.daysTo50.estimate / one.value.daysTo50.estimate).toBeCloseTo(1, 5);
        expect((many.value.spreadDays.standardError * Math.sqrt(times)) / one.value.spreadDays.standardError).toBeCloseTo(1, 3);
      }),
      { numRuns: 60, seed: 20_260_507 },
    );
  });

  it('in another unit of time is the same curve', () => {
    fc.assert(
      fc.property(few, fc.constantFrom(...emergenceShapes), fc.double({ min: 0.05, max: 200, noNaN: true }), (seen, shape, times) => {
        const days = emergenceFit(seen, shape);
        const others = emergenceFit(seen.map((each) => ({ ...each, afterDays: each.afterDays * times, byDays: each.byDays * times })), shape);
        if (days.kind === 'insufficient' || others.kind === 'insufficient') return expect(others.kind).toBe(days.kind);
        expect(others.value.daysTo90.estimate / days.value.daysTo90.estimate / times).toBeCloseTo(1, 6);
        expect(others.value.scale.standardError / days.value.scale.standardError).toBeCloseTo(1, 4);
        expect(others.value.logLikelihood).toBeCloseTo(days.value.logLikelihood, 6);
      }),
      { numRuns: 60, seed: 20_260_507 },
    );
  });

  it('settles with one plant as far from the others as may be, and no curve beside it is likelier', () => {
    fc.assert(
      fc.property(few, fc.constantFrom(...emergenceShapes), fc.integer({ min: 20, max: 300 }), fc.integer({ min: 1, max: 200 }), (near, shape, far, times) => {
        const seen = [...near.map((each) => ({ ...each, plants: each.plants * times })), { afterDays: far, byDays: far + 1, plants: 1 }];
        const fit = emergenceFit(seen, shape);
        if (fit.kind === 'insufficient') throw new Error(fit.had);
        const { location, scale, logLikelihood } = fit.value;
        for (const [up, wider] of [[1, 1], [-1, 1], [0, 1.01], [0, 0.99]] as const) {
          const beside = { location: location.estimate + up * 0.3 * location.standardError, scale: scale.estimate * wider, finalShareLogit: null };
          expect(emergenceLikelihood(seen, shape, beside, null)).toBeLessThan(logLikelihood);
        }
      }),
      { numRuns: 100, seed: 20_260_507 },
    );
  });
});
