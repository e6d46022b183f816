import { describe, expect, it } from 'vitest';
import { digQuestions } from '@/lib/schemas/dig-questions';

const row = { label: 'S1-1', planted: { on: '2026-05-07', at: null } };
const counted = (...plants: number[]) => plants.map((plantsUp, index) => ({ visitedOn: `2026-05-${15 + index}`, visitedAt: null, plantsUp, used: true }));
const asked = (where: 'in-sample' | 'twin-length', counts: ReturnType<typeof counted>) => digQuestions(row, { where, visitedOn: '2026-05-20' }, counts).map(({ rule, about }) => [rule, about]);

describe('a dig', () => {
  it('inside the measured length is asked about while plants may still come', () => {
    const question = [['dig-before-counting-ended', 'S1-1, 20 May 2026']];
    expect(asked('in-sample', [])).toEqual(question);
    expect(asked('in-sample', counted(20, 22, 22))).toEqual(question);
    expect(asked('in-sample', counted(20, 22, 24, 24))).toEqual(question);
  });

  it('is not asked about after two visits with nothing new, nor in the twin length', () => {
    expect(asked('in-sample', counted(20, 22, 22, 22))).toEqual([]);
    expect(asked('twin-length', [])).toEqual([]);
  });

  it('does not take a second person’s count of the same visit for a visit of its own', () => {
    const twice = [...counted(20, 22, 22), { visitedOn: '2026-05-17', visitedAt: null, plantsUp: 22, used: false }];
    expect(asked('in-sample', twice)).toHaveLength(1);
  });
});
