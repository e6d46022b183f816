import { sql } from 'drizzle-orm';
import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { connect, inOrganisation, type Database } from '@/db/connection';
import { CountScene, yesTo } from '../support/count-scene';
import { DecideScene } from '../support/decide-scene';
import { PhoneWrites, type PhoneWrite } from '../support/phone-writes';
import { makeTestDatabase, type TestDatabase } from '../support/test-database';

let own: TestDatabase;
let db: Database;
let scene: DecideScene;
let counted: CountScene;
let phone: PhoneWrites;

// Planted on 7 May; the server's own day is 20 May 2026.
beforeAll(async () => {
  own = await makeTestDatabase();
  process.env.SESSION_SECRET = 'a secret of the tests, long enough to be one';
  db = connect(own.appUrl, 4);
  scene = await new DecideScene(db).settle();
  counted = await new CountScene(scene).settle(Array.from({ length: 12 }, (_, index) => `C-${index + 1}`));
  phone = await new PhoneWrites(scene).settle(4);
});

afterAll(async () => {
  await db.$client.end();
  await own.drop();
});

const countAt = (label: string, on: string, at: string | null, plants: number, more: Partial<{ replacesId: string | null; visitId: string }> = {}): PhoneWrite => ({
  operationId: v7(), kind: 'count.record', version: 1, thingId: v7(), confirmations: [],
  body: { rowSampleId: counted.row(label), visit: { id: more.visitId ?? v7(), personId: null, visitedOn: on, visitedAt: at, marker: null }, countedAs: 'so-far', plants, doubtful: 0, replacesId: more.replacesId ?? null },
});

const visitOf = (write: PhoneWrite) =>
  inOrganisation(db, scene, async (tx) => (await tx.execute<{ on: string; at: string; zone: string }>(sql`select visited_on::text as "on", visited_at as at, time_zone as zone from visit where id = ${(write.body.visit as { id: string }).id}`)).rows[0]);

describe('a phone whose clock is wrong', () => {
  it('by some months ahead is believed, and its day stands as the scout saw it', async () => {
    const write = countAt('C-1', '2026-09-02', '07:40', 20);
    expect(await phone.send(db, write)).toMatchObject({ outcome: 'applied' });
    expect(await visitOf(write)).toEqual({ on: '2026-09-02', at: '07:40', zone: 'America/Chicago' });
  });

  it('is not believed from a form, where the person sees the date before sending', async () => {
    expect(await counted.count('C-2', { on: '2026-09-02', plants: 20 })).toMatchObject({ outcome: 'refused', code: 'bad-input', fields: [{ path: 'visit.visitedOn' }] });
  });

  it.each(['2019-01-01', '2031-05-18'])('by years is told at the date, leaves no trace, and the entry goes in once the date is put right: %s', async (on) => {
    const write = countAt(on < '2026' ? 'C-3' : 'C-4', on, '07:40', 20);
    expect(await phone.send(db, write)).toMatchObject({ outcome: 'refused', code: 'bad-input', fields: [{ path: 'visit.visitedOn' }] });
    expect(await phone.standing(write.operationId)).toEqual({});
    const mended = { ...write, body: { ...write.body, visit: { ...(write.body.visit as object), visitedOn: '2026-05-18' } } };
    expect(await phone.send(db, mended)).toMatchObject({ outcome: 'applied' });
    expect(await visitOf(mended)).toMatchObject({ on: '2026-05-18' });
  });

  it('and is set back during a walk keeps every count and the correction of one', async () => {
    const first = countAt('C-5', '2026-05-18', '09:00', 10);
    const next = countAt('C-6', '2026-05-18', '07:20', 12);
    const corrected = countAt('C-5', '2026-05-18', '09:00', 11, { replacesId: first.thingId, visitId: (first.body.visit as { id: string }).id });
    for (const write of [first, next, corrected]) expect(await phone.send(db, write)).toMatchObject({ outcome: 'applied' });
    expect((await counted.standing('C-5')).map(({ plants }) => plants)).toEqual([11]);
    expect((await counted.standing('C-6')).map(({ plants, visitedAt }) => [plants, visitedAt])).toEqual([[12, '07:20']]);
  });

  it('and is set back between two counts of one row is asked about the fall and keeps both', async () => {
    await phone.send(db, countAt('C-7', '2026-05-18', '09:00', 10));
    const later = countAt('C-7', '2026-05-18', '08:10', 12);
    const asked = await phone.send(db, later);
    expect(asked).toMatchObject({ outcome: 'refused', code: 'needs-confirmation', questions: [{ rule: 'falling-count' }] });
    expect(await phone.send(db, { ...later, confirmations: yesTo(asked) })).toMatchObject({ outcome: 'applied' });
    expect(await counted.standing('C-7')).toHaveLength(2);
  });
});

describe('the hours that daylight saving takes and gives', () => {
  it('stand as the phone showed them: the hour that is skipped in spring', async () => {
    const plantingId = await scene.plant({ plantedOn: '2026-03-01' });
    const rowSampleId = v7();
    await scene.must('agronomist', 'row-samples.add', plantingId, { plantingId, samples: [{ id: rowSampleId, stripId: null, zoneId: null, label: 'D-1', planterRow: null, length: { typed: '17 ft 5 in' }, startEnd: 'mark', farEnd: 'mark' }] });
    const write = countAt('C-8', '2026-03-08', '02:30', 4);
    write.body.rowSampleId = rowSampleId;
    expect(await phone.send(db, write)).toMatchObject({ outcome: 'applied' });
    expect(await visitOf(write)).toEqual({ on: '2026-03-08', at: '02:30', zone: 'America/Chicago' });
  });

  it('are asked about and kept both where one hour comes twice in fall', async () => {
    const once = countAt('C-9', '2026-11-01', '01:30', 20);
    const again = countAt('C-9', '2026-11-01', '01:30', 21);
    expect(await phone.send(db, once)).toMatchObject({ outcome: 'applied' });
    const asked = await phone.send(db, again);
    expect(asked).toMatchObject({ outcome: 'refused', code: 'needs-confirmation', questions: [{ rule: 'counted-twice' }] });
    expect(await phone.send(db, { ...again, confirmations: yesTo(asked) })).toMatchObject({ outcome: 'applied' });
    expect(await counted.standing('C-9')).toHaveLength(2);
  });
});
