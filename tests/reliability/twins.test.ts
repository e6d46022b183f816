import { sql } from 'drizzle-orm';
import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { connect, inOrganisation, type Database } from '@/db/connection';
import { database } from '@/lib/server/database';
import { firstOwner, send } from '../support/people-scene';
import { makeTestDatabase, type TestDatabase } from '../support/test-database';

const twins = 50;
const keys = 20;

let own: TestDatabase;
let first: Database;
let second: Database;
let owner: { personId: string; organisationId: string };

beforeAll(async () => {
  own = await makeTestDatabase();
  process.env.DATABASE_URL = own.appUrl;
  process.env.SESSION_SECRET = 'a secret of the tests, long enough to be one';
  first = database();
  // A second pool stands for a second server: nothing may rest on one process's memory.
  second = connect(own.appUrl);
  owner = await firstOwner(first);
});

afterAll(async () => {
  await first.$client.end();
  await second.$client.end();
  await own.drop();
});

/** Sends each of the keys fifty times at once, through two pools in turn; the tables are counted by SQL afterwards. */
async function underTwins(once: (db: Database, key: string) => Promise<boolean>) {
  const applied: number[] = [];
  for (let each = 0; each < keys; each += 1) {
    const key = v7();
    const answers = await Promise.all(Array.from({ length: twins }, (_, index) => once(index % 2 === 0 ? first : second, key)));
    applied.push(answers.filter(Boolean).length);
  }
  return applied;
}

const countRows = async (query: ReturnType<typeof sql>) =>
  inOrganisation(first, owner, async (tx) => Number((await tx.execute<{ rows: string }>(query)).rows[0]?.rows));

describe('the same operation sent fifty times at once to two servers', () => {
  it('is applied once, and every other sending is told that it stands', async () => {
    const deviceId = v7();
    const applied = await underTwins(async (db, key) => {
      const answer = await send(db, owner, 'farm.add', key, { name: 'Twin', timeZone: 'UTC' }, { operationId: key, deviceId, deviceSequence: 1 });
      expect(['applied', 'duplicate']).toContain(answer.outcome);
      return answer.outcome === 'applied';
    });
    expect(applied).toEqual(Array(keys).fill(1));
    expect(await countRows(sql`select count(*) as rows from farm where name = 'Twin'`)).toBe(keys);
    expect(await countRows(sql`select count(*) as rows from audit_event where device_id = ${deviceId}`)).toBe(keys);
  });

  it('is a test that goes red for a claim that looks first and writes afterwards', async () => {
    const applied = await underTwins((db, key) =>
      inOrganisation(db, owner, async (tx) => {
        const standing = await tx.execute(sql`select 1 from audit_event where thing_id = ${key}`);
        if (standing.rows.length > 0) return false;
        await tx.execute(sql`insert into audit_event (organisation_id, id, person_id, device_id, device_sequence, kind, version, thing_id, body, occurred, confirmations) values (${owner.organisationId}, ${v7()}, ${owner.personId}, ${v7()}, 1, 'broken.claim', 1, ${key}, '{}', '{}', '[]')`);
        return true;
      }),
    );
    expect(Math.max(...applied)).toBeGreaterThan(1);
  });
});
