import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { CountScene, yesTo } from '../support/count-scene';
import { makeDecideScenes, type DecideScene } from '../support/decide-scene';

let scene: DecideScene;
let other: DecideScene;
let close: () => Promise<void>;

beforeAll(async () => {
  const made = await makeDecideScenes(2);
  [scene, other] = made.scenes as [DecideScene, DecideScene];
  close = made.close;
});
afterAll(() => close());

const planted = () => new CountScene(scene).settle();

describe('a count', () => {
  it('is kept as typed and read as so far, in the order of visits', async () => {
    const sheet = await planted();
    await sheet.mustCount('A-1', { on: '2026-05-19', plants: 24, doubtful: 2, marker: 'red' });
    await sheet.mustCount('A-1', { on: '2026-05-17', at: '07:30', plants: 11, marker: 'white' });
    await sheet.mustCount('A-1', { on: '2026-05-18', as: 'new', plants: 5 });
    await sheet.mustCount('A-1', { on: '2026-05-20', as: 'new', plants: 0 });
    expect((await sheet.standing('A-1')).map(({ visitedOn, visitedAt, countedAs, plants, plantsUp, doubtful, marker, used }) => [visitedOn, visitedAt, countedAs, plants, plantsUp, doubtful, marker, used])).toEqual([
      ['2026-05-17', '07:30', 'so-far', 11, 11, 0, 'white', true],
      ['2026-05-18', null, 'new', 5, 16, 0, null, true],
      ['2026-05-19', null, 'so-far', 24, 24, 2, 'red', true],
      ['2026-05-20', null, 'new', 0, 24, 0, null, true],
    ]);
    expect(await sheet.standing('A-2')).toEqual([]);
  });

  it.each<[string, Record<string, unknown>, string, RegExp]>([
    ['before planting', { on: '2026-05-06', plants: 1 }, 'visit.visitedOn', /^This is before planting, 7 May 2026/],
    ['on the planting day before planting was done', { on: '2026-05-07', at: '07:00', plants: 0 }, 'visit.visitedOn', /^This is before planting, 7 May 2026 at noon/],
    ['of a day to come', { on: '2026-05-21', plants: 1 }, 'visit.visitedOn', /^This day has not come yet; today is 20 May 2026/],
    ['without a date', { on: '', plants: 1 }, 'visit.visitedOn', /^Give a date/],
    ['of a day no calendar has', { on: '2026-02-30', plants: 1 }, 'visit.visitedOn', /^Give a date/],
    ['at no time of day', { on: '2026-05-18', at: '25:00', plants: 1 }, 'visit.visitedAt', /^Give a time of day/],
    ['in letters', { on: '2026-05-18', plants: 'many' }, 'plants', /whole number/],
    ['left empty', { on: '2026-05-18', plants: '' }, 'plants', /whole number/],
    ['with a decimal comma', { on: '2026-05-18', plants: '11,5' }, 'plants', /whole number/],
    ['of half a plant', { on: '2026-05-18', plants: 11.5 }, 'plants', /whole number/],
    ['below zero', { on: '2026-05-18', plants: -1 }, 'plants', /zero or more/],
    ['of more than any row holds', { on: '2026-05-18', plants: 2_001 }, 'plants', /cannot be right/],
    ['of three times the seeds and more', { on: '2026-05-18', plants: 103 }, 'plants', /^103 plants cannot stand where about 34 seeds were planted/],
    ['with more doubtful plants than plants', { on: '2026-05-18', plants: 3, doubtful: 4 }, 'doubtful', /^No more plants can be doubtful than the 3/],
    ['with a marker longer than a label', { on: '2026-05-18', plants: 3, marker: 'x'.repeat(21) }, 'visit.marker', /./],
  ])('%s is refused at its field', async (_, sent, path, message) => {
    const sheet = await planted();
    const answer = await sheet.count('A-1', sent as never);
    expect(answer).toMatchObject({ outcome: 'refused', code: 'bad-input' });
    expect(answer.fields?.map((field) => field.path)).toEqual([path]);
    expect(answer.fields?.[0]?.message).toMatch(message);
    expect(await sheet.standing('A-1')).toEqual([]);
  });

  it('of more plants than seeds is asked about, and taken with its answer', async () => {
    const sheet = await planted();
    // 34,000 seeds per acre in 17 ft 5 in of a 30-inch row are 33.98 seeds.
    await sheet.mustCount('A-2', { on: '2026-05-18', plants: 34 });
    const asked = await sheet.count('A-1', { on: '2026-05-18', plants: 35 });
    expect(asked).toMatchObject({ outcome: 'refused', code: 'needs-confirmation', questions: [{ rule: 'more-plants-than-seeds' }] });
    expect(await sheet.standing('A-1')).toEqual([]);
    await sheet.mustCount('A-1', { on: '2026-05-18', plants: 35, confirmations: yesTo(asked) });
  });

  it('that falls is asked about, against the visit before and the visit after', async () => {
    const sheet = await planted();
    await sheet.mustCount('A-1', { on: '2026-05-17', plants: 20 });
    await sheet.mustCount('A-1', { on: '2026-05-19', plants: 24 });
    const low = await sheet.count('A-1', { on: '2026-05-18', plants: 19 });
    const high = await sheet.count('A-1', { on: '2026-05-18', plants: 25 });
    expect(low.questions?.map((question) => question.rule)).toEqual(['falling-count']);
    expect(low.questions?.[0]?.sentence).toBe('A-1, 18 May 2026: 19 plants, fewer than the 20 plants on 17 May 2026. Have plants gone?');
    expect(high.questions?.map((question) => question.rule)).toEqual(['falling-count']);
    expect(high.questions?.[0]?.sentence).toBe('A-1, 18 May 2026: 25 plants, more than the 24 plants on 19 May 2026. Have plants gone in between?');
    await sheet.mustCount('A-1', { on: '2026-05-18', plants: 19, confirmations: yesTo(low) });
  });

  it('with another number is asked about anew: an answer holds for what was asked', async () => {
    const sheet = await planted();
    await sheet.mustCount('A-1', { on: '2026-05-17', plants: 20 });
    const asked = await sheet.count('A-1', { on: '2026-05-18', plants: 19 });
    const changed = await sheet.count('A-1', { on: '2026-05-18', plants: 2, confirmations: yesTo(asked) });
    expect(changed).toMatchObject({ code: 'needs-confirmation', questions: [{ rule: 'falling-count' }] });
  });

  it('before a count of new plants does not make that one fall', async () => {
    const sheet = await planted();
    await sheet.mustCount('A-1', { on: '2026-05-19', as: 'new', plants: 2 });
    await sheet.mustCount('A-1', { on: '2026-05-18', plants: 20 });
    expect((await sheet.standing('A-1')).map((count) => count.plantsUp)).toEqual([20, 22]);
  });

  it('that would leave a later one with more doubtful plants than plants is refused', async () => {
    const sheet = await planted();
    await sheet.mustCount('A-1', { on: '2026-05-17', plants: 10 });
    await sheet.mustCount('A-1', { on: '2026-05-19', as: 'new', plants: 5, doubtful: 12 });
    const answer = await sheet.count('A-1', { on: '2026-05-18', plants: 2 });
    expect(answer.fields).toEqual([{ path: 'plants', message: 'With this count, that of 19 May 2026 would have more doubtful plants than plants. Correct that one first.' }]);
  });

  it('by two people at one visit is kept twice and flagged, and the first recorded is used until it is taken back', async () => {
    const sheet = await planted();
    const first = await sheet.mustCount('A-1', { on: '2026-05-18', at: '07:30', plants: 20 }, 'agronomist');
    await sheet.mustCount('A-1', { on: '2026-05-18', at: '07:30', plants: 22 }, 'scout');
    await sheet.mustCount('A-1', { on: '2026-05-19', as: 'new', plants: 1 });
    const show = async () => (await sheet.standing('A-1')).map(({ plantsUp, used, alsoCountedBy }) => [plantsUp, used, alsoCountedBy]);
    expect(await show()).toEqual([[20, true, 'Test scout'], [22, false, 'Test agronomist'], [21, true, null]]);
    expect(await sheet.takeBack('count', first)).toMatchObject({ outcome: 'applied' });
    expect(await show()).toEqual([[22, true, null], [23, true, null]]);
  });

  it('by two people at the very same moment is kept twice, whoever comes first', async () => {
    const sheet = await planted();
    const answers = await Promise.all([
      sheet.count('A-1', { on: '2026-05-18', plants: 20 }, 'agronomist'),
      sheet.count('A-1', { on: '2026-05-18', plants: 22 }, 'scout'),
    ]);
    expect(answers.map((answer) => answer.outcome)).toEqual(['applied', 'applied']);
    expect((await sheet.standing('A-1')).map((count) => count.used)).toEqual([true, false]);
  });

  it('by two people of whom one left the time out is of one visit', async () => {
    const sheet = await planted();
    await sheet.mustCount('A-1', { on: '2026-05-18', at: '07:30', plants: 20 }, 'agronomist');
    await sheet.mustCount('A-1', { on: '2026-05-18', plants: 22 }, 'scout');
    expect((await sheet.standing('A-1')).map((count) => count.used)).toEqual([true, false]);
  });

  it('at two times of one day is of two visits', async () => {
    const sheet = await planted();
    await sheet.mustCount('A-1', { on: '2026-05-18', at: '07:00', plants: 20 });
    await sheet.mustCount('A-1', { on: '2026-05-18', at: '18:00', plants: 22 });
    expect((await sheet.standing('A-1')).map((count) => count.used)).toEqual([true, true]);
  });

  it('by the same person at the same visit is asked about', async () => {
    const sheet = await planted();
    await sheet.mustCount('A-1', { on: '2026-05-18', plants: 20 });
    const again = await sheet.count('A-1', { on: '2026-05-18', plants: 21 });
    expect(again.questions?.map((question) => question.rule)).toEqual(['counted-twice']);
  });
});

