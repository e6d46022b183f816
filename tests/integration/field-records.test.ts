import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { readCountTable } from '@/lib/server/services/counts/read-count-table';
import { readRowSheet } from '@/lib/server/services/counts/read-row-sheet';
import { readFieldRestrictions } from '@/lib/server/services/entry-restrictions/read-field-restrictions';
import { readPlantingRecords } from '@/lib/server/services/field-records/read-planting-records';
import { readRowRecords } from '@/lib/server/services/field-records/read-row-records';
import { CountScene, yesTo } from '../support/count-scene';
import { makeDecideScenes, type DecideScene } from '../support/decide-scene';
import { fieldKinds, sprayed, sprayedField, standingOf, visit, type FieldKind } from '../support/field-scene';
import { PlanScene } from '../support/plan-scene';
import { readAs } from '../support/trial-scene';

let scene: DecideScene;
let other: DecideScene;
let counted: CountScene;
let otherCounted: CountScene;
let close: () => Promise<void>;

beforeAll(async () => {
  const made = await makeDecideScenes(2);
  [scene, other] = made.scenes as [DecideScene, DecideScene];
  close = made.close;
  otherCounted = await new CountScene(other).settle();
  await sprayedField(otherCounted);
});
afterAll(() => close());

async function settled() {
  counted = await new CountScene(scene).settle();
  await sprayedField(counted);
  return counted;
}

const standing = async ({ targetKind }: FieldKind) => (await standingOf(counted))[targetKind] ?? [];
const idsOf = (rows: readonly Record<string, unknown>[]) => rows.map((row) => row.id);

describe.each(fieldKinds)('$kind', (kind) => {
  const send = (id: string, more: Record<string, unknown> = {}, who: Parameters<DecideScene['send']>[0] = 'scout') =>
    scene.send(who, kind.kind, id, { ...kind.body(counted), ...more });

  it('is taken and stands', async () => {
    await settled();
    const id = v7();
    expect(await send(id)).toMatchObject({ outcome: 'applied', version: 1 });
    expect(idsOf(await standing(kind))).toEqual([id]);
    expect((await standing(kind))[0]).toMatchObject({ personName: 'Test scout' });
  });

  it('sent again under another operation is answered as before, and with other content refused', async () => {
    await settled();
    const id = v7();
    const body = kind.body(counted);
    const sent = (more = {}) => scene.send('scout', kind.kind, id, { ...body, ...more });
    expect(await sent()).toMatchObject({ outcome: 'applied' });
    expect(await sent()).toMatchObject({ outcome: 'applied', version: 1 });
    expect(await sent(kind.changed)).toMatchObject({ outcome: 'refused', code: 'operation-reused' });
    expect(idsOf(await standing(kind))).toEqual([id]);
  });

  it('sent many times at once stands once', async () => {
    await settled();
    const id = v7();
    const body = kind.body(counted);
    const answers = await Promise.all(Array.from({ length: 6 }, () => scene.send('scout', kind.kind, id, body)));
    expect(answers.map(({ outcome }) => outcome)).toEqual(Array.from({ length: 6 }, () => 'applied'));
    expect(idsOf(await standing(kind))).toEqual([id]);
  });

  it('is taken back and no longer stands, and taking it back twice is one withdrawal', async () => {
    await settled();
    const id = v7();
    await send(id);
    expect(await counted.takeBack(kind.targetKind, id)).toMatchObject({ outcome: 'applied' });
    expect(await counted.takeBack(kind.targetKind, id)).toMatchObject({ outcome: 'applied' });
    expect(await standing(kind)).toEqual([]);
  });

  it.each(kind.bad)('%s is refused at its field', async (_, spoiled, path) => {
    await settled();
    const answer = await send(v7(), spoiled);
    expect([answer.outcome, answer.code, answer.fields?.map((field) => field.path)]).toEqual(['refused', 'bad-input', [path]]);
    expect(await standing(kind)).toEqual([]);
  });

  it('of another organisation’s place, or taken back from there, is not found', async () => {
    await settled();
    expect(await scene.send('owner', kind.kind, v7(), kind.body(otherCounted))).toMatchObject({ outcome: 'refused', code: 'not-found' });
    const theirs = v7();
    await other.must('scout', kind.kind, theirs, kind.body(otherCounted));
    expect(await counted.takeBack(kind.targetKind, theirs, 'not mine', 'owner')).toMatchObject({ outcome: 'refused', code: 'not-found' });
  });

  it('is forbidden to a grower', async () => {
    await settled();
    expect(await send(v7(), {}, 'grower')).toMatchObject({ outcome: 'refused', code: 'forbidden' });
  });
});

