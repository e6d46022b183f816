import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { connect, type Database } from '@/db/connection';
import { allOperations } from '@/lib/server/operations/all-operations';
import { CountScene } from '../support/count-scene';
import { DecideScene, purdueInputs } from '../support/decide-scene';
import { TrialScene } from '../support/trial-scene';
import { makeTestDatabase, type TestDatabase } from '../support/test-database';

/**
 * Every value of every form is replaced by each of these, one at a time. What stands may be taken or refused, but a
 * refusal names the field it means, and nothing ever fails on our side.
 */
const oddValues: readonly unknown[] = [
  '', ' ', 'letters', '-1', -1, 0, 1.5, '1e9', 1e21, Number.MAX_SAFE_INTEGER, '17,5', '5 1/4', "17'5", '17 ft 5 in', '１２', '½', '1/0', 'NaN', 'Infinity', '٣', '0x10',
  '1900-01-01', '2999-12-31', '2026-02-30', '2026-13-01', '24:61', 'x'.repeat(5_000), '\u0000', '\ud800', "'; drop table farm; --", '=1+1',
  null, true, [], {}, [null], { typed: '-3' }, { typed: '999999999999' }, { typed: '' }, { typed: '1', unit: 'furlong' }, v7(), 'not-an-id',
];

type Sent = { kind: string; version?: number; thingId: () => string; body: () => Record<string, unknown>; baseVersion?: number };
type Path = readonly (string | number)[];

let own: TestDatabase;
let db: Database;
let scene: DecideScene;
let counted: CountScene;
let drawn: TrialScene;
let locked: TrialScene;
let writes: Sent[];

beforeAll(async () => {
  own = await makeTestDatabase();
  process.env.DATABASE_URL = own.appUrl;
  process.env.SESSION_SECRET = 'a secret of the tests, long enough to be one';
  db = connect(own.appUrl);
  scene = await new DecideScene(db).settle();
  counted = await new CountScene(scene).settle(['A-1', 'A-2', 'A-3']);
  await counted.mustCount('A-1', { on: '2026-05-17', plants: 20 });
  drawn = await new TrialScene(scene).layOut(['raised', 'floating']);
  locked = await new TrialScene(scene).layOut(['raised', 'floating']);
  await scene.must('agronomist', 'trial.lock', locked.trialId, {}, { baseVersion: 1 });
  writes = writesOf(counted);
});

afterAll(async () => {
  await db.$client.end();
  await own.drop();
});

