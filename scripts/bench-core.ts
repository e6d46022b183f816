// npm run bench:core [part …]: how fast the agronomy core is, each part in its own right, medians with their spread.
import { existsSync } from 'node:fs';
import { spawnSync } from 'node:child_process';

/** A part is a file here that prints its own lines; what several of them need stands beside and prints nothing. */
const folder = new URL('./bench/', import.meta.url);
const parts = ['descriptive', 'fits', 'comparison'].filter((part) =>
  existsSync(new URL(`${part}.ts`, folder)),
);
const wanted = process.argv.slice(2);
const unknown = wanted.filter((part) => !parts.includes(part));
if (unknown.length > 0) {
  console.error(`There is no part ${unknown.join(', ')}. The parts are ${parts.join(', ')}.`);
  process.exit(1);
}
// A process each, so that what one part leaves in memory does not slow the next.
for (const part of wanted.length > 0 ? wanted : parts) {
  const { status } = spawnSync(
    process.execPath,
    ['--expose-gc', '--import', 'tsx', new URL(`${part}.ts`, folder).pathname],
    { stdio: 'inherit' },
  );
  if (status !== 0) process.exit(status ?? 1);
}
