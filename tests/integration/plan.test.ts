import { sql } from 'drizzle-orm';
import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { makeDecideScenes, type DecideScene } from '../support/decide-scene';
import { atField, farmBody, fieldBody, newName, PlanScene, plantingBody, refusedAt, rowSampleBody, settingBody, type Body, type PlanKind } from '../support/plan-scene';

let scene: DecideScene;
let other: DecideScene;
let own: PlanScene;
let close: () => Promise<void>;

beforeAll(async () => {
  const made = await makeDecideScenes(2);
  [scene, other] = made.scenes as [DecideScene, DecideScene];
  close = made.close;
  own = await new PlanScene(scene).settle();
});
afterAll(() => close());

/** Each kind of thing on its own: how to make one, change it, and see what it became. */
const things: [kind: PlanKind, make: () => Promise<string>, changed: () => Body, table: string, sees: (id: string) => Promise<unknown>][] = [
  ['farm', () => own.addFarm(), farmBody, 'farm', async (id) => (await own.farms()).find((each) => each.id === id)],
  ['field', () => own.addField(), fieldBody, 'field', async (id) => (await own.farm(scene.farmId)).fields.find((each) => each.id === id)],
  ['planting', () => own.addPlanting({ fieldId: own.fieldId }), plantingBody, 'planting', async (id) => (await own.field(own.fieldId)).plantings.find((each) => each.plantingId === id)],
  ['setting', () => own.addSetting(), settingBody, 'setting', (id) => own.setting(id)],
  ['row-sample', () => own.addRowSample(own.plantingId), rowSampleBody, 'row_sample', async (id) => (await own.plan(own.plantingId)).rowSamples.find((each) => each.id === id)],
];

describe.each(things)('a %s', (kind, make, changed, table, sees) => {
  const change = (who: 'owner' | 'agronomist', id: string, body: Body, more: Body = { baseVersion: 1 }) => scene.send(who, `${kind}.change`, id, body, more);

  it('changed by two people from one version holds the first; the second is a conflict and kept as it was sent', async () => {
    const id = await make();
    const [first, second] = [changed(), changed()];
    expect(await change('owner', id, first)).toMatchObject({ outcome: 'applied', version: 2 });
    const standing = await sees(id);
    expect(await change('agronomist', id, second)).toMatchObject({ outcome: 'conflict', code: 'conflict', standingVersion: 2 });
    expect(await sees(id)).toEqual(standing);
    expect(await own.lost(id)).toEqual([{ kind: `${kind}.change`, body: second, baseVersion: 1, standingVersion: 2 }]);
  });

  it('changed by two people at the very same moment holds once; the other edit is kept', async () => {
    const id = await make();
    const sent = [changed(), changed()] as const;
    const answers = await Promise.all([change('owner', id, sent[0]), change('agronomist', id, sent[1])]);
    expect(answers.map((answer) => answer.outcome).sort()).toEqual(['applied', 'conflict']);
    const loser = sent[answers.findIndex((answer) => answer.outcome === 'conflict')];
    expect((await own.lost(id)).map((each) => each.body)).toEqual([loser]);
    expect(await own.rows(sql`select version from ${sql.identifier(table)} where id = ${id}`)).toEqual([{ version: 2 }]);
  });

  it('sent again is answered as it was, and done once', async () => {
    const id = await make();
    const sent = { operationId: v7(), deviceSequence: 900_001, baseVersion: 1 };
    const body = changed();
    const first = await change('owner', id, body, sent);
    await scene.must('agronomist', `${kind}.change`, id, changed(), { baseVersion: 2 });
    expect(await change('owner', id, body, sent)).toEqual({ ...first, outcome: 'duplicate' });
    expect(await own.rows(sql`select version from ${sql.identifier(table)} where id = ${id}`)).toEqual([{ version: 3 }]);
    expect(await own.lost(id)).toEqual([]);
  });

  it('added again is answered as it was, and stands once', async () => {
    const sent = { operationId: v7(), deviceSequence: 900_002 };
    const body = own.body(kind);
    const [thingId, as] = kind === 'row-sample' ? [own.plantingId, 'row-samples.add'] : [v7(), `${kind}.add`];
    const first = await scene.send('agronomist', as, thingId, body, sent);
    expect(first).toMatchObject({ outcome: 'applied', version: 1 });
    expect(await scene.send('agronomist', as, thingId, body, sent)).toEqual({ ...first, outcome: 'duplicate' });
    expect(await own.rows(sql`select 1 from ${sql.identifier(table)} where operation_id = ${sent.operationId}`)).toHaveLength(1);
  });

  it('removed stays in the database and is out of sight, and nothing more can be done to it', async () => {
    const id = await make();
    expect(await sees(id)).toBeDefined();
    expect(await scene.send('owner', `${kind}.remove`, id, {}, { baseVersion: 1 })).toMatchObject({ outcome: 'applied', version: 2 });
    expect(await own.stands(table, id)).toBe('removed');
    expect(await sees(id)).toBeUndefined();
    expect(await change('owner', id, changed(), { baseVersion: 2 })).toMatchObject({ outcome: 'refused', code: 'not-found' });
    expect(await scene.send('owner', `${kind}.remove`, id, {}, { baseVersion: 2 })).toMatchObject({ outcome: 'refused', code: 'not-found' });
  });

  it('is not removed from a version that somebody has changed since', async () => {
    const id = await make();
    await change('owner', id, changed());
    expect(await scene.send('agronomist', `${kind}.remove`, id, {}, { baseVersion: 1 })).toMatchObject({ outcome: 'conflict', standingVersion: 2 });
    expect(await scene.send('agronomist', `${kind}.remove`, id, {})).toMatchObject({ code: 'bad-input', fields: [{ path: 'baseVersion' }] });
    expect(await own.stands(table, id)).toBe('stands');
  });

  it('is added, changed and removed by owners and agronomists, not by scouts and growers', async () => {
    const id = await make();
    for (const who of ['scout', 'grower', 'neighbor'] as const) {
      expect(await own.send(kind, own.body(kind), {}, who)).toMatchObject({ outcome: 'refused', code: 'forbidden' });
      expect(await scene.send(who, `${kind}.change`, id, changed(), { baseVersion: 1 })).toMatchObject({ outcome: 'refused', code: 'forbidden' });
      expect(await scene.send(who, `${kind}.remove`, id, {}, { baseVersion: 1 })).toMatchObject({ outcome: 'refused', code: 'forbidden' });
    }
    expect(await own.rows(sql`select version, removed_at from ${sql.identifier(table)} where id = ${id}`)).toEqual([{ version: 1, removed_at: null }]);
  });

  it('of one organisation is not found from another', async () => {
    const id = await make();
    expect(await other.send('owner', `${kind}.change`, id, changed(), { baseVersion: 1 })).toMatchObject({ outcome: 'refused', code: 'not-found' });
    expect(await other.send('owner', `${kind}.remove`, id, {}, { baseVersion: 1 })).toMatchObject({ outcome: 'refused', code: 'not-found' });
    expect(await own.stands(table, id)).toBe('stands');
  });
});

