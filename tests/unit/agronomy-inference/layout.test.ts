import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { layout, smallestAttainableP } from '../../../lib/agronomy/layout';
import { ImpossibleInput } from '../../../lib/agronomy/outcome';

describe('layout', () => {
  it('puts every setting once into every block, numbered on in field order', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 2, max: 8 }),
        fc.integer({ min: 1, max: 8 }),
        fc.integer({ min: 0, max: 4_294_967_295 }),
        (settingCount, blocks, seed) => {
          const settings = Array.from({ length: settingCount }, (_, index) => `setting ${index}`);
          const laid = layout({ settings, blocks, seed });
          expect(laid.blocks).toHaveLength(blocks);
          for (const block of laid.blocks) {
            expect(block.strips.map((strip) => strip.setting).sort()).toEqual([...settings].sort());
          }
          expect(laid.blocks.flatMap((block) => block.strips.map((strip) => strip.stripNumber))).toEqual(
            Array.from({ length: settingCount * blocks }, (_, index) => index + 1),
          );
          expect(layout({ settings, blocks, seed })).toEqual(laid);
        },
      ),
      { numRuns: 60 },
    );
  });

  it('does not repeat one order through all blocks of a long trial', () => {
    const laid = layout({ settings: ['A', 'B', 'C', 'D'], blocks: 6, seed: 5 });
    expect(
      new Set(laid.blocks.map((block) => block.strips.map((strip) => strip.setting).join())).size,
    ).toBeGreaterThan(1);
  });

  it('puts each of two settings first about half the time over seeds', () => {
    let first = 0;
    for (let seed = 0; seed < 4000; seed += 1) {
      if (layout({ settings: ['A', 'B'], blocks: 1, seed }).blocks[0]?.strips[0]?.setting === 'A') first += 1;
    }
    // Four standard deviations of 4,000 even tosses are 126.
    expect(Math.abs(first - 2000)).toBeLessThan(126);
  });

  it('calls two settings pairs and more of them blocks', () => {
    expect(layout({ settings: ['A', 'B'], blocks: 4, seed: 1 }).design).toBe('pairs');
    expect(layout({ settings: ['A', 'B', 'C'], blocks: 4, seed: 1 }).design).toBe('complete-blocks');
  });

  it.each([
    ['one setting', ['A'], 4, 'settings'],
    ['a repeated setting', ['A', 'A'], 4, 'settings'],
    ['25 settings', Array.from({ length: 25 }, (_, index) => String(index)), 4, 'settings'],
    ['no block', ['A', 'B'], 0, 'blocks'],
    ['two and a half blocks', ['A', 'B'], 2.5, 'blocks'],
  ])('refuses %s and names the field', (_, settings, blocks, field) => {
    try {
      layout({ settings, blocks, seed: 1 });
      expect.unreachable();
    } catch (error) {
      expect(error).toBeInstanceOf(ImpossibleInput);
      expect((error as ImpossibleInput).field).toBe(field);
    }
  });
});

describe('smallestAttainableP', () => {
  // Two settings in 4, 5, 6 blocks: 2 of 2^b arrangements, by counting.
  it.each([
    [2, 4, 0.125],
    [2, 5, 0.0625],
    [2, 6, 0.03125],
    [3, 4, 6 / 1296],
    [4, 4, 24 / 331_776],
    [4, 1, 1],
  ])('is, for %d settings in %d blocks, %d', (settingCount, blockCount, expected) => {
    expect(smallestAttainableP(settingCount, blockCount)).toBeCloseTo(expected, 12);
  });
});
