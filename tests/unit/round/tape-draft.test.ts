import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { afterTapePress, beginTape, correctTape, goThrough, inchesFromLast, isPending, sheetBody, type TapeDraft, type TapeHand, type TapePress } from '@/lib/client/round/tape-draft';
import { checkSheetOfRow, markersOfSheet } from '@/lib/client/round/tape-sheet-of-row';
import type { RoundRow, RoundTapeSheet } from '@/lib/schemas/round-day';

const hand: TapeHand = { unit: 'in', step: 'half', zeroAt: 'mark', readFrom: 'start' };
const me = { id: 'scout', name: 'Scout' };
const visit = { id: 'visit', personId: null, visitedOn: '2026-05-20', visitedAt: '08:00', marker: null };

/** Presses as a scout makes them: digits and signs typed, other words pressed. */
function pressed(draft: TapeDraft, ...keys: (string | TapePress)[]): TapeDraft {
  const words = new Set(['next', 'back', 'undo', 'in-order', 'insert', 'remove', 'cut', 'surely-inches']);
  const presses = keys.flatMap((key): TapePress[] => {
    if (typeof key !== 'string') return [key];
    if (words.has(key)) return [{ press: key } as TapePress];
    return [...key].map((sign): TapePress => (sign === '½' || sign === '¼' || sign === '¾' ? { press: 'fraction', text: sign } : { press: 'key', text: sign }));
  });
  return presses.reduce(afterTapePress, draft);
}
const read = (...places: string[]) => pressed(beginTape(hand), ...places.flatMap((place) => [place, 'next']));
const typed = (draft: TapeDraft) => draft.places.map((place) => place.typed);
const marker = (name: string | null): TapePress => ({ press: 'marker', marker: name });
const select = (index: number): TapePress => ({ press: 'select', index });

const sheet: RoundTapeSheet = {
  id: 'before', visitId: 'v', visitedOn: '2026-05-18', visitedAt: null, visitMarker: null, personId: 'scout', personName: 'Scout', tapeUnit: 'in', readFrom: 'far-end', zeroAt: 'mark', segmentStarts: [2],
  places: ['6', '12½', '5', '11'].map((place) => ({ typed: place, kind: 'plant', marker: 'red', leafStage: 2 })),
};

