// npm run field-day: a scripted scout counts a whole trial on a real phone browser without a network, loses power, and comes home.
//   npm run field-day              16 strips, 2 row samples each, 9 visits, 3 tape sheets a strip, power lost three times
//   npm run field-day -- --short   8 strips and 4 visits
//   npm run field-day -- --kill-each   the short one, with the browser killed after the first of each of twelve kinds of press
import { setTimeout as pause } from 'node:timers/promises';
import { chanceFrom, type Chance } from './chaos/chance';
import { ensureBuild, makeChaosCluster } from './chaos/prepare';
import { standingServer } from './chaos/web-servers';
import { differences } from './field-day/compare';
import { makeGate, type Gate } from './field-day/gate';
import { PhoneBrowser } from './field-day/phone-browser';
import { settleTrial, type FieldScene } from './field-day/scene';
import { signIn, typePassword } from './field-day/sign-in';
import { nothingEntered, Walk, type Entered, type PressKind } from './field-day/walk';
import { Interrupted, leave, listenForSignals } from './interruption.mjs';
import { Stop, say } from './say.mjs';

const dayMilliseconds = 86_400_000;
const dayOf = (instant: number) => new Date(instant).toISOString().slice(0, 10);
const plantedDaysAgo = 20;
const markers = ['red', 'blue', 'white', 'yellow', 'pink', 'black', 'orange', 'purple', 'green'];

type Plan = { blocks: number; visitDays: number[]; losses: number; photos: number; transects: number; digPairs: number; covers: number; killEach?: boolean };
const full: Plan = { blocks: 4, visitDays: [6, 7, 8, 9, 10, 11, 12, 13, 14], losses: 3, photos: 20, transects: 3, digPairs: 4, covers: 4 };
const short: Plan = { blocks: 2, visitDays: [8, 9, 10, 11], losses: 3, photos: 4, transects: 1, digPairs: 1, covers: 1 };

/** The days of one row: rising until all are up, then nothing new twice. */
function countsOf(chance: Chance, days: number): (number | 'none-new')[] {
  let up = chance.whole(2, 6);
  return Array.from({ length: days }, (_, day) => {
    if (day >= days - 2) return day === days - 1 ? 'none-new' : up;
    up = Math.min(31, up + chance.whole(1, 6));
    return up;
  });
}

const placesOf = (chance: Chance): string[] => {
  let at = chance.whole(2, 6);
  return Array.from({ length: chance.whole(22, 26) }, () => {
    const place = `${at}${chance.happens(0.4) ? '½' : ''}`;
    at += chance.whole(6, 8);
    return place;
  });
};

async function walkAll(phone: PhoneBrowser, gate: Gate, scene: FieldScene, plan: Plan, chance: Chance): Promise<Entered> {
  const entered = nothingEntered();
  const planted = Date.now() - plantedDaysAgo * dayMilliseconds;
  let kept = 0;
  const total = scene.rows.length * plan.visitDays.length + scene.strips * 4;
  const lossesAt = new Set(Array.from({ length: plan.losses }, (_, index) => Math.floor((total * (index + 0.6)) / plan.losses)));
  const tried = new Set<PressKind>();
  const walk = new Walk(scene, entered, chance, () => phone.page, async (press) => {
    const firstOfKind = plan.killEach && !tried.has(press);
    tried.add(press);
    if (press !== 'typed' && press !== 'place-typed') kept += 1;
    else if (!firstOfKind) return;
    if (!firstOfKind && !lossesAt.has(kept)) return;
    const address = new URL(phone.page.url());
    await phone.losePower();
    await phone.open(address.pathname + address.search);
    await phone.page.getByRole('heading', { level: 1 }).filter({ hasNotText: 'Opening' }).waitFor();
    say(`  lost power after ${kept} things kept (${press}), and went on`);
  });
  const plans = new Map(scene.rows.map(({ label }) => [label, countsOf(chance, plan.visitDays.length)]));
  const doubtful = new Map<string, number>();
  gate.set('closed');
  for (const [visit, day] of plan.visitDays.entries()) {
    phone.clockOffset = planted + day * dayMilliseconds - Date.now();
    // Another day: the phone was off over night.
    await phone.close();
    await phone.open(`/round?org=${scene.organisationId}`);
    const on = dayOf(planted + day * dayMilliseconds);
    const order = walked(scene);
    await walk.go(walk.address('count', order[0]));
    for (const label of order) {
      const plants = plans.get(label)?.[visit] ?? 0;
      // "Looked, none new" leaves the doubtful as they were at the visit before.
      if (plants !== 'none-new') doubtful.set(label, chance.happens(0.1) ? 1 : 0);
      await walk.count(label, on, markers[visit] ?? null, plants, doubtful.get(label) ?? 0);
    }
  }
  const on = dayOf(planted + (plan.visitDays.at(-1) ?? 0) * dayMilliseconds);
  const sheets = new Map<string, string[]>();
  for (const { label } of scene.rows) {
    const places = placesOf(chance);
    sheets.set(label, places);
    await walk.tape(label, on, walk.address('tape', label), places);
  }
  for (const { label } of scene.rows.filter((row) => row.label.endsWith('-1'))) {
    await walk.tapeAgain(label, on, walk.address('tape', label), sheets.get(label) ?? []);
    await walk.depths(label, walk.address('depth', label), Array.from({ length: 10 }, () => chance.pick(['1 1/2', '1 3/4', '2', '2 1/4'])));
  }
  const rows = scene.rows.map((row) => row.label);
  for (const label of rows.slice(0, plan.covers)) await walk.cover(label, walk.address('cover', label), 50, chance.whole(5, 40));
  for (let index = 0; index < plan.transects; index += 1) await walk.cover(null, walk.address('transect'), 100, chance.whole(20, 70));
  for (const label of rows.slice(0, plan.digPairs)) await walk.digPair(label, walk.address('dig', label));
  for (const label of rows.slice(0, 4)) await walk.photos(walk.address('photos', label), plan.photos / 4);
  return entered;
}

