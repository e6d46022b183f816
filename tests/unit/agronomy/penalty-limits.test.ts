import { describe, expect, it } from 'vitest';
import { lawles2012 } from '@/lib/agronomy/penalty/lawles-2012';
import { nafziger1991 } from '@/lib/agronomy/penalty/nafziger-1991';
import { novakRansom2018Late, novakRansom2018Skips } from '@/lib/agronomy/penalty/novak-ransom-2018';
import { ontarioLate } from '@/lib/agronomy/penalty/ontario-late';
import { answerOf } from './answer-of';

const late = (lateShare: number, delayDays: number) => ({ lateShare, delayDays });

describe('the limits of a study', () => {
  // Novak and Ransom 2018: 10 % of plants 5 to 17 days late cost 5 to 6 bu/ac, 10 % skips 16 bu/ac.
  it.each([
    [late(0.1, 5), 5, 6, 'measured'],
    [late(0.1, 17), 5, 6, 'measured'],
    [late(0.1, 2.5), 2.5, 3, 'interpolated'],
    [late(0.05, 10), 2.5, 3, 'interpolated'],
    [late(0.05, 2.5), 1.25, 1.5, 'interpolated'],
    [late(0, 10), 0, 0, 'measured'],
    [late(0.05, 0), 0, 0, 'measured'],
  ])('late plants by Novak and Ransom, %j: %d to %d bu/ac, %s', (asked, lossLow, lossHigh, basis) => {
    expect(answerOf(novakRansom2018Late(asked))).toMatchObject({ lossLow: expect.closeTo(lossLow, 9), lossHigh: expect.closeTo(lossHigh, 9), basis });
  });

  it.each([
    [late(0.12, 10), 'at most 10 % of plants late', '12 %'],
    [late(0.05, 18), 'a delay up to 17 days', '18 days'],
  ])('late plants by Novak and Ransom, %j: beyond, and it says what it had', (asked, needed, had) => {
    expect(novakRansom2018Late(asked)).toEqual({ kind: 'insufficient', reason: 'beyond-study', needed, had });
  });

  it.each([[0.1, 16, 'measured'], [0.05, 8, 'interpolated'], [0, 0, 'measured']])('skips by Novak and Ransom, %d: %d bu/ac, %s', (share, loss, basis) => {
    expect(answerOf(novakRansom2018Skips(share))).toMatchObject({ lossLow: expect.closeTo(loss, 9), lossHigh: expect.closeTo(loss, 9), basis });
  });

  it('skips by Novak and Ransom beyond 10 % say what they had', () => {
    expect(novakRansom2018Skips(0.15)).toEqual({ kind: 'insufficient', reason: 'beyond-study', needed: 'at most 10 % skips', had: '15 %' });
  });

  // Ontario: half the stand 7 days late 5 %, 14 days late 12 %.
  it.each([
    [late(0.5, 7), 5, 'measured'],
    [late(0.5, 14), 12, 'measured'],
    [late(0.5, 10.5), 8.5, 'interpolated'],
    [late(0.25, 7), 2.5, 'interpolated'],
    [late(0, 30), 0, 'measured'],
    [late(0.9, 0), 0, 'measured'],
  ])('late plants by Ontario, %j: %d %%, %s', (asked, loss, basis) => {
    expect(answerOf(ontarioLate(asked))).toMatchObject({ lossLow: expect.closeTo(loss, 9), basis });
  });

  it.each([
    [late(0.6, 7), 'at most 50 % of plants late', '60 %'],
    [late(0.5, 15), 'a delay up to 14 days', '15 days'],
  ])('late plants by Ontario, %j: beyond, and it says what it had', (asked, needed, had) => {
    expect(ontarioLate(asked)).toEqual({ kind: 'insufficient', reason: 'beyond-study', needed, had });
  });

  it('late plants by Lawles are named by the water they had', () => {
    // Every third plant 5 days late: irrigated −10 %, rainfed −25 %.
    expect(answerOf(lawles2012(late(1 / 3, 5), 'irrigated'))).toMatchObject({ study: 'lawles-2012-irrigated', lossLow: expect.closeTo(10, 9) });
    expect(answerOf(lawles2012(late(1 / 3, 5), 'rainfed'))).toMatchObject({ study: 'lawles-2012-rainfed', lossLow: expect.closeTo(25, 9) });
  });

  it('late plants by Nafziger between his two delays are interpolated, and measured within either', () => {
    expect(answerOf(nafziger1991(late(0.25, 11), 'alternating')).basis).toBe('measured');
    expect(answerOf(nafziger1991(late(0.25, 24), 'alternating')).basis).toBe('measured');
    expect(answerOf(nafziger1991(late(0.25, 16), 'alternating')).basis).toBe('interpolated');
  });
});
