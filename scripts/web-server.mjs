// Runs the web server and says when it answers.
import { setTimeout as pause } from 'node:timers/promises';
import { beforeLeaving, throwIfInterrupted } from './interruption.mjs';
import { checkout } from './places.mjs';
import { end, ended, start } from './run.mjs';
import { Stop } from './say.mjs';
import { plainEnvironment } from './typescript.mjs';

const healthSecondsMost = 90;

async function isHealthy(address) {
  try {
    const answer = await fetch(`${address}/api/health`, {
      signal: AbortSignal.timeout(5000),
      redirect: 'manual',
    });
    return answer.ok;
  } catch {
    return false;
  }
}

/**
 * Starts `next start`, or `next dev`, and answers once it is healthy: its address, a promise of its end, and ways to stop
 * it and to kill it outright. A harness may start a program of its own in the place of next.
 */
export async function startWebServer({
  dev = false,
  host,
  port,
  env,
  stdio = ['ignore', 'inherit', 'inherit'],
  program = ['node_modules/next/dist/bin/next', dev ? 'dev' : 'start', '-H', host, '-p', String(port)],
}) {
  const child = start(process.execPath, program, {
    cwd: checkout,
    stdio,
    env: {
      ...plainEnvironment(),
      NODE_ENV: dev ? 'development' : 'production',
      ...env,
      PORT: String(port),
      HOST: host,
    },
  });
  child.on('error', () => {});
  const stop = () => end(child, { graceSeconds: 10 });
  beforeLeaving(stop);
  const reach = host === '0.0.0.0' || host === '::' ? '127.0.0.1' : host.includes(':') ? `[${host}]` : host;
  const address = `http://${reach}:${port}`;
  const deadline = Date.now() + healthSecondsMost * 1000;
  while (!(await isHealthy(address))) {
    throwIfInterrupted();
    if (child.exitCode !== null || child.signalCode !== null)
      throw new Stop('The web server ended while starting.');
    if (Date.now() > deadline)
      throw new Stop(`The web server did not answer at ${address}/api/health in ${healthSecondsMost} s.`);
    await pause(150);
  }
  return { address, over: ended(child), stop, kill: () => end(child, { signal: 'SIGKILL' }) };
}
