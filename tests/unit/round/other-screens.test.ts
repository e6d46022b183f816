import { describe, expect, it } from 'vitest';
import { studentQuantile } from '@/lib/agronomy/inference/student-t';
import { smallT } from '@/lib/agronomy/small-t-table';
import { placesSoFar } from '@/lib/client/round/another-place';
import { afterCoverPress, coverFigures, emptyCover } from '@/lib/client/round/cover-draft';
import { afterDepthPress, depthFigures, emptyDepths, type DepthPress } from '@/lib/client/round/depth-draft';
import { hoursTyped } from '@/lib/client/round/hours-typed';
import { markersLeft, markersSet } from '@/lib/client/round/markers-left';
import { instantOf, restrictedUntil } from '@/lib/client/round/restricted-until';
import type { RoundField } from '@/lib/schemas/round-day';
import { aCount, aRow, me, other } from './round-scene';

const zone = 'America/Chicago';
const field = (restriction: Partial<RoundField['restrictions'][number]>): RoundField => ({
  id: 'f', farmId: 'a', name: 'Back forty',
  restrictions: [{ id: 'r', product: 'Invented herbicide', endedOn: '2026-05-20', endedAt: '06:30', hours: 12, personName: other.name, exceptions: [], ...restriction }],
});
const at = (date: string, time: string) => ({ date, time, zone });

describe('restricted entry', () => {
  it('blocks until the interval has passed since the end of the application, to the minute', () => {
    expect(restrictedUntil(field({}), at('2026-05-20', '18:29'), me.id)?.until).toEqual({ date: '2026-05-20', time: '18:30' });
    expect(restrictedUntil(field({}), at('2026-05-20', '18:30'), me.id)).toBeUndefined();
  });
  it('counts real hours through the night in which the clocks go forward, and back', () => {
    // 2 a.m. became 3 a.m. on 8 March 2026: twelve hours after 20:00 are 9:00 by the clock, not 8:00.
    expect(restrictedUntil(field({ endedOn: '2026-03-07', endedAt: '20:00' }), at('2026-03-08', '08:30'), me.id)?.until).toEqual({ date: '2026-03-08', time: '09:00' });
    // 2 a.m. became 1 a.m. on 1 November 2026.
    expect(restrictedUntil(field({ endedOn: '2026-10-31', endedAt: '20:00' }), at('2026-11-01', '06:00'), me.id)?.until).toEqual({ date: '2026-11-01', time: '07:00' });
  });
  it('takes the later of two hours that read alike', () => {
    expect(new Date(instantOf({ date: '2026-11-01', time: '01:30' }, zone)).toISOString()).toBe('2026-11-01T07:30:00.000Z');
  });
  it('is opened by an exception for the person and the day it was recorded for, and for nobody else', () => {
    const excepted = field({ exceptions: [{ id: 'e', personId: me.id, enteredOn: '2026-05-20', exception: 'No contact', equipment: 'Gloves' }] });
    expect(restrictedUntil(excepted, at('2026-05-20', '10:00'), me.id)).toBeUndefined();
    expect(restrictedUntil(excepted, at('2026-05-20', '10:00'), other.id)).toBeDefined();
  });
  it.each([['12', 12], ['4,5', 4.5], ['0', undefined], ['-3', undefined], ['', undefined], ['5000', undefined], ['a day', undefined]])('reads hours typed as %s', (typed, hours) => {
    expect(hoursTyped(typed)).toBe(hours);
  });
});

describe('seeding depths on the keypad', () => {
  const press = (presses: DepthPress[], from = emptyDepths) => presses.reduce(afterDepthPress, from);
  const keys = (...texts: string[]): DepthPress[] => texts.map((text) => ({ press: 'key', text }));
  it('puts a fraction behind the whole inches, and another in its place', () => {
    expect(press(keys('1', '3/4')).current).toBe('1 3/4');
    expect(press(keys('1', '3/4', '1/2')).current).toBe('1 1/2');
    expect(press([...keys('1', '3/4'), { press: 'back' }]).current).toBe('1');
    expect(press(keys('1/2')).current).toBe('1/2');
  });
  it('takes no depth that cannot be, and gives the last one back to be mended', () => {
    expect(press([...keys('9'), { press: 'next' }]).depths).toEqual([]);
    const two = press([...keys('2'), { press: 'next' }, ...keys('1', '1/2'), { press: 'next' }]);
    expect(two.depths).toEqual(['2', '1 1/2']);
    expect(press([{ press: 'back' }], two)).toMatchObject({ depths: ['2'], current: '1 1/2' });
  });
  it('says mean and range in the unit typed', () => {
    expect(depthFigures(['2', '1 1/2', '1 3/4'], 'in')).toEqual({ mean: 1.75, least: 1.5, most: 2 });
    expect(depthFigures([], 'in')).toBeUndefined();
  });
});

describe('cover read mark by mark', () => {
  it('says 44 of 100 as 44 percent (Missouri G1570), and takes the last mark back', () => {
    const read = Array.from({ length: 100 }, (_, index) => (index < 44 ? ('residue' as const) : ('bare' as const))).reduce(afterCoverPress, emptyCover);
    expect(coverFigures(read)).toEqual({ marksRead: 100, marksCovered: 44, percent: 44 });
    expect(coverFigures(afterCoverPress(read, 'undo'))).toMatchObject({ marksRead: 99, marksCovered: 44 });
    expect(coverFigures(emptyCover).percent).toBeNull();
  });
});

describe('places of a spot count', () => {
  it('agrees with the distribution of the server at every number of places', () => {
    for (let df = 1; df <= 30; df += 1) expect(smallT(df)).toBeCloseTo(studentQuantile(0.975, df), 2);
  });
  it('says nothing of a field from one place', () => {
    expect(placesSoFar([30_000])).toEqual({ answer: 'insufficient', places: 1 });
  });
  it('gives mean and interval from the spread between places', () => {
    // 28, 30, 32 thousand: SD 2,000, standard error 1,154.7, t(2) 4.303: 4,968.7 to each side (by hand).
    const found = placesSoFar([28_000, 30_000, 32_000]);
    expect(found).toMatchObject({ answer: 'interval', places: 3, mean: 30_000 });
    expect(found.answer === 'interval' && [found.lower, found.upper].map(Math.round)).toEqual([25_031, 34_969]);
    expect(found.answer === 'interval' && found.narrowerBy).toBeGreaterThan(0);
  });
});

describe('markers out', () => {
  it('takes one marker a plant as set until somebody has counted them', () => {
    const row = aRow('A', { counts: [aCount('2026-05-18', 20, { marker: 'red' }), aCount('2026-05-19', 24, { marker: 'blue' })] });
    expect(markersSet(row)).toEqual({ markers: 24, recorded: false });
    expect(markersSet(aRow('B', { counts: [aCount('2026-05-18', 20)] }))).toEqual({ markers: 0, recorded: false });
  });
  it('is done only when every row is: more out of one does not make up for another', () => {
    const marked = (set: number, out: number) => aRow('A', { markers: [{ id: 'a', event: 'set', happenedOn: '2026-05-18', markers: set, personName: 'x' }, { id: 'b', event: 'taken-up', happenedOn: '2026-05-25', markers: out, personName: 'x' }] });
    expect(markersLeft([marked(24, 21), marked(20, 23)])).toBe(3);
    expect(markersLeft([marked(24, 24)])).toBe(0);
  });
});