describe('reading a tape', () => {
  it('takes a place with its digits and Next', () => {
    expect(typed(read('4', '11½', '17'))).toEqual(['4', '11½', '17']);
  });

  it('carries the marker to the next plant, and neither kind nor leaf stage', () => {
    const draft = pressed(beginTape(hand), marker('red'), '4', { press: 'kind', kind: 'late' }, { press: 'leaf', by: 0.5 }, 'next', '11', 'next');
    expect(draft.places).toEqual([
      { typed: '4', kind: 'late', marker: 'red', leafStage: 2, cutBefore: false },
      { typed: '11', kind: 'plant', marker: 'red', leafStage: null, cutBefore: false },
    ]);
  });

  it('begins the leaf stage at that of the plant before, and goes by halves', () => {
    const first = pressed(beginTape(hand), { press: 'leaf', by: 0.5 }, { press: 'leaf', by: 0.5 }, '4', 'next');
    expect(first.places[0]?.leafStage).toBe(2.5);
    expect(pressed(first, { press: 'leaf', by: -0.5 }).current.leafStage).toBe(2.5);
    const gone = Array.from({ length: 6 }, (): TapePress => ({ press: 'leaf', by: -0.5 }));
    expect(pressed(first, { press: 'leaf', by: -0.5 }, ...gone).current.leafStage).toBeNull();
  });

  it('lets a kind go with a second press', () => {
    expect(pressed(beginTape(hand), { press: 'kind', kind: 'double' }, { press: 'kind', kind: 'double' }).current.kind).toBe('plant');
  });

  it.each([
    ['½ twice', ['4', '½', '½'], '4'],
    ['another quarter', ['4', '¼', '¾'], '4¾'],
    ['a digit behind a fraction', ['4', '½', '5'], '4½'],
    ['two points', ['4', '.', '.', '5'], '4.5'],
    ['a fraction behind a point', ['4', '.', '½'], '4.'],
    ['feet without a number', ["'", '4'], '4'],
    ['feet twice', ['5', "'", '8', "'"], "5'8"],
    ['a number without end', ['1234567890123'], '123456789012'],
    ['the last sign deleted', ['45', 'back'], '4'],
  ])('makes sense of %s', (_, keys, expected) => {
    expect(pressed(beginTape(hand), ...keys).current.typed).toBe(expected);
  });

  it('does not take what the tape cannot read, and goes on once it is mended', () => {
    const draft = pressed(beginTape({ ...hand, unit: 'ft-in' }), '5½', 'next');
    expect([draft.refused, typed(draft)]).toEqual(['unread', []]);
    expect(typed(pressed(draft, 'back', "'", '3½', 'next'))).toEqual(["5'3½"]);
  });

  it('does not take a place before the last one, and puts it in order when told so', () => {
    const draft = pressed(read('4', '11', '17'), '9', 'next');
    expect([draft.refused, typed(draft)]).toEqual(['order', ['4', '11', '17']]);
    expect(typed(pressed(draft, 'in-order'))).toEqual(['4', '9', '11', '17']);
    expect(typed(pressed(draft, '0', 'next'))).toEqual(['4', '11', '17', '90']);
  });

  it('changes, takes out and adds before a place, and then goes on at the end', () => {
    const draft = read('4', '11', '17');
    const changed = pressed(draft, select(1), '12', 'next');
    expect([typed(changed), changed.at]).toEqual([['4', '12', '17'], { put: 'end' }]);
    expect(typed(pressed(draft, select(1), 'remove'))).toEqual(['4', '17']);
    expect(typed(pressed(draft, select(1), 'insert', '9', 'next'))).toEqual(['4', '9', '11', '17']);
    expect(pressed(draft, select(1), '18', 'next').refused).toBe('order');
    expect(typed(pressed(draft, select(1), '18', 'next', 'in-order'))).toEqual(['4', '17', '18']);
  });

  it('notes a marker, kind and leaf of a place that stands at once', () => {
    const draft = pressed(read('4', '11'), select(0), marker('blue'), { press: 'kind', kind: 'late' });
    expect(draft.places[0]).toMatchObject({ typed: '4', marker: 'blue', kind: 'late' });
    expect(pressed(draft, select(0)).at).toEqual({ put: 'end' });
  });

  it('takes what is typed before it goes to another place', () => {
    const draft = pressed(read('4', '11'), '17', select(0));
    expect([typed(draft), draft.at]).toEqual([['4', '11', '17'], { put: 'change', index: 0 }]);
    expect(pressed(read('4', '11'), '2', select(0))).toMatchObject({ refused: 'order', at: { put: 'end' } });
  });

  it('lays the tape anew after a cut, and begins again from its zero', () => {
    const draft = pressed(read('4', '11'), 'cut', '3', 'next', '9', 'next');
    expect(sheetBody(draft)).toMatchObject({ segmentStarts: [2], places: [{ typed: '4' }, { typed: '11' }, { typed: '3' }, { typed: '9' }] });
    expect(sheetBody(pressed(draft, select(2), 'remove')).segmentStarts).toEqual([2]);
    expect(sheetBody(pressed(draft, select(2), 'insert', '1', 'next')).segmentStarts).toEqual([2]);
    expect(typed(pressed(draft, '6', 'next', 'in-order'))).toEqual(['4', '11', '3', '6', '9']);
    expect(sheetBody(pressed(draft, '1', 'next', 'in-order'))).toMatchObject({ segmentStarts: [2], places: [{}, {}, { typed: '1' }, {}, {}] });
    expect(sheetBody(pressed(draft, select(2), 'cut')).segmentStarts).toEqual([]);
    expect(pressed(beginTape(hand), 'cut').current.cutBefore).toBe(false);
  });

  it('has the plant at zero typed where the tape is laid from a plant', () => {
    const draft = pressed(beginTape({ ...hand, zeroAt: 'plant' }), marker('red'), 'next');
    expect(draft.places).toMatchObject([{ typed: '0', marker: 'red' }]);
  });

  it('says how far on a place lies, but not over a cut', () => {
    expect(inchesFromLast(pressed(read('4'), '11½'))).toBe(7.5);
    expect(inchesFromLast(pressed(read('4'), 'cut', '3'))).toBeUndefined();
    expect(inchesFromLast(pressed(beginTape({ ...hand, unit: 'cm' }), '10', 'next', '35.4'))).toBeCloseTo(10, 9);
  });
});

