import { describe, expect, it } from 'vitest';
import { ImpossibleInput } from '@/lib/agronomy/outcome';
import { seedAccount, type AccountedRow } from '@/lib/agronomy/seed-account';
import { answerOf } from './answer-of';

const row: AccountedRow = { seeds: 34, onTime: 29, late: 2, dayNotSeen: 0, doubles: 1, digs: ['no-seed', 'seed-rotten'] };

describe('where the seeds went', () => {
  it('accounts for every planned seed, doubles beside them', () => {
    const account = answerOf(seedAccount([row]));
    expect(account.onTime.seeds + account.late.seeds + account.dayNotSeen.seeds + account.missing.seeds).toBe(34);
    expect(account).toMatchObject({ seedsPlanned: 34, doubles: 1, digs: 2, notDug: 1, missing: { seeds: 3, share: 3 / 34 } });
    expect(account.onTime.share).toBeCloseTo(29 / 34, 12);
  });

  it('gives shares the interval of Wilson, as R prints it', () => {
    // R 4.2.2, prop.test(28, 34, correct = FALSE) and prop.test(1, 2, correct = FALSE).
    const account = answerOf(seedAccount([{ ...row, onTime: 28 }]));
    expect(answerOf(account.onTime.interval)).toMatchObject({ shareLower: expect.closeTo(0.6649, 3), shareUpper: expect.closeTo(0.9165, 3) });
    expect(answerOf(account.dug['no-seed']?.interval ?? { kind: 'insufficient', reason: '', needed: '', had: '' })).toMatchObject({ shareLower: expect.closeTo(0.0945, 3), shareUpper: expect.closeTo(0.9055, 3) });
  });

  it('speaks of what was dug only, and leaves the rest unknown', () => {
    const account = answerOf(seedAccount([{ ...row, digs: ['eaten', 'eaten', 'other'] }]));
    expect(account.dug).toMatchObject({ eaten: { seeds: 2, share: 2 / 3 }, other: { seeds: 1, share: 1 / 3 } });
    expect(Object.keys(account.dug)).toEqual(['eaten', 'other']);
    expect(account.notDug).toBe(0);
    expect(answerOf(seedAccount([{ ...row, digs: [] }]))).toMatchObject({ dug: {}, digs: 0, notDug: 3 });
  });

  it('adds row samples up, seeds that are no whole number among them', () => {
    const account = answerOf(seedAccount([row, { ...row, seeds: 33.6, onTime: 30, late: 1, dayNotSeen: 1, doubles: 0, digs: [] }]));
    expect(account.seedsPlanned).toBeCloseTo(67.6, 9);
    expect(account).toMatchObject({ onTime: { seeds: 59 }, late: { seeds: 3 }, dayNotSeen: { seeds: 1 }, doubles: 1 });
    expect(account.missing.seeds).toBeCloseTo(4.6, 9);
    expect(account.notDug).toBeCloseTo(2.6, 9);
  });

  it('takes a dig more than whole missing seeds, because the planned number need not be whole', () => {
    expect(answerOf(seedAccount([{ ...row, seeds: 32.5, digs: ['no-seed', 'no-seed'] }]))).toMatchObject({ digs: 2, notDug: 0 });
  });

  it('is insufficient without a sheet, and with more plants than seeds', () => {
    expect(seedAccount([])).toMatchObject({ kind: 'insufficient', reason: 'no-tape-sheets' });
    expect(seedAccount([{ ...row, seeds: 30.04 }])).toEqual({ kind: 'insufficient', reason: 'more-plants-than-seeds', needed: 'at most 30 plants, one a seed', had: '31 plants besides doubles' });
  });

  it.each([[{ seeds: 0 }], [{ seeds: NaN }], [{ onTime: -1 }], [{ late: -1 }], [{ dayNotSeen: NaN }], [{ doubles: -1 }], [{ digs: ['other', 'other', 'other', 'other'] as const }]])('refuses %j', (changes) => {
    expect(() => seedAccount([{ ...row, ...changes }])).toThrow(ImpossibleInput);
  });
});
