import { setTimeout as pause } from 'node:timers/promises';
import pg from 'pg';
import { say } from '../say.mjs';
import { chanceFrom } from './chance';
import { httpRequest } from './http-request';
import { sendingTo, signIn, watched, type Watch } from './http-send';
import { balances, countByLedger } from './ledger';
import { makeEntries } from './make-entries';
import { Phone } from './phone';
import type { Cluster } from './prepare';
import { settleScene } from './scene';
import { slowLink } from './slow-link';
import { smallDisk } from './small-disk';
import { standingServer } from './web-servers';

type Trouble = { name: string; seconds: number; begin: () => Promise<void>; end: () => Promise<void> };
export type Told = { passed: number; failed: number; notRun: number };

const phonesAtOnce = 16;
const entriesEach = 30;
const patienceSeconds = 90;

/** Whether a plain question is answered again, without anybody having touched the server. */
async function secondsUntilAnswered(address: string): Promise<number> {
  const startedAt = performance.now();
  for (;;) {
    const answer = await httpRequest(`${address}/api/health`, { method: 'GET', headers: {}, body: '', hangUpAfterMs: 5_000 }).catch(() => undefined);
    const seconds = (performance.now() - startedAt) / 1000;
    if (answer?.status === 200 || seconds > patienceSeconds) return seconds;
    await pause(100);
  }
}

/** Phones send to one server while the trouble lasts; afterwards everything is counted by SQL. */
async function playTrouble(cluster: Cluster, seed: number, make: (at: { adminUrl: string; link: Awaited<ReturnType<typeof slowLink>> }) => Promise<Trouble>): Promise<boolean> {
  const chance = chanceFrom(seed);
  const { adminUrl, appUrl, env } = await cluster.database();
  const link = await slowLink(Number(new URL(appUrl).port));
  const throughLink = new URL(appUrl);
  throughLink.port = String(link.port);
  const scene = await settleScene(appUrl, chance, { scouts: phonesAtOnce, plantings: 2, rowsEach: 60 });
  const admin = new pg.Client({ connectionString: adminUrl });
  await admin.connect();
  const trouble = await make({ adminUrl, link });
  const server = await standingServer({ env: { ...env, DATABASE_URL: throughLink.href }, logFile: cluster.log('server-slow'), broken: null });
  const watch: Watch = { statuses: {}, withoutRetryAfter: 0, slowestMs: 0 };
  try {
    const phones: Phone[] = [];
    for (let index = 0; index < phonesAtOnce; index += 1) {
      const scout = makeEntries(scene, index, entriesEach, chance.branch());
      const cookie = await signIn(server.address, scene.scouts[index]?.email ?? '');
      const send = watched(sendingTo([server.address], scene, cookie, chance.branch()), watch);
      const habits = { ways: 1, batchMost: 10, resentShare: 0.1, abandonShare: 0, twinShare: 0, madeWithinMs: trouble.seconds * 500, calm: () => true, forgetsOnAny2xx: false };
      phones.push(new Phone(scout, send, habits, chance.branch()));
    }
    await trouble.begin();
    const endsAt = performance.now() + trouble.seconds * 1000;
    const walking = Promise.all(phones.map((phone) => phone.walk(() => performance.now() > endsAt + patienceSeconds * 1000)));
    await pause(trouble.seconds * 1000);
    await trouble.end();
    const endedAt = performance.now();
    const answeredAfter = await secondsUntilAnswered(server.address);
    await walking;
    const convergedAfter = (performance.now() - endedAt) / 1000;
    const ledger = await countByLedger(admin, scene.organisationId, phones.flatMap((phone) => phone.scout.made), new Set(phones.flatMap((phone) => phone.stillKept)));
    const waiting = phones.reduce((sum, phone) => sum + phone.left, 0);
    const complaints = phones.flatMap((phone) => [...phone.complaints.values()]);
    const refusedForNow = watch.statuses['503'] ?? 0;
    say(`  ${trouble.seconds} s of it; answers ${JSON.stringify(watch.statuses)}, ${watch.withoutRetryAfter} of the 503 without Retry-After; the slowest reply took ${(watch.slowestMs / 1000).toFixed(1)} s`);
    say(`  a plain request is answered ${answeredAfter.toFixed(1)} s and all entries ${convergedAfter.toFixed(1)} s afterwards, nobody having touched the server; ${waiting} still waiting`);
    say(`  by SQL, of ${ledger.made} entries: ${ledger.lost} lost, ${ledger.doubled} doubled, ${ledger.invented} invented, ${ledger.altered} altered, ${ledger.apart} apart`);
    for (const each of [...ledger.told, ...new Set(complaints)].slice(0, 8)) say(`    ${each}`);
    return balances(ledger) && waiting === 0 && complaints.length === 0 && refusedForNow > 0 && watch.withoutRetryAfter === 0 && answeredAfter < 30 && server.kills() === 0;
  } finally {
    await server.stop();
    await link.close();
    await admin.end();
  }
}

