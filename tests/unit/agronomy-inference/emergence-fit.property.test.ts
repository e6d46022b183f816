import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { emergenceFit } from '@/lib/agronomy/inference/emergence-fit';
import { emergenceShapes } from '@/lib/agronomy/inference/emergence-shape';
import { seenBetween } from '@/lib/agronomy/seen-between';

const counts = fc
  .tuple(fc.integer({ min: 4, max: 12 }), fc.array(fc.integer({ min: 0, max: 12 }), { minLength: 3, maxLength: 10 }))
  .map(([first, fresh]) => fresh.map((_, index) => ({ days: first + index, plantsUp: fresh.slice(0, index + 1).reduce((sum, each) => sum + each, 0) })));

describe('a smooth curve', () => {
  it('settles on whatever was counted, or says that it does not; it never runs away', () => {
    fc.assert(
      fc.property(counts, fc.constantFrom(...emergenceShapes), fc.constantFrom('emerged', 'seeds', 'seeds-with-final-share'), (visits, shape, basis) => {
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
      { numRuns: 150, seed: 20_260_507 },
    );
  });
});
