import { describe, expect, it } from 'vitest';
import { accountedRow } from '@/lib/agronomy/accounted-row';
import { ImpossibleInput } from '@/lib/agronomy/outcome';
import type { TapePlace } from '@/lib/agronomy/row-sample';
import {
  digFindings,
  seedAccount,
  type AccountedRow,
  type DigFinding,
  type SeedShare,
} from '@/lib/agronomy/seed-account';
import estimators from '../../reference/stand-estimators.json';
import { answerOf, reasonOf } from './answer-of';
import { countsFrom, rowSampleOf } from './row-sample-of';

const row: AccountedRow = {
  seeds: 34,
  onTime: 29,
  late: 2,
  dayNotSeen: 0,
  doubles: 1,
  digs: ['no-seed', 'seed-rotten'],
};
const accountOf = (changes: Partial<AccountedRow>) => answerOf(seedAccount([{ ...row, ...changes }]));

describe('seedAccount', () => {
  it('accounts for every planned seed, doubles beside them', () => {
    const account = accountOf({});
    const { onTime, late, dayNotSeen, missing } = account;
    expect(onTime.seeds + late.seeds + dayNotSeen.seeds + missing.seeds).toBe(34);
    expect(missing.seeds).toBe(account.digs + account.notAccountedFor.seeds);
    expect(account).toMatchObject({
      seedsPlanned: 34,
      doubles: 1,
      digs: 2,
      missing: { seeds: 3, share: 3 / 34 },
      notAccountedFor: { seeds: 1, share: 1 / 34 },
      beyondPlanned: 0,
    });
  });

  it('gives every share the interval that R prints', () => {
    const account = accountOf({});
    const shares = [account.onTime, account.late, account.missing, account.dug['no-seed'] as SeedShare];
    shares.forEach((share, index) => {
      const { shareLower, shareUpper } = answerOf(share.interval);
      expect(share.seeds).toBe(estimators.seedShares.hits[index]);
      expect(shareLower).toBeCloseTo(estimators.seedShares.lower[index] as number, 9);
      expect(shareUpper).toBeCloseTo(estimators.seedShares.upper[index] as number, 9);
    });
  });

  it('speaks of what was dug only, and leaves the rest unknown', () => {
    const account = accountOf({ digs: ['eaten', 'eaten', 'other'] });
    expect(account.dug).toMatchObject({
      eaten: { seeds: 2, share: 2 / 3 },
      other: { seeds: 1, share: 1 / 3 },
    });
    expect(Object.keys(account.dug)).toEqual(['eaten', 'other']);
    expect(account.notAccountedFor.seeds).toBe(0);
    expect(accountOf({ digs: [] })).toMatchObject({ dug: {}, digs: 0, notAccountedFor: { seeds: 3 } });
  });

  it('knows every finding of the key', () => {
    const account = accountOf({ seeds: 40, digs: digFindings });
    expect(Object.keys(account.dug)).toEqual([...digFindings]);
    expect(account.notAccountedFor.seeds).toBe(0);
  });

  it('adds row samples up, seeds that are no whole number among them', () => {
    const second = { seeds: 33.6, onTime: 30, late: 1, dayNotSeen: 1, doubles: 0, digs: [] };
    const account = answerOf(seedAccount([row, second]));
    expect(account.seedsPlanned).toBeCloseTo(67.6, 9);
    expect(account).toMatchObject({
      onTime: { seeds: 59 },
      late: { seeds: 3 },
      dayNotSeen: { seeds: 1 },
      doubles: 1,
    });
    expect(account.missing.seeds).toBeCloseTo(4.6, 9);
    expect(account.notAccountedFor.seeds).toBeCloseTo(2.6, 9);
    expect(answerOf(seedAccount([second, row]))).toEqual(account);
  });

  it('shows more plants than planned seeds, without an interval of them and without cutting off', () => {
    const account = accountOf({ onTime: 34, digs: [] });
    expect(account).toMatchObject({
      beyondPlanned: 2,
      missing: { seeds: 0, share: 0 },
      notAccountedFor: { seeds: 0 },
    });
    expect(reasonOf(account.missing.interval)).toBe('more-plants-than-seeds');
    expect(account.onTime.share).toBe(1);
    const over = accountOf({ onTime: 35, digs: [] });
    expect(over.onTime.share).toBeCloseTo(35 / 34, 12);
    expect(reasonOf(over.onTime.interval)).toBe('more-plants-than-seeds');
  });

  it('shows digs beyond the planned seeds, since a planter may drop more than its rate', () => {
    const account = accountOf({ digs: ['other', 'other', 'other', 'other'] });
    expect(account).toMatchObject({ beyondPlanned: 1, digs: 4, notAccountedFor: { seeds: 0, share: 0 } });
    expect(account.missing.seeds).toBe(3);
  });

  it('takes a hair of decimals as no excess', () => {
    const account = accountOf({ seeds: 30.99999999999999, digs: [] });
    expect(account).toMatchObject({ beyondPlanned: 0, missing: { seeds: 0 } });
    expect(answerOf(account.missing.interval).shareLower).toBe(0);
  });

  it('is insufficient without a sheet', () => {
    expect(reasonOf(seedAccount([]))).toBe('no-tape-sheets');
  });

  it.each([
    ['seeds', 0],
    ['seeds', NaN],
    ['seeds', Infinity],
    ['onTime', -1],
    ['onTime', 28.5],
    ['late', -1],
    ['late', Infinity],
    ['dayNotSeen', NaN],
    ['doubles', -1],
    ['doubles', 0.5],
  ] as const)('refuses %s of %s, alone or after a sound row', (field, wrong) => {
    const broken = { ...row, [field]: wrong };
    expect(() => seedAccount([broken])).toThrow(expect.objectContaining({ field }));
    expect(() => seedAccount([row, broken])).toThrow(ImpossibleInput);
  });

  it('refuses a finding that is not in the key', () => {
    const digs = ['no-seed', 'toString'] as unknown as DigFinding[];
    expect(() => seedAccount([{ ...row, digs }])).toThrow(expect.objectContaining({ field: 'digs' }));
  });
});

