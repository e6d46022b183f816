// Runs every check there is, or the parts that are named: npm test -- unit, npm test -- database tests/access.
import { setTimeout as pause } from 'node:timers/promises';
import { join } from 'node:path';
import {
  Interrupted,
  beforeLeaving,
  leave,
  listenForSignals,
  throwIfInterrupted,
  together,
} from './interruption.mjs';
import { takeLock } from './lock.mjs';
import { installModules } from './modules.mjs';
import { localFolder, makeLocalFolder } from './places.mjs';
import { postgresPrograms } from './postgres-programs.mjs';
import { findOnPath } from './run.mjs';
import { Stop, say, secondsSince, step } from './say.mjs';
import { installSystemPackages } from './system-packages.mjs';

const startedAt = performance.now();
const partNames = ['lint', 'types', 'unit', 'database', 'browser'];

function readOptions() {
  const args = process.argv.slice(2);
  const until = args.findIndex((argument) => !partNames.includes(argument));
  const parts = until === -1 ? args : args.slice(0, until);
  const more = until === -1 ? [] : args.slice(until);
  if (more.length > 0 && parts.length !== 1) {
    throw new Stop(`Name one part first, then what is meant for it. The parts are ${partNames.join(', ')}.`);
  }
  return { parts: parts.length > 0 ? parts : partNames, more };
}

async function waitForTurn() {
  let told = false;
  for (;;) {
    const lock = takeLock(join(localFolder, 'test.lock'));
    if (!lock.holder) return beforeLeaving(() => lock.release());
    if (!told) say(`Another npm test runs in this folder (process ${lock.holder.pid}); waiting for its end.`);
    told = true;
    await pause(500);
    throwIfInterrupted();
  }
}

async function prepare(parts) {
  await together(installModules(), installPrograms(parts));
}

async function installPrograms(parts) {
  if (parts.includes('database') || parts.includes('browser')) await postgresPrograms();
  if (parts.includes('browser') && !findOnPath('chromium'))
    await installSystemPackages('Chromium', ['chromium']);
}

/** The cluster is made when the first part asks for it, and once. */
function sharedCluster() {
  let made;
  return () => {
    made ??= import('./test-cluster.mjs').then(({ startTestCluster }) =>
      step('Making a database for the tests', startTestCluster),
    );
    return made;
  };
}

async function runStage(stage, cluster, more) {
  const stageStartedAt = performance.now();
  say(`\n── ${stage.name}`);
  let counts;
  try {
    counts = await stage.work(cluster, more);
  } catch (error) {
    if (error instanceof Interrupted) throw error;
    say(error instanceof Stop ? error.message : error.stack);
    counts = { passed: 0, failed: 1, skipped: 0, note: 'could not be run' };
  }
  return { name: stage.name, seconds: secondsSince(stageStartedAt), ...counts };
}

function sayResults(results) {
  say('');
  for (const { name, passed, failed, skipped, seconds, note } of results) {
    const parts = [`${passed} passed`, failed && `${failed} failed`, skipped && `${skipped} skipped`, note];
    say(`${name.padEnd(10)}${`${seconds} s`.padStart(8)}   ${parts.filter(Boolean).join(', ')}`);
  }
  const sum = (key) => results.reduce((total, result) => total + result[key], 0);
  say(`all       ${`${secondsSince(startedAt)} s`.padStart(8)}`);
  return { passed: sum('passed'), failed: sum('failed') };
}

async function main() {
  const { parts, more } = readOptions();
  makeLocalFolder();
  await waitForTurn();
  await prepare(parts);
  const { stages } = await import('./test-stages.mjs');
  const cluster = sharedCluster();
  const results = [];
  for (const stage of stages.filter(({ name, partOf }) => parts.includes(partOf ?? name))) {
    results.push(await runStage(stage, cluster, more));
  }
  return sayResults(results);
}

listenForSignals();
let totals;
let exitCode = 1;
try {
  totals = await main();
  exitCode = totals.failed === 0 ? 0 : 1;
} catch (error) {
  if (error instanceof Interrupted) exitCode = error.exitCode;
  process.stderr.write(
    `${error instanceof Stop || error instanceof Interrupted ? error.message : error.stack}\n`,
  );
}
await leave();
if (totals) say(`${totals.passed} passed, ${totals.failed} failed`);
process.exitCode = exitCode;
