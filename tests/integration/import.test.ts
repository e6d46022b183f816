import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { inOrganisation } from '@/db/connection';
import { listImportFiles } from '@/lib/server/data/import-file';
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
const files = (row: CountScene) =>
  inOrganisation(scene.db, { organisationId: scene.organisationId }, (tx) => listImportFiles(tx, { organisationId: scene.organisationId, plantingId: row.plantingId }));
const nothingStands = async (row: CountScene) => {
  expect(await row.observations()).toEqual({ counts: [], tapeSheets: [], residueReadings: [] });
  expect(await files(row)).toEqual([]);
};
const messages = (answer: { fields?: { message: string }[] | undefined }) => answer.fields?.map((field) => field.message);
const rules = (answer: { questions?: { rule: string }[] | undefined }) => answer.questions?.map((question) => question.rule);

/** 2,000 lines: 200 row samples at ten visits, rising to 19 plants. */
const labels = Array.from({ length: 200 }, (_, index) => `R-${index + 1}`);
const longFile = (plantsOf: (line: number, plants: number) => string = (_, plants) => String(plants)) =>
  ['row_sample,date,so_far', ...labels.flatMap((label, row) => Array.from({ length: 10 }, (_, day) => `${label},2026-05-${day + 11},${plantsOf(row * 10 + day + 2, day * 2 + 1)}`))].join('\n');

