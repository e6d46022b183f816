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
    process.on(signal, () => {
      // A second press changes nothing: the first one is being carried out, and cutting it short leaves servers behind.
      if (interrupted) return;
      interrupted = new Interrupted(signal);
      for (const tell of [...waiting]) tell(interrupted);
    });
  }
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