describe.each(fieldKinds.filter((kind) => kind.corrected))('a correction by $kind', (kind) => {
  const send = (id: string, more: Record<string, unknown> = {}, who: Parameters<DecideScene['send']>[0] = 'scout') =>
    scene.send(who, kind.kind, id, { ...kind.body(counted), ...more });

  it('stands in the place of what it corrects, until it is taken back', async () => {
    await settled();
    const [first, second] = [v7(), v7()];
    await send(first);
    expect(await send(second, { ...kind.changed, replacesId: first })).toMatchObject({ outcome: 'applied' });
    expect(idsOf(await standing(kind))).toEqual([second]);
    await counted.takeBack(kind.targetKind, second);
    expect(idsOf(await standing(kind))).toEqual([first]);
  });

  it('made twice at once is taken once; the other is kept, and shown what stands', async () => {
    await settled();
    const first = v7();
    await send(first);
    const made = [v7(), v7()] as const;
    const answers = await Promise.all([send(made[0], { ...kind.changed, replacesId: first }), send(made[1], { ...kind.changed, replacesId: first }, 'agronomist')]);
    const [won, lost] = [answers.findIndex(({ outcome }) => outcome === 'applied'), answers.findIndex(({ outcome }) => outcome === 'conflict')];
    expect([won, lost].sort()).toEqual([0, 1]);
    expect(answers[lost]).toMatchObject({ code: 'conflict', standing: { id: made[won], personName: won === 0 ? 'Test scout' : 'Test agronomist' } });
    expect(idsOf(await standing(kind))).toEqual([made[won]]);
    expect(await new PlanScene(scene).lost(made[lost] ?? '')).toHaveLength(1);
    // Settled by choosing: what stands is named instead.
    expect(await send(v7(), { ...kind.changed, replacesId: made[won] })).toMatchObject({ outcome: 'applied' });
  });

  it('of what was taken back meanwhile has lost, and of another place is refused', async () => {
    await settled();
    const first = v7();
    await send(first);
    await counted.takeBack(kind.targetKind, first);
    const late = await send(v7(), { replacesId: first });
    expect(late).toMatchObject({ outcome: 'conflict' });
    expect(late.standing).toBeUndefined();
    const elsewhere = v7();
    const before = counted;
    await settled();
    await send(elsewhere);
    counted = before;
    expect(await send(v7(), { replacesId: elsewhere })).toMatchObject({ code: 'bad-input', fields: [{ path: 'replacesId' }] });
  });
});


describe('what a phone sends', () => {
  it('of a day to come is taken, where a form is refused', async () => {
    await settled();
    const ahead = { ...fieldKinds[0]?.body(counted), visit: visit({ visitedOn: '2026-05-29' }) };
    expect(await scene.send('scout', 'depth.record', v7(), ahead)).toMatchObject({ code: 'bad-input' });
    expect(await scene.sendFromPhone('scout', 'depth.record', v7(), ahead)).toMatchObject({ outcome: 'applied' });
  });

  it('as a correction of a count that was corrected meanwhile is shown the count that stands', async () => {
    await settled();
    const first = await counted.mustCount('A-1', { on: '2026-05-18', plants: 20 });
    const visitId = v7();
    await counted.mustCount('A-1', { on: '2026-05-18', plants: 21, visitId, replacesId: first });
    const answer = await counted.count('A-1', { on: '2026-05-18', plants: 22, replacesId: first }, 'agronomist');
    expect(answer).toMatchObject({ outcome: 'conflict', standing: { plants: 21, doubtful: 0, countedAs: 'so-far', personName: 'Test scout', visitedOn: '2026-05-18' } });
    // Corrected once more by way of the one in between.
    await counted.mustCount('A-1', { on: '2026-05-18', plants: 23, replacesId: String(answer.standing?.id) });
    expect(await counted.count('A-1', { on: '2026-05-18', plants: 22, replacesId: first })).toMatchObject({ outcome: 'conflict', standing: { plants: 23 } });
  });
});

