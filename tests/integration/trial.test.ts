import { sql } from 'drizzle-orm';
import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { yesTo } from '../support/count-scene';
import { makeDecideScenes, type DecideScene } from '../support/decide-scene';
import { atField, drawnBody, newName, PlanScene, refusedAt, rowSampleBody, settingBody, withAt, type Body, type LaidBlock } from '../support/plan-scene';

let scene: DecideScene;
let own: PlanScene;
let other: PlanScene;
let close: () => Promise<void>;
let settings: string[];

beforeAll(async () => {
  const made = await makeDecideScenes(2);
  const [first, second] = made.scenes as [DecideScene, DecideScene];
  scene = first;
  close = made.close;
  own = await new PlanScene(scene).settle();
  other = await new PlanScene(second).settle();
  settings = [];
  for (let index = 0; index < 4; index += 1) settings.push(await own.addSetting());
});
afterAll(() => close());

const layOut = (body: Body, more: Body = {}, who: Parameters<DecideScene['send']>[0] = 'agronomist', trialId = v7()) => scene.send(who, 'trial.lay-out', trialId, body, more);
const drawn = (count = 4, more: Body = {}) => drawnBody(own.plantingId, settings.slice(0, count), { more });
const trialOf = async (plantingId: string) => (await own.plan(plantingId)).trial;

/** The blocks as sent, with one thing about them spoiled. */
const spoiled = (spoil: (blocks: LaidBlock[]) => void): Body => {
  const body = drawn();
  const blocks = structuredClone(body.blocks);
  spoil(blocks);
  return { ...body, blocks };
};

