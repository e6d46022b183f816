import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { fieldAreaRule } from '@/lib/schemas/field';
import { intendedStandRule, rowSpacingRule, seedingRateRule, tagGerminationRule } from '@/lib/schemas/planting';
import { parseReading, readingIn, type ReadingRule } from '@/lib/schemas/reading';
import { readingSchema } from '@/lib/schemas/reading-schema';
import { rowLengthRule } from '@/lib/schemas/row-sample';
import { pressureRule, workingDepthRule } from '@/lib/schemas/setting';
import { readingUnits } from '@/lib/schemas/vocabulary';

const rules: ReadingRule[] = [fieldAreaRule, rowSpacingRule, seedingRateRule, tagGerminationRule, intendedStandRule, rowLengthRule, pressureRule, workingDepthRule];

/** A foot is 12 inches and an inch 25.4 mm, by the international agreement of 1959; nothing below rests on our own code. */
describe('what is typed as a row length', () => {
  it.each([
    ['17 ft 5 in', 'in', 209_000],
    ['17ft5in', 'in', 209_000],
    ['17 feet 5 inches', 'in', 209_000],
    ["17'5", 'in', 209_000],
    ["17'5\"", 'in', 209_000],
    ['17′ 5″', 'in', 209_000],
    ["17' 5 1/2", 'in', 209_500],
    ['17 ft 5½ in', 'in', 209_500],
    ['17 ft', 'in', 204_000],
    ['17.42', 'ft', 17_420],
    ['17,5', 'ft', 17_500],
    ['17½', 'ft', 17_500],
    ['17 1/2', 'ft', 17_500],
    ['½', 'ft', 500],
    ['.5', 'ft', 500],
    ['209 in', 'in', 209_000],
    ['5.31 m', 'm', 5_310],
    ['531cm', 'cm', 531_000],
    [' 17.5 ', 'ft', 17_500],
    ['17.5 Ft.', 'ft', 17_500],
    ['17’5”', 'in', 209_000],
    ['17’ 5 1/2”', 'in', 209_500],
    ["17'5''", 'in', 209_000],
    ["17 1/2'", 'ft', 17_500],
    ['209"', 'in', 209_000],
    ['17 ft 5,5 in', 'in', 209_500],
    ['17 ft 5⅜', 'in', 209_375],
    ['17\u00a0ft\u00a05\u00a0in', 'in', 209_000],
    ['17\u202f1/2', 'ft', 17_500],
    ['17 1\u20442', 'ft', 17_500],
    ['17⅞', 'ft', 17_875],
    ['17⅓ ft', 'ft', 17_333],
    ['\u00a017.5\u00a0', 'ft', 17_500],
    ['+17', 'ft', 17_000],
  ])('takes %j as it was typed, in %s', (typed, unit, thousandths) => {
    expect(parseReading(typed, rowLengthRule)).toEqual({ ok: true, reading: { typed: typed.trim(), unit, thousandths } });
  });

  it.each([
    ['', 'Type the row length.'],
    ['   ', 'Type the row length.'],
    ['abc', 'Write the row length as a number such as 17 ft 5 in.'],
    ['1e9', 'Write the row length as a number such as 17 ft 5 in.'],
    ['NaN', 'Write the row length as a number such as 17 ft 5 in.'],
    ['Infinity', 'Write the row length as a number such as 17 ft 5 in.'],
    ['1/0', 'Write the row length as a number such as 17 ft 5 in.'],
    ['1e3', 'Write the row length as a number such as 17 ft 5 in.'],
    ['0x10', 'Write the row length as a number such as 17 ft 5 in.'],
    ['１７', 'Write the row length as a number such as 17 ft 5 in.'],
    ['٣', 'Write the row length as a number such as 17 ft 5 in.'],
    ['=1+1', 'Write the row length as a number such as 17 ft 5 in.'],
    ['17-5', 'Write the row length as a number such as 17 ft 5 in.'],
    ['17½5', 'Write the row length as a number such as 17 ft 5 in.'],
    ['17½¼', 'Write the row length as a number such as 17 ft 5 in.'],
    ['17 5/4', 'Write the row length as a number such as 17 ft 5 in.'],
    ["17.5'5", 'Write the row length as a number such as 17 ft 5 in.'],
    ["17'-5", 'Write the row length as a number such as 17 ft 5 in.'],
    ["-17'5", 'Write the row length as a number such as 17 ft 5 in.'],
    ['17 ft 5 ft', 'Write the row length as a number such as 17 ft 5 in.'],
    ['1.234,5', 'Write the row length as a number such as 17 ft 5 in.'],
    ['\u00a0', 'Type the row length.'],
    ['17 ft 13 in', 'Write the row length as a number such as 17 ft 5 in.'],
    ['17 5', 'Write the row length as a number such as 17 ft 5 in.'],
    ['17..5', 'Write the row length as a number such as 17 ft 5 in.'],
    ['1,234', '"1,234" can be read two ways. Write it without the comma, or with a point for the decimals.'],
    ['-5', 'The row length cannot be below zero.'],
    ['−5', 'The row length cannot be below zero.'],
    ['-1/2', 'The row length cannot be below zero.'],
    ['–5', 'The row length cannot be below zero.'],
    ['-5 1/4', 'The row length cannot be below zero.'],
    ['-17,5', 'The row length cannot be below zero.'],
    ['999999 ft 5 in', 'The row length is expected between 0.5 and 1,000 ft; this says 999999 ft 5 in.'],
    ['5 acres', 'The row length is given in ft or in or m or cm.'],
    ['17 furlongs', 'Write the row length as a number such as 17 ft 5 in.'],
    ['0', 'The row length is expected between 0.5 and 1,000 ft; this says 0.'],
    ['0.2', 'The row length is expected between 0.5 and 1,000 ft; this says 0.2.'],
    ['100000', 'The row length is expected between 0.5 and 1,000 ft; this says 100000.'],
    ['99999999999999999999999', 'The row length is expected between 0.5 and 1,000 ft; this says 99999999999999999999999.'],
  ])('refuses %j with a sentence', (typed, message) => {
    expect(parseReading(typed, rowLengthRule)).toEqual({ ok: false, message });
  });

  it('refuses what is too long to be a length', () => {
    expect(parseReading('1'.repeat(41), rowLengthRule)).toMatchObject({ ok: false, message: expect.stringContaining('too long') });
  });
});