describe('a correction of a tape sheet', () => {
  it('that was corrected meanwhile is shown how many plants the standing sheet has, and whose it is', async () => {
    await settled();
    const [first, second] = [v7(), v7()];
    expect(await counted.tape('A-1', ['6', '12', '18'], { sheetId: first })).toMatchObject({ outcome: 'applied' });
    expect(await counted.tape('A-1', ['6', '12', { typed: '15', kind: 'missing' }, '18', '24'], { sheetId: second, replacesId: first })).toMatchObject({ outcome: 'applied' });
    const late = await counted.tape('A-1', ['6', '12', '19'], { replacesId: first }, 'agronomist');
    expect(late).toMatchObject({ outcome: 'conflict', standing: { id: second, plants: 4, personName: 'Test scout', visitedOn: '2026-05-19' } });
  });
});

describe('the desk', () => {
  it('marks a count dated after today on the table and the sheet, and no other', async () => {
    await settled();
    await counted.mustCount('A-1', { on: '2026-05-19', plants: 20 });
    const ahead = { rowSampleId: counted.row('A-1'), visit: visit({ visitedOn: '2026-05-29' }), countedAs: 'new', plants: 1, doubtful: 0, replacesId: null };
    expect(await scene.sendFromPhone('scout', 'count.record', v7(), ahead)).toMatchObject({ outcome: 'applied' });
    const table = await readAs(scene, 'agronomist', (context) => readCountTable(context, counted.plantingId));
    expect(table.rows.map(({ label, findings }) => [label, findings.datedAheadOn])).toEqual([['A-1', ['2026-05-29']], ['A-2', []]]);
    const sheet = await readAs(scene, 'agronomist', (context) => readRowSheet(context, counted.plantingId, counted.row('A-1')));
    expect(sheet.findings.datedAheadOn).toEqual(['2026-05-29']);
  });

  it('shows the mean and range of depths, pairs of digs with the late plant first, and markers that are still out', async () => {
    await settled();
    const send = (kind: string, more: Record<string, unknown>) => scene.must('scout', kind, v7(), { ...fieldKinds.find((each) => each.kind === kind)?.body(counted), ...more });
    await send('depth.record', { depths: ['1 1/2', '2', '2 1/2'] });
    const pairId = v7();
    for (const plant of ['neighbor', 'late']) await send('dig.record', { pairId, plant });
    await send('markers.record', { event: 'set', markers: 24 });
    await send('markers.record', { event: 'taken-up', markers: 21 });
    const records = await readAs(scene, 'scout', (context) => readRowRecords(context, counted.plantingId, counted.row('A-1')));
    expect(records.depths).toMatchObject([{ plants: 3, mean: 2, shallowest: 1.5, deepest: 2.5, unit: 'in' }]);
    expect(records.digPairs.map(({ digs }) => digs.map(({ plant }) => plant))).toEqual([['late', 'neighbor']]);
    expect(records.markers).toMatchObject({ set: 24, takenUp: 21, left: 3 });
    const whole = await readAs(scene, 'scout', (context) => readPlantingRecords(context, counted.plantingId));
    expect(whole.markersOut).toEqual([{ id: counted.row('A-1'), label: 'A-1', left: 3 }]);
    expect(await readAs(scene, 'scout', (context) => readRowRecords(context, counted.plantingId, counted.row('A-2')))).toMatchObject({ depths: [], digPairs: [], markers: { left: 0 } });
  });

  // Today is 20 May, 10:00 in Chicago.
  it.each([
    ['17:00 the day before for 17 hours', { endedOn: '2026-05-19', endedAt: '17:00', hours: 17 }, { untilOn: '2026-05-20', untilAt: '10:00', isOver: true }],
    ['17:00 the day before for 17 hours and a half', { endedOn: '2026-05-19', endedAt: '17:00', hours: 17.5 }, { untilOn: '2026-05-20', untilAt: '10:30', isOver: false }],
    // The clocks went forward on 8 March 2026: an interval is hours, not clock time.
    ['the night the clocks go forward', { endedOn: '2026-03-07', endedAt: '20:00', hours: 24 }, { untilOn: '2026-03-08', untilAt: '21:00', isOver: true }],
  ])('says until when a field is closed after %s', async (_, interval, until) => {
    await settled();
    await scene.must('scout', 'entry-restriction.record', v7(), { fieldId: sprayed(counted), product: 'A burndown', replacesId: null, ...interval });
    const read = await readAs(scene, 'grower', (context) => readFieldRestrictions(context, sprayed(counted)));
    expect(read).toMatchObject({ mayWrite: false, restrictions: [{ product: 'A burndown', ...until }] });
  });
});