describe('a visit', () => {
  it('that stands is named again by its id', async () => {
    const sheet = await planted();
    const visitId = v7();
    await sheet.mustCount('A-1', { on: '2026-05-18', plants: 20, visitId, marker: 'white' });
    const answer = await sheet.tape('A-1', ['3', '9'], { visit: { id: visitId, visitedOn: '2026-05-18', marker: 'white' } });
    expect(answer.outcome).toBe('applied');
    expect((await sheet.observations()).tapeSheets[0]?.visitId).toBe(visitId);
  });

  it('of another row sample is refused, and so is one that stands with another day', async () => {
    const sheet = await planted();
    const visitId = v7();
    await sheet.mustCount('A-1', { on: '2026-05-18', plants: 20, visitId });
    expect((await sheet.count('A-2', { on: '2026-05-18', plants: 20, visitId })).fields?.[0]?.message).toMatch(/belongs to another row sample/);
    expect((await sheet.count('A-1', { on: '2026-05-19', plants: 20, visitId })).fields?.[0]?.path).toBe('visit.visitedOn');
  });

  it('may be another person\'s, who belongs to the account', async () => {
    const sheet = await planted();
    await sheet.mustCount('A-1', { on: '2026-05-18', plants: 20, personId: scene.people.scout.id }, 'agronomist');
    expect((await sheet.standing('A-1'))[0]?.personName).toBe('Test scout');
    const stranger = await sheet.count('A-1', { on: '2026-05-19', plants: 20, personId: other.people.scout.id }, 'agronomist');
    expect(stranger.fields?.[0]?.path).toBe('visit.personId');
  });
});

