import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import pg from 'pg';
import { throwIfInterrupted } from '../interruption.mjs';
import { say } from '../say.mjs';
import { chanceFrom } from './chance';
import { sendingTo, signIn } from './http-send';
import { balances, countByLedger, type Ledger } from './ledger';
import { makeEntries } from './make-entries';
import { Phone, type Habits, type Tally } from './phone';
import { countPhotos, photosBalance, takePhoto, uploadAll, type PhotoLedger, type TakenPhoto } from './photos';
import { openPortal } from './portal';
import type { Cluster } from './prepare';
import { settleScene } from './scene';
import { strikeUntil } from './strikes';
import { standingServer } from './web-servers';

export type Plan = {
  seed: number;
  phones: number;
  entriesEach: number;
  plantings: number;
  faultSeconds: number;
  convergeSeconds: number;
  portalShare: number;
  photosEach: number;
  habits: Partial<Habits>;
  /** The name of the broken server that stands in the place of the product, in a control. */
  broken: string | null;
  /** What a control breaks in the database of its own before anything is sent. */
  breakDatabase: readonly string[];
};

export type Outcome = { ledger: Ledger; photos: PhotoLedger; waiting: number; complaints: string[]; convergedSeconds: number; struck: Record<string, number>; tally: Tally; seconds: number; passed: boolean };

const usual: Habits = { ways: 3, batchMost: 40, resentShare: 0.15, abandonShare: 0.2, twinShare: 0.1, madeWithinMs: 0, calm: () => false, forgetsOnAny2xx: false };

function interrupted(): boolean {
  try {
    throwIfInterrupted();
    return false;
  } catch {
    return true;
  }
}

async function withAdmin<T>(url: string, work: (client: pg.Client) => Promise<T>): Promise<T> {
  const client = new pg.Client({ connectionString: url });
  client.on('error', () => undefined);
  await client.connect();
  try {
    return await work(client);
  } finally {
    await client.end();
  }
}

/** Plays the phones of one plan against two servers under faults, lets everything come to rest, and counts by SQL. */
export async function play(cluster: Cluster, plan: Plan): Promise<Outcome> {
  const startedAt = performance.now();
  const chance = chanceFrom(plan.seed);
  const { appUrl, adminUrl, env: databaseEnv } = await cluster.database();
  const photoFolder = join(cluster.folder, `photos-${plan.seed}-${cluster.databases()}`);
  const env = { ...databaseEnv, PHOTO_FOLDER: photoFolder };
  const stopsBefore = cluster.stops();
  const scene = await settleScene(appUrl, chance, { scouts: plan.phones, plantings: plan.plantings, rowsEach: 40 });
  await withAdmin(adminUrl, async (client) => {
    for (const statement of plan.breakDatabase) await client.query(statement);
  });
  const servers = [
    await standingServer({ env, logFile: cluster.log('server-1'), broken: plan.broken }),
    await standingServer({ env, logFile: cluster.log('server-2'), broken: plan.broken }),
  ];
  const [first, second] = servers.map(({ address }) => address) as [string, string];
  const portal = await openPortal(first, plan.portalShare, chance.branch());
  try {
    let faultsEnd = Number.POSITIVE_INFINITY;
    const habits: Habits = { ...usual, madeWithinMs: plan.faultSeconds * 800, calm: () => performance.now() > faultsEnd, ...plan.habits };
    const phones: Phone[] = [];
    const photos: TakenPhoto[] = [];
    const uploads: ((over: () => boolean) => Promise<number>)[] = [];
    for (let index = 0; index < plan.phones; index += 1) {
      const taken = await Promise.all(Array.from({ length: plan.photosEach }, () => takePhoto(chance.id(), chance)));
      const scout = makeEntries(scene, index, plan.entriesEach, chance.branch(), taken);
      photos.push(...taken);
      const cookie = plan.broken === null ? await signIn(index % 2 === 0 ? first : second, scene.scouts[index]?.email ?? '') : '';
      const at = { addresses: [first, second, portal.address], organisationId: scene.organisationId, cookie };
      const uploading = chance.branch();
      uploads.push((over) => uploadAll(taken, at, uploading, over));
      phones.push(new Phone(scout, sendingTo([first, second, portal.address], scene, cookie, chance.branch()), habits, chance.branch()));
    }
    faultsEnd = performance.now() + plan.faultSeconds * 1000;
    const deadline = faultsEnd + plan.convergeSeconds * 1000;
    const faultsOver = () => interrupted() || performance.now() > faultsEnd;
    const walking = phones.map(async (phone) => {
      await phone.walk(() => interrupted() || performance.now() > deadline);
      return performance.now();
    });
    const uploaded = uploads.map((upload) => upload(() => interrupted() || performance.now() > deadline));
    await strikeUntil(
      faultsOver,
      [
        { name: 'first server killed', strike: servers[0]?.kill ?? (() => undefined), betweenMs: [3_000, 6_000] },
        { name: 'second server killed', strike: servers[1]?.kill ?? (() => undefined), betweenMs: [3_500, 7_000] },
        { name: 'PostgreSQL stopped', strike: cluster.stopHard, betweenMs: [13_000, 16_000] },
      ],
      chance,
    );
    const ends = await Promise.all(walking);
    const photosLeft = (await Promise.all(uploaded)).reduce((sum, left) => sum + left, 0);
    throwIfInterrupted();
    const waiting = phones.reduce((sum, phone) => sum + phone.left, photosLeft);
    // What hung up in flight may still be under way on a server; it comes to rest before anything is counted.
    await pause(1_500);
    const made = phones.flatMap((phone) => phone.scout.made);
    const ledger = await withAdmin(adminUrl, (client) => countByLedger(client, scene.organisationId, made, new Set(phones.flatMap((phone) => phone.stillKept))));
    const photoLedger = await withAdmin(adminUrl, (client) => countPhotos(client, scene.organisationId, made, photos, photoFolder));
    const complaints = phones.flatMap((phone) => [...phone.complaints.values()]);
    return {
      ledger,
      photos: photoLedger,
      waiting,
      complaints,
      convergedSeconds: Math.max(0, (Math.max(...ends) - faultsEnd) / 1000),
      struck: { 'servers killed': servers.reduce((sum, server) => sum + server.kills(), 0), 'PostgreSQL stopped': cluster.stops() - stopsBefore },
      tally: addedUp(phones.map((phone) => phone.tally)),
      seconds: (performance.now() - startedAt) / 1000,
      // A run in which nothing was struck holds nothing.
      passed: balances(ledger) && photosBalance(photoLedger) && waiting === 0 && complaints.length === 0 && servers.every((server) => server.kills() > 0) && cluster.stops() > stopsBefore,
    };
  } finally {
    await portal.close();
    await Promise.all(servers.map((server) => server.stop()));
  }
}