describe('a dig', () => {
  const dig = (more: Record<string, unknown>) => ({ ...fieldKinds.find(({ kind }) => kind === 'dig.record')?.body(counted), where: 'in-sample', ...more });

  it('inside the measured length is asked about until counting there has ended', async () => {
    await settled();
    const asked = await scene.send('scout', 'dig.record', v7(), dig({}));
    expect(asked).toMatchObject({ code: 'needs-confirmation', questions: [{ rule: 'dig-before-counting-ended', about: 'A-1, 18 May 2026' }] });
    expect(await scene.send('scout', 'dig.record', v7(), dig({}), { confirmations: yesTo(asked) })).toMatchObject({ outcome: 'applied' });
    for (const [on, plants] of [['2026-05-15', 20], ['2026-05-16', 22], ['2026-05-17', 22], ['2026-05-18', 22]] as const) await counted.mustCount('A-1', { on, plants });
    expect(await scene.send('scout', 'dig.record', v7(), dig({}))).toMatchObject({ outcome: 'applied' });
  });

  it('keeps a late plant and its neighbor as one pair', async () => {
    await settled();
    const pairId = v7();
    for (const plant of ['late', 'neighbor']) await scene.must('scout', 'dig.record', v7(), dig({ where: 'twin-length', pairId, plant }));
    expect((await standingOf(counted)).dig?.map((row) => [row.pairId, row.plant])).toEqual([[pairId, 'late'], [pairId, 'neighbor']]);
  });
});

describe('an exception from an entry restriction', () => {
  const restriction = (more: Record<string, unknown> = {}) => ({ ...fieldKinds.find(({ kind }) => kind === 'entry-restriction.record')?.body(counted), ...more });
  const exception = (restrictionId: string, more: Record<string, unknown> = {}) => ({ restrictionId, enteredOn: '2026-05-18', exception: 'No contact', equipment: 'Coveralls, gloves', ...more });

  it('is kept under its restriction, also where that is corrected, and is taken back', async () => {
    await settled();
    const [first, second, entered] = [v7(), v7(), v7()];
    await scene.must('agronomist', 'entry-restriction.record', first, restriction());
    await scene.must('scout', 'entry-exception.record', entered, exception(first));
    await scene.must('agronomist', 'entry-restriction.record', second, restriction({ hours: 24, replacesId: first }));
    const shown = async () => (await standingOf(counted))['entry-restriction'];
    expect(await shown()).toMatchObject([{ id: second, hours: 24, exceptions: [{ id: entered, personId: scene.people.scout.id, exception: 'No contact' }] }]);
    await counted.takeBack('entry-exception', entered);
    expect(await shown()).toMatchObject([{ id: second, exceptions: [] }]);
  });

  it('sent again is answered as before; before the application, without equipment, or of another organisation it is refused', async () => {
    await settled();
    const [first, entered] = [v7(), v7()];
    await scene.must('agronomist', 'entry-restriction.record', first, restriction());
    for (let turn = 0; turn < 2; turn += 1) expect(await scene.send('scout', 'entry-exception.record', entered, exception(first))).toMatchObject({ outcome: 'applied' });
    expect(await scene.send('scout', 'entry-exception.record', entered, exception(first, { equipment: 'None' }))).toMatchObject({ code: 'operation-reused' });
    expect(await scene.send('scout', 'entry-exception.record', v7(), exception(first, { enteredOn: '2026-05-16' }))).toMatchObject({ fields: [{ path: 'enteredOn' }] });
    expect(await scene.send('scout', 'entry-exception.record', v7(), exception(first, { equipment: ' ' }))).toMatchObject({ fields: [{ path: 'equipment' }] });
    const theirs = v7();
    await other.must('agronomist', 'entry-restriction.record', theirs, { ...restriction(), fieldId: sprayed(otherCounted) });
    expect(await scene.send('owner', 'entry-exception.record', v7(), exception(theirs))).toMatchObject({ code: 'not-found' });
  });
});