describe('a correction', () => {
  it('takes the place of the count it names, also where two people counted', async () => {
    const sheet = await planted();
    const visitId = v7();
    const wrong = await sheet.mustCount('A-1', { on: '2026-05-18', plants: 2, visitId });
    await sheet.mustCount('A-1', { on: '2026-05-18', plants: 21 }, 'agronomist');
    await sheet.mustCount('A-1', { on: '2026-05-18', plants: 20, visitId, replacesId: wrong });
    expect((await sheet.standing('A-1')).map(({ plantsUp, used }) => [plantsUp, used])).toEqual([[20, true], [21, false]]);
  });

  it('of what somebody else corrected meanwhile has lost and is kept', async () => {
    const sheet = await planted();
    const wrong = await sheet.mustCount('A-1', { on: '2026-05-18', plants: 2 });
    await sheet.mustCount('A-1', { on: '2026-05-18', plants: 20, replacesId: wrong }, 'agronomist');
    expect(await sheet.count('A-1', { on: '2026-05-18', plants: 22, replacesId: wrong })).toMatchObject({ outcome: 'conflict', code: 'conflict' });
    expect((await sheet.standing('A-1')).map((count) => count.plantsUp)).toEqual([20]);
  });

  it('names a count of the same row sample', async () => {
    const sheet = await planted();
    const ofOther = await sheet.mustCount('A-2', { on: '2026-05-18', plants: 20 });
    for (const replacesId of [ofOther, v7()]) {
      expect((await sheet.count('A-1', { on: '2026-05-18', plants: 22, replacesId })).fields?.[0]?.path).toBe('replacesId');
    }
  });

  it('taken back leaves the count it named standing again', async () => {
    const sheet = await planted();
    const wrong = await sheet.mustCount('A-1', { on: '2026-05-18', plants: 2 });
    const corrected = await sheet.mustCount('A-1', { on: '2026-05-18', plants: 20, replacesId: wrong });
    await sheet.takeBack('count', corrected);
    expect((await sheet.standing('A-1')).map((count) => count.plantsUp)).toEqual([2]);
  });
});

