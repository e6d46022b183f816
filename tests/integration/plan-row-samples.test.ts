import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { CountScene, yesTo } from '../support/count-scene';
import { makeDecideScenes, type DecideScene } from '../support/decide-scene';
import { atField, newName, PlanScene, plantingBody, refusedAt, rowSampleBody, type Body } from '../support/plan-scene';

let scene: DecideScene;
let other: PlanScene;
let own: PlanScene;
let close: () => Promise<void>;

beforeAll(async () => {
  const made = await makeDecideScenes(2);
  const [first, second] = made.scenes as [DecideScene, DecideScene];
  scene = first;
  close = made.close;
  own = await new PlanScene(scene).settle();
  other = await new PlanScene(second).settle();
});
afterAll(() => close());

const addTo = (plantingId: string, samples: Body[]) => scene.send('agronomist', 'row-samples.add', plantingId, { plantingId, samples });
const sampleOf = async (plantingId: string, id: string) => (await own.plan(plantingId)).rowSamples.find((each) => each.id === id);

/** A planting with one counted row sample A-1 and the body it was added with. */
async function counted() {
  const sheet = await new CountScene(scene).settle(['A-1', 'A-2']);
  await sheet.mustCount('A-1', { on: '2026-05-18', plants: 20 });
  const standing: Body = { stripId: null, zoneId: null, label: 'A-1', planterRow: null, length: { typed: '17 ft 5 in' }, startEnd: 'mark', farEnd: 'mark' };
  const change = (more: Body, confirmations: Body[] = [], baseVersion = 1) =>
    scene.send('agronomist', 'row-sample.change', sheet.row('A-1'), { ...standing, ...more }, { baseVersion, confirmations });
  return { sheet, id: sheet.row('A-1'), plantingId: sheet.plantingId, change };
}

describe('row samples of a planting', () => {
  it('come back as they were laid out', async () => {
    const plantingId = await own.addPlanting();
    const [zone] = (await own.plan(plantingId)).planting.zones;
    const id = await own.addRowSample(plantingId, { label: ' S7-2 ', zoneId: zone?.id, planterRow: null });
    expect(await sampleOf(plantingId, id)).toEqual({
      id, version: 1, stripId: null, zoneId: zone?.id, label: 'S7-2', planterRow: null, length: { typed: '17 ft 5 in', unit: 'in', thousandths: 209_000 },
      startEnd: 'mark', farEnd: 'plant', visited: false,
    });
  });

  it('have a label each, in whatever letters, within the sheet and beside what stands', async () => {
    const plantingId = await own.addPlanting();
    const sample = (label: string) => rowSampleBody({ id: v7(), label });
    expect(refusedAt(await addTo(plantingId, [sample('S1'), sample('S2'), sample('s1')]))).toEqual(atField('samples.2.label'));
    expect((await own.plan(plantingId)).rowSamples).toEqual([]);
    expect((await addTo(plantingId, [sample('S1'), sample('S2')])).outcome).toBe('applied');
    expect(refusedAt(await addTo(plantingId, [sample('S3'), sample(' s2 ')]))).toEqual(atField('samples.1.label'));
    const [first] = (await own.plan(plantingId)).rowSamples;
    expect(refusedAt(await scene.send('owner', 'row-sample.change', first?.id ?? '', rowSampleBody({ label: 's2' }), { baseVersion: 1 }))).toEqual(atField('label'));
    // Another planting has labels of its own, and a removed row sample gives its label back.
    expect((await addTo(await own.addPlanting(), [sample('S1')])).outcome).toBe('applied');
    await scene.must('owner', 'row-sample.remove', first?.id ?? '', {}, { baseVersion: 1 });
    expect((await addTo(plantingId, [sample('S1')])).outcome).toBe('applied');
  });

  it('given one label by two people at the same moment stand once', async () => {
    const plantingId = await own.addPlanting();
    const answers = await Promise.all(['T1', 't1'].map((label) => addTo(plantingId, [rowSampleBody({ id: v7(), label })])));
    expect(answers.map((answer) => answer.outcome).sort()).toEqual(['applied', 'refused']);
    expect((await own.plan(plantingId)).rowSamples).toHaveLength(1);
  });

  it('lie in the strips and zones of their own planting only', async () => {
    const plantingId = await own.addPlanting();
    const elsewhere = await own.addTrial();
    const theirs = await other.addTrial();
    const [zoneElsewhere] = (await own.plan(elsewhere.plantingId)).planting.zones;
    const strips = [elsewhere.strips[0]?.id, theirs.strips[0]?.id, v7()];
    for (const stripId of strips) expect(refusedAt(await addTo(plantingId, [rowSampleBody({ id: v7() }), rowSampleBody({ id: v7(), stripId })]))).toEqual(atField('samples.1.stripId'));
    for (const zoneId of [zoneElsewhere?.id, v7()]) expect(refusedAt(await addTo(plantingId, [rowSampleBody({ id: v7(), zoneId })]))).toEqual(atField('samples.0.zoneId'));
    const id = await own.addRowSample(plantingId);
    expect(refusedAt(await scene.send('owner', 'row-sample.change', id, rowSampleBody({ stripId: strips[0] }), { baseVersion: 1 }))).toEqual(atField('stripId'));
    expect((await own.plan(plantingId)).rowSamples).toHaveLength(1);
  });

  it('are at most 400 at once', async () => {
    const plantingId = await own.addPlanting();
    const samples = Array.from({ length: 401 }, () => rowSampleBody({ id: v7() }));
    expect(refusedAt(await addTo(plantingId, samples))).toEqual(atField('samples'));
    expect((await addTo(plantingId, samples.slice(1))).outcome).toBe('applied');
  });
});

