import { execFileSync } from 'node:child_process';
import { chownSync, mkdirSync, rmSync, statfsSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { beforeLeaving } from '../interruption.mjs';
import { postgresUser } from '../postgres-programs.mjs';

export type SmallDisk = { folder: string; fill: () => void; free: () => void };

/** A mount of a few megabytes for the database's user, or why there can be none here. It is taken away on leaving. */
export function smallDisk(parent: string, megabytes: number): SmallDisk | { reason: string } {
  const user = postgresUser();
  if (!user) return { reason: 'only root can mount a small disk' };
  const mount = join(parent, 'small-disk');
  mkdirSync(mount);
  try {
    execFileSync('mount', ['-t', 'tmpfs', '-o', `size=${megabytes}m,mode=755`, 'tmpfs', mount], { stdio: 'pipe' });
  } catch {
    return { reason: 'this system does not let a small disk be mounted' };
  }
  beforeLeaving(() => void execFileSync('umount', ['--lazy', mount], { stdio: 'pipe' }));
  const folder = join(mount, 'tablespace');
  mkdirSync(folder);
  chownSync(folder, user.uid, user.gid);
  const ballast = join(mount, 'ballast');
  return {
    folder,
    fill: () => {
      const { bavail, bsize } = statfsSync(mount);
      writeFileSync(ballast, Buffer.alloc(Number(bavail) * Number(bsize)));
    },
    free: () => rmSync(ballast, { force: true }),
  };
}