/** To and fro over the two lines, as the phone leads. */
function walked(scene: FieldScene): string[] {
  const line = (which: string) => scene.rows.map((row) => row.label).filter((label) => label.endsWith(which));
  return [...line('-1'), ...line('-2').reverse()];
}

async function comeHome(phone: PhoneBrowser, gate: Gate, scene: FieldScene): Promise<void> {
  // First a network that answers everything with a page of its own, then the real one.
  gate.set('portal');
  phone.clockOffset = 0;
  await phone.close();
  await phone.open(`/round?org=${scene.organisationId}&at=kept`);
  await phone.page.getByRole('button', { name: 'Send now' }).click();
  await pause(3_000);
  const waiting = await phone.page.getByRole('heading', { level: 1 }).textContent();
  say(`  behind a sign-in page of a network: ${waiting}`);
  if (/Everything is sent/.test(waiting ?? '')) throw new Error('The phone took a network’s own page for an answer.');
  gate.set('open');
  await phone.page.getByRole('button', { name: 'Send now' }).click();
  const everything = phone.page.getByRole('heading', { level: 1, name: 'Everything is sent' });
  const signedOut = phone.page.getByRole('link', { name: 'Sign in to send' });
  await everything.or(signedOut).waitFor({ timeout: 60_000 });
  // A browser that was killed soon after signing in has not written its cookie down. What was entered waits all the same.
  if (await signedOut.isVisible()) {
    say('  the sign-in was lost with the power; signing in again');
    await signedOut.click();
    await typePassword(phone.page, scene);
    await phone.page.waitForURL(/\/round/);
    await phone.page.getByRole('heading', { level: 1 }).filter({ hasNotText: 'Opening' }).waitFor();
    await phone.page.goto(`${gate.address}/round?org=${scene.organisationId}&at=kept`);
  }
  await phone.page.getByRole('heading', { level: 1, name: 'Everything is sent' }).waitFor({ timeout: 60_000 });
}

async function main(): Promise<boolean> {
  const killEach = process.argv.includes('--kill-each');
  const plan: Plan = killEach ? { ...short, losses: 0, killEach } : process.argv.includes('--short') ? short : full;
  const seed = Number(process.argv[process.argv.indexOf('--seed') + 1]) || 20_260_507;
  await ensureBuild();
  const cluster = await makeChaosCluster();
  const database = await cluster.database();
  const photoFolder = `${cluster.folder}/photos`;
  const server = await standingServer({ env: { ...database.env, PHOTO_FOLDER: photoFolder }, logFile: cluster.log('field-day'), broken: null });
  const gate = await makeGate(() => server.address);
  const phone = new PhoneBrowser(gate.address);
  try {
    const chance = chanceFrom(seed);
    const scene = await settleTrial(database.appUrl, chance, { blocks: plan.blocks, plantedOn: dayOf(Date.now() - plantedDaysAgo * dayMilliseconds) });
    await signIn(phone, scene);
    const day = await phone.page.evaluate(async (path) => (await fetch(path)).text(), `/api/o/${scene.organisationId}/round-day`);
    if (/CANARYSETTING/.test(day)) throw new Error('The phone was given a setting.');
    const startedAt = performance.now();
    const entered = await walkAll(phone, gate, scene, plan, chance).catch(async (error: unknown) => {
      // What stood on the screen tells more than where the script was.
      say(`  the screen said: ${(await phone.page.locator('body').innerText().catch(() => '')).replace(/\s+/g, ' ').slice(0, 600)}`);
      throw error;
    });
    const walkedSeconds = (performance.now() - startedAt) / 1_000;
    const home = performance.now();
    await comeHome(phone, gate, scene).catch(async (error: unknown) => {
      say(`  the screen said: ${(await phone.page.locator('main').innerText().catch(() => '')).replace(/\s+/g, ' ').slice(0, 1_500)}`);
      throw error;
    });
    const { found, sums } = await differences(database.adminUrl, scene, entered);
    say(`Seed ${seed}: walked in ${walkedSeconds.toFixed(0)} s, power lost ${phone.losses} times, sent in ${((performance.now() - home) / 1_000).toFixed(0)} s.`);
    say(`The database holds ${sums}.`);
    for (const each of found.slice(0, 20)) say(`  ${each}`);
    say(found.length === 0 ? 'GREEN: the server holds exactly what the script entered.' : `RED: ${found.length} differences.`);
    return found.length === 0;
  } finally {
    await phone.forget();
    await gate.stop();
    await server.stop();
  }
}

listenForSignals();
let exitCode = 1;
try {
  exitCode = (await main()) ? 0 : 1;
} catch (error) {
  exitCode = error instanceof Interrupted ? error.exitCode : 1;
  if (!(error instanceof Interrupted)) process.stderr.write(`${error instanceof Stop ? error.message : (error as Error).stack}\n`);
}
await leave();
process.exit(exitCode);