describe('accountedRow', () => {
  const place = (index: number, changes: Partial<TapePlace> = {}): TapePlace => ({
    positionInches: index * 6.15,
    kind: 'plant',
    firstSeen: { afterDays: null, byDays: 8 },
    ...changes,
  });
  /** Up from day 8 on, with one visit a day until 25. */
  const counts = countsFrom(7, [0, 30, ...Array<number>(17).fill(31)]);
  const seen = (byDays: number) => ({ firstSeen: { afterDays: byDays - 1, byDays } });

  it('puts each plant of the sheet into one class, and doubles apart', () => {
    const tape = [
      place(0),
      place(1, seen(11)),
      place(2, seen(17)),
      place(3, seen(25)),
      place(4, { kind: 'double' }),
      place(5, { kind: 'missing', firstSeen: null }),
      place(6, { firstSeen: null }),
    ];
    const account = answerOf(accountedRow(rowSampleOf({ counts, tape }), ['seed-firm']));
    // The plant of day 11 is slow, which is a label of plants on time.
    expect(account).toMatchObject({ onTime: 2, late: 2, dayNotSeen: 1, doubles: 1, digs: ['seed-firm'] });
    expect(account.seeds).toBeCloseTo(34, 9);
  });

  it('takes plants by sight where no visit saw them, and the limits of the planting', () => {
    const unseen = { firstSeen: null };
    const bySight = [
      place(0, unseen),
      place(1, { ...unseen, kind: 'late' }),
      place(2, { ...unseen, kind: 'double' }),
    ];
    expect(answerOf(accountedRow(rowSampleOf({ tape: bySight }), []))).toMatchObject({
      onTime: 1,
      late: 1,
      dayNotSeen: 0,
      doubles: 1,
    });
    const tape = [place(0), place(1, seen(11))];
    const lateLimits = { slowDays: 1, lateDays: 2, veryLateDays: 4 };
    expect(answerOf(accountedRow(rowSampleOf({ counts, tape, lateLimits }), []))).toMatchObject({
      onTime: 1,
      late: 1,
    });
  });

  it('leaves days unknown where nobody saw or marked any', () => {
    const tape = [place(0, { firstSeen: null }), place(1, { firstSeen: null })];
    expect(answerOf(accountedRow(rowSampleOf({ tape }), []))).toMatchObject({
      onTime: 0,
      late: 0,
      dayNotSeen: 2,
    });
  });

  it.each([
    { startEnd: 'mark', farEnd: 'mark', seeds: 34 },
    { startEnd: 'plant', farEnd: 'mark', seeds: 34.5 },
    { startEnd: 'mark', farEnd: 'plant', seeds: 34.5 },
    { startEnd: 'plant', farEnd: 'plant', seeds: 35 },
  ] as const)('plans $seeds seeds from a $startEnd to a $farEnd', ({ seeds, ...ends }) => {
    const account = answerOf(accountedRow(rowSampleOf({ ...ends, tape: [place(0)] }), []));
    expect(account.seeds).toBeCloseTo(seeds, 9);
  });

  it('leaves none missing from a row whose every seed came up, from a plant to a plant', () => {
    const length = 10 * 6.534;
    const tape = Array.from({ length: 11 }, (_, index) => place(index));
    const sample = rowSampleOf({
      seedsPerAcre: 32_000,
      lengthInches: length,
      startEnd: 'plant',
      farEnd: 'plant',
      tape,
    });
    const account = answerOf(seedAccount([answerOf(accountedRow({ ...sample, counts }, []))]));
    expect(account.missing.seeds).toBeCloseTo(0, 9);
    expect(account.beyondPlanned).toBe(0);
  });

  it('is insufficient without a tape sheet or a seeding rate', () => {
    expect(reasonOf(accountedRow(rowSampleOf(), []))).toBe('no-tape-sheet');
    expect(reasonOf(accountedRow(rowSampleOf({ tape: [place(0)], seedsPerAcre: null }), []))).toBe(
      'seeds-not-known',
    );
  });

  it.each([0, -1, Number.NaN])('refuses a length of %s', (lengthInches) => {
    expect(() => accountedRow(rowSampleOf({ tape: [place(0)], lengthInches }), [])).toThrow(ImpossibleInput);
  });
});
