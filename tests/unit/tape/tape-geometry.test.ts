import { describe, expect, it } from 'vitest';
import { plantHeight, plantLook } from '@/components/tape/plant-height';
import { tapeCuts } from '@/components/tape/tape-cuts';
import { tapeDoubles } from '@/components/tape/tape-doubles';
import { tapeGaps } from '@/components/tape/tape-gaps';
import { tapeMarks } from '@/components/tape/tape-marks';
import type { TapePlant } from '@/components/tape/tape-plant';

const plant = (positionInches: number, more: Partial<TapePlant> = {}): TapePlant => ({
  positionInches,
  earliness: 0.5,
  late: false,
  double: false,
  kind: 'plant',
  ...more,
});

describe('the marks on a tape', () => {
  it('numbers every foot of 17 ft 5 in, from 1 to 17', () => {
    const numerals = tapeMarks(0, 209, 'us', 4.5).flatMap((mark) => mark.numeral ?? []);
    expect(numerals).toEqual(Array.from({ length: 17 }, (_, index) => String(index + 1)));
  });

  it('numbers meters on a metric tape', () => {
    const marks = tapeMarks(0, 209, 'metric', 4.5).filter((mark) => mark.numeral);
    expect(marks.map((mark) => mark.numeral)).toEqual(['1', '2', '3', '4', '5']);
    expect(marks[0]?.atInches).toBeCloseTo(39.3701, 4);
  });

  it('leaves the fine marks out where they would touch', () => {
    expect(tapeMarks(0, 24, 'us', 4.5)).toHaveLength(25);
    expect(tapeMarks(0, 24, 'us', 1.8)).toHaveLength(9);
  });

  it('opens a later piece with the mark it starts at', () => {
    expect(tapeMarks(108, 209, 'us', 3.5)[0]).toEqual({ atInches: 108, rank: 'whole', numeral: '9' });
  });
});

describe('the gaps that are named', () => {
  // Spacings 2, 15, 16, 5, 1, 5, 8, 3, 5, 8; their upper median is 5.
  const guide = [0, 2, 17, 33, 38, 39, 44, 52, 55, 60, 68].map((at) => plant(at));

  it('names the longest first, from one and three quarters of the median spacing', () => {
    expect(tapeGaps(guide)).toEqual([
      { fromInches: 17, toInches: 33 },
      { fromInches: 2, toInches: 17 },
    ]);
  });

  it('takes the length it is given instead', () => {
    expect(tapeGaps(guide, 15.5)).toEqual([{ fromInches: 17, toInches: 33 }]);
  });

  it('measures between plants, past a seed that never came', () => {
    const row = [plant(0), plant(6, { kind: 'missing' }), plant(12), plant(18), plant(24)];
    expect(tapeGaps(row)).toEqual([{ fromInches: 0, toInches: 12 }]);
  });

  it('names none where there is too little row to know what a gap is', () => {
    expect(tapeGaps([])).toEqual([]);
    expect(tapeGaps([plant(3)])).toEqual([]);
    expect(tapeGaps([plant(3), plant(20), plant(60)])).toEqual([]);
  });
});

describe('the bracket of a double', () => {
  it('joins a double with its nearest neighbor, once', () => {
    const row = [plant(10), plant(16, { double: true }), plant(16.8, { double: true }), plant(22)];
    expect(tapeDoubles(row)).toEqual([{ fromInches: 16, toInches: 16.8 }]);
  });

  it('joins with a neighbor that was not noted as double itself', () => {
    expect(tapeDoubles([plant(38), plant(39, { double: true })])).toEqual([{ fromInches: 38, toInches: 39 }]);
  });

  it('stands over one place where both plants are at one mark', () => {
    expect(tapeDoubles([plant(10), plant(20, { double: true })])).toEqual([{ fromInches: 20, toInches: 20 }]);
  });
});

describe('the height of a plant', () => {
  it('is greater the earlier it came up', () => {
    expect(plantHeight(plant(0, { earliness: 1 }), 10, 40)).toBe(40);
    expect(plantHeight(plant(0, { earliness: 0.5 }), 10, 40)).toBe(25);
    expect(plantHeight(plant(0, { earliness: 0 }), 10, 40)).toBe(10);
  });

  it('claims nothing where nobody saw the day', () => {
    expect(plantLook(plant(0, { earliness: null }))).toBe('unknown');
    expect(plantLook(plant(0, { earliness: null, late: true }))).toBe('late');
  });
});

describe('a tape laid anew after a cut', () => {
  const pieces = [plant(4), plant(10), plant(16), plant(60, { segment: 1, double: true }), plant(66, { segment: 1 }), plant(72, { segment: 1 })];

  it('is cut halfway between its pieces', () => {
    expect(tapeCuts(pieces)).toEqual([38]);
    expect(tapeCuts([plant(4), plant(10)])).toEqual([]);
  });

  it('has no gap over the cut', () => {
    expect(tapeGaps(pieces)).toEqual([]);
    expect(tapeGaps(pieces.map((each) => ({ ...each, segment: 0 })))).toEqual([{ fromInches: 16, toInches: 60 }]);
  });

  it('joins no double over the cut', () => {
    expect(tapeDoubles([plant(10), plant(11, { segment: 1, double: true })])).toEqual([{ fromInches: 11, toInches: 11 }]);
  });
});