describe('a layout', () => {
  it('stands in field order as its seed draws it, each setting once in a block', async () => {
    const plantingId = await own.addPlanting();
    const body = drawnBody(plantingId, settings);
    expect(await layOut(body)).toMatchObject({ outcome: 'applied', version: 1 });
    const trial = await trialOf(plantingId);
    expect(trial).toMatchObject({ layout: 'complete-blocks', mainFigure: 'spread-days', comparisonRule: 'tukey', referenceSettingId: settings[0], randomSeed: 7, lockedAt: null, version: 1 });
    expect(trial?.strips.map(({ id, number, blockNumber, plannedSettingId, asPlanted }) => [id, number, blockNumber, plannedSettingId, asPlanted])).toEqual(
      body.blocks.flatMap((block, blockIndex) => block.strips.map((strip, place) => [strip.id, blockIndex * 4 + place + 1, blockIndex + 1, strip.settingId, null])),
    );
    for (const block of body.blocks) expect(block.strips.map((strip) => strip.settingId).sort()).toEqual([...settings].sort());
  });

  it.each<[string, () => Body, string]>([
    ['with two strips changed over', () => spoiled(([block]) => block?.strips.reverse()), 'blocks'],
    ['with another seed than it was drawn from', () => drawn(4, { randomSeed: 8 }), 'blocks'],
    ['with its settings in another order than they were drawn in', () => drawn(4, { settingIds: [...settings].reverse() }), 'blocks'],
    ['with two blocks changed over', () => spoiled((blocks) => blocks.reverse()), 'blocks'],
    ['with a strip too many', () => spoiled(([block]) => block?.strips.push({ id: v7(), settingId: settings[0] ?? '' })), 'blocks'],
    ['with a strip too few', () => spoiled(([block]) => block?.strips.pop()), 'blocks'],
    ['with a strip of a setting that is not compared', () => spoiled(([block]) => block?.strips.splice(0, 1, { id: v7(), settingId: v7() })), 'blocks'],
    ['with one setting twice', () => drawn(4, { settingIds: [settings[0], settings[0], settings[1], settings[2]] }), 'settingIds'],
    ['with a reference that is not compared', () => drawn(3, { referenceSettingId: settings[3] }), 'referenceSettingId'],
    ['called pairs, of four settings', () => drawn(4, { layout: 'pairs' }), 'layout'],
    ['called complete blocks, of two settings', () => drawn(2, { layout: 'complete-blocks' }), 'layout'],
    ['of one setting', () => drawn(4, { settingIds: [settings[0]] }), 'settingIds'],
    ['of more settings than a field holds', () => drawn(4, { settingIds: Array.from({ length: 25 }, () => v7()) }), 'settingIds'],
    ['of a setting that is not there', () => drawn(4, { settingIds: [...settings.slice(1), v7()] }), 'settingIds'],
    ['of no block', () => drawn(4, { blocks: [] }), 'blocks'],
    ['of more blocks than a field holds', () => drawnBody(own.plantingId, settings, { blocks: 13 }), 'blocks'],
    ['with a seed below zero', () => drawn(4, { randomSeed: -1 }), 'randomSeed'],
    ['with half a seed', () => drawn(4, { randomSeed: 1.5 }), 'randomSeed'],
    ['with a seed that no column holds', () => drawn(4, { randomSeed: 2 ** 31 }), 'randomSeed'],
    ['with a seed in letters', () => drawn(4, { randomSeed: '7' }), 'randomSeed'],
    ['without a seed', () => withAt(drawn(), 'randomSeed', undefined), 'randomSeed'],
    ['of a study without a name', () => drawn(4, { studyName: ' ' }), 'studyName'],
    ['without a main figure', () => drawn(4, { mainFigure: '' }), 'mainFigure'],
    ['with a main figure nobody measures', () => drawn(4, { mainFigure: 'yield' }), 'mainFigure'],
    ['with a rule nobody knows', () => drawn(4, { comparisonRule: 'none' }), 'comparisonRule'],
    ['without a reference', () => drawn(4, { referenceSettingId: '' }), 'referenceSettingId'],
  ])('%s is refused at its field and leaves nothing', async (_, body, path) => {
    const answer = await layOut(body());
    expect(refusedAt(answer)).toEqual(atField(path));
    expect(answer.fields?.[0]?.message).not.toBe('');
    expect(await trialOf(own.plantingId)).toBeNull();
  });

  it('does not compare a setting of another organisation, or one that was removed', async () => {
    const removed = await own.addSetting();
    await scene.must('agronomist', 'setting.remove', removed, {}, { baseVersion: 1 });
    for (const foreign of [await other.addSetting(), removed]) {
      expect(refusedAt(await layOut(drawnBody(own.plantingId, [...settings, foreign])))).toEqual(atField('settingIds'));
    }
    expect(await trialOf(own.plantingId)).toBeNull();
  });

  it('does not lie in a planting of another organisation, or one that was removed', async () => {
    const removed = await own.addPlanting();
    await scene.must('agronomist', 'planting.remove', removed, {}, { baseVersion: 1 });
    for (const plantingId of [other.plantingId, removed, v7()]) {
      expect(await layOut(drawnBody(plantingId, settings))).toMatchObject({ outcome: 'refused', code: 'not-found' });
    }
    expect((await other.plan(other.plantingId)).trial).toBeNull();
  });

  it('does not take a strip of another trial for its own', async () => {
    const laid = await own.addTrial();
    const body = drawn(2);
    const answer = await layOut(withAt(body, 'blocks.0.strips.0.id', laid.strips[0]?.id));
    expect(answer).toMatchObject({ outcome: 'refused', code: 'already-there' });
    expect(await trialOf(own.plantingId)).toBeNull();
    expect((await trialOf(laid.plantingId))?.strips.map((strip) => strip.id)).toEqual(laid.strips.map((strip) => strip.id));
  });

  it('is drawn by owners and agronomists, not by scouts and growers', async () => {
    for (const who of ['scout', 'grower', 'neighbor'] as const) {
      expect(await layOut(drawn(), {}, who)).toMatchObject({ outcome: 'refused', code: 'forbidden' });
    }
    expect(await trialOf(own.plantingId)).toBeNull();
  });

  it('sent again is answered as it was, and stands once', async () => {
    const plantingId = await own.addPlanting();
    const sent = { operationId: v7(), deviceSequence: 910_001 };
    const [body, trialId] = [drawnBody(plantingId, settings), v7()];
    const first = await layOut(body, sent, 'agronomist', trialId);
    expect(first.outcome).toBe('applied');
    expect(await layOut(body, sent, 'agronomist', trialId)).toEqual({ ...first, outcome: 'duplicate' });
    expect(await own.rows(sql`select 1 from trial where planting_id = ${plantingId}`)).toHaveLength(1);
  });

  it('drawn by two people at once stands once; the other is a conflict and kept', async () => {
    const plantingId = await own.addPlanting();
    const sent = [1, 2].map((seed) => ({ trialId: v7(), body: drawnBody(plantingId, settings, { seed }) }));
    const answers = await Promise.all(sent.map(({ body, trialId }) => layOut(body, {}, 'agronomist', trialId)));
    expect(answers.map((answer) => answer.outcome).sort()).toEqual(['applied', 'conflict']);
    const loser = sent[answers.findIndex((answer) => answer.outcome === 'conflict')];
    expect(await own.lost(loser?.trialId ?? '')).toMatchObject([{ kind: 'trial.lay-out', body: loser?.body, standingVersion: 1 }]);
  });

  it('drawn again replaces the one it names, and no other', async () => {
    const laid = await own.addTrial();
    const again = drawnBody(laid.plantingId, laid.settingIds, { seed: 9, more: { replacesTrialId: laid.trialId } });
    expect((await layOut({ ...again, replacesTrialId: null })).outcome).toBe('conflict');
    expect((await layOut({ ...again, replacesTrialId: v7() })).outcome).toBe('conflict');
    expect((await trialOf(laid.plantingId))?.id).toBe(laid.trialId);
    expect((await layOut(again)).outcome).toBe('applied');
    expect(await own.stands('trial', laid.trialId)).toBe('removed');
    expect((await trialOf(laid.plantingId))?.strips.map((strip) => strip.id)).toEqual(again.blocks.flatMap((block) => block.strips.map((strip) => strip.id)));
    expect(await scene.send('agronomist', 'trial.lock', laid.trialId, {}, { baseVersion: 1 })).toMatchObject({ code: 'not-found' });
  });

  it('with row samples in its strips is not drawn again until they are gone', async () => {
    const laid = await own.addTrial();
    const sample = await own.addRowSample(laid.plantingId, { stripId: laid.strips[0]?.id });
    const again = () => layOut(drawnBody(laid.plantingId, laid.settingIds, { seed: 9, more: { replacesTrialId: laid.trialId } }));
    expect(await again()).toMatchObject({ outcome: 'refused', code: 'in-use', sentence: expect.stringContaining('Row samples') });
    await scene.must('agronomist', 'row-sample.remove', sample, {}, { baseVersion: 1 });
    expect((await again()).outcome).toBe('applied');
  });

  it('goes with its planting while it is not locked, and gives its settings free', async () => {
    const laid = await own.addTrial();
    expect((await scene.send('agronomist', 'setting.remove', laid.settingIds[0] ?? '', {}, { baseVersion: 1 })).code).toBe('in-use');
    await scene.must('agronomist', 'planting.remove', laid.plantingId, {}, { baseVersion: 1 });
    expect(await own.stands('trial', laid.trialId)).toBe('removed');
    expect((await scene.send('agronomist', 'setting.remove', laid.settingIds[0] ?? '', {}, { baseVersion: 1 })).outcome).toBe('applied');
  });

  it('is not shown to those who count, only its strips', async () => {
    const laid = await own.addTrial();
    expect(await own.plan(laid.plantingId, 'scout')).toMatchObject({ trial: null, settings: [], may: { showTrial: false, layOut: false, write: false } });
    expect((await own.plan(laid.plantingId, 'scout')).strips.map((strip) => strip.id)).toEqual(laid.strips.map((strip) => strip.id));
    expect((await own.plan(laid.plantingId, 'grower')).trial?.id).toBe(laid.trialId);
  });
});

