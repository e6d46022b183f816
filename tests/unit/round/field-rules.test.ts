import { describe, expect, it } from 'vitest';
import { afterPress, emptyCount, type CountPress } from '@/lib/client/round/count-draft';
import { checkCountOfRow, countOfDraft, noneNew } from '@/lib/client/round/count-visit';
import { dueOf, hasEnded, newAtLast } from '@/lib/client/round/due-row';
import { wallTimeAt } from '@/lib/client/round/field-time';
import { markerOfToday } from '@/lib/client/round/markers';
import { visitOfRow } from '@/lib/client/round/visit-of-row';
import { walkingOrder } from '@/lib/client/round/walking-order';
import type { KeptEntry } from '@/lib/client/round/entry';
import { aCount, aPlanting, aRow, me } from './round-scene';

const typed = (presses: CountPress[], last = 28) => presses.reduce((draft, press) => afterPress(draft, press, last), emptyCount);
const digits = (text: string): CountPress[] => [...text].map((digit) => ({ press: 'digit', digit: Number(digit) }));

describe('what is due at a row', () => {
  const today = '2026-05-20';
  it.each([
    ['nothing before anything can stand', aRow('A'), '2026-05-18', { do: 'nothing', why: 'too-early' }],
    ['a first count', aRow('A'), '2026-05-01', { do: 'count', why: 'first' }],
    ['a count while plants still come', aRow('A', { counts: [aCount('2026-05-18', 20), aCount('2026-05-19', 24)] }), '2026-05-01', { do: 'count', why: 'still-coming' }],
    ['a count after one visit with nothing new', aRow('A', { counts: [aCount('2026-05-18', 24), aCount('2026-05-19', 24)] }), '2026-05-01', { do: 'count', why: 'one-without-new' }],
    ['nothing more on the day of a count', aRow('A', { counts: [aCount('2026-05-19', 20), aCount(today, 24)] }), '2026-05-01', { do: 'nothing', why: 'counted-today' }],
    ['a tape sheet after two visits with nothing new', aRow('A', { counts: [aCount('2026-05-17', 24), aCount('2026-05-18', 24), aCount('2026-05-19', 24)] }), '2026-05-01', { do: 'tape' }],
  ])('is %s', (_, row, plantedOn, due) => {
    expect(dueOf(row, aPlanting([row], { plantedOn }), today)).toEqual(due);
  });

  it('is the depth of ten plants in one row of each strip only, and nothing in a strip that was lost', () => {
    const ended = [aCount('2026-05-17', 24), aCount('2026-05-18', 24), aCount('2026-05-19', 24)];
    const sheet = { id: 's', visitId: 'v', visitedOn: '2026-05-20', visitedAt: null, visitMarker: null, personId: 'p', personName: 'n', tapeUnit: 'in' as const, readFrom: 'start' as const, zeroAt: 'mark' as const, segmentStarts: [], places: [] };
    const [one, two, lost] = [['S1-1', 'a'], ['S1-2', 'a'], ['S2-1', 'b']].map(([label, stripId]) => aRow(label!, { stripId: stripId!, counts: ended, tapeSheets: [sheet] }));
    const planting = aPlanting([two!, one!, lost!], { strips: [{ id: 'a', number: 1, blockNumber: 1, lost: false }, { id: 'b', number: 2, blockNumber: 1, lost: true }] });
    expect([one, two, lost].map((row) => dueOf(row!, planting, today))).toEqual([{ do: 'depth' }, { do: 'nothing', why: 'done' }, { do: 'nothing', why: 'strip-lost' }]);
  });

  it('tells what is new at the last visit, and that counting has not ended after one such visit', () => {
    const row = aRow('A', { counts: [aCount('2026-05-17', 20), aCount('2026-05-18', 24), aCount('2026-05-19', 24)] });
    expect([newAtLast(row), hasEnded(row, aPlanting([row]))]).toEqual([0, false]);
  });
});

describe('the order of a walk', () => {
  it('goes along the near line and back along the next, and to free places last', () => {
    const rows = [3, 1, 2, 10].flatMap((strip) => [2, 1].map((line) => aRow(`S${strip}-${line}`, { stripNumber: strip, stripId: String(strip) })));
    expect(walkingOrder([aRow('P2'), ...rows, aRow('P1')]).map((row) => row.label)).toEqual(['S1-1', 'S2-1', 'S3-1', 'S10-1', 'S10-2', 'S3-2', 'S2-2', 'S1-2', 'P1', 'P2']);
  });
});