/** The pool held: somebody's lock keeps every connection of the server waiting. */
async function poolHeld({ adminUrl }: { adminUrl: string }): Promise<Trouble> {
  const holder = new pg.Client({ connectionString: adminUrl });
  await holder.connect();
  return {
    name: 'pool held',
    seconds: 20,
    begin: async () => {
      await holder.query('begin');
      await holder.query('lock table receipt in access exclusive mode');
    },
    end: async () => {
      await holder.query('rollback');
      await holder.end();
    },
  };
}

const sluggish = async ({ link }: { link: Awaited<ReturnType<typeof slowLink>> }): Promise<Trouble> => ({
  name: 'two-second answers',
  seconds: 25,
  begin: async () => link.delayBy(2_000),
  end: async () => link.delayBy(0),
});

/** The tables that entries go to lie on a mount of a few megabytes, which is full for a while. */
async function diskFull(cluster: Cluster, adminUrl: string, disk: { folder: string; fill: () => void; free: () => void }): Promise<Trouble> {
  const admin = new pg.Client({ connectionString: adminUrl });
  await admin.connect();
  await admin.query(`create tablespace small location '${disk.folder}'`);
  for (const table of ['receipt', 'audit_event', 'count', 'residue_reading', 'tape_sheet', 'visit', 'withdrawal']) await admin.query(`alter table "${table}" set tablespace small`);
  await admin.end();
  return { name: 'disk full', seconds: 15, begin: async () => disk.fill(), end: async () => disk.free() };
}

/** Pool held, two-second answers, disk full: 503 with Retry-After, nothing acknowledged and lost, and it recovers unaided. */
export async function slowAndFull(cluster: Cluster, seed: number): Promise<Told> {
  const told: Told = { passed: 0, failed: 0, notRun: 0 };
  const note = (name: string, passed: boolean) => {
    told[passed ? 'passed' : 'failed'] += 1;
    say(`  ${name}: ${passed ? 'holds' : 'DOES NOT HOLD'}`);
  };
  say('Pool held: every connection of the server waits for a lock.');
  note('pool held', await playTrouble(cluster, seed, poolHeld));
  say('Two-second answers: every answer of the database is held back.');
  note('two-second answers', await playTrouble(cluster, seed + 1, sluggish));
  say('Disk full: the tables lie on a small mount without room.');
  const disk = smallDisk(cluster.folder, 24);
  if ('reason' in disk) {
    told.notRun += 1;
    say(`  disk full: NOT RUN, ${disk.reason}`);
  } else {
    note('disk full', await playTrouble(cluster, seed + 2, ({ adminUrl }) => diskFull(cluster, adminUrl, disk)));
  }
  say(`${told.passed} held, ${told.failed} did not, ${told.notRun} not run.`);
  return told;
}
