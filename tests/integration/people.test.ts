import { sql } from 'drizzle-orm';
import pg from 'pg';
import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Database } from '@/db/connection';
import { inOrganisation } from '@/db/connection';
import { database } from '@/lib/server/database';
import { checkCredentials } from '@/lib/server/services/session/check-credentials';
import { openLink } from '@/lib/server/services/session/open-link';
import { findBrokenSeal, sealAudit } from '@/lib/server/services/audit/seal-audit';
import { caller, firstOwner, password, roleOf, secretOf, send } from '../support/people-scene';
import { makeTestDatabase, type TestDatabase } from '../support/test-database';

let own: TestDatabase;
let db: Database;
let owner: { personId: string; organisationId: string; email: string };
let farmId: string;

beforeAll(async () => {
  own = await makeTestDatabase();
  process.env.DATABASE_URL = own.appUrl;
  process.env.SESSION_SECRET = 'a secret of the tests, long enough to be one';
  db = database();
  owner = await firstOwner(db);
  farmId = v7();
  await send(db, owner, 'farm.add', farmId, { name: 'Test farm', timeZone: 'America/Chicago' });
});

afterAll(async () => {
  await db.$client.end();
  await own.drop();
});

const invitation = (email: string) => ({ email, name: 'Test Scout', role: 'scout', farmIds: [farmId] });

async function member(email = `${v7()}@example.test`) {
  const made = await send(db, owner, 'person.invite', v7(), invitation(email));
  const personId = await openLink({ secret: secretOf(made), password }, caller);
  return { personId, organisationId: owner.organisationId, email };
}

describe('one-time links', () => {
  it('lets an invited person in with the role and farms that were chosen', async () => {
    const scout = await member();
    expect(await roleOf(db, scout)).toEqual({ role: 'scout', farmIds: [farmId] });
  });

  it('opens once, also when ten browsers open it at the same moment', async () => {
    const made = await send(db, owner, 'person.invite', v7(), invitation(`${v7()}@example.test`));
    const tries = await Promise.allSettled(
      Array.from({ length: 10 }, () => openLink({ secret: secretOf(made), password }, { socketAddress: '192.0.2.8' })),
    );
    expect(tries.filter((each) => each.status === 'fulfilled')).toHaveLength(1);
  });

  it('answers a resent request with the same link, though no table holds it', async () => {
    const [operationId, thingId, deviceId] = [v7(), v7(), v7()];
    const body = invitation(`${v7()}@example.test`);
    const first = await send(db, owner, 'person.invite', thingId, body, { operationId, deviceId, deviceSequence: 900 });
    const again = await send(db, owner, 'person.invite', thingId, body, { operationId, deviceId, deviceSequence: 900 });
    expect(again).toMatchObject({ outcome: 'duplicate', result: { path: first.result?.path } });
    const kept = await inOrganisation(db, owner, (tx) =>
      tx.execute<{ text: string }>(sql`select (select jsonb_agg(answer)::text from receipt) || (select jsonb_agg(body)::text from audit_event) || (select string_agg(secret_hash, ' ') from one_time_link) as text`),
    );
    expect(kept.rows[0]?.text).not.toContain(secretOf(first));
  });

  it('tells a used, a taken-back, an old and an invented link apart from nothing', async () => {
    const email = `${v7()}@example.test`;
    const linkId = v7();
    const revoked = await send(db, owner, 'person.invite', linkId, invitation(email));
    await send(db, owner, 'link.revoke', linkId, {});
    const old = await send(db, owner, 'person.invite', v7(), invitation(`${v7()}@example.test`));
    await db.execute(sql`update one_time_link set expires_at = now() - interval '1 minute' where email = (select max(email) from one_time_link where used_at is null and revoked_at is null)`);
    for (const secret of [secretOf(revoked), secretOf(old), 'x'.repeat(43)]) {
      await expect(openLink({ secret, password }, { socketAddress: '192.0.2.9' })).rejects.toMatchObject({ code: 'link-used' });
    }
  });

  it('does not hand an account over: somebody with one joins by their own password only', async () => {
    const other = await firstOwner(db);
    const made = await send(db, owner, 'person.invite', v7(), invitation(other.email));
    await expect(openLink({ secret: secretOf(made), password: 'not their password at all' }, caller)).rejects.toMatchObject({ code: 'wrong-credentials' });
    expect(await openLink({ secret: secretOf(made), password }, caller)).toBe(other.personId);
  });

  it('makes no password link for somebody who belongs to another account too', async () => {
    const other = await firstOwner(db);
    const made = await send(db, owner, 'person.invite', v7(), invitation(other.email));
    await openLink({ secret: secretOf(made), password }, caller);
    expect(await send(db, owner, 'person.reset-link', other.personId, {})).toMatchObject({ outcome: 'refused', code: 'forbidden' });
  });

  it('sets a new password by link and ends every session', async () => {
    const scout = await member();
    await db.execute(sql`insert into session (secret_hash, person_id, expires_at) values (${v7()}, ${scout.personId}, now() + interval '1 day')`);
    const made = await send(db, owner, 'person.reset-link', scout.personId, {});
    await openLink({ secret: secretOf(made), password: 'quite another sentence' }, caller);
    expect(await checkCredentials({ email: scout.email, password: 'quite another sentence' }, caller)).toBe(scout.personId);
    const open = await db.execute(sql`select 1 from session where person_id = ${scout.personId} and revoked_at is null`);
    expect(open.rows).toEqual([]);
  });
});

