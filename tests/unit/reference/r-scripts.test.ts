import { spawnSync } from 'node:child_process';
import { readdirSync, readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';

const folder = new URL('../../reference/', import.meta.url);
const scripts = readdirSync(new URL('r/', folder)).filter((name) => name.endsWith('.R'));

/** What a script prints is JSON; numbers may differ in the last of the digits it prints where R was built otherwise. */
function closeTo(printed: unknown, committed: unknown, place: string): void {
  if (typeof printed === 'number' && typeof committed === 'number') {
    expect(Math.abs(printed - committed), place).toBeLessThanOrEqual(1e-8 * Math.max(1, Math.abs(committed)));
  } else if (
    typeof printed === 'object' &&
    printed !== null &&
    typeof committed === 'object' &&
    committed !== null
  ) {
    expect(Object.keys(printed), place).toEqual(Object.keys(committed));
    for (const [key, each] of Object.entries(printed)) {
      closeTo(each, (committed as Record<string, unknown>)[key], `${place}.${key}`);
    }
  } else expect(printed, place).toBe(committed);
}

describe('committed reference values', () => {
  it.each(scripts)(
    'are what R prints now, where R and the packages of the script are there: %s',
    (script) => {
      const run = spawnSync('Rscript', [fileURLToPath(new URL(`r/${script}`, folder))], { encoding: 'utf8' });
      if (run.error || /there is no package called/.test(run.stderr)) {
        console.info(
          `${script} is not run again: ${run.error ? 'R' : 'a package of it'} is not on this machine.`,
        );
        return;
      }
      expect(run.stderr).toBe('');
      const committed = readFileSync(new URL(script.replace(/\.R$/, '.json'), folder), 'utf8');
      closeTo(JSON.parse(run.stdout), JSON.parse(committed), script);
    },
  );
});
