import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { ImpossibleInput } from '@/lib/agronomy/outcome';
import { carlsonDoergeClay } from '@/lib/agronomy/penalty/carlson-doerge-clay';
import { fordHicks1992 } from '@/lib/agronomy/penalty/ford-hicks-1992';
import { lauerRankin2004 } from '@/lib/agronomy/penalty/lauer-rankin-2004';
import { lawles2012, type LawlesWater } from '@/lib/agronomy/penalty/lawles-2012';
import { liu2004Late } from '@/lib/agronomy/penalty/liu-2004-late';
import { liu2004Spacing } from '@/lib/agronomy/penalty/liu-2004-spacing';
import { nafziger1991, type PatternRead } from '@/lib/agronomy/penalty/nafziger-1991';
import { nielsen2004 } from '@/lib/agronomy/penalty/nielsen-2004';
import { nielsenQuoted } from '@/lib/agronomy/penalty/nielsen-quoted';
import { novakRansom2018Late, novakRansom2018Skips } from '@/lib/agronomy/penalty/novak-ransom-2018';
import { ontarioLate } from '@/lib/agronomy/penalty/ontario-late';
import { spacingsInches, spacingVariation } from '@/lib/agronomy/spacing';
import published from '../../reference/published-examples.json';
import { answerOf, reasonOf } from './answer-of';

const { lateStudies, tapeReadings } = published;

describe('nafziger1991', () => {
  test.each(published.nafziger1991.rows)(
    'gives $yieldPercent % for $lateShare late by $delayDays days, $pattern, as measured',
    ({ lateShare, delayDays, pattern, yieldPercent }) => {
      const penalty = answerOf(nafziger1991({ lateShare, delayDays }, pattern as PatternRead));
      expect(Math.abs(100 - penalty.lossLow - yieldPercent)).toBeLessThan(published.nafziger1991.tolerance);
      expect(penalty.basis).toBe('measured');
    },
  );

  test('follows from the yields the paper prints', () => {
    const { even, tenDays, threeWeeks, tolerancePercent } = published.nafziger1991Yields;
    const columns = [
      [0.25, 'alternating'],
      [0.5, 'alternating'],
      [0.5, 'in-groups'],
      [0.75, 'alternating'],
      [1, 'alternating'],
    ] as const;
    for (const [delayDays, yields] of [
      [11, tenDays],
      [24, threeWeeks],
    ] as const) {
      columns.forEach(([lateShare, pattern], index) => {
        const percent = ((yields[index] as number) / even) * 100;
        const penalty = answerOf(nafziger1991({ lateShare, delayDays }, pattern));
        expect(Math.abs(100 - penalty.lossLow - percent)).toBeLessThan(tolerancePercent);
      });
    }
  });

  test('stays within what Illinois restates', () => {
    for (const { delayDays, lateShares, lossPercent } of published.illinois2014.rows) {
      for (const lateShare of lateShares) {
        const penalty = answerOf(nafziger1991({ lateShare, delayDays }, 'not-known'));
        expect(penalty.lossLow).toBeGreaterThanOrEqual(lossPercent[0] as number);
        expect(penalty.lossHigh).toBeLessThanOrEqual(lossPercent[1] as number);
      }
    }
  });

  test('keeps the ten-day line as measured though it is not monotone', () => {
    const loss = (lateShare: number) =>
      answerOf(nafziger1991({ lateShare, delayDays: 11 }, 'in-groups')).lossLow;
    expect(loss(1)).toBeLessThan(loss(0.5));
  });

  test('is 100 % without late plants or without delay, and labels what lies between as interpolated', () => {
    expect(answerOf(nafziger1991({ lateShare: 0, delayDays: 30 }, 'alternating')).lossHigh).toBe(0);
    expect(answerOf(nafziger1991({ lateShare: 0.5, delayDays: 0 }, 'alternating')).lossHigh).toBe(0);
    const between = answerOf(nafziger1991({ lateShare: 0.125, delayDays: 11 }, 'alternating'));
    expect(between).toMatchObject({ basis: 'interpolated' });
    expect(between.lossLow).toBeCloseTo(3.4, 9);
    const shorter = answerOf(nafziger1991({ lateShare: 0.25, delayDays: 5 }, 'alternating'));
    expect(shorter.lossLow).toBeCloseTo(3.4, 9);
  });

  test('gives both columns when the pattern is not known', () => {
    const penalty = answerOf(nafziger1991({ lateShare: 0.5, delayDays: 21 }, 'not-known'));
    expect(penalty.lossLow).toBeCloseTo(20.3, 9);
    expect(penalty.lossHigh).toBeCloseTo(22, 9);
  });

  test('is refused beyond 27 days and for shares that cannot be', () => {
    const beyond = nafziger1991({ lateShare: 0.5, delayDays: 27.4 }, 'alternating');
    expect(beyond).toMatchObject({ reason: 'beyond-study', had: 'a mean delay of 27.4 days' });
    expect(() => nafziger1991({ lateShare: 1.2, delayDays: 5 }, 'alternating')).toThrow(ImpossibleInput);
    expect(() => nafziger1991({ lateShare: 0.2, delayDays: -1 }, 'alternating')).toThrow(ImpossibleInput);
  });

  test('never loses more than the most that was measured', () => {
    const share = fc.double({ min: 0, max: 1, noNaN: true });
    const delay = fc.double({ min: 0, max: 27, noNaN: true });
    fc.assert(
      fc.property(share, delay, (lateShare, delayDays) => {
        const penalty = answerOf(nafziger1991({ lateShare, delayDays }, 'not-known'));
        expect(penalty.lossLow).toBeGreaterThanOrEqual(0);
        expect(penalty.lossHigh).toBeLessThanOrEqual(22.9 + 1e-9);
      }),
    );
  });
});

