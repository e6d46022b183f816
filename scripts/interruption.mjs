// Ctrl-C, a closed terminal and SIGTERM all mean the same thing here: end what was begun, then leave.

export class Interrupted extends Error {
  constructor(signal) {
    super(`Stopped by ${signal}.`);
    this.signal = signal;
    this.exitCode = { SIGINT: 130, SIGTERM: 143, SIGHUP: 129 }[signal];
  }
}

const waiting = new Set();
const cleanups = [];
let interrupted = null;

export function listenForSignals() {
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
    process.on(signal, () => giveUp(new Interrupted(signal)));
  }
}

/** Ends whatever is under way. A second reason, or a second press, changes nothing: cutting the end short leaves servers behind. */
function giveUp(reason) {
  if (interrupted) return;
  interrupted = reason;
  for (const tell of [...waiting]) tell(interrupted);
}

/** Does several things at once; when one fails the others are ended before the failure is passed on. */
export async function together(...works) {
  const guarded = works.map((work) =>
    work.catch((error) => {
      giveUp(error);
      throw error;
    }),
  );
  const results = await Promise.allSettled(guarded);
  if (results.some(({ status }) => status === 'rejected')) throw interrupted;
  return results.map(({ value }) => value);
}

export function throwIfInterrupted() {
  if (interrupted) throw interrupted;
}

/** Calls `tell` once when the person interrupts; the answer takes the wish back. */
export function onInterruption(tell) {
  waiting.add(tell);
  if (interrupted) tell(interrupted);
  return () => waiting.delete(tell);
}

/** Registers what must be undone before leaving; the last one registered is undone first. */
export function beforeLeaving(cleanup) {
  cleanups.push(cleanup);
}

export async function leave() {
  while (cleanups.length > 0) {
    try {
      await cleanups.pop()();
    } catch (error) {
      process.stderr.write(`${error.message}\n`);
    }
  }
}
