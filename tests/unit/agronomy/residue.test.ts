import { describe, expect, test } from 'vitest';
import { clearedBandPercent } from '@/lib/agronomy/cleared-band';
import { residueCleared } from '@/lib/agronomy/inference/residue-cleared';
import { residueCover } from '@/lib/agronomy/inference/residue-cover';
import { ImpossibleInput } from '@/lib/agronomy/outcome';
import { residueMarks, residueMarksPercent } from '@/lib/agronomy/residue-marks';
import { tillageClass } from '@/lib/agronomy/tillage-class';
import { transectLengthFeet } from '@/lib/agronomy/transect-length';
import published from '../../reference/published-stand-counts.json';
import estimators from '../../reference/stand-estimators.json';
import { answerOf, reasonOf } from './answer-of';

const refused = [Number.NaN, Number.POSITIVE_INFINITY, -1];

function expectClose(figured: number, expected: number): void {
  expect(Math.abs(figured / expected - 1)).toBeLessThan(1e-9);
}

const tapesOf = ({ covered, read }: { covered: number[]; read: number[] }) =>
  covered.map((marksCovered, index) => ({ marksCovered, marksRead: read[index] as number }));

describe('residueMarksPercent', () => {
  test('makes 44 of 100 marks 44 %', () => {
    const { percent, ...marks } = published.residue.hits;
    expect(residueMarksPercent(marks)).toBe(percent);
  });

  test.each([
    { marksRead: 0, marksCovered: 0, field: 'marksRead' },
    { marksRead: 100.5, marksCovered: 0, field: 'marksRead' },
    { marksRead: 100, marksCovered: 101, field: 'marksCovered' },
    { marksRead: 100, marksCovered: -1, field: 'marksCovered' },
    { marksRead: 100, marksCovered: 0.5, field: 'marksCovered' },
    { marksRead: Number.NaN, marksCovered: 1, field: 'marksRead' },
  ])('refuses $marksCovered of $marksRead marks', ({ field, ...marks }) => {
    expect(() => residueMarksPercent(marks)).toThrow(expect.objectContaining({ field }));
  });
});

describe('residueMarks', () => {
  test('makes marks 1, 3, 8 and 9 of 10 40 %', () => {
    const { marksRead, marksOverResidue, percent } = published.residue.listed;
    expect(residueMarksPercent(residueMarks(marksRead, marksOverResidue))).toBe(percent);
    expect(residueMarks(marksRead, [...marksOverResidue].reverse()).marksCovered).toBe(4);
  });

  test('is none where none was over residue', () => {
    expect(residueMarks(10, [])).toEqual({ marksRead: 10, marksCovered: 0 });
  });

  test.each([{ marks: [0] }, { marks: [11] }, { marks: [2.5] }, { marks: [3, 3] }, { marks: [Number.NaN] }])(
    'refuses marks $marks of 10',
    ({ marks }) => {
      expect(() => residueMarks(10, marks)).toThrow(expect.objectContaining({ field: 'marksOverResidue' }));
    },
  );

  test('refuses a tape without a mark', () => {
    expect(() => residueMarks(0, [])).toThrow(expect.objectContaining({ field: 'marksRead' }));
  });
});

describe('residueCover', () => {
  test.each([
    { name: 'of equal tapes', expected: estimators.residueEqual },
    { name: 'of unequal tapes', expected: estimators.residueUnequal },
  ])('has the intervals of R $name', ({ expected }) => {
    const cover = answerOf(residueCover(tapesOf(expected), 'field'));
    const overPlaces = answerOf(cover.overPlaces);
    expectClose(cover.coverPercent, expected.percent);
    expectClose(cover.counting.coverPercentLower, expected.wilsonLower);
    expectClose(cover.counting.coverPercentUpper, expected.wilsonUpper);
    expectClose(overPlaces.coverPercentLower, expected.lower);
    expectClose(overPlaces.coverPercentUpper, expected.upper);
    expect([cover.counting.method, overPlaces.method]).toEqual(['binomial-wilson', 't-over-places']);
  });

  test('says which cover it is', () => {
    const tape = [{ marksRead: 50, marksCovered: 10 }];
    expect(answerOf(residueCover(tape, 'in-row'))).toMatchObject({
      place: 'in-row',
      coverPercent: 20,
      marksRead: 50,
      marksCovered: 10,
      places: 1,
    });
  });

  test.each([1, 2])('has the counting but no interval over places from %s', (places) => {
    const tapes = Array.from({ length: places }, () => ({ marksRead: 100, marksCovered: 44 }));
    const cover = answerOf(residueCover(tapes, 'field'));
    expect(cover.coverPercent).toBe(44);
    expect(cover.overPlaces).toMatchObject({
      reason: 'too-few-places',
      needed: '3 places',
      had: `${places}`,
    });
  });

  test('never passes 0 or 100 %', () => {
    const ends = (covered: number[]) => {
      const tapes = tapesOf({ covered, read: covered.map(() => 100) });
      return answerOf(answerOf(residueCover(tapes, 'field')).overPlaces);
    };
    expect(ends([0, 1, 9]).coverPercentLower).toBe(0);
    expect(ends([100, 99, 91]).coverPercentUpper).toBe(100);
  });

  test('is insufficient without a place', () => {
    expect(reasonOf(residueCover([], 'field'))).toBe('no-places');
  });

  test('refuses one impossible tape among sound ones, even where the sum would pass', () => {
    const tapes = [
      { marksRead: 100, marksCovered: 10 },
      { marksRead: 50, marksCovered: 60 },
    ];
    expect(() => residueCover(tapes, 'field')).toThrow(expect.objectContaining({ field: 'marksCovered' }));
  });
});