describe('the other studies of late plants', () => {
  test.each(lateStudies.liu2004)('Liu: $leafStagesBehind leaf stages lose $lossPercent %', (row) => {
    expect(answerOf(liu2004Late(row.lateShare, row.leafStagesBehind)).lossLow).toBeCloseTo(
      row.lossPercent,
      6,
    );
  });

  test.each(lateStudies.ontario)('Ontario: half $delayDays days late lose $lossPercent %', (row) => {
    const penalty = answerOf(ontarioLate(row));
    expect(penalty).toMatchObject({ basis: 'measured' });
    expect(penalty.lossLow).toBeCloseTo(row.lossPercent, 6);
  });

  test.each(lateStudies.fordHicks1992)('Ford and Hicks: $leavesBehind leaves lose $lossPercent %', (row) => {
    const penalty = answerOf(fordHicks1992(row.lateShare, row.leavesBehind));
    expect(penalty).toMatchObject({ reading: 'quoted' });
    expect(penalty.lossLow).toBeCloseTo(row.lossPercent, 6);
  });

  test.each(lateStudies.lawles2012)('Lawles $water: $delayDays days lose $lossPercent %', (row) => {
    const late = { lateShare: 1 / 3, delayDays: row.delayDays };
    const penalty = answerOf(lawles2012(late, row.water as LawlesWater));
    expect(penalty).toMatchObject({ unit: 'percent-of-three-plants', basis: 'measured' });
    expect(penalty.lossLow).toBeCloseTo(row.lossPercent, 6);
  });

  test('Novak and Ransom: a tenth late costs 5 to 6 bushels, a tenth skips 16', () => {
    const { late, skips } = lateStudies.novakRansom2018;
    for (const delayDays of late.delayDays) {
      const penalty = answerOf(novakRansom2018Late({ lateShare: late.lateShare, delayDays }));
      expect([penalty.lossLow, penalty.lossHigh]).toEqual(late.bushels);
    }
    expect(answerOf(novakRansom2018Skips(skips.skipsShare)).lossLow).toBe(skips.bushels);
    expect(answerOf(novakRansom2018Skips(0.05))).toMatchObject({ basis: 'interpolated', lossLow: 8 });
  });

  test('interpolates from the even stand and says so', () => {
    expect(answerOf(ontarioLate({ lateShare: 0.25, delayDays: 7 }))).toMatchObject({
      basis: 'interpolated',
      lossLow: 2.5,
    });
    expect(answerOf(novakRansom2018Late({ lateShare: 0.05, delayDays: 10 }))).toMatchObject({
      basis: 'interpolated',
      lossLow: 2.5,
      lossHigh: 3,
    });
  });

  test.each([
    ['Liu, above one in six', () => liu2004Late(0.2, 2)],
    ['Liu, above four leaf stages', () => liu2004Late(0.1, 5)],
    ['Ontario, above half', () => ontarioLate({ lateShare: 0.6, delayDays: 7 })],
    ['Ontario, above 14 days', () => ontarioLate({ lateShare: 0.5, delayDays: 15 })],
    ['Ford and Hicks, above two leaves', () => fordHicks1992(0.5, 3)],
    ['Lawles, above one in three', () => lawles2012({ lateShare: 0.4, delayDays: 5 }, 'rainfed')],
    ['Lawles, above 12 days', () => lawles2012({ lateShare: 0.3, delayDays: 13 }, 'irrigated')],
    ['Novak and Ransom, above 10 %', () => novakRansom2018Late({ lateShare: 0.11, delayDays: 10 })],
    ['Novak and Ransom, above 17 days', () => novakRansom2018Late({ lateShare: 0.1, delayDays: 18 })],
    ['Novak and Ransom, above 10 % skips', () => novakRansom2018Skips(0.2)],
  ])('refuses what lies beyond the study: %s', (_, ask) => {
    expect(reasonOf(ask())).toBe('beyond-study');
  });
});

