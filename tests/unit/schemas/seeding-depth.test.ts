import { describe, expect, it } from 'vitest';
import { parseSeedingDepth } from '@/lib/schemas/seeding-depth';

describe('a seeding depth as typed', () => {
  it.each([
    ['1 3/4', 'in', 1_750],
    ['2', 'in', 2_000],
    ['2¼', 'in', 2_250],
    ['0', 'in', 0],
    ['6', 'in', 6_000],
    ['4,5', 'cm', 4_500],
    // Six inches are 15.24 cm exactly.
    ['15.24', 'cm', 15_240],
  ] as const)('%s %s is kept exactly, with what was typed', (typed, unit, thousandths) => {
    expect(parseSeedingDepth(typed, unit)).toEqual({ ok: true, reading: { typed, unit, thousandths } });
  });

  it.each([['6.01', 'in'], ['15.25', 'cm'], ['-1', 'in'], ['5 cm', 'in'], ['2 in', 'cm'], ['deep', 'in'], ['', 'cm']] as const)('"%s" in %s is refused with a sentence', (typed, unit) => {
    const parsed = parseSeedingDepth(typed, unit);
    expect(parsed.ok ? '' : parsed.message).toMatch(/\.$/);
  });
});
