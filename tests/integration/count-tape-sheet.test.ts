import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { spacingsInches, spacingVariation } from '@/lib/agronomy/spacing';
import { CountScene, yesTo } from '../support/count-scene';
import { makeDecideScenes, type DecideScene } from '../support/decide-scene';
import { scoresOf } from '../support/trial-scene';

let scene: DecideScene;
let close: () => Promise<void>;

beforeAll(async () => {
  const made = await makeDecideScenes(1);
  [scene] = made.scenes as [DecideScene];
  close = made.close;
});
afterAll(() => close());

const planted = () => new CountScene(scene).settle();
const sheetsOf = async (scene: CountScene, label = 'A-1') => (await scene.observations()).tapeSheets.filter((sheet) => sheet.rowSampleId === scene.row(label));
const rules = (answer: { questions?: { rule: string }[] | undefined }) => answer.questions?.map((question) => question.rule);

describe('a tape sheet', () => {
  it('of the published readings has their mean and SD', async () => {
    const row = await new CountScene(scene).settle(['B-1'], '68 in', 'plant');
    expect((await row.tape('B-1', '0 2 17 33 38 39 44 52 55 60 68'.split(' '))).outcome).toBe('applied');
    const [sheet] = await sheetsOf(row, 'B-1');
    const spacing = spacingVariation(spacingsInches(sheet?.places.map((place) => place.positionInches) ?? []));
    if (spacing.kind !== 'value') throw new Error(spacing.reason);
    // Printed with the SSMG-37 guide: mean 6.8 in, SD 5.1 in.
    expect(spacing.value.spacingInchesMean).toBeCloseTo(6.8, 9);
    expect(spacing.value.spacingInchesSd).toBeCloseTo(5.116, 3);
  });

  it('comes back exactly as it was typed, on the tape it was read off', async () => {
    const row = await planted();
    const places = [
      { typed: '5 ft 3', marker: 'White', leafStage: 2.5 },
      { typed: "5'9 1/2", kind: 'late' },
      { typed: '6 ft', kind: 'missing' },
      { typed: '6 ft', kind: 'double' },
    ];
    await row.mustCount('A-1', { on: '2026-05-16', plants: 0 });
    await row.mustCount('A-1', { on: '2026-05-17', at: '07:30', plants: 1, marker: 'white' });
    expect((await row.tape('A-1', places, { tapeUnit: 'ft-in' })).outcome).toBe('applied');
    expect(await sheetsOf(row)).toMatchObject([
      {
        tapeUnit: 'ft-in',
        used: true,
        places: [
          { typed: '5 ft 3', positionInches: 63, kind: 'plant', marker: 'White', leafStage: 2.5, firstSeen: { after: { on: '2026-05-16', at: null }, by: { on: '2026-05-17', at: '07:30' } } },
          { typed: "5'9 1/2", positionInches: 69.5, kind: 'late', marker: null, leafStage: null, firstSeen: null },
          { typed: '6 ft', positionInches: 72, kind: 'missing', firstSeen: null },
          { typed: '6 ft', positionInches: 72, kind: 'double', firstSeen: null },
        ],
      },
    ]);
  });

  it('reads a marker of the first visit as up by then, and one of two visits as between them', async () => {
    const row = await planted();
    for (const [day, plants, marker] of [['16', 2, 'red'], ['17', 5, 'white'], ['18', 9, 'blue'], ['19', 12, 'white']] as const) {
      await row.mustCount('A-1', { on: `2026-05-${day}`, plants, marker });
    }
    await row.tape('A-1', [{ typed: '3', marker: 'red' }, { typed: '9', marker: 'white' }]);
    const [sheet] = await sheetsOf(row);
    expect(sheet?.places.map((place) => [place.firstSeen?.after?.on ?? null, place.firstSeen?.by.on])).toEqual([[null, '2026-05-16'], ['2026-05-16', '2026-05-19']]);
  });

  it.each<[string, (string | Record<string, unknown>)[], Record<string, unknown>, string]>([
    ['empty', [], {}, 'places'],
    ['with an empty place', ['3', ' '], {}, 'places.1.typed'],
    ['in letters', ['3', 'six'], {}, 'places.1.typed'],
    ['below zero', ['-3'], {}, 'places.0.typed'],
    ['of another tape', ['5 ft 3'], { tapeUnit: 'cm' }, 'places.0.typed'],
    ['with leaf collars in letters', [{ typed: '3', leafStage: 'two' }], {}, 'places.0.leafStage'],
    ['before planting', ['3'], { on: '2026-05-01' }, 'visit.visitedOn'],
    ['of a day to come', ['3'], { on: '2026-05-21' }, 'visit.visitedOn'],
  ])('%s is refused at its field', async (_, places, more, path) => {
    const row = await planted();
    const answer = await row.tape('A-1', places, more);
    expect(answer).toMatchObject({ outcome: 'refused', code: 'bad-input' });
    expect(answer.fields?.map((field) => field.path)).toEqual([path]);
    expect(answer.fields?.[0]?.message).not.toMatch(/Invalid|expected/);
    expect(await sheetsOf(row)).toEqual([]);
  });

  it('names each place that is out of order, and not the right ones after a slip', async () => {
    const row = await planted();
    const answer = await row.tape('A-1', ['3', '55', '12', '18', '60', '70', '65']);
    expect(answer.fields?.map((field) => [field.path, field.message.slice(0, 21)])).toEqual([
      ['places.2.typed', '12 comes after 55, an'],
      ['places.3.typed', '18 comes after 55, an'],
      ['places.6.typed', '65 comes after 70, an'],
    ]);
  });

  it('asks about a place outside the length, and takes it with the answer', async () => {
    const row = await planted();
    // 17 ft 5 in are 209 in.
    expect((await row.tape('A-2', ['3', '209'])).outcome).toBe('applied');
    const asked = await row.tape('A-1', ['3', '209.5']);
    expect(rules(asked)).toEqual(['place-outside-length']);
    expect(await sheetsOf(row)).toEqual([]);
    expect((await row.tape('A-1', ['3', '209.5'], { confirmations: yesTo(asked) })).outcome).toBe('applied');
  });

  it('asks about two plants at one mark, unless one is noted as a double', async () => {
    const row = await planted();
    expect(rules(await row.tape('A-1', ['3', '9', '9']))).toEqual(['two-at-one-mark']);
    expect((await row.tape('A-1', ['3', '9', { typed: '9', kind: 'double' }])).outcome).toBe('applied');
  });

  it('asks about more places than seeds', async () => {
    const row = await planted();
    const places = (count: number) => Array.from({ length: count }, (_, index) => String(index * 5));
    // 34,000 seeds per acre in 17 ft 5 in of a 30-inch row are 33.98 seeds.
    expect(rules(await row.tape('A-1', places(35)))).toEqual(['more-places-than-seeds']);
    expect((await row.tape('A-1', places(34))).outcome).toBe('applied');
  });

  it('asks once about a marker that no visit of the row has', async () => {
    const row = await planted();
    await row.mustCount('A-1', { on: '2026-05-17', plants: 2, marker: 'white' });
    await row.mustCount('A-2', { on: '2026-05-17', plants: 2, marker: 'pink' });
    const asked = await row.tape('A-1', [{ typed: '3', marker: 'WHITE' }, { typed: '9', marker: 'pink' }, { typed: '15', marker: 'pink' }]);
    expect(asked.questions?.map((question) => question.sentence)).toEqual(['A-1: no visit of this row has the marker pink, so it tells no day. Keep it all the same?']);
  });

  it('counts no plant where one is missing', async () => {
    const row = await planted();
    await row.tape('A-1', ['3', { typed: '9', kind: 'missing' }, { typed: '15', kind: 'late' }]);
    const [sheet] = await sheetsOf(row);
    expect(sheet?.places.filter((place) => place.kind !== 'missing')).toHaveLength(2);
  });

  it('is corrected by a new version that names it, and the earlier one is left out', async () => {
    const row = await planted();
    const [first, second] = [v7(), v7()];
    await row.tape('A-1', ['3', '9'], { sheetId: first });
    expect((await row.tape('A-1', ['3', '10'], { sheetId: second, replacesId: first })).outcome).toBe('applied');
    expect((await sheetsOf(row)).map((sheet) => [sheet.id, sheet.used])).toEqual([[second, true]]);
    expect(await row.tape('A-1', ['3', '11'], { replacesId: first })).toMatchObject({ code: 'conflict' });
    expect((await row.tape('A-2', ['3', '11'], { replacesId: second })).fields?.[0]?.path).toBe('replacesId');
  });

  it('read from the far end comes back from the start, and as it was typed when it is corrected', async () => {
    const row = await new CountScene(scene).settle(['C-1'], '100 in');
    const laid = { readFrom: 'far-end', zeroAt: 'mark', segmentStarts: [] };
    expect((await row.tape('C-1', ['10', { typed: '30', kind: 'late' }, '36'], { laid })).outcome).toBe('applied');
    expect((await sheetsOf(row, 'C-1'))[0]).toMatchObject({
      laid,
      places: [
        { typed: '36', order: 2, positionInches: 64, segment: 0 },
        { typed: '30', order: 1, positionInches: 70, kind: 'late' },
        { typed: '10', order: 0, positionInches: 90 },
      ],
    });
  });

  it('of a cut row is in order on each piece, and no spacing crosses the cut', async () => {
    const row = await new CountScene(scene).settle(['C-1'], '100 in');
    const laid = { readFrom: 'start', zeroAt: 'mark', segmentStarts: [3] };
    expect((await row.tape('C-1', ['5', '11', '17', '4', '11', '17'], { laid })).outcome).toBe('applied');
    const [sheet] = await sheetsOf(row, 'C-1');
    // 17 + 17 of 100 in were measured; the 66 left are shared by the cut and the end.
    expect(sheet?.places.map((place) => [place.segment, place.positionInches])).toEqual([[0, 5], [0, 11], [0, 17], [1, 54], [1, 61], [1, 67]]);
    const scores = await scoresOf(scene, row.plantingId, 'row-sample');
    // Spacings 6 6 and 7 6, by hand: mean 25 / 4.
    expect(scores.rowSamples[0]?.scored?.figures.spacingInchesMean).toMatchObject({ kind: 'value', value: 6.25 });
  });

  it('asks about a place that lies beyond the end only once the pieces before it are counted in', async () => {
    const row = await new CountScene(scene).settle(['C-1'], '40 in');
    const laid = { readFrom: 'start', zeroAt: 'mark', segmentStarts: [2] };
    expect((await row.tape('C-1', ['5', '20', '6', '20'], { laid })).outcome).toBe('applied');
    expect(rules(await row.tape('C-1', ['5', '20', '6', '21'], { laid, on: '2026-05-18' }))).toEqual(['place-outside-length']);
  });

  it.each<[string, string[], Record<string, unknown>, string]>([
    ['that falls within a piece', ['3', '9', '4', '2'], { segmentStarts: [2] }, 'places.3.typed'],
    ['with a cut behind its last place', ['3', '9'], { segmentStarts: [2] }, 'segmentStarts'],
    ['with its cuts out of order', ['3', '9', '4', '8'], { segmentStarts: [2, 1] }, 'segmentStarts'],
    ['laid from a plant without that plant', ['3', '9'], { zeroAt: 'plant' }, 'places.0.typed'],
  ])('%s is refused at its field', async (_, places, laid, path) => {
    const row = await planted();
    const answer = await row.tape('A-1', places, { laid: { readFrom: 'start', zeroAt: 'mark', segmentStarts: [], ...laid } });
    expect(answer.fields?.map((field) => field.path)).toEqual([path]);
    expect(await sheetsOf(row)).toEqual([]);
  });

  it('that looks like feet and tenths is asked about before it is taken as inches', async () => {
    const row = await planted();
    const places = ['0.4', '1.1', '1.6', '2.3', '2.8'];
    const asked = await row.tape('A-1', places);
    expect(asked.questions?.map((question) => question.sentence)).toEqual(['A-1: 0.4 to 2.8 look like feet and tenths, and the tape is given in inches. Are they inches?']);
    expect((await row.tape('A-1', places, { tapeUnit: 'ft-tenths' })).outcome).toBe('applied');
  });

  it('of the second version sent again stands once, and turned around under its id changes nothing', async () => {
    const row = await planted();
    const laid = { readFrom: 'start', zeroAt: 'mark', segmentStarts: [1] };
    const sent = { sheetId: v7(), visit: { id: v7() }, laid };
    expect((await row.tape('A-1', ['3', '9'], sent)).outcome).toBe('applied');
    expect((await row.tape('A-1', ['3', '9'], sent)).outcome).toBe('applied');
    for (const other of [{ readFrom: 'far-end' }, { segmentStarts: [] }]) {
      expect(await row.tape('A-1', ['3', '9'], { ...sent, laid: { ...laid, ...other } })).toMatchObject({ code: 'operation-reused' });
    }
    expect(await sheetsOf(row)).toHaveLength(1);
  });

  it('of a later visit is the one used, in whatever order they come; of one visit the later recorded', async () => {
    const row = await planted();
    await row.tape('A-1', ['3', '9'], { on: '2026-05-19' });
    await row.tape('A-1', ['3', '10'], { on: '2026-05-18' });
    await row.tape('A-1', ['3', '11'], { on: '2026-05-19' }, 'agronomist');
    expect((await sheetsOf(row)).map((sheet) => [sheet.visitedOn, sheet.places[1]?.typed, sheet.used])).toEqual([
      ['2026-05-18', '10', false],
      ['2026-05-19', '9', false],
      ['2026-05-19', '11', true],
    ]);
  });

  it('of the same person, row and day is asked about', async () => {
    const row = await planted();
    await row.tape('A-1', ['3', '9']);
    expect(rules(await row.tape('A-1', ['3', '9']))).toEqual(['taped-twice']);
  });

  it('sent again stands once, and with other content under its id changes nothing', async () => {
    const row = await planted();
    const sent = { sheetId: v7(), visit: { id: v7() } };
    const answers = await Promise.all([row.tape('A-1', ['3', '9'], sent), row.tape('A-1', ['3', '9'], sent)]);
    expect(answers.map((answer) => answer.outcome)).toEqual(['applied', 'applied']);
    expect(await row.tape('A-1', ['3', '10'], sent)).toMatchObject({ code: 'operation-reused' });
    expect(await sheetsOf(row)).toHaveLength(1);
  });

  it('taken back leaves the one before it in use', async () => {
    const row = await planted();
    const second = v7();
    await row.tape('A-1', ['3', '9'], { on: '2026-05-18' });
    await row.tape('A-1', ['3', '10'], { on: '2026-05-19', sheetId: second });
    await row.takeBack('tape-sheet', second);
    expect((await sheetsOf(row)).map((sheet) => [sheet.visitedOn, sheet.used])).toEqual([['2026-05-18', true]]);
  });
});