describe('a row sample that was counted', () => {
  it('is not removed, and is neither once its count was taken back', async () => {
    const { sheet, id, plantingId } = await counted();
    const remove = () => scene.send('owner', 'row-sample.remove', id, {}, { baseVersion: 1 });
    expect(await remove()).toMatchObject({ outcome: 'refused', code: 'in-use', sentence: expect.stringContaining('Take its counts back instead') });
    const [count] = await sheet.standing('A-1');
    expect((await sheet.takeBack('count', count?.id ?? '')).outcome).toBe('applied');
    expect((await remove()).code).toBe('in-use');
    expect(await sampleOf(plantingId, id)).toMatchObject({ version: 1, visited: true });
    expect((await scene.send('owner', 'row-sample.remove', sheet.row('A-2'), {}, { baseVersion: 1 })).outcome).toBe('applied');
  });

  it.each<[string, Body]>([
    ['another length', { length: { typed: '17 ft 6 in' } }],
    ['the same length written otherwise', { length: { typed: "17'5" } }],
    ['another end', { farEnd: 'plant' }],
  ])('is given %s only when asked and answered', async (_, more) => {
    const { id, plantingId, change } = await counted();
    const asked = await change(more);
    expect(asked).toMatchObject({ outcome: 'refused', code: 'needs-confirmation', questions: [{ rule: 'counted-row-measured-otherwise', about: id }] });
    expect(await sampleOf(plantingId, id)).toMatchObject({ version: 1, length: { typed: '17 ft 5 in' }, farEnd: 'mark' });
    expect(await change(more, [{ rule: 'counted-row-moved', about: id, answer: 'yes' }])).toMatchObject({ code: 'needs-confirmation' });
    expect(await change(more, yesTo(asked))).toMatchObject({ outcome: 'applied', version: 2 });
  });

  it('is moved only when asked and answered, and renamed without a question', async () => {
    const { sheet, id, plantingId, change } = await counted();
    expect(await change({ label: 'A-9', planterRow: 4 })).toMatchObject({ outcome: 'applied', version: 2 });
    const zoneId = v7();
    const { planting } = await own.plan(plantingId);
    const body = { ...plantingBody({ plantedOn: planting.plantedOn, plantedAt: null }), zones: [{ id: zoneId, name: 'hill', area: { typed: '10' } }] };
    await scene.must('agronomist', 'planting.change', plantingId, body, { baseVersion: 1 });
    const asked = await change({ label: 'A-9', zoneId }, [], 2);
    expect(asked).toMatchObject({ code: 'needs-confirmation', questions: [{ rule: 'counted-row-moved', about: id }] });
    expect((await change({ label: 'A-9', zoneId }, yesTo(asked), 2)).outcome).toBe('applied');
    expect(await sheet.standing('A-1')).toHaveLength(1);
    // The zone that it lies in now stays.
    expect(await scene.send('agronomist', 'planting.change', plantingId, { ...body, zones: [] }, { baseVersion: 2 })).toMatchObject({
      outcome: 'refused', code: 'in-use', sentence: expect.stringContaining('hill'),
    });
  });

  it('keeps its planting, whose day moves only when asked and answered, and never past the first visit', async () => {
    const { plantingId } = await counted();
    const change = (more: Body, confirmations: Body[] = []) =>
      scene.send('agronomist', 'planting.change', plantingId, plantingBody({ plantedOn: '2026-05-07', plantedAt: null, zones: [], ...more }), { baseVersion: 1, confirmations });
    expect(refusedAt(await change({ plantedOn: '2026-05-19' }))).toEqual(atField('plantedOn'));
    expect(refusedAt(await change({ plantedOn: '2026-05-18', plantedAt: '13:00' }))).toEqual(atField('plantedAt'));
    expect(refusedAt(await change({ plantedOn: '2027-05-21' }))).toEqual(atField('plantedOn'));
    const asked = await change({ plantedOn: '2026-05-06' });
    expect(asked).toMatchObject({ code: 'needs-confirmation', questions: [{ rule: 'planting-date-moved', about: '2026-05-06' }] });
    // The answer holds for the day that was asked about.
    expect((await change({ plantedOn: '2026-05-05' }, yesTo(asked))).code).toBe('needs-confirmation');
    expect((await change({ plantedOn: '2026-05-06' }, yesTo(asked))).outcome).toBe('applied');
    expect(await scene.send('owner', 'planting.remove', plantingId, {}, { baseVersion: 2 })).toMatchObject({ code: 'in-use' });
  });
});

