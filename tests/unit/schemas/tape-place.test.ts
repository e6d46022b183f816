import { describe, expect, it } from 'vitest';
import { parseTapePlace, placeInches } from '@/lib/schemas/tape-place';
import type { TapeUnit } from '@/lib/schemas/vocabulary';

const inchesOf = (typed: string, unit: TapeUnit) => {
  const read = parseTapePlace(typed, unit);
  return read.ok ? placeInches(read.thousandths, unit) : read.message;
};

describe('a place on the tape', () => {
  // Arithmetic: 12 in a foot, 2.54 cm an inch.
  it.each<[string, TapeUnit, number]>([
    ['68', 'in', 68],
    ['68.5', 'in', 68.5],
    ['68,5', 'in', 68.5],
    ['68 1/2', 'in', 68.5],
    ['68½', 'in', 68.5],
    ['68 ½', 'in', 68.5],
    ['68⅜', 'in', 68.375],
    ['68\u00a01/2', 'in', 68.5],
    ['5–3', 'ft-in', 63],
    ['5 3½', 'ft-in', 63.5],
    ['1/4', 'in', 0.25],
    ['.5', 'in', 0.5],
    ['0', 'in', 0],
    [' 68 in ', 'in', 68],
    ['68"', 'in', 68],
    ['5 ft 3', 'in', 63],
    ["5'3 1/2", 'in', 63.5],
    ['5 ft 3', 'ft-in', 63],
    ['5 ft 3 in', 'ft-in', 63],
    ['5ft3in', 'ft-in', 63],
    ["5'3 1/2", 'ft-in', 63.5],
    ['5\'3 1/2"', 'ft-in', 63.5],
    ['5′3½″', 'ft-in', 63.5],
    ['5’3”', 'ft-in', 63],
    ['5 ft 3,5', 'ft-in', 63.5],
    ['5 3', 'ft-in', 63],
    ['5-3', 'ft-in', 63],
    ['5 3 1/2', 'ft-in', 63.5],
    ['5', 'ft-in', 60],
    ['5 ft', 'ft-in', 60],
    ['8 in', 'ft-in', 8],
    ['5.7', 'ft-tenths', 68.4],
    ['5,7', 'ft-tenths', 68.4],
    ['5.7 ft', 'ft-tenths', 68.4],
    ['5 ft 3', 'ft-tenths', 63],
    ['172.72', 'cm', 68],
    ['172,72', 'cm', 68],
    ['172.72 cm', 'cm', 68],
    ['2 1/2', 'cm', 2.5 / 2.54],
  ])('reads %s on a tape of %s', (typed, unit, inches) => {
    expect(inchesOf(typed, unit)).toBeCloseTo(inches, 9);
  });

  it.each<[string, TapeUnit]>([
    ['', 'in'], ['sixty', 'in'], ['-3', 'in'], ['6..8', 'in'], ['1/0', 'in'], ['68 5/2', 'in'], ['1e3', 'in'], ['NaN', 'in'], ['68 68', 'in'],
    ['5 ft 12', 'ft-in'], ['5 ft 3 ft', 'ft-in'], ['ft 3', 'ft-in'], ['5.5', 'ft-in'], ['5 1/2', 'ft-in'], ['5½', 'ft-in'], ['68½¼', 'in'], ['68½5', 'in'], ['٥', 'in'], ['=1+1', 'in'],
  ])('refuses "%s" on a tape of %s with an example of how it is written', (typed, unit) => {
    expect(inchesOf(typed, unit)).toMatch(/^Write the place as the tape says it, such as /);
  });

  it('asks again where a comma could part thousands or decimals', () => {
    expect(inchesOf('1,200', 'in')).toMatch(/^Write the place/);
    expect(inchesOf('1200', 'in')).toBe(1200);
  });

  it('does not take another kind of tape for the one in hand', () => {
    expect(inchesOf('68 cm', 'in')).toBe('This place is in centimeters; the tape is not.');
    expect(inchesOf('5 ft 3', 'cm')).toBe('This tape is in centimeters; the place is in feet or inches.');
  });

  it('refuses a place beyond any tape', () => {
    expect(inchesOf('12000', 'in')).toBe(12_000);
    expect(inchesOf('12001', 'in')).toBe('This place is farther than any tape reaches.');
    expect(inchesOf('999999999', 'cm')).toBe('This place is farther than any tape reaches.');
  });

  it('is kept as whole thousandths of what the tape says', () => {
    expect(parseTapePlace('68 1/3', 'in')).toEqual({ ok: true, thousandths: 68_333 });
    expect(parseTapePlace('172.5', 'cm')).toEqual({ ok: true, thousandths: 172_500 });
  });
});
