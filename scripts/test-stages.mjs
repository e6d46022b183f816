// The parts of `npm test`, in the order they run. Each answers with its counts.
import { rmSync } from 'node:fs';
import { join } from 'node:path';
import { build, buildIsCurrent } from './build.mjs';
import { lockHolder } from './lock.mjs';
import { checkout, localFolder, lockPath } from './places.mjs';
import { run } from './run.mjs';
import { say } from './say.mjs';
import { testEnvironment } from './test-cluster.mjs';
import { playwrightCounts, vitestCounts, wholeCounts } from './test-counts.mjs';
import { withBrowserServers } from './test-servers.mjs';
import { plainEnvironment } from './typescript.mjs';

const tool = (path, args, options = {}) =>
  run(process.execPath, [join('node_modules', path), ...args], {
    cwd: checkout,
    show: true,
    mayFail: true,
    ...options,
    env: { ...plainEnvironment(), ...options.env },
  });

/** Where a tool writes its report; the last run's must not pass for this one's. */
function freshReport(name) {
  const path = join(localFolder, `test-report-${name}.json`);
  rmSync(path, { force: true });
  return path;
}

async function vitest(name, folders, more, env) {
  const report = freshReport(name);
  // A file named by hand stands in for the folders.
  const chosen = more.some((argument) => argument.startsWith('tests/')) ? more : [...folders, ...more];
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${report}`];
  const { code } = await tool('vitest/vitest.mjs', ['run', ...chosen, ...reporters], { env });
  return vitestCounts(report, code);
}

async function lint(_, more) {
  const { code } = await tool('eslint/bin/eslint.js', ['.', '--max-warnings', '0', ...more]);
  return wholeCounts(code);
}

async function types() {
  const generated = await tool('next/dist/bin/next', ['typegen'], { show: false });
  if (generated.code !== 0) say(generated.output);
  const { code } = await tool('typescript/bin/tsc', ['--noEmit']);
  return wholeCounts(generated.code || code);
}

const unit = (_, more) => vitest('unit', ['tests/unit/', 'tests/reference/', 'tests/architecture/'], more);

const database = async (cluster, more) =>
  vitest(
    'database',
    ['tests/integration/', 'tests/access/', 'tests/reliability/'],
    more,
    testEnvironment(await cluster()),
  );

async function buildOnce() {
  if (buildIsCurrent()) return { ...wholeCounts(0), note: 'unchanged since the last build' };
  const holder = lockHolder(lockPath);
  if (holder && !holder.dev) {
    say(
      'npm start serves from this folder, and a new build would take its files away. Stop it, then test again.',
    );
    return wholeCounts(1);
  }
  const { code, output } = await build({ mayFail: true });
  if (code !== 0) say(output);
  return wholeCounts(code);
}

async function browser(cluster, more) {
  return withBrowserServers(await cluster(), async (env) => {
    const report = freshReport('browser');
    const { code } = await tool('@playwright/test/cli.js', ['test', '--reporter=list,json', ...more], {
      env: { ...env, PLAYWRIGHT_JSON_OUTPUT_FILE: report },
      // Playwright closes its browsers when it is interrupted, and leaves them when it is terminated.
      deathSignal: 'INT',
      interruptWith: 'SIGINT',
    });
    return playwrightCounts(report, code);
  });
}

/** What each part is called on the command line and what has to run for it. */
export const stages = [
  { name: 'lint', work: lint },
  { name: 'types', work: types },
  { name: 'unit', work: unit },
  { name: 'database', work: database },
  { name: 'build', work: buildOnce, partOf: 'browser' },
  { name: 'browser', work: browser },
];