describe('the zones of a planting', () => {
  it('become what the form says: kept, changed, added and removed', async () => {
    const [low, high, wet] = ['low', 'high', 'wet'].map((name) => ({ id: v7(), name, area: { typed: '10' } }));
    const plantingId = await own.addPlanting({ zones: [low, high] });
    await scene.must('owner', 'planting.change', plantingId, plantingBody({ zones: [{ ...low, name: newName('bottom'), area: { typed: '12,5' } }, wet] }), { baseVersion: 1 });
    const { zones } = (await own.plan(plantingId)).planting;
    expect(zones.map(({ id, area }) => [id, area.typed]).sort()).toEqual([[low?.id, '12,5'], [wet?.id, '10']].sort());
    expect(await own.stands('planting_zone', high?.id ?? '')).toBe('removed');
  });

  it('are not taken from another planting, and nothing of such a change is kept', async () => {
    const plantingId = await own.addPlanting({ zones: [] });
    const [foreign] = (await own.plan(own.plantingId)).planting.zones;
    const answer = await scene.send('owner', 'planting.change', plantingId, plantingBody({ crop: 'soybean', zones: [{ id: foreign?.id, name: 'mine now', area: { typed: '10' } }] }), { baseVersion: 1 });
    expect(answer).toMatchObject({ outcome: 'refused', code: 'already-there' });
    expect((await own.plan(plantingId)).planting).toMatchObject({ crop: 'corn', version: 1, zones: [] });
    expect((await own.plan(own.plantingId)).planting.zones).toEqual([foreign]);
  });
});
