import pg from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { connect, type Database } from '@/db/connection';
import { DecideScene } from '../support/decide-scene';
import { PhoneWrites, phoneKinds } from '../support/phone-writes';
import { struckAt, type Strike } from '../support/struck-at';
import { makeTestDatabase, type TestDatabase } from '../support/test-database';

let own: TestDatabase;
let db: Database;
let writes: PhoneWrites;

beforeAll(async () => {
  own = await makeTestDatabase();
  process.env.SESSION_SECRET = 'a secret of the tests, long enough to be one';
  db = connect(own.appUrl, 4);
  writes = await new PhoneWrites(await new DecideScene(db).settle()).settle();
});

afterAll(async () => {
  await db.$client.end();
  await own.drop();
});

/** Strikes the n-th query of one write; says whether there was one. */
async function struckOnce(kind: (typeof phoneKinds)[number], strike: Strike, n: number): Promise<boolean> {
  const write = await writes.ready(kind);
  const { faulty, struck } = struckAt(own.appUrl, n, strike);
  const answer = await writes.send(faulty, write);
  await faulty.$client.end().catch(() => undefined);
  if (!struck()) return false;
  const before = await writes.standing(write.operationId);
  if (strike !== 'delay') expect(answer).toMatchObject({ outcome: 'refused', code: 'busy' });
  const again = await writes.send(db, write);
  expect(['applied', 'duplicate']).toContain(again.outcome);
  const after = await writes.standing(write.operationId);
  expect(after).toMatchObject({ receipt: 1, audit_event: 1 });
  // Whole or not at all; half of a write stands nowhere.
  expect([{}, after]).toContainEqual(before);
  if (again.outcome === 'applied') expect(before).toEqual({});
  return true;
}

/** Strikes one query after another of a kind of write, a few at a time, until it has no more; answers with how many there were. */
async function struckThroughout(kind: (typeof phoneKinds)[number], strike: Strike): Promise<number> {
  const atOnce = 6;
  let queries = 0;
  for (let from = 1; ; from += atOnce) {
    const struck = await Promise.all(Array.from({ length: atOnce }, (_, index) => struckOnce(kind, strike, from + index)));
    queries += struck.filter(Boolean).length;
    if (struck.includes(false)) return queries;
  }
}

describe('every kind of write of a phone, struck at its n-th query', () => {
  it.each(phoneKinds)('is stored whole or not at all where the connection drops, and can be sent again: $name', { timeout: 60_000 }, async (kind) => {
    // Fewer queries than a write has would mean that nothing was struck.
    expect(await struckThroughout(kind, 'drop')).toBeGreaterThan(8);
  });

  it('is stored whole or not at all where the database refuses for the moment', { timeout: 60_000 }, async () => {
    expect(await struckThroughout({ kind: 'count.record', version: 1, name: 'count.record.v1' }, 'throw')).toBeGreaterThan(8);
  });

  it('is stored once where an answer of the database comes late', { timeout: 60_000 }, async () => {
    expect(await struckThroughout({ kind: 'count.record', version: 1, name: 'count.record.v1' }, 'delay')).toBeGreaterThan(8);
  });

  it('leaves no open transaction', async () => {
    const watcher = new pg.Client({ connectionString: own.migratorUrl });
    await watcher.connect();
    const open = await watcher.query(`select 1 from pg_stat_activity where datname = current_database() and state like 'idle in transaction%'`);
    await watcher.end();
    expect(open.rows).toEqual([]);
  });
});
