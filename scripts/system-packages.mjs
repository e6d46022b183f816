// Debian's packages, installed when this runs as root and they are missing.
import { existsSync, mkdirSync, rmSync, writeFileSync } from 'node:fs';
import { findOnPath, run } from './run.mjs';
import { Stop, step } from './say.mjs';

const environment = { ...process.env, DEBIAN_FRONTEND: 'noninteractive', LC_ALL: 'C.UTF-8' };
const aptOptions = ['-o', 'DPkg::Lock::Timeout=120', '-o', 'APT::Get::Assume-Yes=true'];

async function apt(args, options) {
  return run('apt-get', [...aptOptions, ...args], { env: environment, cwd: '/', ...options });
}

/** Installs packages; `title` names what is missing in the sentence for those who cannot install it from here. */
export async function installSystemPackages(title, packages) {
  const byHand = `sudo apt-get install --no-install-recommends ${packages.join(' ')}`;
  if (process.getuid?.() !== 0 || !findOnPath('apt-get')) {
    throw new Stop(
      `${title} is missing and can only be installed by an administrator, on Debian with: ${byHand}`,
    );
  }
  await step(`Installing ${title} from Debian's packages`, async () => {
    // An installation cut short earlier leaves packages half set up; this finishes them and is quick otherwise.
    await run('dpkg', ['--configure', '-a'], { env: environment, cwd: '/', mayFail: true });
    // One unreachable source among several need not matter: the installation itself shows whether it did.
    await apt(['update'], { mayFail: true });
    await apt(['install', '--no-install-recommends', ...packages], {
      failure: `${title} could not be installed. Try it by hand with: ${byHand}\napt-get said:`,
    });
  });
}

/**
 * Debian's package would create and start a server of its own on the standard port. Rowrise makes its own cluster,
 * so that one is declined, unless an administrator has settled the question already.
 */
export async function withoutDefaultCluster(work) {
  const folder = '/etc/postgresql-common/createcluster.d';
  const note = `${folder}/rowrise.conf`;
  const settled = existsSync('/etc/postgresql-common/createcluster.conf');
  if (process.getuid?.() !== 0 || settled) return work();
  mkdirSync(folder, { recursive: true });
  writeFileSync(note, 'create_main_cluster = false\n');
  try {
    return await work();
  } finally {
    rmSync(note, { force: true });
  }
}
