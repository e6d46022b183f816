import { setTimeout as pause } from 'node:timers/promises';
import { sql } from 'drizzle-orm';
import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { inOrganisation } from '@/db/connection';
import { makeDecideScenes, type DecideScene } from '../support/decide-scene';
import { atField, PlanScene, refusedAt, type Body } from '../support/plan-scene';

let scene: DecideScene;
let own: PlanScene;
let other: PlanScene;
let close: () => Promise<void>;
let laid: Awaited<ReturnType<PlanScene['addLockedTrial']>>;

beforeAll(async () => {
  const made = await makeDecideScenes(2);
  const [first, second] = made.scenes as [DecideScene, DecideScene];
  scene = first;
  close = made.close;
  own = await new PlanScene(scene).settle();
  other = await new PlanScene(second).settle();
  laid = await own.addLockedTrial({ settings: 3 });
});
afterAll(() => close());

type Said = { stripId?: unknown; settingId?: unknown; reason?: unknown };

const asPlanted = (strips: readonly Said[], more: Body = {}, who: Parameters<DecideScene['send']>[0] = 'agronomist', trialId = laid.trialId) =>
  scene.send(who, 'trial.as-planted', trialId, { strips: strips.map((strip) => ({ id: v7(), ...strip })) }, more);
const stripNow = async (stripId: string, plantingId = laid.plantingId) => (await own.plan(plantingId)).trial?.strips.find((strip) => strip.id === stripId);
const strip = (index: number) => laid.strips[index] ?? { id: '', settingId: '' };
/** A setting of the trial that was not planned for this strip. */
const another = (index: number) => laid.settingIds.find((each) => each !== strip(index).settingId) ?? '';