describe('a spot count', () => {
  const start = (more: Record<string, unknown> = {}) => ({
    farmId: scene.farmId, field: { id: v7(), name: 'West forty' }, plantedOn: '2026-05-07', crop: 'corn', rowSpacing: { typed: '30' }, seedingRate: { typed: '34,000' }, intendedStand: { typed: '31,500' }, ...more,
  });
  const place = (plantingId: string, more: Record<string, unknown> = {}) => ({ plantingId, zoneId: null, label: 'P1', length: { typed: '17 ft 5 in' }, startEnd: 'mark', farEnd: 'mark', ...more });
  const counting = (rowSampleId: string) => ({ rowSampleId, visit: visit(), countedAs: 'so-far', plants: 31, doubtful: 0, replacesId: null });

  it('is begun by a scout from nothing, with its field, its places and their counts, each sent twice', async () => {
    const [plantingId, placeId, countId] = [v7(), v7(), v7()];
    const body = start();
    for (let turn = 0; turn < 2; turn += 1) {
      expect(await scene.send('scout', 'spot-count.start', plantingId, body)).toMatchObject({ outcome: 'applied', version: 1 });
      expect(await scene.send('scout', 'spot-place.add', placeId, place(plantingId))).toMatchObject({ outcome: 'applied', version: 1 });
    }
    await scene.must('scout', 'count.record', countId, counting(placeId));
    const plan = await new PlanScene(scene).plan(plantingId, 'scout');
    expect(plan).toMatchObject({ field: { name: 'West forty' } });
    expect(await scene.send('scout', 'spot-count.start', plantingId, { ...body, seedingRate: { typed: '33,000' } })).toMatchObject({ code: 'operation-reused' });
    expect(await scene.send('scout', 'spot-place.add', placeId, place(plantingId, { label: 'P2' }))).toMatchObject({ code: 'operation-reused' });
  });

  it('goes into a field that stands, and is refused for one that is not on the farm', async () => {
    await settled();
    expect(await scene.send('scout', 'spot-count.start', v7(), start({ field: { id: sprayed(counted), name: null } }))).toMatchObject({ outcome: 'applied' });
    for (const id of [v7(), sprayed(otherCounted)]) {
      expect(await scene.send('scout', 'spot-count.start', v7(), start({ field: { id, name: null } }))).toMatchObject({ code: 'bad-input', fields: [{ path: 'field.id' }] });
    }
  });

  it.each<[string, Record<string, unknown>, string]>([
    ['without the name of the field', { field: { id: v7(), name: ' ' } }, 'field.name'],
    ['in rows wider than a road', { rowSpacing: { typed: '900' } }, 'rowSpacing'],
    ['at a rate in letters', { seedingRate: { typed: 'many' } }, 'seedingRate'],
    ['planted on a day to come', { plantedOn: '2026-05-21' }, 'plantedOn'],
    ['of no crop', { crop: 'weeds' }, 'crop'],
  ])('%s is refused at its field', async (_, spoiled, path) => {
    expect((await scene.send('scout', 'spot-count.start', v7(), start(spoiled))).fields?.map((field) => field.path)).toEqual([path]);
  });

  it('takes no two places under one label', async () => {
    const plantingId = v7();
    await scene.must('scout', 'spot-count.start', plantingId, start());
    await scene.must('scout', 'spot-place.add', v7(), place(plantingId));
    expect(await scene.send('scout', 'spot-place.add', v7(), place(plantingId))).toMatchObject({ fields: [{ path: 'label' }] });
  });

  it('is not found on a farm that the scout is not attached to, of this organisation or another, and forbidden to a grower', async () => {
    const farmId = await new PlanScene(scene).addFarm();
    for (const elsewhere of [farmId, other.farmId, v7()]) {
      expect(await scene.send('scout', 'spot-count.start', v7(), start({ farmId: elsewhere }))).toMatchObject({ code: 'not-found' });
    }
    expect(await scene.send('scout', 'spot-place.add', v7(), place(otherCounted.plantingId))).toMatchObject({ code: 'not-found' });
    expect(await scene.send('grower', 'spot-count.start', v7(), start())).toMatchObject({ code: 'forbidden' });
  });
});

describe('a scout taken off the farm', () => {
  beforeAll(async () => {
    const farmId = await new PlanScene(other).addFarm();
    await other.must('owner', 'person.change-role', other.people.scout.id, { role: 'scout', farmIds: [farmId] }, { baseVersion: 1 });
  });

  it.each(fieldKinds)('does not find its place for $kind', async (kind) => {
    const body = kind.body(otherCounted);
    expect(await other.send('scout', kind.kind, v7(), body)).toMatchObject({ outcome: 'refused', code: 'not-found' });
  });
});
