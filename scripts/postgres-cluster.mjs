// A PostgreSQL cluster of our own: made once, started on loopback, ended with the script.
import {
  chownSync,
  existsSync,
  mkdtempSync,
  readFileSync,
  readdirSync,
  renameSync,
  rmSync,
  writeFileSync,
} from 'node:fs';
import { basename, dirname, join } from 'node:path';
import { bornAt } from './process-identity.mjs';
import { postgresUser } from './postgres-programs.mjs';
import { run } from './run.mjs';
import { Stop } from './say.mjs';

// PostgreSQL's programs look at the folder they are started in; root's is closed to them.
export const postgresEnvironment = { PATH: process.env.PATH, LC_ALL: 'C.UTF-8', HOME: '/', TZ: 'UTC' };

export function majorOnDisk(dataFolder) {
  const version = join(dataFolder, 'PG_VERSION');
  return existsSync(version) ? Number.parseInt(readFileSync(version, 'utf8'), 10) : undefined;
}

/** Makes the cluster under a passing name first, so that one cut short is never taken for a whole one. */
export async function makeCluster({ programs, dataFolder, password, lasting = true }) {
  const user = postgresUser();
  const parent = dirname(dataFolder);
  const prefix = `${basename(dataFolder)}.making-`;
  for (const name of readdirSync(parent).filter((it) => it.startsWith(prefix))) {
    rmSync(join(parent, name), { recursive: true, force: true });
  }
  const making = mkdtempSync(join(parent, prefix));
  try {
    const passwordFile = join(making, 'password');
    const made = join(making, 'data');
    writeFileSync(passwordFile, password, { mode: 0o600 });
    if (user) for (const path of [making, passwordFile]) chownSync(path, user.uid, user.gid);
    await run(
      join(programs.folder, 'initdb'),
      [
        ...['-D', made, '-U', 'postgres', '--auth=scram-sha-256', `--pwfile=${passwordFile}`],
        ...['--encoding=UTF8', '--locale=C.UTF-8', lasting ? '--data-checksums' : '--no-sync'],
      ],
      { user, cwd: '/', env: postgresEnvironment, failure: 'The database could not be made. initdb said:' },
    );
    renameSync(made, dataFolder);
  } finally {
    rmSync(making, { recursive: true, force: true });
  }
}

/** Refuses a cluster that the programs at hand cannot open; nothing on disk is touched. */
export function refuseOtherMajor(programs, dataFolder) {
  const onDisk = majorOnDisk(dataFolder);
  if (onDisk === undefined) {
    throw new Stop(
      `The folder ${dataFolder} holds no PostgreSQL cluster. Move it away, and start again to make a new one.`,
    );
  }
  if (onDisk !== programs.major) {
    throw new Stop(
      `The database in ${dataFolder} was made by PostgreSQL ${onDisk}, and PostgreSQL ${programs.major} is installed. ` +
        `Nothing was changed. Install PostgreSQL ${onDisk} beside it, or move that folder away to begin with a new database.`,
    );
  }
}

/**
 * The postmaster that has this cluster open, if there is one. A note left by a killed postmaster whose number another
 * program wears by now is removed: PostgreSQL itself would refuse to start because of it.
 */
export function runningPostmaster(dataFolder) {
  const note = join(dataFolder, 'postmaster.pid');
  if (!existsSync(note)) return undefined;
  const [pid, , , port] = readFileSync(note, 'utf8').split('\n');
  const alive = bornAt(Number(pid)) !== undefined;
  if (alive && isPostgres(pid, dataFolder)) return { pid: Number(pid), port: Number(port) };
  if (alive) rmSync(note, { force: true });
  return undefined;
}

function isPostgres(pid, dataFolder) {
  try {
    const commandLine = readFileSync(`/proc/${pid}/cmdline`, 'utf8').split('\0');
    return /postgres/.test(commandLine[0]) && commandLine.includes(dataFolder);
  } catch {
    // Without /proc there is no telling; PostgreSQL's own check then decides.
    return true;
  }
}