describe('what was planted', () => {
  it('otherwise than planned stands beside the plan with its reason; the newest word holds and the first is kept', async () => {
    const { id, settingId } = strip(0);
    expect((await asPlanted([{ stripId: id, settingId: another(0), reason: 'Wrench lost in block 1.' }])).outcome).toBe('applied');
    expect(await stripNow(id)).toMatchObject({ plannedSettingId: settingId, asPlanted: { settingId: another(0), reason: 'Wrench lost in block 1.' } });
    expect((await asPlanted([{ stripId: id, settingId: null, reason: 'Flooded.' }], {}, 'owner')).outcome).toBe('applied');
    expect(await stripNow(id)).toMatchObject({ plannedSettingId: settingId, asPlanted: { settingId: null, reason: 'Flooded.' } });
    expect(await own.rows(sql`select reason, created_by from strip_as_planted where strip_id = ${id} order by created_at`)).toEqual([
      { reason: 'Wrench lost in block 1.', created_by: scene.people.agronomist.id },
      { reason: 'Flooded.', created_by: scene.people.owner.id },
    ]);
  });

  it('as planned needs no reason, and what nobody has spoken of stays open', async () => {
    const { id, settingId } = strip(1);
    expect((await asPlanted([{ stripId: id, settingId, reason: null }])).outcome).toBe('applied');
    expect((await stripNow(id))?.asPlanted).toEqual({ settingId, reason: null });
    expect((await stripNow(strip(2).id))?.asPlanted).toBeNull();
  });

  it.each<[string, () => Said[], string]>([
    ['otherwise without a reason', () => [{ stripId: strip(3).id, settingId: another(3), reason: null }], 'strips.0.reason'],
    ['otherwise with a blank reason', () => [{ stripId: strip(3).id, settingId: another(3), reason: ' ' }], 'strips.0.reason'],
    ['otherwise with a reason longer than a note', () => [{ stripId: strip(3).id, settingId: another(3), reason: 'x'.repeat(301) }], 'strips.0.reason'],
    ['and lost without a reason', () => [{ stripId: strip(3).id, settingId: null, reason: null }], 'strips.0.reason'],
    ['in a strip that was never there', () => [{ stripId: v7(), settingId: another(3), reason: 'Mixed up.' }], 'strips.0.stripId'],
    ['in a strip without a name', () => [{ stripId: 'S4', settingId: another(3), reason: 'Mixed up.' }], 'strips.0.stripId'],
    ['with a setting that was never there', () => [{ stripId: strip(3).id, settingId: v7(), reason: 'Mixed up.' }], 'strips.0.settingId'],
    ['with a setting left out', () => [{ stripId: strip(3).id, reason: 'Mixed up.' }], 'strips.0.settingId'],
    ['twice in one strip', () => [0, 1].map(() => ({ stripId: strip(3).id, settingId: strip(3).settingId, reason: null })), 'strips'],
    ['in no strip', () => [], 'strips'],
  ])('%s is refused at its field', async (_, strips, path) => {
    expect(refusedAt(await asPlanted(strips()))).toEqual(atField(path));
    expect((await stripNow(strip(3).id))?.asPlanted).toBeNull();
  });

  it('in one strip that cannot be is taken in none', async () => {
    const answer = await asPlanted([{ stripId: strip(4).id, settingId: strip(4).settingId, reason: null }, { stripId: strip(5).id, settingId: another(5), reason: null }]);
    expect(refusedAt(answer)).toEqual(atField('strips.1.reason'));
    expect((await stripNow(strip(4).id))?.asPlanted).toBeNull();
  });

  it('is said of strips of this trial only, and with settings of this organisation that stand', async () => {
    const elsewhere = await own.addLockedTrial();
    const theirs = await other.addLockedTrial();
    const removed = await own.addSetting();
    await scene.must('owner', 'setting.remove', removed, {}, { baseVersion: 1 });
    const foreign = { settingId: another(6), reason: 'Mixed up.' };
    for (const stripId of [elsewhere.strips[0]?.id, theirs.strips[0]?.id]) expect(refusedAt(await asPlanted([{ stripId, ...foreign }]))).toEqual(atField('strips.0.stripId'));
    for (const settingId of [theirs.settingIds[0], removed]) {
      expect(refusedAt(await asPlanted([{ stripId: strip(6).id, settingId, reason: 'Mixed up.' }]))).toEqual(atField('strips.0.settingId'));
    }
    expect((await asPlanted([{ stripId: theirs.strips[0]?.id, settingId: null, reason: 'Flooded.' }], {}, 'owner', theirs.trialId)).code).toBe('not-found');
    expect((await other.plan(theirs.plantingId)).trial?.strips.every((each) => each.asPlanted === null)).toBe(true);
    expect(await stripNow(elsewhere.strips[0]?.id ?? '', elsewhere.plantingId)).toMatchObject({ asPlanted: null });
  });

  it('may be a setting that the trial did not plan, which then stays', async () => {
    const unplanned = await own.addSetting();
    expect((await asPlanted([{ stripId: strip(7).id, settingId: unplanned, reason: 'Left over from the field before.' }])).outcome).toBe('applied');
    expect(await scene.send('owner', 'setting.remove', unplanned, {}, { baseVersion: 1 })).toMatchObject({ outcome: 'refused', code: 'in-use' });
  });

  it('never names a setting that is removed at the same moment', async () => {
    const settingId = await own.addSetting();
    const said = await inOrganisation(scene.db, { organisationId: scene.organisationId }, async (tx) => {
      await tx.execute(sql`update setting set removed_at = now(), version = version + 1 where id = ${settingId}`);
      const waiting = asPlanted([{ stripId: strip(8).id, settingId, reason: 'Mixed up.' }]);
      await Promise.race([waiting, pause(500)]);
      return { waiting };
    });
    expect(refusedAt(await said.waiting)).toEqual(atField('strips.0.settingId'));
    expect((await stripNow(strip(8).id))?.asPlanted).toBeNull();
  });

  it('is held against a locked plan only', async () => {
    const open = await own.addTrial();
    const answer = await asPlanted([{ stripId: open.strips[0]?.id, settingId: open.strips[0]?.settingId, reason: null }], {}, 'agronomist', open.trialId);
    expect(answer).toMatchObject({ outcome: 'refused', code: 'bad-input', sentence: expect.stringContaining('Lock the plan first') });
    expect(await stripNow(open.strips[0]?.id ?? '', open.plantingId)).toMatchObject({ asPlanted: null });
  });

  it('is said by owners and agronomists, not by scouts and growers', async () => {
    const said = [{ stripId: strip(9).id, settingId: null, reason: 'Flooded.' }];
    for (const who of ['scout', 'grower', 'neighbor'] as const) expect(await asPlanted(said, {}, who)).toMatchObject({ outcome: 'refused', code: 'forbidden' });
    expect((await stripNow(strip(9).id))?.asPlanted).toBeNull();
  });

  it('sent again is answered as it was, and stands once', async () => {
    const sent = { operationId: v7(), deviceSequence: 920_001 };
    const body = { strips: [{ id: v7(), stripId: strip(10).id, settingId: null, reason: 'Flooded.' }] };
    const first = await scene.send('agronomist', 'trial.as-planted', laid.trialId, body, sent);
    expect(first.outcome).toBe('applied');
    expect(await scene.send('agronomist', 'trial.as-planted', laid.trialId, body, sent)).toEqual({ ...first, outcome: 'duplicate' });
    expect(await own.rows(sql`select 1 from strip_as_planted where strip_id = ${strip(10).id}`)).toHaveLength(1);
  });

  it('by two people at once is kept twice, and one of them holds', async () => {
    const said = ['Flooded.', 'Washed out.'];
    const answers = await Promise.all(said.map((reason, index) => asPlanted([{ stripId: strip(11).id, settingId: null, reason }], {}, index === 0 ? 'owner' : 'agronomist')));
    expect(answers.map((answer) => answer.outcome)).toEqual(['applied', 'applied']);
    expect(await own.rows(sql`select 1 from strip_as_planted where strip_id = ${strip(11).id}`)).toHaveLength(2);
    expect(said).toContain((await stripNow(strip(11).id))?.asPlanted?.reason);
  });
});