describe('members', () => {
  it('act under a changed role at the next request, and not at all once removed', async () => {
    const scout = await member();
    await send(db, owner, 'person.change-role', scout.personId, { role: 'grower', farmIds: [farmId] }, { baseVersion: 1 });
    expect((await roleOf(db, scout)).role).toBe('grower');
    await send(db, owner, 'person.remove', scout.personId, {}, { baseVersion: 2 });
    await expect(roleOf(db, scout)).rejects.toMatchObject({ code: 'not-found' });
  });

  it('keeps the last owner', async () => {
    const alone = await firstOwner(db);
    const removed = await send(db, alone, 'person.remove', alone.personId, {}, { baseVersion: 1 });
    const demoted = await send(db, alone, 'person.change-role', alone.personId, { role: 'agronomist', farmIds: [] }, { baseVersion: 1 });
    expect([removed.code, demoted.code]).toEqual(['in-use', 'in-use']);
  });

  it('are not another organisation’s to change, and a farm must be the account’s own', async () => {
    const other = await firstOwner(db);
    expect((await send(db, other, 'person.remove', owner.personId, {}, { baseVersion: 1 })).code).toBe('not-found');
    const body = { ...invitation(`${v7()}@example.test`) };
    expect((await send(db, other, 'person.invite', v7(), body)).fields).toMatchObject([{ path: 'farmIds' }]);
  });

  it('are invited by owners only', async () => {
    const scout = await member();
    expect((await send(db, scout, 'person.invite', v7(), invitation(`${v7()}@example.test`))).code).toBe('forbidden');
  });
});

describe('signing in', () => {
  it('answers a wrong password, an unknown address and a disabled account alike', async () => {
    const scout = await member();
    await db.execute(sql`update person set disabled_at = now() where id = ${scout.personId}`);
    const from = { socketAddress: '192.0.2.20' };
    const answers = await Promise.allSettled([
      checkCredentials({ email: owner.email, password: 'wrong' }, from),
      checkCredentials({ email: 'nobody@example.test', password: 'wrong' }, from),
      checkCredentials({ email: scout.email, password }, from),
    ]);
    expect(answers.map((each) => (each.status === 'rejected' ? each.reason.code : 'in'))).toEqual(Array(3).fill('wrong-credentials'));
  });

  it('stops after ten wrong passwords for one account, the right one included', async () => {
    const scout = await member();
    for (let attempt = 0; attempt < 10; attempt += 1) {
      await checkCredentials({ email: scout.email, password: 'wrong' }, { socketAddress: `192.0.2.${100 + attempt}` }).catch(() => undefined);
    }
    await expect(checkCredentials({ email: scout.email, password }, { socketAddress: '192.0.2.200' })).rejects.toMatchObject({ code: 'too-many-tries' });
  });

  it('reads a password beyond the 72 bytes that bcrypt reads', async () => {
    const long = 'a sentence of more than seventy-two bytes, which a plain hash would cut off here: ';
    const made = await send(db, owner, 'person.invite', v7(), invitation(`${v7()}@example.test`));
    const email = (await db.execute<{ email: string }>(sql`select email from one_time_link where used_at is null order by created_at desc limit 1`)).rows[0]?.email ?? '';
    await openLink({ secret: secretOf(made), password: `${long}one` }, caller);
    await expect(checkCredentials({ email, password: `${long}two` }, caller)).rejects.toMatchObject({ code: 'wrong-credentials' });
    await checkCredentials({ email, password: `${long}one` }, caller);
  });
});

describe('the sealed chain of changes', () => {
  it('is whole after sealing, and tells where a sealed change was altered behind the product', async () => {
    await sealAudit(db);
    const check = () => inOrganisation(db, owner, (tx) => findBrokenSeal(tx, owner.organisationId));
    expect(await check()).toBeUndefined();
    const behind = new pg.Client({ connectionString: own.migratorUrl });
    await behind.connect();
    await behind.query(
      `update audit_event set body = '{"name": "Another farm"}' where id = (select event_id from audit_seal where organisation_id = $1 and place = 2) and organisation_id = $1`,
      [owner.organisationId],
    );
    await behind.end();
    expect(await check()).toBe(2);
  });
});
