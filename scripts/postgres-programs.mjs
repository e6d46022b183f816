// Finds PostgreSQL's programs, and the user they may run as.
import { execFileSync } from 'node:child_process';
import { existsSync, readdirSync, statSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { findOnPath } from './run.mjs';
import { Stop } from './say.mjs';
import { installSystemPackages, withoutDefaultCluster } from './system-packages.mjs';

// Row security on partitions, generated columns and the checksum option are all there from this version on.
const oldestMajor = 14;

function foldersWithPrograms() {
  const debian = '/usr/lib/postgresql';
  const folders = existsSync(debian)
    ? readdirSync(debian).map((version) => join(debian, version, 'bin'))
    : [];
  const onPath = findOnPath('postgres');
  if (onPath) folders.push(dirname(onPath));
  return folders.filter(
    (folder) => existsSync(join(folder, 'initdb')) && existsSync(join(folder, 'postgres')),
  );
}

function majorOf(folder) {
  const answer = execFileSync(join(folder, 'postgres'), ['--version'], { encoding: 'utf8', cwd: '/' });
  return Number(/(\d+)/.exec(answer)?.[1] ?? 0);
}

function found() {
  return foldersWithPrograms()
    .map((folder) => ({ folder, major: majorOf(folder) }))
    .filter(({ major }) => major >= oldestMajor)
    .sort((a, b) => b.major - a.major);
}

/** PostgreSQL's programs of the wanted major version, or of the newest one installed. */
export async function postgresPrograms(wantedMajor) {
  let programs = found();
  if (programs.length === 0) {
    await withoutDefaultCluster(() => installSystemPackages('PostgreSQL', ['postgresql']));
    programs = found();
  }
  if (programs.length === 0)
    throw new Stop(`PostgreSQL ${oldestMajor} or newer is needed and was not found.`);
  const fitting =
    wantedMajor === undefined ? programs[0] : programs.find(({ major }) => major === wantedMajor);
  return { ...(fitting ?? programs[0]), fits: fitting !== undefined };
}

/**
 * The user PostgreSQL's programs run as: it refuses root, so root hands them to the owner of the cluster or to the
 * user of Debian's package; everybody else runs them directly.
 */
export function postgresUser(dataFolder) {
  if (process.getuid?.() !== 0) return undefined;
  if (dataFolder && existsSync(dataFolder)) {
    const { uid, gid } = statSync(dataFolder);
    if (uid !== 0) return { uid, gid };
  }
  const idOf = (kind) => Number(execFileSync('id', [kind, 'postgres'], { encoding: 'utf8' }).trim());
  try {
    return { uid: idOf('-u'), gid: idOf('-g') };
  } catch {
    throw new Stop(
      'PostgreSQL refuses to run as root, and there is no user named postgres. Start as another user.',
    );
  }
}