describe('what is typed as a seeding rate', () => {
  it.each([
    ['34,000', 'per-acre', 34_000_000],
    ['34 000', 'per-acre', 34_000_000],
    ['34\u00a0000', 'per-acre', 34_000_000],
    ['34\u202f000', 'per-acre', 34_000_000],
    ['34000', 'per-acre', 34_000_000],
    ['84,000 /ha', 'per-ha', 84_000_000],
    ['84,000 per ha', 'per-ha', 84_000_000],
    ['1,234', 'per-acre', 1_234_000],
  ])('takes %j in %s', (typed, unit, thousandths) => {
    expect(parseReading(typed, seedingRateRule)).toEqual({ ok: true, reading: { typed, unit, thousandths } });
  });

  it.each(['', 'letters', '34.000', '17,5', '1e5', "17'5", '5 1/4', '34\n000', '34', '3,4,0', '34,00,000', '9,999,999', '-34,000', '34k'])('refuses %j', (typed) => {
    expect(parseReading(typed, seedingRateRule).ok).toBe(false);
  });
});

describe('what is typed as a row spacing', () => {
  it.each([
    ['30', 'in', 30_000],
    ['7 1/2', 'in', 7_500],
    ['5 1/4', 'in', 5_250],
    ['5\u00a01/4', 'in', 5_250],
    ['5¼', 'in', 5_250],
    ['5⅛', 'in', 5_125],
    ['17,5', 'in', 17_500],
    ['76 cm', 'cm', 76_000],
    ['0.75 m', 'm', 750],
    ["2'6", 'in', 30_000],
  ])('takes %j in %s', (typed, unit, thousandths) => {
    expect(parseReading(typed, rowSpacingRule)).toEqual({ ok: true, reading: { typed, unit, thousandths } });
  });
});

describe('a pressure as the cab shows it', () => {
  it.each([
    ['60', 'lbf', 60_000],
    ['20 psi', 'psi', 20_000],
    ['140 kPa', 'kPa', 140_000],
    ['250 N', 'N', 250_000],
  ])('takes %j in %s, a force or a pressure', (typed, unit, thousandths) => {
    expect(parseReading(typed, pressureRule)).toEqual({ ok: true, reading: { typed, unit, thousandths } });
  });

  it('refuses what no air line holds', () => {
    expect(parseReading('5000 psi', pressureRule)).toMatchObject({ ok: false, message: 'The pressure is expected between 0 and 1,000 psi; this says 5000 psi.' });
  });
});

describe('a reading on the wire', () => {
  it('is read in the unit the field stood in', () => {
    expect(readingSchema(rowSpacingRule).parse({ typed: '76', unit: 'cm' })).toEqual({ typed: '76', unit: 'cm', thousandths: 76_000 });
    expect(readingSchema(pressureRule).parse({ typed: '20', unit: 'psi' })).toEqual({ typed: '20', unit: 'psi', thousandths: 20_000 });
  });

  it('ignores a unit that measures something else, and any number sent along', () => {
    expect(readingSchema(rowSpacingRule).parse({ typed: '30', unit: 'acres', thousandths: 5 })).toEqual({ typed: '30', unit: 'in', thousandths: 30_000 });
  });

  it('never throws and never keeps what is not a whole number of thousandths, whatever is typed', () => {
    fc.assert(
      fc.property(fc.constantFrom(...rules), fc.string({ maxLength: 50 }), fc.constantFrom(...readingUnits, undefined), (rule, typed, unit) => {
        const parsed = readingSchema(rule).safeParse(unit ? { typed, unit } : { typed });
        if (!parsed.success) return;
        expect(Number.isSafeInteger(parsed.data.thousandths)).toBe(true);
        expect(parsed.data.thousandths).toBeGreaterThanOrEqual(0);
        expect(parsed.data.typed).toBe(typed.trim());
      }),
      { numRuns: 500 },
    );
  });
});

describe('a reading in another unit', () => {
  it.each([
    [{ unit: 'in', thousandths: 209_000 }, 'cm', 530.86],
    [{ unit: 'ft', thousandths: 1_000 }, 'm', 0.3048],
    [{ unit: 'ha', thousandths: 1_000 }, 'acres', 2.47105381],
    [{ unit: 'per-ha', thousandths: 84_000_000 }, 'per-acre', 33_993.59],
    [{ unit: 'bu/ac', thousandths: 200_000 }, 't/ha', 12.5549],
  ] as const)('turns %j into %s', (reading, unit, expected) => {
    expect(readingIn(reading, unit)).toBeCloseTo(expected, 2);
  });

  it('throws where the two measure different things', () => {
    expect(() => readingIn({ unit: 'psi', thousandths: 1_000 }, 'lbf')).toThrow('cannot be read as');
  });
});