describe('a lock', () => {
  const lock = (trialId: string, more: Body = { baseVersion: 1 }, who: Parameters<DecideScene['send']>[0] = 'agronomist') => scene.send(who, 'trial.lock', trialId, {}, more);

  it('is set once, at the moment of its writer, and answered the same when sent again', async () => {
    const laid = await own.addTrial();
    const sent = { baseVersion: 1, operationId: v7(), deviceSequence: 910_002 };
    const first = await lock(laid.trialId, sent);
    expect(first).toMatchObject({ outcome: 'applied', version: 2 });
    expect(await lock(laid.trialId, sent)).toEqual({ ...first, outcome: 'duplicate' });
    expect(await lock(laid.trialId, { baseVersion: 2 })).toMatchObject({ outcome: 'refused', code: 'locked' });
    expect(await own.rows(sql`select locked_by, version from trial where id = ${laid.trialId}`)).toEqual([{ locked_by: scene.people.agronomist.id, version: 2 }]);
    // The clock of this scene stands at 15:00 in Greenwich.
    expect(new Date((await trialOf(laid.plantingId))?.lockedAt ?? '').toISOString()).toBe('2026-05-20T15:00:00.000Z');
  });

  it('names the version it was made on, and is for owners and agronomists', async () => {
    const laid = await own.addTrial();
    expect(refusedAt(await lock(laid.trialId, {}))).toEqual(atField('baseVersion'));
    expect(await lock(laid.trialId, { baseVersion: 2 })).toMatchObject({ outcome: 'conflict', standingVersion: 1 });
    for (const who of ['scout', 'grower', 'neighbor'] as const) expect((await lock(laid.trialId, { baseVersion: 1 }, who)).code).toBe('forbidden');
    expect((await other.scene.send('owner', 'trial.lock', laid.trialId, {}, { baseVersion: 1 })).code).toBe('not-found');
    expect((await trialOf(laid.plantingId))?.lockedAt).toBeNull();
    expect((await lock(laid.trialId, { baseVersion: 1 }, 'owner')).outcome).toBe('applied');
  });

  it('by two people at the same moment is set once', async () => {
    const laid = await own.addTrial();
    const answers = await Promise.all([lock(laid.trialId), lock(laid.trialId, { baseVersion: 1 }, 'owner')]);
    expect(answers.map((answer) => answer.outcome).sort()).toEqual(['applied', 'refused']);
  });

  it('after rows were counted is asked about, and taken with the answer', async () => {
    const laid = await own.addTrial();
    await scene.countAgain(await own.addRowSample(laid.plantingId, { stripId: laid.strips[0]?.id }), 20, '2026-05-18');
    const asked = await lock(laid.trialId);
    expect(asked).toMatchObject({ outcome: 'refused', code: 'needs-confirmation', questions: [{ rule: 'locked-after-counts', about: laid.trialId }] });
    expect(asked.questions?.[0]?.sentence).toContain('18 May 2026');
    expect((await lock(laid.trialId, { baseVersion: 1, confirmations: yesTo(asked) })).outcome).toBe('applied');
  });

  it('keeps layout, planting and what is compared as they were', async () => {
    const laid = await own.addLockedTrial();
    const before = await trialOf(laid.plantingId);
    for (const replacesTrialId of [laid.trialId, null]) {
      expect(await layOut(drawnBody(laid.plantingId, laid.settingIds, { seed: 9, more: { replacesTrialId, mainFigure: 'score' } }))).toMatchObject({ outcome: 'refused', code: 'locked' });
    }
    expect(await scene.send('owner', 'planting.remove', laid.plantingId, {}, { baseVersion: 1 })).toMatchObject({ outcome: 'refused', code: 'in-use' });
    expect(await trialOf(laid.plantingId)).toEqual(before);
    expect(await scene.send('owner', 'setting.remove', laid.settingIds[0] ?? '', {}, { baseVersion: 1 })).toMatchObject({ outcome: 'refused', code: 'in-use' });
  });

  it('lets a setting be renamed, and nothing that it is on the planter be changed', async () => {
    const laid = await own.addLockedTrial();
    const [settingId = ''] = laid.settingIds;
    const change = (more: Body, baseVersion = 1) => scene.send('owner', 'setting.change', settingId, settingBody(more), { baseVersion });
    const others: Body[] = [
      { cleaner: 'fixed' }, { wheels: 'smooth' }, { pressureDirection: 'lift' }, { pressure: { typed: '41' } }, { pressure: null }, { pressure: { typed: '40 psi' } },
      { workingDepth: { typed: '3/4' } }, { adjustedFrom: 'wrench' },
    ];
    for (const more of others) expect([more, (await change(more)).code]).toEqual([more, 'in-use']);
    // The same depth in other writing is the same depth.
    expect((await change({ name: newName('Renamed'), phrase: 'the cleaners under another name', note: 'Bolt renewed.', workingDepth: { typed: '0.5' } })).outcome).toBe('applied');
    expect(await own.setting(settingId)).toMatchObject({ version: 2, workingDepth: { typed: '0.5' } });
  });

  it('leaves room for row samples in its strips', async () => {
    const laid = await own.addLockedTrial();
    const id = await own.addRowSample(laid.plantingId, { stripId: laid.strips[3]?.id });
    expect((await own.plan(laid.plantingId)).rowSamples).toMatchObject([{ id, stripId: laid.strips[3]?.id }]);
    expect((await scene.send('agronomist', 'row-samples.add', laid.plantingId, { plantingId: laid.plantingId, samples: [rowSampleBody({ id: v7(), stripId: v7() })] })).code).toBe('bad-input');
  });
});
