// npm run press-time: how long from a press to stored to ready at four times slower CPU, with 10 and with 10,000 entries waiting,
// and how long a cold start takes without a network. The two are compared within one run.
import { chanceFrom } from './chaos/chance';
import { ensureBuild, makeChaosCluster } from './chaos/prepare';
import { standingServer } from './chaos/web-servers';
import { makeGate } from './field-day/gate';
import { PhoneBrowser } from './field-day/phone-browser';
import { settleTrial, type FieldScene } from './field-day/scene';
import { signIn } from './field-day/sign-in';
import { nothingEntered, Walk } from './field-day/walk';
import { Interrupted, leave, listenForSignals } from './interruption.mjs';
import { say } from './say.mjs';

const dayMilliseconds = 86_400_000;
const slower = 4;
const dayOf = (instant: number) => new Date(instant).toISOString().slice(0, 10);

async function slowDown(phone: PhoneBrowser): Promise<void> {
  const session = await phone.page.context().newCDPSession(phone.page);
  await session.send('Emulation.setCPUThrottlingRate', { rate: slower });
}

/** One round over all rows, each press timed inside the page: from the press until the next row is drawn, which follows the store. */
async function timedRound(phone: PhoneBrowser, scene: FieldScene, walk: Walk): Promise<number[]> {
  await walk.go(walk.address('count', scene.rows[0]?.label));
  await phone.page.getByRole('button', { name: 'Looked, none new' }).waitFor();
  return phone.page.evaluate(async (presses) => {
    const times: number[] = [];
    const title = () => document.querySelector('h1')?.textContent ?? '';
    for (let press = 0; press < presses; press += 1) {
      await new Promise((rest) => setTimeout(rest, 150));
      const before = title();
      const button = [...document.querySelectorAll('button')].find((each) => each.textContent?.includes('Looked, none new'));
      if (!button) break;
      const startedAt = performance.now();
      button.click();
      times.push(
        await new Promise<number>((done) => {
          const look = () => (title() === before ? requestAnimationFrame(look) : requestAnimationFrame(() => done(performance.now() - startedAt)));
          requestAnimationFrame(look);
        }),
      );
    }
    return times;
  }, scene.rows.length - 1);
}

/** Fills the phone's store with entries like those that stand in it, on earlier days, until so many wait. */
function fill(phone: PhoneBrowser, wanted: number): Promise<number> {
  return phone.page.evaluate(async (most) => {
    const open = await new Promise<IDBDatabase>((done, failed) => {
      const asked = indexedDB.open('rowrise-round');
      asked.onsuccess = () => done(asked.result);
      asked.onerror = () => failed(asked.error ?? new Error('The store did not open.'));
    });
    const of = <T>(request: IDBRequest<T>) => new Promise<T>((done, failed) => { request.onsuccess = () => done(request.result); request.onerror = () => failed(request.error ?? new Error('refused')); });
    const standing = (await of(open.transaction('entries').objectStore('entries').getAll())) as { deviceSequence: number; body: { visit: object } }[];
    const store = open.transaction('entries', 'readwrite').objectStore('entries');
    for (let index = 0; standing.length + index < most; index += 1) {
      const like = standing[index % standing.length];
      if (!like) break;
      const round = Math.floor(index / standing.length);
      const visitedOn = new Date(Date.now() - (1 + (round % 9)) * 86_400_000).toISOString().slice(0, 10);
      const visitedAt = `${String(6 + (Math.floor(round / 9) % 12)).padStart(2, '0')}:${String((round * 7) % 60).padStart(2, '0')}`;
      store.put({ ...like, operationId: crypto.randomUUID(), thingId: crypto.randomUUID(), deviceSequence: 1_000_000 + index, body: { ...like.body, visit: { ...like.body.visit, id: crypto.randomUUID(), visitedOn, visitedAt } } });
    }
    await new Promise<void>((done, failed) => { store.transaction.oncomplete = () => done(); store.transaction.onerror = () => failed(store.transaction.error ?? new Error('refused')); });
    const count = await of(open.transaction('entries').objectStore('entries').count());
    open.close();
    return count;
  }, wanted);
}

/** Milliseconds from the start of loading until today's rows stand there, without a network. */
async function coldStart(phone: PhoneBrowser, scene: FieldScene): Promise<number> {
  await phone.page.goto('about:blank');
  await phone.page.goto(`${phone.address}/round?org=${scene.organisationId}`, { waitUntil: 'commit' });
  return phone.page.evaluate(
    () =>
      new Promise<number>((done) => {
        const look = () => (/due today|Nothing is due/.test(document.querySelector('h1')?.textContent ?? '') ? done(performance.now()) : requestAnimationFrame(look));
        look();
      }),
  );
}

const at = (times: readonly number[], share: number) => [...times].sort((a, b) => a - b)[Math.min(times.length - 1, Math.floor(times.length * share))] ?? 0;
const told = (times: readonly number[]) => `median ${at(times, 0.5).toFixed(0)} ms, 95 % within ${at(times, 0.95).toFixed(0)} ms (${times.length} presses)`;

async function main(): Promise<boolean> {
  await ensureBuild();
  const cluster = await makeChaosCluster();
  const database = await cluster.database();
  const server = await standingServer({ env: database.env, logFile: cluster.log('press-time'), broken: null });
  const gate = await makeGate(() => server.address);
  const phone = new PhoneBrowser(gate.address);
  try {
    const scene = await settleTrial(database.appUrl, chanceFrom(1), { blocks: 4, plantedOn: dayOf(Date.now() - 20 * dayMilliseconds) });
    await signIn(phone, scene);
    const walk = new Walk(scene, nothingEntered(), chanceFrom(1), () => phone.page, async () => undefined);
    gate.set('closed');
    const round = async (daysAgo: number) => {
      phone.clockOffset = -daysAgo * dayMilliseconds;
      await phone.close();
      await phone.open(`/round?org=${scene.organisationId}`);
      await slowDown(phone);
      return timedRound(phone, scene, walk);
    };
    await round(12);
    const few = [...(await round(6)), ...(await round(5))];
    const cold = [await coldStart(phone, scene), await coldStart(phone, scene), await coldStart(phone, scene)];
    const waiting = await fill(phone, 10_000);
    const many = [...(await round(4)), ...(await round(3))];
    const coldMany = [await coldStart(phone, scene), await coldStart(phone, scene)];
    say(`At ${slower} times slower CPU, press to stored to ready:`);
    say(`  with up to 100 waiting: ${told(few)}`);
    say(`  with ${waiting} waiting: ${told(many)}; ratio of the medians ${(at(many, 0.5) / at(few, 0.5)).toFixed(2)}`);
    say(`  cold start without a network: ${cold.map((each) => each.toFixed(0)).join(', ')} ms; with ${waiting} waiting ${coldMany.map((each) => each.toFixed(0)).join(', ')} ms`);
    return at(few, 0.95) <= 150 && at(many, 0.95) <= 150 && Math.min(...cold) <= 2_000;
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
  if (!(error instanceof Interrupted)) process.stderr.write(`${(error as Error).stack}\n`);
}
await leave();
process.exit(exitCode);
