import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { RoundDay } from '@/lib/schemas/round-day';
import { readRoundDay } from '@/lib/server/services/round-day/read-round-day';
import { CountScene } from '../support/count-scene';
import { makeDecideScenes, type DecideScene } from '../support/decide-scene';
import { fieldKinds, sprayed, sprayedField } from '../support/field-scene';
import { PlanScene, settingBody } from '../support/plan-scene';
import { readAs } from '../support/trial-scene';

let scene: DecideScene;
let other: DecideScene;
let counted: CountScene;
let close: () => Promise<void>;

const canary = 'zanzibarite';

beforeAll(async () => {
  const made = await makeDecideScenes(2);
  [scene, other] = made.scenes as [DecideScene, DecideScene];
  close = made.close;
  counted = await new CountScene(scene).settle();
  await sprayedField(counted);
  for (const { kind, body } of fieldKinds) await scene.must('scout', kind, v7(), body(counted));
});
afterAll(() => close());

const dayOf = (who: Parameters<typeof readAs>[1] = 'scout', of = scene) => readAs(of, who, (context) => readRoundDay(context));
const plantingIn = (day: RoundDay, plantingId: string) => day.plantings.find(({ id }) => id === plantingId);

describe('the day that a phone takes along', () => {
  it('holds what was recorded at each row, in the planting and in the field', async () => {
    const day = await dayOf();
    const planting = plantingIn(day, counted.plantingId);
    expect(planting).toMatchObject({
      transects: [{ stripId: null, readOn: '2026-05-09', marksRead: 100, marksCovered: 44, personName: 'Test scout' }],
      conditions: [{ observedOn: '2026-05-18', growthStage: 'V1', soilTemperature: { typed: '52.5', unit: 'F' }, soilMoisture: 'moist' }],
      notes: [{ rowSampleId: null, text: 'Wheel tracks come up later' }],
    });
    const [first, second] = ['A-1', 'A-2'].map((label) => planting?.rows.find((row) => row.label === label));
    expect(first).toMatchObject({
      depths: [{ visitedOn: '2026-05-18', unit: 'in', depths: ['1 3/4', '2', '2.25'], personName: 'Test scout' }],
      digs: [{ plant: 'late', where: 'twin-length', placeTyped: '68 1/2', depth: { typed: '2 1/2', unit: 'in' }, found: ['twisted-shoot', 'residue-in-furrow'] }],
      crusts: [{ sproutsSound: 6, sproutsDead: 1, crust: 'thick' }],
      markers: [{ event: 'set', happenedOn: '2026-05-18', markers: 24 }],
    });
    expect(second).toMatchObject({ depths: [], digs: [], crusts: [], markers: [] });
    expect(day.fields.find(({ id }) => id === sprayed(counted))?.restrictions).toMatchObject([{ product: 'A burndown', endedOn: '2026-05-17', endedAt: '14:30', hours: 48, personName: 'Test scout', exceptions: [] }]);
  });

  it('names no setting: neither its words nor its id stand anywhere in it', async () => {
    const plan = new PlanScene(scene);
    const words = ['name', 'phrase', 'note'] as const;
    const settingIds: string[] = [];
    for (const turn of [1, 2]) {
      const id = v7();
      await scene.must('agronomist', 'setting.add', id, settingBody({ ...Object.fromEntries(words.map((word) => [word, `${canary} ${word} ${turn}`])), pressure: { typed: '47.125' } }));
      settingIds.push(id);
    }
    const plantingId = await plan.addPlanting();
    const laid = await plan.addTrial({ plantingId });
    const trialId = v7();
    await scene.must('agronomist', 'trial.lay-out', trialId, {
      ...laid.body, studyId: v7(), studyName: `${canary} study`, replacesTrialId: laid.trialId, settingIds, referenceSettingId: settingIds[0],
      blocks: laid.body.blocks.map((block) => ({ id: v7(), strips: block.strips.map((strip) => ({ id: v7(), settingId: settingIds[laid.settingIds.indexOf(strip.settingId)] })) })),
    });
    await scene.must('agronomist', 'trial.lock', trialId, {}, { baseVersion: 1 });
    const strips = (await plan.plan(plantingId)).trial?.strips ?? [];
    await scene.must('agronomist', 'trial.as-planted', trialId, { strips: [{ id: v7(), stripId: strips[0]?.id, settingId: settingIds[1], reason: `${canary} wrench` }] });
    await plan.addRowSample(plantingId, { stripId: strips[0]?.id });
    for (const who of ['scout', 'agronomist', 'owner'] as const) {
      const day = await dayOf(who);
      const planting = plantingIn(day, plantingId);
      expect(planting).toMatchObject({ hasTrial: true });
      expect(planting?.strips.length).toBe(8);
      const text = JSON.stringify(day);
      expect(text).not.toContain(canary);
      expect(text).not.toContain('47.125');
      for (const id of [...settingIds, ...laid.settingIds]) expect(text).not.toContain(id);
      expect(text).not.toMatch(/setting/i);
    }
  });

  it('holds nothing of another organisation, nor of a farm that the scout is not attached to', async () => {
    const theirs = await new CountScene(other).settle(['B-9']);
    await other.must('scout', 'note.record', v7(), { plantingId: theirs.plantingId, rowSampleId: null, notedOn: '2026-05-18', notedAt: null, text: canary });
    const farmId = await new PlanScene(scene).addFarm({ name: 'Far farm' });
    const [farScout, agronomist] = [await dayOf('scout'), await dayOf('agronomist')];
    expect(JSON.stringify(farScout)).not.toContain(canary);
    expect([farScout.farms.some(({ id }) => id === farmId), agronomist.farms.some(({ id }) => id === farmId)]).toEqual([false, true]);
  });

  it('leaves out what was taken back', async () => {
    const day = await dayOf();
    const row = plantingIn(day, counted.plantingId)?.rows.find(({ label }) => label === 'A-1');
    await counted.takeBack('depth-reading', row?.depths[0]?.id ?? '');
    expect(plantingIn(await dayOf(), counted.plantingId)?.rows.find(({ label }) => label === 'A-1')?.depths).toEqual([]);
  });
});