describe('a file of counts', () => {
  it('is taken in whole, its records marked with the import they came by', async () => {
    const row = await planted();
    const importId = v7();
    const answer = await row.take('row_sample,date,time,so_far,doubtful,marker\nA-1,2026-05-17,07:30,11,0,white\nA-1,2026-05-18,07:30,24,2,red\na-2,2026-05-18,,9,,\n', { importId, fileName: '18 May.csv' });
    expect(answer).toMatchObject({ outcome: 'applied', result: { lines: 3, records: 3, rowSamples: 2 } });
    expect((await row.standing('A-1')).map(({ visitedAt, plantsUp, doubtful, marker, originKind, personName }) => [visitedAt, plantsUp, doubtful, marker, originKind, personName])).toEqual([
      ['07:30', 11, 0, 'white', 'import', 'Test scout'],
      ['07:30', 24, 2, 'red', 'import', 'Test scout'],
    ]);
    expect(await row.standing('A-2')).toHaveLength(1);
    expect(await files(row)).toMatchObject([{ id: importId, kind: 'counts', fileName: '18 May.csv', lines: 3, records: 3, personName: 'Test scout' }]);
  });

  it('sums new plants up over the lines, in whatever order they stand', async () => {
    const row = await planted();
    await row.mustCount('A-1', { on: '2026-05-16', plants: 3 });
    await row.take('row_sample;date;new\nA-1;2026-05-18;4\nA-1;2026-05-17;8\n');
    expect((await row.standing('A-1')).map((count) => count.plantsUp)).toEqual([3, 11, 15]);
  });

  it('of 2,000 lines is taken in within a few seconds', async () => {
    const row = await new CountScene(scene).settle(labels);
    const began = performance.now();
    expect(await row.take(longFile())).toMatchObject({ outcome: 'applied', result: { lines: 2_000, records: 2_000, rowSamples: 200 } });
    expect(performance.now() - began).toBeLessThan(10_000);
    expect((await row.observations()).counts).toHaveLength(2_000);
  });

  it('with one bad line at 1,999 stores nothing and names that line', async () => {
    const row = await new CountScene(scene).settle(labels);
    const answer = await row.take(longFile((line, plants) => (line === 1_999 ? 'x' : String(plants))));
    expect(messages(answer)).toEqual(['Line 1999, so_far: "x" is no whole number. Write the plants, such as 24.']);
    expect(answer.fields?.[0]?.path).toBe('text.1999.so_far');
    await nothingStands(row);
  });

  it('of 2,001 lines, with wrong columns, or with nothing in it is refused in a sentence', async () => {
    const row = await planted();
    expect(messages(await row.take(`${longFile()}\nR-1,2026-05-10,1`))).toEqual(['The file has 2,001 lines; at most 2,000 are taken at once. Split it.']);
    expect(messages(await row.take('row,date,plants\nA-1,2026-05-18,4'))).toEqual([
      'Line 1: The first line names the columns row_sample, date, so_far or new, and where wanted time, doubtful, marker. It has "row", "plants", which no column is called. It lacks row_sample. It must have so_far or new, one of the two.',
    ]);
    expect(messages(await row.take(''))).toEqual(['The file is empty.']);
    expect((await row.take('x'.repeat(1_000_001))).fields?.[0]?.path).toBe('text');
    await nothingStands(row);
  });

  it('names every line that breaks a rule which typed counts are held to', async () => {
    const row = await planted();
    const answer = await row.take(
      ['row_sample,date,time,so_far,doubtful', 'A-1,2026-05-06,,1,0', 'A-1,2026-05-21,,1,0', 'Z-9,2026-05-18,,1,0', 'A-1,2026-05-18,,3,4', 'A-2,2026-05-18,,500,0', 'A-2,2028-05-18,,5,0'].join('\n'),
    );
    expect(messages(answer)).toEqual([
      'Line 2, date: This is before planting, 7 May 2026. Check the date.',
      'Line 3, date: This day has not come yet; today is 20 May 2026. Check the date.',
      'Line 4, row_sample: There is no row sample "Z-9" in this planting. Write it as on its peg.',
      'Line 5, doubtful: No more plants can be doubtful than the 3 that are up.',
      'Line 6, so_far: 500 plants cannot stand where about 34 seeds were planted. Check the number and the row.',
      'Line 7, date: This day has not come yet; today is 20 May 2026. Check the date.',
    ]);
    await nothingStands(row);
  });

  it('asks once a rule over all its lines, and takes them all with the answers', async () => {
    const row = await planted();
    await row.mustCount('A-1', { on: '2026-05-19', plants: 20 });
    const text = 'row_sample,date,so_far\nA-1,2026-05-17,22\nA-1,2026-05-18,21\nA-2,2026-05-17,35\nA-2,2026-05-18,36\n';
    const asked = await row.take(text);
    expect(asked.code).toBe('needs-confirmation');
    expect(rules(asked)?.sort()).toEqual(['falling-count', 'more-plants-than-seeds']);
    const falling = asked.questions?.find((question) => question.rule === 'falling-count');
    // Line 3 falls below line 2, and the count that stands of 19 May lies below line 3.
    expect(falling?.sentence.split('\n').map((line) => line.slice(0, 30))).toEqual(['In 2 places a count is lower t', 'Line 3: A-1, 18 May 2026: 21 p', 'Line 3: A-1, 18 May 2026: 21 p']);
    expect(await row.standing('A-2')).toEqual([]);
    expect((await row.take(text, { confirmations: yesTo(asked) })).outcome).toBe('applied');
    expect(await row.standing('A-2')).toHaveLength(2);
  });

  it('asks anew when the file is another: an answer holds for its lines', async () => {
    const row = await planted();
    const asked = await row.take('row_sample,date,so_far\nA-1,2026-05-17,35\n');
    const changed = await row.take('row_sample,date,so_far\nA-1,2026-05-17,60\n', { confirmations: yesTo(asked) });
    expect(rules(changed)).toEqual(['more-plants-than-seeds']);
  });

  it('taken twice under the same id stands once; as a new import it is asked about', async () => {
    const row = await planted();
    const text = 'row_sample,date,so_far\nA-1,2026-05-17,11\n';
    const importId = v7();
    const answers = await Promise.all([row.take(text, { importId }), row.take(text, { importId })]);
    expect(answers.map((answer) => answer.outcome)).toEqual(['applied', 'applied']);
    expect(await row.standing('A-1')).toHaveLength(1);
    expect(await row.take(text, { importId, fileName: 'other.csv' })).toMatchObject({ code: 'operation-reused' });
    expect(rules(await row.take(text))).toEqual(['counted-twice']);
  });

  it('by two people at once is kept from both and flagged', async () => {
    const row = await planted();
    const text = 'row_sample,date,so_far\nA-1,2026-05-17,11\nA-2,2026-05-17,12\n';
    const answers = await Promise.all([row.take(text), row.take(text, {}, 'agronomist')]);
    expect(answers.map((answer) => answer.outcome)).toEqual(['applied', 'applied']);
    expect((await row.standing('A-1')).map((count) => count.used)).toEqual([true, false]);
  });

  it('is taken back with all that it brought, and nothing else', async () => {
    const row = await planted();
    const importId = v7();
    await row.mustCount('A-1', { on: '2026-05-16', plants: 3 });
    await row.take('row_sample,date,so_far\nA-1,2026-05-17,11\nA-2,2026-05-17,12\n', { importId });
    expect((await row.takeBack('import', importId, 'The wrong file')).outcome).toBe('applied');
    expect((await row.observations()).counts.map((count) => count.plantsUp)).toEqual([3]);
    expect((await row.take('row_sample,date,so_far\nA-1,2026-05-17,11\n')).outcome).toBe('applied');
  });

  it('keeps formula-like text as text', async () => {
    const row = await planted();
    expect((await row.take('row_sample,date,so_far,marker\nA-1,2026-05-17,11,=1+1\n')).outcome).toBe('applied');
    expect((await row.standing('A-1'))[0]?.marker).toBe('=1+1');
  });

  it('belongs to a planting of the account, and a grower takes none in', async () => {
    const row = await planted();
    const body = { plantingId: row.plantingId, importKind: 'counts', fileName: 'a.csv', text: 'row_sample,date,so_far\nA-1,2026-05-17,11\n' };
    expect(await other.send('owner', 'import.take', v7(), body)).toMatchObject({ code: 'not-found' });
    expect(await scene.send('grower', 'import.take', v7(), body)).toMatchObject({ code: 'forbidden' });
    await nothingStands(row);
  });
});

