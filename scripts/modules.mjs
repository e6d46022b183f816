// Installs the modules the lock file names, when they are not there already.
import { createHash } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { checkout } from './places.mjs';
import { run } from './run.mjs';
import { step } from './say.mjs';

const lockFile = join(checkout, 'package-lock.json');
const installed = join(checkout, 'node_modules', '.package-lock.json');
// The mark stands inside the folder it speaks of: an installation cut short, or a removed folder, takes the mark along.
const mark = join(checkout, 'node_modules', '.rowrise-lock-hash');

function lockHash() {
  return createHash('sha256').update(readFileSync(lockFile)).update(process.version).digest('hex');
}

/** Modules a developer installed by hand count as well, as long as they are the ones the lock file names. */
function installedAgrees() {
  if (!existsSync(installed)) return false;
  const wanted = JSON.parse(readFileSync(lockFile, 'utf8')).packages;
  const present = JSON.parse(readFileSync(installed, 'utf8')).packages;
  const same = ([path, it]) => present[path]?.version === it.version || (it.optional && !present[path]);
  return Object.entries(wanted).every((entry) => entry[0] === '' || same(entry));
}

export async function installModules() {
  const hash = lockHash();
  if (existsSync(mark) && existsSync(installed) && readFileSync(mark, 'utf8') === hash) return;
  if (!installedAgrees()) {
    const npm = process.env.npm_execpath;
    const [command, before] = npm ? [process.execPath, [npm]] : ['npm', []];
    await step('Installing modules', () =>
      run(command, [...before, 'ci', '--include=dev', '--no-audit', '--no-fund'], {
        cwd: checkout,
        // npm answers a polite signal by taking back what it did, long after; a next start begins by clearing anyway.
        deathSignal: 'KILL',
        interruptWith: 'SIGKILL',
        failure: 'The modules could not be installed. npm said:',
      }),
    );
  }
  writeFileSync(mark, hash);
}
