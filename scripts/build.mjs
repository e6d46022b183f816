// Builds the web application when its sources have changed since the last build.
import { createHash } from 'node:crypto';
import { existsSync, readFileSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { join, relative } from 'node:path';
import { checkout } from './places.mjs';
import { run } from './run.mjs';
import { plainEnvironment } from './typescript.mjs';

// Nothing in these folders can change what the browser or the server gets.
const apart = new Set([
  ...[
    '.git',
    '.ci',
    '.next',
    '.rowrise',
    'node_modules',
    'coverage',
    'docs',
    'migrations',
    'scripts',
    'tests',
  ],
  ...['test-results', 'playwright-report', 'next-env.d.ts'],
]);
const mark = join(checkout, '.next', 'rowrise-sources');

function filesIn(folder) {
  return readdirSync(folder, { withFileTypes: true })
    .filter(
      (entry) => folder !== checkout || !(apart.has(entry.name) || /\.(md|tsbuildinfo)$/.test(entry.name)),
    )
    .flatMap((entry) => {
      const path = join(folder, entry.name);
      if (entry.isDirectory()) return filesIn(path);
      return entry.isFile() ? [path] : [];
    });
}

export function sourcesHash() {
  const hash = createHash('sha256').update(process.version);
  for (const path of filesIn(checkout).sort()) {
    hash.update(`\0${relative(checkout, path)}\0`).update(readFileSync(path));
  }
  return hash.digest('hex');
}

export function buildIsCurrent() {
  return existsSync(mark) && readFileSync(mark, 'utf8') === sourcesHash();
}

export async function build(options = {}) {
  // The mark goes first: a build cut short must not pass for the one before.
  rmSync(mark, { force: true });
  const hash = sourcesHash();
  const result = await run(process.execPath, ['node_modules/next/dist/bin/next', 'build'], {
    cwd: checkout,
    env: { ...plainEnvironment(), NODE_ENV: 'production' },
    failure: 'The application could not be built.',
    ...options,
  });
  if (result.code === 0) {
    // Only here: esbuild is among the modules, which a first start has installed by now.
    const { makeRoundWorker } = await import('./round-worker.mjs');
    await makeRoundWorker();
    writeFileSync(mark, hash);
  }
  return result;
}