function writesOf(count: CountScene): Sent[] {
  const fieldId = v7();
  const restrictionId = v7();
  const visit = () => ({ id: v7(), personId: null, visitedOn: '2026-05-18', visitedAt: '07:30', marker: 'red' });
  const planting = {
    plantedOn: '2026-05-07', plantedAt: '09:00', crop: 'corn', rowSpacing: { typed: '30' }, seedingRate: { typed: '34,000' }, tagGermination: { typed: '95' },
    intendedStand: { typed: '31,500' }, fullYield: { typed: '200' }, previousCrop: 'corn', tillage: 'no-till', slowAfterDays: 2, lateAfterDays: 7, veryLateAfterDays: 14,
    zones: [{ id: v7(), name: 'low', area: { typed: '10' } }],
  };
  const setting = { phrase: 'the cleaners as tried', cleaner: 'floating', wheels: 'toothed', pressureDirection: 'down', pressure: { typed: '40' }, workingDepth: { typed: '1/2' }, adjustedFrom: 'cab', note: 'none' };
  const settingIds = [...drawn.settingIds.values()];
  return [
    { kind: 'farm.add', thingId: v7, body: () => ({ name: `Farm ${v7()}`, timeZone: 'America/Chicago' }) },
    { kind: 'field.add', thingId: () => fieldId, body: () => ({ farmId: scene.farmId, name: 'Fuzz forty', area: { typed: '40' } }) },
    { kind: 'field.add', thingId: v7, body: () => ({ farmId: scene.farmId, name: `Field ${v7()}`, area: { typed: '40' } }) },
    { kind: 'planting.add', thingId: v7, body: () => ({ ...planting, fieldId, zones: [{ id: v7(), name: 'low', area: { typed: '10' } }] }) },
    { kind: 'setting.add', thingId: v7, body: () => ({ ...setting, name: `Setting ${v7()}` }) },
    { kind: 'row-samples.add', thingId: () => count.plantingId, body: () => ({ plantingId: count.plantingId, samples: [{ id: v7(), stripId: null, zoneId: null, label: `L${v7().slice(-6)}`, planterRow: 3, length: { typed: '17 ft 5 in' }, startEnd: 'mark', farEnd: 'mark' }] }) },
    { kind: 'count.record', thingId: v7, body: () => ({ rowSampleId: count.row('A-2'), visit: visit(), countedAs: 'so-far', plants: 20, doubtful: 1, replacesId: null }) },
    { kind: 'tape-sheet.record', version: 2, thingId: v7, body: () => ({ rowSampleId: count.row('A-3'), readFrom: 'far-end', zeroAt: 'mark', segmentStarts: [1], visit: visit(), tapeUnit: 'in', places: [{ typed: '6', kind: 'plant', marker: 'red', leafStage: 2 }, { typed: '2 1/2', kind: 'late', marker: null, leafStage: null }], replacesId: null }) },
    { kind: 'tape-sheet.record', thingId: v7, body: () => ({ rowSampleId: count.row('A-3'), visit: visit(), tapeUnit: 'in', places: [{ typed: '6', kind: 'plant', marker: 'red', leafStage: 2 }, { typed: '12 1/2', kind: 'late', marker: null, leafStage: null }], replacesId: null }) },
    { kind: 'residue.record', thingId: v7, body: () => ({ rowSampleId: count.row('A-1'), readOn: '2026-05-18', marksRead: 50, marksCovered: 10 }) },
    { kind: 'depth.record', thingId: v7, body: () => ({ rowSampleId: count.row('A-1'), visit: visit(), unit: 'in', depths: ['1 3/4', '2'], replacesId: null }) },
    {
      kind: 'dig.record', thingId: v7,
      body: () => ({
        rowSampleId: count.row('A-1'), visit: visit(), pairId: v7(), plant: 'late', where: 'twin-length', placeTyped: '68', depth: { typed: '2', unit: 'in' }, residue: 'pinned',
        moisture: 'dry', crust: 'thin', found: ['rotted', 'sound'], note: 'by the wheel track', replacesId: null,
      }),
    },
    { kind: 'crust.record', thingId: v7, body: () => ({ rowSampleId: count.row('A-1'), visit: visit(), sproutsSound: 6, sproutsDead: 1, crust: 'thick', replacesId: null }) },
    { kind: 'transect.record', thingId: v7, body: () => ({ plantingId: count.plantingId, stripId: null, readOn: '2026-05-18', marksRead: 100, marksCovered: 44, replacesId: null }) },
    {
      kind: 'condition.record', thingId: v7,
      body: () => ({ plantingId: count.plantingId, rowSampleId: count.row('A-1'), observedOn: '2026-05-18', observedAt: '07:30', growthStage: 'V1', soilTemperature: { typed: '52', unit: 'F' }, soilMoisture: 'dry', replacesId: null }),
    },
    { kind: 'photo.record', thingId: v7, body: () => ({ plantingId: count.plantingId, rowSampleId: count.row('A-1'), digId: null, takenOn: '2026-05-18', takenAt: '07:30', place: { latitude: 41.5, longitude: -93.5, accuracyMeters: 12 }, sha256: '0'.repeat(64), bytes: 1000 }) },
    { kind: 'note.record', thingId: v7, body: () => ({ plantingId: count.plantingId, rowSampleId: count.row('A-1'), notedOn: '2026-05-18', notedAt: '07:30', text: 'wheel track' }) },
    { kind: 'markers.record', thingId: v7, body: () => ({ rowSampleId: count.row('A-1'), happenedOn: '2026-05-18', event: 'set', markers: 20, replacesId: null }) },
    { kind: 'entry-restriction.record', thingId: () => restrictionId, body: () => ({ fieldId, product: 'A burndown', endedOn: '2026-05-17', endedAt: '14:00', hours: 24, replacesId: null }) },
    { kind: 'entry-exception.record', thingId: v7, body: () => ({ restrictionId, enteredOn: '2026-05-18', exception: 'no contact', equipment: 'gloves' }) },
    { kind: 'spot-count.start', thingId: v7, body: () => ({ farmId: scene.farmId, field: { id: v7(), name: 'Spot' }, plantedOn: '2026-05-07', crop: 'corn', rowSpacing: { typed: '30' }, seedingRate: { typed: '34,000' }, intendedStand: { typed: '31,500' } }) },
    { kind: 'spot-place.add', thingId: v7, body: () => ({ plantingId: count.plantingId, zoneId: null, label: `P${v7().slice(-6)}`, length: { typed: '17 ft 5 in' }, startEnd: 'mark', farEnd: 'mark' }) },
    { kind: 'observation.withdraw', thingId: v7, body: () => ({ targetKind: 'count', targetId: v7(), reason: 'typed into the wrong row' }) },
    { kind: 'import.take', thingId: v7, body: () => ({ plantingId: count.plantingId, importKind: 'counts', fileName: 'fuzz.csv', text: 'row_sample,date,so_far\nA-1,2026-05-19,20' }) },
    { kind: 'replant-sheet.save', thingId: v7, body: () => ({ plantingId: count.plantingId, zoneId: null, inputs: { typedIn: 'us', ...purdueInputs } }) },
    { kind: 'decision.sign', thingId: v7, body: () => ({ plantingId: count.plantingId, zoneId: null, decided: 'keep', signedName: 'A test', basisHash: '0'.repeat(64) }) },
    {
      kind: 'trial.lay-out', thingId: v7,
      body: () => ({
        plantingId: drawn.plantingId, studyId: v7(), studyName: 'Fuzz', replacesTrialId: drawn.trialId, layout: 'pairs', mainFigure: 'score', comparisonRule: 'holm', settingIds,
        referenceSettingId: settingIds[0], randomSeed: 1, blocks: [1, 2].map(() => ({ id: v7(), strips: settingIds.map((settingId) => ({ id: v7(), settingId })) })),
      }),
    },
    { kind: 'trial.as-planted', thingId: () => locked.trialId, body: () => ({ strips: [{ id: v7(), stripId: locked.strips[0]?.id, settingId: settingIds[0], reason: 'wrench lost' }] }) },
    { kind: 'person.invite', thingId: v7, body: () => ({ email: `${v7()}@example.test`, name: 'Somebody', role: 'scout', farmIds: [scene.farmId] }) },
    { kind: 'person.change-role', thingId: () => scene.people.neighbor.id, body: () => ({ role: 'scout', farmIds: [scene.farmId] }) },
    { kind: 'farm.change', thingId: () => scene.farmId, baseVersion: 1, body: () => ({ name: 'Test farm', timeZone: 'America/Chicago' }) },
  ];
}

