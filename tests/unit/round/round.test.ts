import 'fake-indexeddb/auto';
import fc from 'fast-check';
import { v7 } from 'uuid';
import { afterEach, describe, expect, it } from 'vitest';
import { Round } from '@/lib/client/round/round';
import { dayKey, RoundStore } from '@/lib/client/round/round-store';
import { aDay, aPlanting, aRow, countOf, FakeServer, json, me, organisationId, other, portal } from './round-scene';

const open: Round[] = [];
afterEach(() => {
  for (const round of open.splice(0)) round.close();
});

const row = aRow('S1-1');
const planting = aPlanting([row]);
const aServer = () => new FakeServer(aDay([planting]));
const silence: typeof fetch = () => Promise.reject(new TypeError('Failed to fetch'));

async function aPhone(fetch: typeof globalThis.fetch, storeName = `phone ${v7()}`, now: () => number = Date.now): Promise<Round> {
  const round = new Round({ fetch, now, storeName });
  open.push(round);
  await round.open(null);
  await round.wake();
  return round;
}

describe('a phone in the field', () => {
  it('forgets an entry only on the receipt for it', async () => {
    const server = aServer();
    const round = await aPhone(server.fetch);
    const answers = [
      () => portal(),
      () => json({ code: 'not-signed-in', title: '' }, 401),
      () => json({ code: 'other-origin', title: '' }, 403),
      () => json({ code: 'not-found', title: '' }, 404),
      () => json({ code: 'too-many-tries', title: '' }, 429, { 'Retry-After': '900' }),
      () => json({ code: 'busy', title: '' }, 503, { 'Retry-After': '900' }),
      () => new Response('Bad gateway', { status: 502 }),
      () => json({ answers: 'all fine' }),
      () => json({}),
      () => json({ answers: [{ operationId: v7(), outcome: 'applied' }] }),
      () => { throw new TypeError('Failed to fetch'); },
    ];
    server.before = () => json({ code: 'busy', title: '' }, 503, { 'Retry-After': '900' });
    await round.keep([countOf(row, planting, 28)]);
    for (const answer of answers) {
      server.before = answer;
      await round.wake();
      expect(round.entriesIn('kept'), answer.toString()).toHaveLength(1);
    }
    server.before = () => undefined;
    await round.wake();
    expect(round.entriesIn('kept')).toHaveLength(0);
    expect(server.taken.size).toBe(1);
  });

  it('sends again what was taken but whose answer got lost, and it is taken once', async () => {
    const server = aServer();
    const round = await aPhone(server.fetch);
    server.after = () => portal();
    await round.keep([countOf(row, planting, 28)]);
    await round.wake();
    await round.wake();
    expect(round.entriesIn('kept')).toHaveLength(1);
    server.after = () => undefined;
    await round.wake();
    expect([server.applied, round.entriesIn('kept').length]).toEqual([1, 0]);
  });

  it('holds one bad entry up for a look and lets those behind it go', async () => {
    const server = aServer();
    const round = await aPhone(server.fetch);
    server.refuse = (operation) => ((operation.body as { plants: number }).plants === 7 ? { outcome: 'refused', code: 'bad-input', sentence: 'Seven is refused.', fields: [], questions: [] } : undefined);
    await round.keep(Array.from({ length: 200 }, (_, index) => countOf(row, planting, index)));
    await round.wake();
    expect(server.taken.size).toBe(199);
    const [poison] = round.entriesIn('needs-look');
    expect(poison?.body.plants).toBe(7);
    expect(poison?.answer?.sentence).toBe('Seven is refused.');
  });

  it('finds the one entry that makes a whole batch fail', async () => {
    const server = aServer();
    const round = await aPhone(server.fetch);
    server.before = (operations) => (operations.some((operation) => (operation.body as { plants: number }).plants === 7) ? json({ code: 'too-large', title: 'Too much at once.' }, 413) : undefined);
    await round.keep(Array.from({ length: 60 }, (_, index) => countOf(row, planting, index)));
    await round.wake();
    expect(server.taken.size).toBe(59);
    expect(round.entriesIn('needs-look').map((entry) => entry.body.plants)).toEqual([7]);
  });

  it('keeps what was entered for its author through sign-out and another person on the phone', async () => {
    const server = aServer();
    const storeName = `phone ${v7()}`;
    const round = await aPhone(server.fetch, storeName);
    server.before = () => portal();
    await round.keep(Array.from({ length: 20 }, (_, index) => countOf(row, planting, index)));
    await round.wake();
    await round.signOut();
    expect(round.phase).toBe('nobody');
    expect(round.othersWaiting).toBe(20);
    round.close();

    server.before = () => undefined;
    server.signedIn = other;
    const theirs = await aPhone(server.fetch, storeName);
    expect(theirs.me?.id).toBe(other.id);
    expect(theirs.entriesIn('kept')).toHaveLength(0);
    await theirs.keep([countOf(row, planting, 99)]);
    await theirs.wake();
    expect([...server.taken.values()].map((each) => each.personId)).toEqual([other.id]);
    expect(theirs.othersWaiting).toBe(20);
    theirs.close();

    server.signedIn = me;
    const again = await aPhone(server.fetch, storeName);
    await again.wake();
    expect([...server.taken.values()].filter((each) => each.personId === me.id)).toHaveLength(20);
  });

  it('opens without a network with all that was kept, drafts too, and in the same order', async () => {
    const server = aServer();
    const storeName = `phone ${v7()}`;
    const round = await aPhone(server.fetch, storeName);
    server.before = () => portal();
    await round.keep([countOf(row, planting, 11), countOf(row, planting, 12)]);
    await round.setDraft('count x', { plants: 5 });
    round.close();
    const again = await aPhone(silence, storeName);
    expect(again.phase).toBe('ready');
    expect(again.entriesIn('kept').map((entry) => entry.body.plants)).toEqual([11, 12]);
    expect(again.draft('count x')).toEqual({ plants: 5 });
    expect(again.row(row).counts.map((count) => count.plantsUp)).toEqual([11, 12]);
  });

  it('never numbers two entries alike, whatever its clock says', async () => {
    const storeName = `phone ${v7()}`;
    let clock = Date.parse('2031-01-01');
    const server = aServer();
    const round = await aPhone(server.fetch, storeName, () => clock);
    server.before = () => portal();
    await round.keep([countOf(row, planting, 1)]);
    clock = Date.parse('2019-01-01');
    await round.keep([countOf(row, planting, 2)]);
    clock = Date.parse('2026-05-20');
    await round.keep([countOf(row, planting, 3)]);
    expect(round.entriesIn('kept').map((entry) => [entry.deviceSequence, entry.body.plants])).toEqual([[1, 1], [2, 2], [3, 3]]);
    server.before = () => undefined;
    await round.wake();
    expect(server.taken.size).toBe(3);
  });

  it('takes back an unsent entry at once, and one that may have arrived by another entry', async () => {
    const server = aServer();
    const round = await aPhone(server.fetch);
    const [unsent] = await round.keep([countOf(row, planting, 28)]);
    await round.undo(unsent!, 'slip');
    expect(round.entriesIn('kept')).toHaveLength(0);
    server.after = () => portal();
    const [maybe] = await round.keep([countOf(row, planting, 29)]);
    await round.wake();
    await round.undo(maybe!, 'slip');
    expect(round.row(row).counts).toEqual([]);
    server.after = () => undefined;
    await round.wake();
    expect([...server.taken.values()].map((each) => (each.body as { targetId?: string }).targetId ?? 'count')).toEqual(['count', maybe!.thingId]);
  });

  it('says that a press was not kept where the phone refuses it, and keeps what is being typed', async () => {
    const round = await aPhone(aServer().fetch);
    await round.setDraft('count x', { plants: 31 });
    const full = new DOMException('The quota has been exceeded.', 'QuotaExceededError');
    const add = round.store.entries.bulkAdd.bind(round.store.entries);
    round.store.entries.bulkAdd = (() => Promise.reject(full)) as never;
    await expect(round.keep([countOf(row, planting, 31)], { clearDrafts: ['count x'] })).rejects.toThrow();
    expect(round.trouble).toBe('storage-full');
    expect([round.entriesIn('kept').length, round.draft('count x')]).toEqual([0, { plants: 31 }]);
    round.store.entries.bulkAdd = add;
    await round.keep([countOf(row, planting, 31)], { clearDrafts: ['count x'] });
    expect([round.trouble, round.entriesIn('kept').length, round.draft('count x')]).toEqual([null, 1, undefined]);
  });

  it('shows a day that a newer server made as an update that is needed, with everything kept', async () => {
    const server = aServer();
    const round = await aPhone(server.fetch);
    server.before = () => portal();
    await round.keep([countOf(row, planting, 28)]);
    server.before = () => undefined;
    server.day = { ...server.day, version: 2 as never };
    await round.wake();
    expect(round.phase).toBe('update-needed');
    expect(await round.store.entries.count()).toBe(1);
  });

  it('keeps an entry of a kind the server does not know, for a look', async () => {
    const server = aServer();
    const round = await aPhone(server.fetch);
    server.refuse = () => ({ outcome: 'refused', code: 'unknown-kind', sentence: 'Update.' });
    await round.keep([countOf(row, planting, 28)]);
    await round.wake();
    expect(round.entriesIn('needs-look')).toHaveLength(1);
    server.refuse = () => undefined;
    await round.sendAgain(round.entriesIn('needs-look')[0]!);
    await round.wake();
    expect(server.taken.size).toBe(1);
  });

  it('loses, doubles and invents nothing, whatever the network does', async () => {
    const faults = fc.constantFrom('none', 'silence', 'portal', 'lost-answer', '401', '500', '503', 'half');
    await fc.assert(
      fc.asyncProperty(fc.array(fc.record({ fault: faults, entries: fc.integer({ min: 0, max: 12 }), reopen: fc.boolean() }), { maxLength: 12 }), async (steps) => {
        const server = aServer();
        const storeName = `phone ${v7()}`;
        let round = await aPhone(server.fetch, storeName);
        const made = new Map<string, number>();
        for (const [index, step] of steps.entries()) {
          server.before = () => {
            if (step.fault === 'silence') throw new TypeError('Failed to fetch');
            if (step.fault === 'portal') return portal();
            if (step.fault === '401') return json({ code: 'not-signed-in', title: '' }, 401);
            if (step.fault === '500') return json({ code: 'unexpected', title: '' }, 500);
            return step.fault === '503' ? json({ code: 'busy', title: '' }, 503, { 'Retry-After': '900' }) : undefined;
          };
          server.after = () => (step.fault === 'lost-answer' ? portal() : undefined);
          server.refuse = (operation) => (step.fault === 'half' && Number(operation.deviceSequence) % 2 === 0 ? { outcome: 'refused', code: 'busy' } : undefined);
          const kept = await round.keep(Array.from({ length: step.entries }, (_, at) => countOf(row, planting, index * 20 + at)));
          for (const entry of kept) made.set(entry.operationId, Number(entry.body.plants));
          await round.wake();
          if (step.reopen) {
            round.close();
            round = await aPhone(server.fetch, storeName);
          }
        }
        Object.assign(server, { before: () => undefined, after: () => undefined, refuse: () => undefined });
        await round.wake();
        await round.wake();
        expect(new Map([...server.taken].map(([id, { body }]) => [id, (body as { plants: number }).plants]))).toEqual(made);
        expect(server.applied).toBe(made.size);
        expect(round.entriesIn('kept', 'needs-look')).toEqual([]);
        round.close();
      }),
      { numRuns: 25 },
    );
  }, 60_000);
});

