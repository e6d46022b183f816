// npm run chaos: what phones enter, under everything that can go wrong at once, held against the database by SQL.
//   npm run chaos                        20 phones × 500 entries; -- --short for 6 × 60; -- --seed <number>
//   npm run chaos -- --control <name>    one run with one thing broken on purpose, which has to go red
//   npm run chaos -- --controls          all of those, short; green only when each was caught
//   npm run chaos -- --twins             200 entries, each 50 times at once to two servers
//   npm run chaos -- --slow-and-full     pool held, two-second answers, disk full
import { controls, isCaught, type Control } from './chaos/controls';
import { httpTwins } from './chaos/http-twins';
import { play, tell, type Plan } from './chaos/play';
import { ensureBuild, makeChaosCluster, type Cluster } from './chaos/prepare';
import { slowAndFull } from './chaos/slow-and-full';
import { Interrupted, leave, listenForSignals } from './interruption.mjs';
import { Stop, say } from './say.mjs';

const full = { phones: 20, entriesEach: 500, plantings: 5, faultSeconds: 180, convergeSeconds: 120, photosEach: 3 };
const short = { phones: 6, entriesEach: 60, plantings: 2, faultSeconds: 20, convergeSeconds: 60, photosEach: 1 };
const usual = { portalShare: 0.15, habits: {}, broken: null, breakDatabase: [] };

function readOptions(args: readonly string[]) {
  const valueOf = (option: string) => (args.includes(option) ? args[args.indexOf(option) + 1] : undefined);
  const seed = Number(valueOf('--seed') ?? 20_260_507);
  const name = valueOf('--control');
  const control = controls.find((each) => each.name === name);
  if (args.includes('--control') && !control) throw new Stop(`The controls are ${controls.map((each) => each.name).join(', ')}.`);
  if (!Number.isSafeInteger(seed)) throw new Stop('A seed is a whole number.');
  return { seed, control, short: args.includes('--short'), controls: args.includes('--controls'), slowAndFull: args.includes('--slow-and-full'), twins: args.includes('--twins') };
}

async function runControl(cluster: Cluster, control: Control, seed: number): Promise<boolean> {
  say(`Control ${control.name}: ${control.breaks}.`);
  // The broken servers know no photos, and the controls are about entries.
  const plan: Plan = { ...usual, ...short, photosEach: 0, seed, ...control.change };
  const outcome = await play(cluster, plan);
  tell(plan, outcome);
  return isCaught(control, outcome.ledger);
}

async function main(): Promise<boolean> {
  const options = readOptions(process.argv.slice(2));
  await ensureBuild();
  const cluster = await makeChaosCluster();
  if (options.controls) {
    const missed: string[] = [];
    for (const control of controls) {
      const caught = await runControl(cluster, control, options.seed);
      say(caught ? `  caught: ${control.caughtBy}` : '  not caught');
      if (!caught) missed.push(control.name);
    }
    say(missed.length === 0 ? `All ${controls.length} controls were caught.` : `Not caught: ${missed.join(', ')}.`);
    return missed.length === 0;
  }
  if (options.control) {
    const caught = await runControl(cluster, options.control, options.seed);
    say(caught ? `RED as it has to be: ${options.control.caughtBy}.` : 'The control was not caught, so this harness cannot see that fault.');
    // A control is a run that goes red; its exit code says so.
    return !caught;
  }
  if (options.twins) return httpTwins(cluster, options.seed);
  if (options.slowAndFull) return (await slowAndFull(cluster, options.seed)).failed === 0;
  const plan: Plan = { ...usual, ...(options.short ? short : full), seed: options.seed };
  say('Playing the phones …');
  const outcome = await play(cluster, plan);
  tell(plan, outcome);
  const late = outcome.waiting > 0 ? ` ${outcome.waiting} entries and photos had no receipt ${plan.convergeSeconds} s after the faults, and are still on the phones.` : '';
  say(outcome.passed ? 'GREEN: everything the phones made stands once and as made.' : `RED.${late}`);
  return outcome.passed;
}

listenForSignals();
let exitCode = 0;
try {
  exitCode = (await main()) ? 0 : 1;
} catch (error) {
  exitCode = error instanceof Interrupted ? error.exitCode : 1;
  if (!(error instanceof Interrupted)) process.stderr.write(`${error instanceof Stop ? error.message : (error as Error).stack}\n`);
}
await leave();
process.exit(exitCode);