describe('a sheet that begins with the last one', () => {
  it('goes through its places one by one, each still there with one press', () => {
    const draft = goThrough(sheet, hand);
    expect([draft.toGo, draft.at, draft.readFrom, draft.places[0]?.leafStage]).toEqual([4, { put: 'change', index: 0 }, 'far-end', null]);
    const gone = pressed(draft, 'next', '13', 'next', 'remove', 'next');
    expect([typed(gone), gone.toGo, gone.at]).toEqual([['6', '13', '11'], 0, { put: 'end' }]);
    expect(sheetBody(gone)).toMatchObject({ readFrom: 'far-end', segmentStarts: [2] });
  });

  it('comes back to where it was after another place', () => {
    const draft = pressed(goThrough(sheet, hand), 'next', select(0), '7', 'next');
    expect([draft.toGo, draft.at, typed(draft)[0]]).toEqual([3, { put: 'change', index: 1 }, '7']);
    expect(pressed(goThrough(sheet, hand), 'insert', '2', 'next')).toMatchObject({ toGo: 4, at: { put: 'change', index: 1 } });
  });

  it('keeps what was read where it corrects the sheet of the day', () => {
    const draft = correctTape(sheet, hand);
    expect(draft).toMatchObject({ toGo: 0, replacesId: 'before', at: { put: 'end' }, places: [{ leafStage: 2 }, {}, { cutBefore: true }, {}] });
  });
});

describe('undo', () => {
  const presses: fc.Arbitrary<TapePress> = fc.oneof(
    { weight: 6, arbitrary: fc.constantFrom('0', '1', '2', '9', '.', "'").map((text): TapePress => ({ press: 'key', text })) },
    { weight: 6, arbitrary: fc.constant<TapePress>({ press: 'next' }) },
    fc.constantFrom<TapePress>({ press: 'back' }, { press: 'in-order' }, { press: 'insert' }, { press: 'remove' }, { press: 'cut' }, { press: 'fraction', text: '½' }, { press: 'leaf', by: 0.5 }, { press: 'kind', kind: 'late' }, { press: 'marker', marker: 'red' }),
    fc.nat(6).map(select),
  );

  it('leads back by one press from any press, as stored and read again', () => {
    fc.assert(
      fc.property(fc.array(presses, { maxLength: 60 }), presses, (before, last) => {
        const standing = before.reduce(afterTapePress, beginTape(hand));
        const after = JSON.parse(JSON.stringify(afterTapePress(standing, last))) as TapeDraft;
        if (JSON.stringify(after) === JSON.stringify(standing)) return;
        const back = afterTapePress(after, { press: 'undo' });
        expect({ ...back, past: [] }).toEqual(JSON.parse(JSON.stringify({ ...standing, past: [] })));
      }),
    );
  });

  it('never leaves a sheet that the server would find out of order, except where a cut was taken away', () => {
    fc.assert(
      fc.property(fc.array(presses.filter((each) => each.press !== 'cut'), { maxLength: 80 }), (made) => {
        const draft = made.reduce(afterTapePress, beginTape(hand));
        expect(checkSheetOfRow(rowOf(), draft, visit, me).fields).toEqual([]);
        expect(draft.toGo).toBe(0);
      }),
    );
  });

  it('keeps what one press changed and not the sheet, so that the fortieth plant costs no more than the first', () => {
    const many = read(...Array.from({ length: 60 }, (_, index) => String(index * 3)));
    expect(JSON.stringify(many.past).length).toBeLessThan(20_000);
    expect(many.past.length).toBeLessThanOrEqual(40);
  });
});

