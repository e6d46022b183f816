// Starts other programs so that none of them outlives this one.
import { spawn } from 'node:child_process';
import { existsSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { onInterruption, throwIfInterrupted } from './interruption.mjs';
import { Stop } from './say.mjs';

export function findOnPath(name) {
  // A root shell may lack the system folders that hold administration tools.
  const folders = [...(process.env.PATH ?? '').split(delimiter), '/usr/sbin', '/sbin', '/usr/bin', '/bin'];
  return folders.map((folder) => join(folder || '.', name)).find((path) => existsSync(path));
}

const setpriv = process.platform === 'linux' ? findOnPath('setpriv') : undefined;

/**
 * Starts a program in a process group of its own: Ctrl-C reaches only this script, which then ends things in order.
 * Where the system can do it, the program is also told to end when this script is killed outright.
 */
export function start(command, args, { user, deathSignal = 'TERM', ...options } = {}) {
  const whole = setpriv ? [setpriv, '--pdeathsig', deathSignal, '--', command, ...args] : [command, ...args];
  return spawn(whole[0], whole.slice(1), { ...options, ...user, detached: true });
}

export function ended(child) {
  if (child.exitCode !== null || child.signalCode !== null) return Promise.resolve(child.exitCode ?? 1);
  return new Promise((resolve) => {
    child.once('error', () => resolve(127));
    child.once('exit', (code) => resolve(code ?? 1));
  });
}

function signalGroup(child, signal) {
  try {
    process.kill(-child.pid, signal);
  } catch {
    // The group is gone already, which is what was wanted.
  }
}

/** Asks the program and everything it started to end, and insists after the grace time. */
export async function end(child, { signal = 'SIGTERM', graceSeconds = 8 } = {}) {
  if (child.pid === undefined) return;
  if (child.exitCode === null && child.signalCode === null) {
    signalGroup(child, signal);
    const insist = setTimeout(() => signalGroup(child, 'SIGKILL'), graceSeconds * 1000);
    await ended(child);
    clearTimeout(insist);
  }
  signalGroup(child, 'SIGKILL');
}

/**
 * Runs a program to its end. Its output is kept and shown only when it fails, unless `show` is set.
 * With `mayFail` the exit code is handed back, otherwise a failure stops everything with `failure` as the sentence.
 */
export async function run(
  command,
  args,
  { show = false, mayFail = false, failure, input, interruptWith, ...options } = {},
) {
  throwIfInterrupted();
  const outputs = show ? ['inherit', 'inherit'] : ['pipe', 'pipe'];
  const child = start(command, args, {
    ...options,
    stdio: [input === undefined ? 'ignore' : 'pipe', ...outputs],
  });
  let output = '';
  let printed = '';
  child.stdout?.on('data', (text) => {
    output += text;
    printed += text;
  });
  child.stderr?.on('data', (text) => (output += text));
  if (input !== undefined) {
    child.stdin.on('error', () => {});
    child.stdin.end(input);
  }
  const forget = onInterruption(() => void end(child, { signal: interruptWith }));
  const closed = show
    ? ended(child)
    : new Promise((resolve) => child.once('close', () => resolve(ended(child))));
  const code = await Promise.race([
    closed,
    new Promise((resolve) => child.once('error', () => resolve(127))),
  ]);
  await end(child);
  forget();
  throwIfInterrupted();
  if (code !== 0 && !mayFail) {
    const lastLines = output.trimEnd().split('\n').slice(-25).join('\n');
    throw new Stop(`${failure ?? `${command} ended with code ${code}.`}${lastLines ? `\n${lastLines}` : ''}`);
  }
  return { code, output, printed };
}
