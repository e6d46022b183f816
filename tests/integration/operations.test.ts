import { sql } from 'drizzle-orm';
import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { inOrganisation, type Database } from '@/db/connection';
import { database } from '@/lib/server/database';
import { firstOwner, send } from '../support/people-scene';
import { makeTestDatabase, type TestDatabase } from '../support/test-database';

let own: TestDatabase;
let db: Database;
let owner: { personId: string; organisationId: string };
let stranger: { personId: string; organisationId: string };

const farm = (name: string) => ({ name, timeZone: 'America/Chicago' });
const rows = <Row extends Record<string, unknown>>(query: ReturnType<typeof sql>) =>
  inOrganisation(db, owner, async (tx) => (await tx.execute<Row>(query)).rows);

beforeAll(async () => {
  own = await makeTestDatabase();
  process.env.DATABASE_URL = own.appUrl;
  process.env.SESSION_SECRET = 'a secret of the tests, long enough to be one';
  db = database();
  owner = await firstOwner(db);
  stranger = await firstOwner(db);
});

afterAll(async () => {
  await db.$client.end();
  await own.drop();
});

describe('an operation', () => {
  it('leaves its change, one receipt and one audit row, and answers the same when sent again', async () => {
    const sent = { operationId: v7(), deviceId: v7(), deviceSequence: 7 };
    const thingId = v7();
    const first = await send(db, owner, 'farm.add', thingId, farm('Once'), sent);
    const again = await send(db, owner, 'farm.add', thingId, farm('Once'), sent);
    expect(first).toMatchObject({ outcome: 'applied', thingId, version: 1 });
    expect(again).toMatchObject({ outcome: 'duplicate', thingId, version: 1 });
    for (const table of ['receipt', 'audit_event']) {
      const id = table === 'receipt' ? 'operation_id' : 'id';
      expect(await rows(sql.raw(`select 1 from ${table} where ${id} = '${sent.operationId}'`))).toHaveLength(1);
    }
    expect(await rows(sql`select 1 from farm where id = ${thingId}`)).toHaveLength(1);
  });

  it('is refused under an id that was sent before with other content', async () => {
    const sent = { operationId: v7(), deviceId: v7(), deviceSequence: 8 };
    const thingId = v7();
    await send(db, owner, 'farm.add', thingId, farm('First'), sent);
    expect(await send(db, owner, 'farm.add', thingId, farm('Second'), sent)).toMatchObject({ outcome: 'refused', code: 'operation-reused' });
  });

  it('is refused for another author, another organisation, an unknown kind and an unknown version', async () => {
    const refuse = async (more: Record<string, unknown>) => (await send(db, owner, 'farm.add', v7(), farm('No'), more)).code;
    expect(await refuse({ personId: stranger.personId })).toBe('not-author');
    expect(await refuse({ organisationId: stranger.organisationId })).toBe('not-found');
    expect(await refuse({ kind: 'farm.burn' })).toBe('unknown-kind');
    expect(await refuse({ version: 99 })).toBe('unknown-kind');
  });

  it('leaves no trace when refused, and may be sent again under the same id once it is mended elsewhere', async () => {
    const sent = { operationId: v7(), deviceId: v7(), deviceSequence: 9 };
    const fieldId = v7();
    const farmId = v7();
    const body = { farmId, name: 'Waits for its farm', area: null };
    expect((await send(db, owner, 'field.add', fieldId, body, sent)).code).toBe('not-found');
    expect(await rows(sql`select 1 from receipt where operation_id = ${sent.operationId}`)).toEqual([]);
    await send(db, owner, 'farm.add', farmId, farm('The farm'));
    expect((await send(db, owner, 'field.add', fieldId, body, sent)).outcome).toBe('applied');
  });

  it('names every field that cannot be used', async () => {
    const answer = await send(db, owner, 'farm.add', v7(), { name: ' ', timeZone: 'Mars/Olympus' });
    expect(answer.fields?.map((field) => field.path).sort()).toEqual(['name', 'timeZone']);
  });

  it('ignores what a body must not set', async () => {
    const thingId = v7();
    await send(db, owner, 'farm.add', thingId, { ...farm('Plain'), version: 99, organisationId: stranger.organisationId, removedAt: '2020-01-01', createdBy: stranger.personId, originKind: 'demo' });
    expect(await rows(sql`select version, removed_at, created_by, origin_kind from farm where id = ${thingId}`)).toEqual([
      { version: 1, removed_at: null, created_by: owner.personId, origin_kind: 'form' },
    ]);
  });

  it('cannot be sent into an organisation by somebody who is no member', async () => {
    const answer = await send(db, { ...stranger, organisationId: owner.organisationId }, 'farm.add', v7(), farm('Not yours'));
    expect(answer).toMatchObject({ outcome: 'refused', code: 'not-found' });
  });
});

describe('an edit', () => {
  it('made on an older version loses, is kept as it was sent, and changes nothing', async () => {
    const thingId = v7();
    await send(db, owner, 'farm.add', thingId, farm('Before'));
    await send(db, owner, 'farm.change', thingId, farm('Theirs'), { baseVersion: 1 });
    const operationId = v7();
    const lost = await send(db, owner, 'farm.change', thingId, farm('Mine'), { baseVersion: 1, operationId });
    expect(lost).toMatchObject({ outcome: 'conflict', code: 'conflict', standingVersion: 2 });
    expect(await rows(sql`select name, version from farm where id = ${thingId}`)).toEqual([{ name: 'Theirs', version: 2 }]);
    expect(await rows(sql`select body->>'name' as name, base_version, standing_version from losing_edit where operation_id = ${operationId}`)).toEqual([
      { name: 'Mine', base_version: 1, standing_version: 2 },
    ]);
  });

  it('of a thing that was unsent follows the operation it builds on', async () => {
    const thingId = v7();
    const [first, second] = [v7(), v7()];
    await send(db, owner, 'farm.add', thingId, farm('Typed'), { operationId: first });
    expect((await send(db, owner, 'farm.change', thingId, farm('Typed again'), { operationId: second, follows: first })).version).toBe(2);
    expect((await send(db, owner, 'farm.change', thingId, farm('And again'), { follows: second })).version).toBe(3);
    expect((await send(db, owner, 'farm.change', thingId, farm('Nothing before'), { follows: v7() })).code).toBe('follows-unknown');
  });

  it('sent by two people at the same moment holds once; the other is kept', async () => {
    const thingId = v7();
    await send(db, owner, 'farm.add', thingId, farm('Before'));
    const answers = await Promise.all(['One', 'Two'].map((name) => send(db, owner, 'farm.change', thingId, farm(name), { baseVersion: 1 })));
    expect(answers.map((answer) => answer.outcome).sort()).toEqual(['applied', 'conflict']);
  });

  it('names the version it was made on', async () => {
    const thingId = v7();
    await send(db, owner, 'farm.add', thingId, farm('Before'));
    expect((await send(db, owner, 'farm.change', thingId, farm('After'))).fields).toMatchObject([{ path: 'baseVersion' }]);
  });
});

describe('poison', () => {
  it('is refused by itself: the other 199 arrive', async () => {
    const answers = [];
    for (let index = 1; index <= 200; index += 1) {
      answers.push(await send(db, owner, 'farm.add', v7(), index === 7 ? { name: '', timeZone: 'UTC' } : farm(`Farm ${index}`)));
    }
    expect(answers.filter((answer) => answer.outcome === 'applied')).toHaveLength(199);
    expect(answers[6]).toMatchObject({ outcome: 'refused', code: 'bad-input' });
  });
});