describe('residueCleared', () => {
  const { field, inRow, points, lower, upper } = estimators.cleared;
  const pairs = field.map((marksCovered, index) => ({
    field: { marksRead: 100, marksCovered },
    inRow: { marksRead: 100, marksCovered: inRow[index] as number },
  }));

  test('is the paired t interval of R', () => {
    const cleared = answerOf(residueCleared(pairs));
    const interval = answerOf(cleared.interval);
    expectClose(cleared.points, points);
    expectClose(interval.pointsLower, lower);
    expectClose(interval.pointsUpper, upper);
  });

  test('is below 0 where the row holds more', () => {
    const turned = pairs.map((pair) => ({ field: pair.inRow, inRow: pair.field }));
    expectClose(answerOf(residueCleared(turned)).points, -points);
  });

  test('has no interval below three places, and is insufficient without one', () => {
    const cleared = answerOf(residueCleared(pairs.slice(0, 2)));
    expect(cleared.points).toBe(35);
    expect(cleared.interval).toMatchObject({ reason: 'too-few-places', had: '2' });
    expect(reasonOf(residueCleared([]))).toBe('no-places');
  });

  test('refuses more marks over residue than were read, in the row or over the field', () => {
    const sound = { marksRead: 10, marksCovered: 4 };
    const impossible = { marksRead: 10, marksCovered: 11 };
    expect(() => residueCleared([{ field: sound, inRow: impossible }])).toThrow(ImpossibleInput);
    expect(() => residueCleared([{ field: impossible, inRow: sound }])).toThrow(ImpossibleInput);
  });
});

describe('tillageClass', () => {
  const alone = (percent: number) => ({
    coverPercent: percent,
    coverPercentLower: percent,
    coverPercentUpper: percent,
  });

  test.each(published.tillageClass.rows)('calls $percent % $tillageClass', (row) => {
    expect(answerOf(tillageClass(alone(row.percent), 'field'))).toEqual({
      tillageClass: row.tillageClass,
      within: [row.tillageClass],
    });
  });

  test('names every class the interval reaches, most cover first', () => {
    const cover = { coverPercent: 20, coverPercentLower: 12, coverPercentUpper: 31 };
    expect(answerOf(tillageClass(cover, 'field')).within).toEqual([
      'conservation',
      'reduced',
      'conventional',
    ]);
    const upper = { coverPercent: 28, coverPercentLower: 20, coverPercentUpper: 37 };
    expect(answerOf(tillageClass(upper, 'field')).within).toEqual(['conservation', 'reduced']);
  });

  test('is insufficient for cover along the seed row', () => {
    expect(reasonOf(tillageClass(alone(10), 'in-row'))).toBe('in-row-cover');
  });

  test.each([...refused, 100.1])('refuses a cover of %s %%', (percent) => {
    expect(() => tillageClass(alone(percent), 'field')).toThrow(
      expect.objectContaining({ field: 'coverPercent' }),
    );
  });

  test('refuses ends on the wrong side of the cover', () => {
    expect(() => tillageClass({ ...alone(20), coverPercentLower: 21 }, 'field')).toThrow(
      expect.objectContaining({ field: 'coverPercentLower' }),
    );
    expect(() => tillageClass({ ...alone(20), coverPercentUpper: 19 }, 'field')).toThrow(
      expect.objectContaining({ field: 'coverPercentUpper' }),
    );
  });
});

describe('transectLengthFeet', () => {
  test('is 57 ft for a 45° line over a 40-ft strip', () => {
    const { stripWidthFeet, angleDegrees, lengthFeet, tolerance } = published.transect;
    expect(Math.abs(transectLengthFeet(stripWidthFeet, angleDegrees) - lengthFeet)).toBeLessThan(tolerance);
    expect(transectLengthFeet(stripWidthFeet)).toBe(transectLengthFeet(stripWidthFeet, 45));
  });

  test('is the width itself straight across, and twice the width at 30°', () => {
    expect(transectLengthFeet(40, 90)).toBeCloseTo(40, 12);
    expect(transectLengthFeet(40, 30)).toBeCloseTo(80, 12);
  });

  test.each([...refused, 0])('refuses a strip of %s ft', (width) => {
    expect(() => transectLengthFeet(width)).toThrow(expect.objectContaining({ field: 'stripWidthFeet' }));
  });

  test.each([...refused, 0, 90.5])('refuses an angle of %s degrees', (angle) => {
    expect(() => transectLengthFeet(40, angle)).toThrow(expect.objectContaining({ field: 'angleDegrees' }));
  });
});

describe('clearedBandPercent', () => {
  test('makes 8 in of 30 in about a quarter', () => {
    // 8 / 30 by hand.
    expect(clearedBandPercent(8, 30)).toBeCloseTo(26.67, 2);
    expect(clearedBandPercent(0, 30)).toBe(0);
    expect(clearedBandPercent(30, 30)).toBe(100);
  });

  test.each([...refused, 31])('refuses a band of %s in between 30-inch rows', (band) => {
    expect(() => clearedBandPercent(band, 30)).toThrow(expect.objectContaining({ field: 'bandInches' }));
  });

  test.each([...refused, 0])('refuses rows %s in apart', (spacing) => {
    expect(() => clearedBandPercent(0, spacing)).toThrow(
      expect.objectContaining({ field: 'rowSpacingInches' }),
    );
  });
});