const rowOf = (more: Partial<RoundRow> = {}): RoundRow => ({
  id: 'row', label: 'A-1', stripId: null, stripNumber: null, blockNumber: null, zoneName: null, planterRow: null, length: { typed: '17 ft 5 in', unit: 'in', inches: 1e9 }, startEnd: 'mark', farEnd: 'mark', seeds: 34,
  counts: [], tapeSheets: [], depths: [], cover: [], digs: [], crusts: [], markers: [], ...more,
});
const count = (visitedOn: string, name: string | null) => ({ id: visitedOn, visitId: visitedOn, visitedOn, visitedAt: null, marker: name, personId: 'scout', personName: 'Scout', countedAs: 'so-far' as const, plants: 1, plantsUp: 1, doubtful: 0, used: true });

describe('a sheet held against its row', () => {
  it('chooses among the markers of the visits, by day, and those the sheet has besides', () => {
    const row = rowOf({ counts: [count('2026-05-16', 'red'), count('2026-05-17', 'blue'), count('2026-05-18', null), count('2026-05-19', 'Red')] });
    const draft = pressed(beginTape(hand), marker('BLUE'), '4', 'next', marker('pink'));
    expect(markersOfSheet(row, [...draft.places, draft.current])).toEqual([
      { marker: 'blue', on: '2026-05-17' },
      { marker: 'Red', on: '2026-05-19' },
      { marker: 'pink', on: null },
    ]);
  });

  it('asks what the server asks, in its words', () => {
    const row = rowOf({ length: { typed: '20 in', unit: 'in', inches: 20 }, tapeSheets: [{ ...sheet, visitedOn: '2026-05-20' }] });
    const draft = pressed(beginTape(hand), marker('pink'), '4', 'next', '4', 'next', '21', 'next');
    expect(checkSheetOfRow(row, draft, visit, me).questions.map(({ rule, about }) => [rule, about])).toEqual([
      ['taped-twice', 'A-1: 3'],
      ['two-at-one-mark', 'A-1: 4'],
      ['place-outside-length', 'A-1: 21'],
      ['unknown-marker', 'A-1: pink'],
    ]);
    expect(checkSheetOfRow(row, { ...draft, replacesId: 'before' }, visit, me).questions.map(({ rule }) => rule)).not.toContain('taped-twice');
  });

  it('notices feet and tenths from the fourth place on, until the scout says that they are inches', () => {
    const row = rowOf({ length: { typed: '17 ft 5 in', unit: 'in', inches: 209 } });
    const draft = pressed(beginTape({ ...hand, step: 'tenth' }), '.4', 'next', '1.1', 'next', '1.6', 'next', '2.3', 'next');
    expect(checkSheetOfRow(row, draft, visit, me).tape?.about).toBe('A-1: .4 to 2.3');
    const sure = pressed(draft, 'surely-inches');
    expect(checkSheetOfRow(row, sure, visit, me).questions).toEqual([]);
    const changed = pressed(draft, { press: 'hand', hand: { unit: 'ft-tenths', step: 'tenth' } });
    expect(checkSheetOfRow(row, changed, visit, me).tape).toBeUndefined();
  });

  it('has nothing pending once every number is taken', () => {
    expect(isPending(pressed(beginTape(hand), '4'))).toBe(true);
    expect(isPending(read('4'))).toBe(false);
    expect(isPending(pressed(read('4'), select(0)))).toBe(false);
    expect(isPending(pressed(read('4'), select(0), '5'))).toBe(true);
    expect(isPending(goThrough(sheet, hand))).toBe(false);
  });
});