describe('the count keypad', () => {
  it('takes every press, ten a second and more', () => {
    expect(typed(digits('1234')).plants).toBe(1234);
    expect(typed(Array.from({ length: 100 }, () => ({ press: 'more' as const }))).plants).toBe(128);
  });
  it('counts on from the last visit, and from nothing where only new plants are counted', () => {
    expect(typed([{ press: 'more' }, { press: 'more' }, { press: 'fewer' }]).plants).toBe(29);
    expect(typed([{ press: 'as', countedAs: 'new' }, { press: 'more' }]).plants).toBe(1);
  });
  it('never makes a number that cannot be', () => {
    expect(typed(digits('20001')).plants).toBe(2000);
    expect(typed([...digits('1'), { press: 'fewer' }, { press: 'fewer' }]).plants).toBe(0);
    expect(typed([...digits('7'), { press: 'back' }]).plants).toBeNull();
    expect(typed([...digits('77'), { press: 'clear' }]).plants).toBeNull();
  });
  it('keeps the doubtful apart', () => {
    const draft = typed([...digits('28'), { press: 'typing', typing: 'doubtful' }, ...digits('2')]);
    expect(countOfDraft(draft)).toEqual({ countedAs: 'so-far', plants: 28, doubtful: 2 });
  });
  it('takes "looked, none new" as a count of its own, with the doubtful as they were', () => {
    expect(noneNew(emptyCount, aRow('A', { counts: [aCount('2026-05-19', 24, { doubtful: 3 })] }))).toEqual({ countedAs: 'new', plants: 0, doubtful: 3 });
  });
  it('tells no number from zero', () => {
    expect([countOfDraft(emptyCount), countOfDraft(typed(digits('0')))?.plants]).toEqual([undefined, 0]);
  });
  it('asks in the field what the server would ask', () => {
    const row = aRow('S1-1', { counts: [aCount('2026-05-19', 24)] });
    const visit = { id: 'v', personId: null, visitedOn: '2026-05-20', visitedAt: '09:00', marker: null };
    expect(checkCountOfRow(row, { countedAs: 'so-far', plants: 21, doubtful: 0 }, 'c', visit, me)?.questions.map((question) => question.rule)).toEqual(['falling-count']);
    expect(checkCountOfRow(row, { countedAs: 'so-far', plants: 24, doubtful: 30 }, 'c', visit, me)?.fields.map((field) => field.path)).toEqual(['doubtful']);
  });
});

describe('markers and visits', () => {
  it('keeps the marker of the day, and takes a new color for a new day', () => {
    const rows = [aRow('A', { counts: [aCount('2026-05-18', 20, { marker: 'red' }), aCount('2026-05-19', 24, { marker: 'blue' })] })];
    expect([markerOfToday(rows, '2026-05-19'), markerOfToday(rows, '2026-05-20')]).toEqual(['blue', 'white']);
  });
  it('is one visit while the scout stands there, and another later in the day', () => {
    const visit = { id: 'v1', personId: null, visitedOn: '2026-05-20', visitedAt: '09:00', marker: 'red' };
    const entries = [{ body: { visit }, state: 'kept' } as unknown as KeptEntry];
    expect(visitOfRow(entries, { date: '2026-05-20', time: '09:40' }, 'red')).toEqual(visit);
    expect(visitOfRow(entries, { date: '2026-05-20', time: '18:00' }, 'red')).toBeUndefined();
    expect(visitOfRow(entries, { date: '2026-05-20', time: '09:40' }, 'blue')).toBeUndefined();
    // A clock that was set back during the walk begins another visit and never one before its own beginning.
    expect(visitOfRow(entries, { date: '2026-05-20', time: '08:00' }, 'red')).toBeUndefined();
  });
});

describe('the wall clock of a farm', () => {
  it.each([
    // US daylight saving began on 8 March 2026 at 2 in the morning, by law the second Sunday of March.
    ['2026-03-08T07:59:00Z', 'America/Chicago', { date: '2026-03-08', time: '01:59' }],
    ['2026-03-08T08:00:00Z', 'America/Chicago', { date: '2026-03-08', time: '03:00' }],
    ['2026-05-21T04:30:00Z', 'America/Chicago', { date: '2026-05-20', time: '23:30' }],
    ['2026-05-21T05:00:00Z', 'America/Chicago', { date: '2026-05-21', time: '00:00' }],
  ])('reads %s in %s', (instant, zone, wall) => {
    expect(wallTimeAt(Date.parse(instant), zone)).toEqual(wall);
  });
});