describe('a file of tape sheets', () => {
  const head = 'row_sample,date,tape,place,marker,kind,leaf_stage';
  const take = (row: CountScene, lines: readonly string[], more = {}) => row.take([head, ...lines].join('\n'), { importKind: 'tape-sheets', ...more });

  it('makes a sheet of each row sample and day', async () => {
    const row = await planted();
    await row.mustCount('A-1', { on: '2026-05-17', plants: 2, marker: 'white' });
    const answer = await take(row, ['A-1,2026-05-19,in,3,white,,2.5', 'A-1,2026-05-19,in,9 1/2,,late,', 'A-2,2026-05-19,ft-in,5 ft 3,,,', 'A-1,2026-05-19,in,15,,missing,']);
    expect(answer).toMatchObject({ outcome: 'applied', result: { lines: 4, records: 2, rowSamples: 2 } });
    const { tapeSheets } = await row.observations();
    expect(tapeSheets.find((sheet) => sheet.rowSampleId === row.row('A-1'))?.places).toMatchObject([
      { typed: '3', positionInches: 3, kind: 'plant', marker: 'white', leafStage: 2.5, firstSeen: { by: { on: '2026-05-17' } } },
      { typed: '9 1/2', positionInches: 9.5, kind: 'late' },
      { typed: '15', positionInches: 15, kind: 'missing' },
    ]);
  });

  it('names the line of each bad place, and stores nothing', async () => {
    const row = await planted();
    expect(messages(await take(row, ['A-1,2026-05-19,in,3,,,', 'A-1,2026-05-19,in,sixty,,,', 'A-1,2026-05-19,in,9,,dead,']))).toEqual([
      'Line 3, place: Write the place as the tape says it, such as 68 or 68 1/2.',
      'Line 4, kind: Write one of plant, late, double, missing, or leave it empty for plant.',
    ]);
    expect(messages(await take(row, ['A-1,2026-05-19,in,9,,,', 'A-2,2026-05-19,in,3,,,', 'A-1,2026-05-19,in,3,,,', 'Q-1,2026-05-21,in,3,,,']))).toEqual([
      'Line 4, place: 3 comes after 9, and places go up along the tape. Correct one, or put them in order.',
      'Line 5, date: This day has not come yet; today is 20 May 2026. Check the date.',
      'Line 5, row_sample: There is no row sample "Q-1" in this planting. Write it as on its peg.',
    ]);
    await nothingStands(row);
  });

  it('is held to the questions of typed sheets, each asked once', async () => {
    const row = await planted();
    const lines = ['A-1,2026-05-19,in,3,pink,,', 'A-1,2026-05-19,in,3,,,', 'A-1,2026-05-19,in,300,,,', 'A-2,2026-05-19,in,3,pink,,', 'A-2,2026-05-19,in,300,,,'];
    const asked = await take(row, lines);
    expect(rules(asked)?.sort()).toEqual(['place-outside-length', 'two-at-one-mark', 'unknown-marker']);
    expect((await take(row, lines, { confirmations: yesTo(asked) })).outcome).toBe('applied');
    expect(rules(await take(row, ['A-1,2026-05-19,in,3,,,']))).toEqual(['taped-twice']);
  });
});
