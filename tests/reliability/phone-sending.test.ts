import 'fake-indexeddb/auto';
import pg from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { connect, type Database } from '@/db/connection';
import { RoundStore } from '@/lib/client/round/round-store';
import { sendEntries, waitingEntries } from '@/lib/client/round/send-entries';
import { applyOperation } from '@/lib/server/operations/apply-operation';
import { chanceFrom, type Chance } from '../../scripts/chaos/chance';
import type { Made } from '../../scripts/chaos/entry';
import { countByLedger } from '../../scripts/chaos/ledger';
import { makeEntries } from '../../scripts/chaos/make-entries';
import { handlerOf, settleScene, type Scene } from '../../scripts/chaos/scene';
import { makeTestDatabase, type TestDatabase } from '../support/test-database';

const phones = 3;
const entriesEach = 80;

let own: TestDatabase;
let pools: Database[];
let scene: Scene;
const chance = chanceFrom(4_711);

beforeAll(async () => {
  own = await makeTestDatabase();
  process.env.SESSION_SECRET = 'a secret of the tests, long enough to be one';
  pools = [connect(own.appUrl, 4), connect(own.appUrl, 4)];
  scene = await settleScene(own.appUrl, chance, { scouts: phones, plantings: 1, rowsEach: 40 });
});

afterAll(async () => {
  await Promise.all(pools.map((pool) => pool.$client.end()));
  await own.drop();
});

const answered = (body: unknown, status = 200) => Response.json(body, { status });
const page = () => new Response('<!doctype html><title>Sign in to this network</title>', { status: 200, headers: { 'Content-Type': 'text/html' } });
const cutShort = (text: string) => new Response(text.slice(0, Math.floor(text.length / 2)), { status: 200, headers: { 'Content-Type': 'application/json' } });

/** The way to the server as a phone meets it: one of two servers, and half of the time something goes wrong before or after. */
function faultyFetch(own: Chance, told: Record<string, number>): typeof fetch {
  return async (_input, init) => {
    const trouble = own.pick(['none', 'none', 'none', 'none', 'away', 'page before', 'page after', 'cut short', 'lost', 'busy', 'proxy', 'signed out', 'failed']);
    told[trouble] = (told[trouble] ?? 0) + 1;
    if (trouble === 'away') throw new TypeError('Failed to fetch');
    if (trouble === 'page before') return page();
    if (trouble === 'busy') return answered({ code: 'busy', title: 'The server is busy.' }, 503);
    if (trouble === 'proxy') return new Response('Bad gateway', { status: 502, headers: { 'Content-Type': 'text/plain' } });
    if (trouble === 'signed out') return answered({ code: 'not-signed-in', title: 'Sign in first.' }, 401);
    if (trouble === 'failed') return answered({ code: 'unexpected', title: 'Something went wrong on our side.' }, 500);
    const { operations } = JSON.parse(String(init?.body)) as { operations: { personId: string }[] };
    const answers = [];
    for (const each of operations) {
      const sender = { personId: each.personId, now: () => new Date(), originKind: 'phone' as const };
      answers.push(await applyOperation(own.pick(pools), { organisationId: scene.organisationId, sender, handlerOf }, each));
    }
    if (trouble === 'page after') return page();
    if (trouble === 'lost') throw new TypeError('Failed to fetch');
    return trouble === 'cut short' ? cutShort(JSON.stringify({ answers })) : answered({ answers });
  };
}

const kept = ({ entry }: Made) => ({ ...entry, plantingId: null, rowSampleId: null, state: 'kept' as const, tried: false, keptAt: 0, sentAt: null, answer: null });

describe('the phone as it is built, with a network and servers that fail half of the time', () => {
  it('brings every entry to the server once and as entered, and keeps each until its own receipt', { timeout: 60_000 }, async () => {
    const made: Made[] = [];
    const told: Record<string, number> = {};
    await Promise.all(
      Array.from({ length: phones }, async (_, index) => {
        const scout = makeEntries(scene, index, entriesEach, chance.branch());
        made.push(...scout.made);
        const store = new RoundStore(`sending-${index}`);
        const mine = { personId: scout.personId, organisationId: scene.organisationId };
        const fetch = faultyFetch(chance.branch(), told);
        const send = () => sendEntries({ store, fetch, ...mine, now: () => 0, onChange: () => undefined });
        // Sent a few at a time as the walk goes on, and by two tabs at once, as after a page was opened twice.
        for (let from = 0; from < entriesEach; from += 5) {
          await store.entries.bulkAdd(scout.made.slice(from, from + 5).map(kept));
          await Promise.all([send(), send()]);
        }
        for (let rounds = 0; (await waitingEntries(store, mine)).length > 0; rounds += 1) {
          expect(rounds).toBeLessThan(200);
          await send();
        }
        const states = (await store.entries.toArray()).map(({ state }) => state);
        expect(states).toEqual(Array(entriesEach).fill('sent'));
        store.close();
      }),
    );
    const client = new pg.Client({ connectionString: own.migratorUrl });
    await client.connect();
    const ledger = await countByLedger(client, scene.organisationId, made);
    await client.end();
    expect(ledger).toMatchObject({ made: phones * entriesEach, lost: 0, doubled: 0, invented: 0, altered: 0, apart: 0, told: [] });
    // A run in which a trouble never came would hold nothing about it.
    expect(Object.keys(told)).toHaveLength(10);
  });
});