describe('a count sent again', () => {
  it('under the same id and content stands once, whether or not its receipt is known', async () => {
    const sheet = await planted();
    const sent = { on: '2026-05-18', plants: 20, countId: v7(), visitId: v7() };
    expect((await sheet.count('A-1', sent)).outcome).toBe('applied');
    expect((await sheet.count('A-1', sent)).outcome).toBe('applied');
    expect(await sheet.standing('A-1')).toHaveLength(1);
  });

  it('under the same id with other content changes nothing', async () => {
    const sheet = await planted();
    const sent = { on: '2026-05-18', plants: 20, countId: v7(), visitId: v7() };
    await sheet.mustCount('A-1', sent);
    expect(await sheet.count('A-1', { ...sent, plants: 21 })).toMatchObject({ outcome: 'refused', code: 'operation-reused' });
    expect((await sheet.standing('A-1')).map((count) => count.plantsUp)).toEqual([20]);
  });

  it('ten times at once stands once', async () => {
    const sheet = await planted();
    const sent = { on: '2026-05-18', plants: 20, countId: v7(), visitId: v7() };
    const answers = await Promise.all(Array.from({ length: 10 }, () => sheet.count('A-1', sent)));
    expect(new Set(answers.map((answer) => answer.outcome))).toEqual(new Set(['applied']));
    expect(await sheet.standing('A-1')).toHaveLength(1);
  });
});