function addedUp(tallies: readonly Tally[]): Tally {
  const sum: Tally = { requests: 0, abandoned: 0, unanswered: 0, kept: {}, resent: 0, sent: 0, applied: 0, duplicate: 0 };
  for (const tally of tallies) {
    for (const key of ['requests', 'abandoned', 'unanswered', 'resent', 'sent', 'applied', 'duplicate'] as const) sum[key] += tally[key];
    for (const [what, times] of Object.entries(tally.kept)) sum.kept[what] = (sum.kept[what] ?? 0) + times;
  }
  return sum;
}

/** What a person reads of one run. */
export function tell(plan: Plan, { ledger, photos, waiting, complaints, convergedSeconds, struck, tally, seconds }: Outcome): void {
  say(`  ${plan.phones} phones × ${plan.entriesEach} entries, seed ${plan.seed}, ${seconds.toFixed(0)} s in all`);
  say(`  faults for ${plan.faultSeconds} s: ${Object.entries(struck).map(([what, times]) => `${what} ${times} times`).join(', ')}`);
  say(`  ${tally.requests} requests with ${tally.sent} entries, ${tally.resent} of them sent before; ${tally.abandoned} hung up in flight, ${tally.unanswered} unanswered; kept because of ${JSON.stringify(tally.kept)}`);
  say(`  converged ${convergedSeconds.toFixed(1)} s after the faults stopped; ${waiting} still waiting`);
  say(`  by SQL, of ${ledger.made} entries and ${ledger.visits} visits: ${ledger.lost} lost, ${ledger.doubled} doubled, ${ledger.invented} invented, ${ledger.altered} altered, ${ledger.apart} receipts or audit events apart`);
  if (photos.made > 0) say(`  of ${photos.made} photos, by SQL and their files: ${photos.lost} lost, ${photos.doubled} doubled, ${photos.invented} invented, ${photos.altered} altered`);
  for (const each of ledger.told) say(`    ${each}`);
  for (const each of [...new Set(complaints)].slice(0, 5)) say(`    refused: ${each}`);
}