/** Every place in a body, branches and leaves alike, lists by their first entry. */
function placesIn(thing: unknown, at: Path = []): Path[] {
  if (thing === null || typeof thing !== 'object') return [at];
  const inner = Array.isArray(thing) ? thing.slice(0, 1).map((each, index) => placesIn(each, [...at, index])) : Object.entries(thing).map(([key, each]) => placesIn(each, [...at, key]));
  return [...(at.length > 0 ? [at] : []), ...inner.flat()];
}

function withValue(thing: unknown, [step, ...rest]: Path, odd: unknown): unknown {
  if (step === undefined) return odd;
  const copy = (Array.isArray(thing) ? [...thing] : { ...(thing as object) }) as Record<string | number, unknown>;
  copy[step] = withValue(copy[step], rest, odd);
  return copy;
}

function without(thing: unknown, path: Path): unknown {
  const last = path.at(-1);
  const copy = structuredClone(thing) as Record<string | number, unknown>;
  const parent = path.slice(0, -1).reduce<unknown>((inner, step) => (inner as Record<string | number, unknown>)[step], copy) as Record<string | number, unknown>;
  if (last !== undefined) delete parent[last];
  return copy;
}

const shortly = (odd: unknown) => String(JSON.stringify(odd)).slice(0, 40);

async function complaintsAbout(sent: Sent): Promise<string[]> {
  const complaints: string[] = [];
  const ask = async (what: string, body: unknown) => {
    const answer = await scene.send(sent.kind === 'decision.sign' ? 'grower' : 'owner', sent.kind, sent.thingId(), body as Record<string, unknown>, { version: sent.version ?? 1, ...(sent.baseVersion ? { baseVersion: sent.baseVersion } : {}) });
    if (answer.code === 'unexpected' || answer.code === 'busy') complaints.push(`${what}: ${answer.code}`);
    if (answer.code === 'bad-input' && (answer.fields ?? []).every((field) => field.path === '')) complaints.push(`${what}: refused without the field it means: ${JSON.stringify(answer.fields)}`);
  };
  for (const place of placesIn(sent.body())) {
    for (const odd of oddValues) await ask(`${place.join('.')} = ${shortly(odd)}`, withValue(sent.body(), place, odd));
    if (typeof place.at(-1) === 'string') await ask(`${place.join('.')} left out`, without(sent.body(), place));
  }
  return complaints;
}

describe('whatever is typed into a form', () => {
  it('is taken, or refused at the field it means, and never fails on our side', { timeout: 240_000 }, async () => {
    const told: Record<string, string[]> = {};
    for (const sent of writes) {
      const complaints = await complaintsAbout(sent);
      if (complaints.length > 0) told[`${sent.kind} ${sent.version ?? 1}`] = complaints;
    }
    expect(told).toEqual({});
  });

  it('is refused where it is nested so deeply that reading it would break the reader', async () => {
    const deep = JSON.parse(`${'['.repeat(50_000)}${']'.repeat(50_000)}`) as unknown;
    const answer = await scene.send('owner', 'farm.add', v7(), { name: 'Deep', timeZone: 'America/Chicago', more: deep });
    expect(answer).toMatchObject({ outcome: 'refused', code: 'bad-input', fields: [{ path: 'more' }] });
  });

  it('covers every kind of write that carries what somebody typed', () => {
    // These carry ids alone; what a wrong id is answered with stands in the table of who may do what.
    const idsAlone = ['farm.remove', 'field.remove', 'planting.remove', 'setting.remove', 'row-sample.remove', 'trial.lock', 'person.remove', 'person.reset-link', 'link.revoke'];
    // A change is held to the very schema of its add.
    const asTheirAdd = ['field.change', 'planting.change', 'setting.change', 'row-sample.change'];
    const kinds = [...new Set(allOperations.map(({ kind }) => kind))];
    expect(kinds.filter((kind) => !idsAlone.includes(kind) && !asTheirAdd.includes(kind)).sort()).toEqual([...new Set(writes.map(({ kind }) => kind))].sort());
  });

  it('leaves pages that can still be read', async () => {
    await expect(locked.scores('planting')).resolves.toBeDefined();
    await expect(counted.observations()).resolves.toBeDefined();
  });
});
