import pg from 'pg';
import { sql } from 'drizzle-orm';
import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { inOrganisation, type Database } from '@/db/connection';
import { database } from '@/lib/server/database';
import { firstOwner, send } from '../support/people-scene';
import { struckAt } from '../support/struck-at';
import { makeTestDatabase, type TestDatabase } from '../support/test-database';

let own: TestDatabase;
let db: Database;
let owner: { personId: string; organisationId: string };

beforeAll(async () => {
  own = await makeTestDatabase();
  process.env.DATABASE_URL = own.appUrl;
  process.env.SESSION_SECRET = 'a secret of the tests, long enough to be one';
  db = database();
  owner = await firstOwner(db);
});

afterAll(async () => {
  await db.$client.end();
  await own.drop();
});

describe('a write whose connection drops at its n-th query', () => {
  it('is stored whole or not at all, can be sent again, and leaves no open transaction', async () => {
    let n = 1;
    for (let goesOn = true; goesOn; n += 1) {
      const { faulty, struck } = struckAt(own.appUrl, n, 'drop');
      const sent = { operationId: v7(), deviceId: v7(), deviceSequence: n };
      const thingId = v7();
      const body = { name: `Struck at ${n}`, timeZone: 'UTC' };
      const answer = await send(faulty, owner, 'farm.add', thingId, body, sent);
      await faulty.$client.end().catch(() => undefined);
      goesOn = struck();
      const stored = () =>
        inOrganisation(db, owner, async (tx) => (await tx.execute(sql`select 1 from farm where id = ${thingId} union all select 1 from receipt where operation_id = ${sent.operationId} union all select 1 from audit_event where id = ${sent.operationId}`)).rows.length);
      expect([0, 3]).toContain(await stored());
      if (goesOn) expect(answer).toMatchObject({ outcome: 'refused', code: 'busy' });
      const again = await send(db, owner, 'farm.add', thingId, body, sent);
      expect(['applied', 'duplicate']).toContain(again.outcome);
      expect(await stored()).toBe(3);
    }
    // Fewer queries than a write has would mean that nothing was struck.
    expect(n).toBeGreaterThan(6);
    const watcher = new pg.Client({ connectionString: own.migratorUrl });
    await watcher.connect();
    const open = await watcher.query(`select 1 from pg_stat_activity where datname = current_database() and state like 'idle in transaction%'`);
    await watcher.end();
    expect(open.rows).toEqual([]);
  });
});