describe('what rests on another', () => {
  const remove = (kind: PlanKind, id: string) => scene.send('owner', `${kind}.remove`, id, {}, { baseVersion: 1 });

  it('keeps it from being removed, from the farm down to the row sample', async () => {
    const farmId = await own.addFarm();
    const field = await own.addField({ farmId });
    const planting = await own.addPlanting({ fieldId: field });
    const sample = await own.addRowSample(planting);
    for (const [kind, id] of [['farm', farmId], ['field', field], ['planting', planting]] as const) {
      expect(await remove(kind, id)).toMatchObject({ outcome: 'refused', code: 'in-use', sentence: expect.stringContaining('stays') });
    }
    for (const [kind, id] of [['row-sample', sample], ['planting', planting], ['field', field], ['farm', farmId]] as const) {
      expect((await remove(kind, id)).outcome).toBe('applied');
    }
  });

  it('is not added to what was removed, is another organisation’s, or was never there', async () => {
    const farmId = await own.addFarm();
    const emptyField = await own.addField();
    const emptyPlanting = await own.addPlanting();
    await remove('farm', farmId);
    await remove('field', emptyField);
    await remove('planting', emptyPlanting);
    const theirs = await other.plant();
    for (const each of [farmId, other.farmId, v7()]) expect((await own.send('field', fieldBody({ farmId: each }))).code).toBe('not-found');
    for (const each of [emptyField, v7()]) expect((await own.send('planting', plantingBody({ fieldId: each }))).code).toBe('not-found');
    for (const each of [emptyPlanting, theirs, v7()]) expect((await own.send('row-sample', { plantingId: each, samples: [rowSampleBody({ id: v7() })] })).code).toBe('not-found');
  });

  it('never lands in what is removed at the same moment', async () => {
    for (let round = 0; round < 8; round += 1) {
      const farmId = await own.addFarm();
      const field = v7();
      await Promise.all([scene.send('agronomist', 'field.add', field, fieldBody({ farmId })), remove('farm', farmId)]);
      expect([await own.stands('farm', farmId), await own.stands('field', field)]).not.toEqual(['removed', 'stands']);
      const emptyField = await own.addField();
      const planting = v7();
      await Promise.all([scene.send('agronomist', 'planting.add', planting, plantingBody({ fieldId: emptyField })), remove('field', emptyField)]);
      expect([await own.stands('field', emptyField), await own.stands('planting', planting)]).not.toEqual(['removed', 'stands']);
    }
  });
});

describe('a name that would be taken twice', () => {
  it('is refused for settings, in whatever letters, at once or one after the other', async () => {
    const name = newName('Twice');
    const answers = await Promise.all([own.send('setting', settingBody({ name })), own.send('setting', settingBody({ name: name.toUpperCase() }))]);
    expect(answers.map((answer) => answer.outcome).sort()).toEqual(['applied', 'refused']);
    expect(refusedAt(await own.send('setting', settingBody({ name: name.toLowerCase() })))).toEqual(atField('name'));
    const id = await own.addSetting();
    expect(refusedAt(await scene.send('owner', 'setting.change', id, settingBody({ name }), { baseVersion: 1 }))).toEqual(atField('name'));
  });

  it('may be kept by its own, and taken once its holder was removed', async () => {
    const name = newName('Freed');
    const id = await own.addSetting({ name });
    expect((await scene.send('owner', 'setting.change', id, settingBody({ name: name.toUpperCase() }), { baseVersion: 1 })).outcome).toBe('applied');
    await scene.must('owner', 'setting.remove', id, {}, { baseVersion: 2 });
    expect((await own.send('setting', settingBody({ name }))).outcome).toBe('applied');
  });
});