describe('the store of an earlier version', () => {
  it('is opened with everything in it, as the first version wrote it', async () => {
    const storeName = `phone ${v7()}`;
    // Written by hand as version 1 laid it out, so that a change of the code cannot change the past along with itself.
    await new Promise<void>((done, failed) => {
      const asked = indexedDB.open(storeName, 10);
      asked.onupgradeneeded = () => {
        const db = asked.result;
        const entries = db.createObjectStore('entries', { keyPath: 'operationId' });
        entries.createIndex('deviceSequence', 'deviceSequence');
        entries.createIndex('[personId+organisationId+state]', ['personId', 'organisationId', 'state']);
        const days = db.createObjectStore('days', { keyPath: 'key' });
        days.createIndex('personId', 'personId');
        const photos = db.createObjectStore('photos', { keyPath: 'photoId' });
        photos.createIndex('[personId+organisationId]', ['personId', 'organisationId']);
        const drafts = db.createObjectStore('drafts', { keyPath: 'key' });
        drafts.createIndex('[personId+organisationId]', ['personId', 'organisationId']);
        db.createObjectStore('facts', { keyPath: 'name' });
        const { kind, thingId, body } = countOf(row, planting, 28);
        entries.put({
          kind, thingId, body, operationId: v7(), personId: me.id, organisationId, deviceId: v7(), deviceSequence: 7, version: 1, baseVersion: null, follows: null, occurred: { date: '2026-05-20', time: '09:00', zone: 'America/Chicago' },
          confirmations: [], plantingId: planting.id, rowSampleId: row.id, state: 'kept', tried: false, keptAt: 1, sentAt: null, answer: null,
        });
        asked.transaction!.objectStore('facts').put({ name: 'device-sequence', value: 7 });
        asked.transaction!.objectStore('facts').put({ name: 'person', value: { person: { ...me, units: 'us' }, organisations: [{ id: organisationId, name: 'x', role: 'scout' }] } });
        asked.transaction!.objectStore('days').put({ key: dayKey(me.id, organisationId), personId: me.id, organisationId, day: aDay([planting]), readAt: 1 });
      };
      asked.onsuccess = () => {
        asked.result.close();
        done();
      };
      asked.onerror = () => failed(asked.error);
    });
    const round = await aPhone(silence, storeName);
    expect(round.entriesIn('kept').map((entry) => entry.body.plants)).toEqual([28]);
    const [next] = await round.keep([countOf(row, planting, 29)]);
    expect(next?.deviceSequence).toBe(8);
  });

  it('made by a newer version is left as it is, and said', async () => {
    const storeName = `phone ${v7()}`;
    const round = await aPhone(aServer().fetch, storeName);
    await round.keep([countOf(row, planting, 28)]);
    await round.store.facts.put({ name: 'store-shape', value: 2 });
    round.close();
    const older = await aPhone(silence, storeName);
    expect(older.phase).toBe('store-away');
    await expect(older.keep([countOf(row, planting, 29)])).rejects.toThrow();
    expect(await older.store.facts.get('store-shape')).toEqual({ name: 'store-shape', value: 2 });
  });

  it('writes strictly: a press counts only once it is on the disk', () => {
    const store = new RoundStore(`phone ${v7()}`);
    expect((store as unknown as { _options: { chromeTransactionDurability: string } })._options.chromeTransactionDurability).toBe('strict');
  });
});