describe('taking back', () => {
  it('asks for a reason', async () => {
    const sheet = await planted();
    const id = await sheet.mustCount('A-1', { on: '2026-05-18', plants: 20 });
    expect((await sheet.takeBack('count', id, ' ')).fields).toEqual([{ path: 'reason', message: 'Say why.' }]);
    expect(await sheet.standing('A-1')).toHaveLength(1);
  });

  it('twice is taking back once', async () => {
    const sheet = await planted();
    const id = await sheet.mustCount('A-1', { on: '2026-05-18', plants: 20 });
    const answers = await Promise.all([sheet.takeBack('count', id), sheet.takeBack('count', id, 'Another reason', 'agronomist')]);
    expect(answers.map((answer) => answer.outcome)).toEqual(['applied', 'applied']);
    expect(await sheet.standing('A-1')).toEqual([]);
  });

  it('does not leave a later count with more doubtful plants than plants', async () => {
    const sheet = await planted();
    const first = await sheet.mustCount('A-1', { on: '2026-05-17', plants: 10 });
    await sheet.mustCount('A-1', { on: '2026-05-19', as: 'new', plants: 5, doubtful: 12 });
    expect(await sheet.takeBack('count', first)).toMatchObject({ outcome: 'refused', code: 'in-use' });
    expect(await sheet.standing('A-1')).toHaveLength(2);
  });
});

describe('whose counts', () => {
  it('a grower reads and does not write, a neighbor finds nothing, and another account neither', async () => {
    const sheet = await planted();
    expect(await sheet.count('A-1', { on: '2026-05-18', plants: 20 }, 'grower')).toMatchObject({ code: 'forbidden' });
    expect(await sheet.count('A-1', { on: '2026-05-18', plants: 20 }, 'neighbor')).toMatchObject({ code: 'forbidden' });
    const id = await sheet.mustCount('A-1', { on: '2026-05-18', plants: 20 });
    const body = { rowSampleId: sheet.row('A-1'), visit: { id: v7(), personId: null, visitedOn: '2026-05-19', visitedAt: null, marker: null }, countedAs: 'so-far', plants: 9, doubtful: 0, replacesId: null };
    expect(await other.send('owner', 'count.record', v7(), body)).toMatchObject({ code: 'not-found' });
    expect(await other.send('owner', 'observation.withdraw', v7(), { targetKind: 'count', targetId: id, reason: 'Mine' })).toMatchObject({ code: 'not-found' });
    expect(await sheet.standing('A-1')).toHaveLength(1);
  });
});

describe('in-row cover', () => {
  const send = (sheet: CountScene, body: Record<string, unknown>, id = v7()) =>
    scene.send('scout', 'residue.record', id, { rowSampleId: sheet.row('A-1'), readOn: '2026-05-08', marksRead: 50, marksCovered: 17, ...body });

  it('is kept as marks, sent again once, and can be taken back', async () => {
    const sheet = await planted();
    const id = v7();
    expect((await send(sheet, {}, id)).outcome).toBe('applied');
    expect((await send(sheet, {}, id)).outcome).toBe('applied');
    expect(await send(sheet, { marksCovered: 18 }, id)).toMatchObject({ code: 'operation-reused' });
    expect((await sheet.observations()).residueReadings).toEqual([{ id, rowSampleId: sheet.row('A-1'), readOn: '2026-05-08', marksRead: 50, marksCovered: 17 }]);
    await sheet.takeBack('residue-reading', id);
    expect((await sheet.observations()).residueReadings).toEqual([]);
  });

  it.each<[Record<string, unknown>, string]>([
    [{ marksCovered: 51 }, 'marksCovered'],
    [{ marksRead: 0, marksCovered: 0 }, 'marksRead'],
    [{ marksRead: '' }, 'marksRead'],
    [{ marksCovered: -1 }, 'marksCovered'],
    [{ readOn: '2026-05-21' }, 'readOn'],
    [{ readOn: '2024-05-21' }, 'readOn'],
    [{ readOn: '' }, 'readOn'],
  ])('refuses %j at its field', async (body, path) => {
    const sheet = await planted();
    const answer = await send(sheet, body);
    expect(answer.fields?.map((field) => field.path)).toContain(path);
    expect(answer.fields?.every((field) => !/Invalid input|expected/.test(field.message))).toBe(true);
  });
});
