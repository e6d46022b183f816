// Where the local parts are kept.
import { createHash } from 'node:crypto';
import { accessSync, chmodSync, constants, mkdirSync, statSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { Stop } from './say.mjs';

export const checkout = dirname(dirname(fileURLToPath(import.meta.url)));
export const localFolder = join(checkout, '.rowrise');
export const lockPath = join(localFolder, 'start.lock');

/** The untracked folder of this checkout. */
export function makeLocalFolder() {
  try {
    mkdirSync(localFolder, { recursive: true });
    accessSync(localFolder, constants.W_OK | constants.X_OK);
    // The database's own user has to pass through this folder; what is secret in it has modes of its own.
    if (statSync(localFolder).uid === process.getuid()) chmodSync(localFolder, 0o755);
  } catch {
    throw new Stop(
      `The folder ${localFolder} cannot be written. Start as the user it belongs to, or use a clone of your own.`,
    );
  }
}

/** The folder of the cluster where the checkout is out of the database user's reach, as under root's home. */
export function stateFolder() {
  const key = createHash('sha256').update(checkout).digest('hex').slice(0, 12);
  return join('/var/lib', `rowrise-${key}`);
}

/** Whether another user may pass through every folder on the way. */
export function everyoneMayPass(folder) {
  for (let path = folder; ; path = dirname(path)) {
    if ((statSync(path).mode & 0o001) === 0) return false;
    if (path === dirname(path)) return true;
  }
}
