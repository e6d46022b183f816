import { describe, expect, it } from 'vitest';
import { looksLikeFeetAndTenths } from '@/lib/schemas/tape-in-hand';

/** 17 ft 5 in. */
const lengthInches = 209;
const looks = (text: string, unit: Parameters<typeof looksLikeFeetAndTenths>[1] = 'in') => looksLikeFeetAndTenths(text.split(' '), unit, lengthInches);

describe('feet and tenths read as inches', () => {
  it.each(['0.4 1.1 1.6 2.3', '0,4 1,1 1,6 2,3', '0.4 1 1.6 2.1 2.7', '0.3 0.9 1.4 2.0 2.6 3.1 3.7 4.2 4.8 17.4'])('are noticed: %s', (text) => {
    expect(looks(text)).toBe(true);
  });

  it.each([
    ['inches with tenths', '4.5 11.2 16.8 23.1'],
    ['running inches', '0 2 17 33 38 39 44 52 55 60 68'],
    ['inches with halves', '4½ 11 16½ 23'],
    ['a crowded beginning of three plants, too few to know', '0.4 1.1 1.6'],
    ['places that no feet of this row can be', '0.4 1.1 1.6 2.3 19.9'],
    ['something that cannot be read', '0.4 1.1 x y'],
  ])('are not seen in %s', (_, text) => {
    expect(looks(text)).toBe(false);
  });

  it('are what they are where the tape in hand says so', () => {
    expect(looks('0.4 1.1 1.6 2.3', 'ft-tenths')).toBe(false);
    expect(looks('0.4 1.1 1.6 2.3', 'cm')).toBe(false);
  });
});
