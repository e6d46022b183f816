import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { changingHours } from '../../../lib/agronomy/changing-hours';
import { ImpossibleInput } from '../../../lib/agronomy/outcome';
import { splitPlanterLayout } from '../../../lib/agronomy/split-planter-layout';

const plan = { settings: ['A', 'B'], passes: 4, seed: 1 };

describe('splitPlanterLayout', () => {
  it('keeps each setting on its half and alternates the direction, so that it lies by turns on either side', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 2, max: 40 }),
        fc.integer({ min: 0, max: 4_294_967_295 }),
        (passes, seed) => {
          const laid = splitPlanterLayout({ ...plan, passes, seed });
          expect(splitPlanterLayout({ ...plan, passes, seed })).toEqual(laid);
          expect([laid.leftHalf, laid.rightHalf].sort()).toEqual(['A', 'B']);
          laid.passes.forEach((pass, index) => {
            expect(pass.direction).toBe(index % 2 === 0 ? 'out' : 'back');
            expect(pass.strips[0]?.half).toBe(index % 2 === 0 ? 'left' : 'right');
            for (const { half, setting } of pass.strips) {
              expect(setting).toBe(half === 'left' ? laid.leftHalf : laid.rightHalf);
            }
          });
          expect(laid.passes.flatMap((pass) => pass.strips.map((each) => each.stripNumber))).toEqual(
            Array.from({ length: 2 * passes }, (_, index) => index + 1),
          );
          expect(laid.isBalanced).toBe(passes % 2 === 0);
        },
      ),
      { numRuns: 60 },
    );
  });

  it('lays four passes A B, B A, A B, B A, or all of them the other way round', () => {
    const order = (seed: number) =>
      splitPlanterLayout({ ...plan, seed })
        .passes.map((pass) => pass.strips.map((each) => each.setting).join(' '))
        .join(', ');
    const orders = new Set(Array.from({ length: 40 }, (_, seed) => order(seed)));
    expect([...orders].sort()).toEqual(['A B, B A, A B, B A', 'B A, A B, B A, A B']);
  });

  it('says that setting and row unit are mixed and that chance shows nothing', () => {
    expect(splitPlanterLayout(plan)).toMatchObject({
      design: 'split-planter',
      settingAndRowUnitMixed: true,
      smallestAttainableP: 1,
    });
  });

  it.each([
    ['one setting', { settings: ['A'] }, 'settings'],
    ['three settings', { settings: ['A', 'B', 'C'] }, 'settings'],
    ['the same setting on both halves', { settings: ['A', 'A'] }, 'settings'],
    ['one pass', { passes: 1 }, 'passes'],
    ['2.5 passes', { passes: 2.5 }, 'passes'],
    ['41 passes', { passes: 41 }, 'passes'],
    ['passes that are no number', { passes: Number.NaN }, 'passes'],
    ['a seed out of range', { seed: -1 }, 'seed'],
  ])('refuses %s and names the field', (_, change, field) => {
    expect(() => splitPlanterLayout({ ...plan, ...change })).toThrow(ImpossibleInput);
    expect(() => splitPlanterLayout({ ...plan, ...change })).toThrow(expect.objectContaining({ field }));
  });
});

describe('changingHours', () => {
  it('counts a change wherever two strips in turn differ', () => {
    expect(changingHours(['A', 'B', 'B', 'A'], 45)).toEqual({ changes: 2, hours: 1.5 });
    expect(changingHours([], 45)).toEqual({ changes: 0, hours: 0 });
    expect(changingHours(['A'], 45)).toEqual({ changes: 0, hours: 0 });
  });

  it('refuses minutes that cannot be', () => {
    expect(() => changingHours(['A', 'B'], -1)).toThrow(ImpossibleInput);
    expect(() => changingHours(['A', 'B'], Number.NaN)).toThrow(ImpossibleInput);
  });
});
