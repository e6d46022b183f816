import { sql } from 'drizzle-orm';
import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { connect, inOrganisation, type Database } from '@/db/connection';
import { allOperations } from '@/lib/server/operations/all-operations';
import { applyOperation, type Sender } from '@/lib/server/operations/apply-operation';
import { CountScene } from '../support/count-scene';
import { DecideScene } from '../support/decide-scene';
import { makeTestDatabase, type TestDatabase } from '../support/test-database';

let own: TestDatabase;
let db: Database;
let scene: DecideScene;
let counted: CountScene;

beforeAll(async () => {
  own = await makeTestDatabase();
  process.env.DATABASE_URL = own.appUrl;
  process.env.SESSION_SECRET = 'a secret of the tests, long enough to be one';
  db = connect(own.appUrl);
  scene = await new DecideScene(db).settle();
  counted = await new CountScene(scene).settle(['A-1']);
});
afterAll(async () => {
  await db.$client.end();
  await own.drop();
});

const now = () => new Date('2026-05-20T15:00:00Z');

/** As the phone saved it, under the scout's name. */
const saved = () => ({
  operationId: v7(), organisationId: scene.organisationId, personId: scene.people.scout.id, deviceId: v7(), deviceSequence: 1, kind: 'count.record', version: 1, thingId: v7(), baseVersion: null, follows: null,
  body: { rowSampleId: counted.row('A-1'), visit: { id: v7(), personId: null, visitedOn: '2026-05-18', visitedAt: '08:00', marker: 'red' }, countedAs: 'so-far', plants: 20, doubtful: 0, replacesId: null },
  occurred: { date: '2026-05-18', time: '08:00', zone: 'America/Chicago' }, confirmations: [],
});

const bring = (operation: unknown, sender: Partial<Sender>) =>
  applyOperation(db, { organisationId: scene.organisationId, handlerOf: (kind, version) => allOperations.find((each) => each.kind === kind && each.version === version), sender: { personId: scene.people.scout.id, now, originKind: 'phone', ...sender } }, operation);

const eventOf = (operationId: string) =>
  inOrganisation(db, { organisationId: scene.organisationId }, async (tx) => (await tx.execute<{ person_id: string; read_in_by: string | null; created_by: string; visitor: string }>(sql`
    select event.person_id, event.read_in_by, count.created_by, visit.person_id as visitor from audit_event event join count on count.operation_id = event.id join visit on visit.id = count.visit_id where event.id = ${operationId}`)).rows[0]);

describe('a file that a phone saved', () => {
  it('stands as its author, with who read it in beside it, and the phone that sends the same later doubles nothing', async () => {
    const operation = saved();
    expect((await bring(operation, { readInBy: scene.people.agronomist.id })).outcome).toBe('applied');
    expect(await eventOf(operation.operationId)).toEqual({ person_id: scene.people.scout.id, read_in_by: scene.people.agronomist.id, created_by: scene.people.scout.id, visitor: scene.people.scout.id });
    expect((await bring(operation, {})).outcome).toBe('duplicate');
    expect((await bring(operation, { readInBy: scene.people.owner.id })).outcome).toBe('duplicate');
  });

  it('tells what the phone had sent already', async () => {
    const operation = { ...saved(), body: { ...saved().body, visit: { id: v7(), personId: null, visitedOn: '2026-05-19', visitedAt: '08:00', marker: 'blue' }, plants: 24 } };
    expect((await bring(operation, {})).outcome).toBe('applied');
    expect((await bring(operation, { readInBy: scene.people.agronomist.id })).outcome).toBe('duplicate');
    expect((await eventOf(operation.operationId))?.read_in_by).toBeNull();
  });

  it('is carried out with what its author may do, not with what the reader may', async () => {
    const operation = { ...saved(), personId: scene.people.grower.id };
    expect(await bring(operation, { personId: scene.people.grower.id, readInBy: scene.people.owner.id })).toMatchObject({ outcome: 'refused', code: 'forbidden' });
  });
});
