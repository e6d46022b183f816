import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { upperTailF } from '../../../lib/agronomy/inference/f-distribution';
import { normalCdf } from '../../../lib/agronomy/inference/normal-cdf';
import { studentQuantile, studentTwoSidedP } from '../../../lib/agronomy/inference/student-t';
import {
  studentizedRangeQuantile,
  studentizedRangeUpperTail,
} from '../../../lib/agronomy/inference/studentized-range';
import { ImpossibleInput } from '../../../lib/agronomy/outcome';

function rows(file: string): string[][] {
  const url = new URL(`../../reference/${file}`, import.meta.url);
  return readFileSync(url, 'utf8')
    .trim()
    .split('\n')
    .slice(1)
    .map((line) => line.split(','));
}

/** The largest relative distance between what is computed and what the file says. */
function farthest(lines: string[][], computed: (numbers: number[]) => number): number {
  return Math.max(
    ...lines.map((line) => {
      const numbers = line.map(Number);
      const expected = numbers[numbers.length - 1] as number;
      return Math.abs(computed(numbers) - expected) / Math.abs(expected);
    }),
  );
}

describe('t and F', () => {
  const table = rows('t-and-f-distributions.csv');
  const of = (name: string) => {
    const lines = table.filter((line) => line[0] === name);
    expect(lines.length).toBeGreaterThan(50);
    return lines;
  };
  // R 4.2.2 prints 15 digits; relative tolerance 1e-11.
  it('agree with R on the quantiles of t', () => {
    expect(
      farthest(of('qt'), ([, share, df]) => studentQuantile(share as number, df as number)),
    ).toBeLessThan(1e-11);
  });
  it('agree with R on the upper tail of t', () => {
    const tail = ([, t, df]: number[]) => studentTwoSidedP(t as number, df as number) / 2;
    expect(farthest(of('pt_upper'), tail)).toBeLessThan(1e-11);
  });
  it('agree with R on the upper tail of F, down to 1e-7 and less', () => {
    const tail = ([, ratio, first, second]: number[]) =>
      upperTailF(ratio as number, first as number, second as number);
    expect(farthest(of('pf_upper'), tail)).toBeLessThan(1e-11);
  });
  it('refuse what cannot be', () => {
    expect(() => studentQuantile(1, 3)).toThrow(ImpossibleInput);
    expect(() => studentTwoSidedP(1, 0)).toThrow(ImpossibleInput);
    expect(() => upperTailF(-1, 2, 3)).toThrow(ImpossibleInput);
  });
});

describe('normalCdf', () => {
  // Printed tables (Abramowitz & Stegun 26.1), 15 places.
  it.each([
    [0, 0.5],
    [1, 0.841344746068543],
    [-1, 0.158655253931457],
    [2, 0.977249868051821],
    [3, 0.99865010196837],
  ])('of %d is %d', (x, expected) => {
    expect(normalCdf(x)).toBeCloseTo(expected, 14);
  });
});

describe('the studentized range', () => {
  it('agrees with the quadrature tables on its quantiles', () => {
    // Relative tolerance 1e-10: the adaptive quadrature behind the table claims no more.
    const computed = ([share, groups, df]: number[]) =>
      studentizedRangeQuantile(1 - (share as number), groups as number, df as number);
    expect(farthest(rows('studentized-range-quantiles.csv'), computed)).toBeLessThan(1e-10);
  });

  it('agrees with the quadrature tables on its probabilities', () => {
    // Absolute tolerance 1e-10.
    const worst = Math.max(
      ...rows('studentized-range-cdf.csv').map((line) => {
        const [q, groups, df, p] = line.map(Number) as [number, number, number, number];
        return Math.abs(1 - studentizedRangeUpperTail(q, groups, df) - p);
      }),
    );
    expect(worst).toBeLessThan(1e-10);
  });

  it('is √2 × t for two groups, also where common routines are off', () => {
    for (const df of [1, 2, 3, 4, 7, 30, 500]) {
      expect(studentizedRangeQuantile(0.05, 2, df) / (Math.SQRT2 * studentQuantile(0.975, df))).toBeCloseTo(
        1,
        10,
      );
    }
  });

  it('takes at most 2 ms a pair for the largest comparison', () => {
    const start = performance.now();
    for (let pair = 0; pair < 276; pair += 1) studentizedRangeUpperTail(0.5 + pair / 40, 24, 69);
    studentizedRangeQuantile(0.05, 24, 69);
    expect((performance.now() - start) / 276).toBeLessThan(2);
  });

  it('refuses one group and no degrees of freedom', () => {
    expect(() => studentizedRangeUpperTail(1, 1, 5)).toThrow(ImpossibleInput);
    expect(() => studentizedRangeQuantile(0.05, 3, 0)).toThrow(ImpossibleInput);
  });
});
