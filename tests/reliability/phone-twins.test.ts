import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { connect, type Database } from '@/db/connection';
import { DecideScene } from '../support/decide-scene';
import { PhoneWrites, phoneKinds } from '../support/phone-writes';
import { makeTestDatabase, type TestDatabase } from '../support/test-database';

const twins = 50;

let own: TestDatabase;
let first: Database;
let second: Database;
let writes: PhoneWrites;

beforeAll(async () => {
  own = await makeTestDatabase();
  process.env.SESSION_SECRET = 'a secret of the tests, long enough to be one';
  first = connect(own.appUrl);
  // A second pool stands for a second server: nothing may rest on one process's memory.
  second = connect(own.appUrl);
  writes = await new PhoneWrites(await new DecideScene(first).settle()).settle();
});

afterAll(async () => {
  await first.$client.end();
  await second.$client.end();
  await own.drop();
});

describe('every payload that a phone sends or once sent', () => {
  it.each(phoneKinds)('is taken, and sent fifty times at once to two servers stands once: $name', async (kind) => {
    const once = await writes.ready(kind);
    expect(await writes.send(first, once)).toMatchObject({ outcome: 'applied' });
    const standing = await writes.standing(once.operationId);
    expect(standing).toMatchObject({ receipt: 1, audit_event: 1 });

    const write = await writes.ready(kind);
    const answers = await Promise.all(Array.from({ length: twins }, (_, index) => writes.send(index % 2 === 0 ? first : second, write)));
    expect(answers.filter(({ outcome }) => outcome === 'applied')).toHaveLength(1);
    expect(answers.filter(({ outcome }) => outcome === 'duplicate')).toHaveLength(twins - 1);
    expect(await writes.standing(write.operationId)).toEqual(standing);
  });

  it.each(phoneKinds)('is taken as standing when it comes again under another operation: $name', async (kind) => {
    const write = await writes.ready(kind);
    await writes.send(first, write);
    const standing = await writes.standing(write.operationId);
    const again = { ...write, operationId: v7() };
    expect(await writes.send(second, again)).toMatchObject({ outcome: 'applied' });
    // The second operation has its receipt and its audit event, and brought no row.
    expect(await writes.standing(again.operationId)).toEqual({ receipt: 1, audit_event: 1 });
    expect(await writes.standing(write.operationId)).toEqual(standing);
  });
});