describe('the spacing rules', () => {
  const sd = answerOf(spacingVariation(spacingsInches(tapeReadings.positionsInches))).spacingInchesSd;

  test('cost 12.5 bushels for the printed readings by the SSMG-37 rule, not 11.4', () => {
    const loss = carlsonDoergeClay(sd).lossLow;
    expect(Math.abs(loss - tapeReadings.lossBushelsPerAcre)).toBeLessThan(tapeReadings.tolerance);
  });

  test.each([
    ['Carlson, Doerge and Clay', carlsonDoergeClay, 10, 'bushels-per-acre'],
    ['Nielsen as quoted', nielsenQuoted, 6.25, 'bushels-per-acre'],
    ['Nielsen 2004', nielsen2004, 5.5, 'bushels-per-acre'],
    ['Lauer and Rankin', lauerRankin2004, 0, 'percent-of-yield'],
    ['Liu and others', liu2004Spacing, 0, 'percent-of-yield'],
  ] as const)('%s, at the survey’s mean SD of 4.5 in', (_, rule, loss, unit) => {
    expect(rule(4.5).lossLow).toBeCloseTo(loss, 9);
    expect(rule(4.5).unit).toBe(unit);
  });

  test('cost nothing below 2 in, and Lauer and Rankin nothing up to 12 cm', () => {
    for (const rule of [carlsonDoergeClay, nielsenQuoted, nielsen2004]) expect(rule(1.4).lossHigh).toBe(0);
    expect(lauerRankin2004(12 / 2.54).lossHigh).toBeCloseTo(0, 9);
    expect(lauerRankin2004(14 / 2.54).lossHigh).toBeCloseTo(2.12, 9);
  });

  test('refuse an SD that cannot be', () => {
    for (const rule of [carlsonDoergeClay, nielsenQuoted, nielsen2004, lauerRankin2004, liu2004Spacing]) {
      expect(() => rule(-0.1)).toThrow(ImpossibleInput);
      expect(() => rule(Number.NaN)).toThrow(ImpossibleInput);
    }
  });
});
