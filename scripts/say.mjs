// What the person at the terminal reads: short sentences, with the seconds a step took.

/** A sentence for the person at the terminal; whoever throws it has said everything that helps. */
export class Stop extends Error {}

// A terminal that was closed must not turn the clean-up into a crash.
process.stdout.on('error', () => {});
process.stderr.on('error', () => {});

export function secondsSince(startedAt) {
  const seconds = (performance.now() - startedAt) / 1000;
  return seconds < 10 ? seconds.toFixed(1) : seconds.toFixed(0);
}

export function say(sentence) {
  process.stdout.write(`${sentence}\n`);
}

/** Says what begins, does it, and says how long it took; two steps at once stay apart by their names. */
export async function step(sentence, work) {
  const startedAt = performance.now();
  say(`${sentence} …`);
  const result = await work();
  say(`  ${sentence}: done in ${secondsSince(startedAt)} s`);
  return result;
}
