// A process number alone says little: after a restart another program may wear it. Number and birth together do.
import { execFileSync } from 'node:child_process';
import { readFileSync } from 'node:fs';

/** When a process began, in the system's own words; undefined when there is no such process. */
export function bornAt(pid) {
  try {
    if (process.platform === 'linux') {
      const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
      const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
      // A zombie holds a number but does nothing any more.
      if (fields[0] === 'Z') return undefined;
      const boot = readFileSync('/proc/sys/kernel/random/boot_id', 'utf8').trim();
      return `${boot}/${fields[19]}`;
    }
    return execFileSync('ps', ['-o', 'lstart=', '-p', String(pid)], { encoding: 'utf8' }).trim() || undefined;
  } catch {
    return undefined;
  }
}
