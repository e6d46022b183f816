// One start at a time in one checkout. The lock survives nothing: a holder that died, by whatever means, holds no longer.
import { linkSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { randomBytes } from 'node:crypto';
import { bornAt } from './process-identity.mjs';

function read(path) {
  try {
    return readFileSync(path, 'utf8');
  } catch {
    return undefined;
  }
}

function holderIn(text) {
  try {
    const holder = JSON.parse(text);
    return bornAt(holder.pid) === holder.born ? holder : undefined;
  } catch {
    return undefined;
  }
}

/** Who holds the lock at this moment, if anyone alive does. */
export function lockHolder(path) {
  const text = read(path);
  return text === undefined ? undefined : holderIn(text);
}

/**
 * Takes the lock, or answers with its holder. `note` replaces what others read about the holder;
 * `release` gives the lock back.
 */
export function takeLock(path, about = {}) {
  const mine = { pid: process.pid, born: bornAt(process.pid), ...about };
  const draft = `${path}.${process.pid}.${randomBytes(4).toString('hex')}`;
  writeFileSync(draft, JSON.stringify(mine));
  try {
    for (;;) {
      try {
        // A hard link appears with its whole content or not at all.
        linkSync(draft, path);
        break;
      } catch (error) {
        if (error.code !== 'EEXIST') throw error;
      }
      const seen = read(path);
      if (seen === undefined) continue;
      const holder = holderIn(seen);
      if (holder) return { holder };
      putAside(path, seen, `${draft}.stale`);
    }
  } finally {
    rmSync(draft, { force: true });
  }
  return {
    note(more) {
      writeFileSync(draft, JSON.stringify({ ...mine, ...more }));
      renameSync(draft, path);
    },
    release() {
      if (lockHolder(path)?.pid === process.pid) rmSync(path, { force: true });
    },
  };
}

/** Two starts may find the same dead lock; the slower one must not remove the lock the faster one has just taken. */
function putAside(path, seen, aside) {
  try {
    renameSync(path, aside);
    if (read(aside) !== seen) linkSync(aside, path);
  } catch {
    // Someone else was faster; the next round looks again.
  } finally {
    rmSync(aside, { force: true });
  }
}
