import 'server-only';
import { randomUUID } from 'node:crypto';
import { join } from 'node:path';
import { Worker } from 'node:worker_threads';

type Waiting = { resolve: (answer: string | boolean) => void; reject: (error: Error) => void };

const waiting = new Map<number, Waiting>();
let worker: Worker | undefined;
let nextId = 0;

function passwordWorker(): Worker {
  if (worker) return worker;
  const file = ['lib', 'server', 'session', 'password-worker.mjs'];
  const started = new Worker(join(/* turbopackIgnore: true */ process.cwd(), ...file));
  started.on('message', ({ id, answer }: { id: number; answer: string | boolean }) => {
    waiting.get(id)?.resolve(answer);
    waiting.delete(id);
  });
  started.on('error', (error) => {
    for (const each of waiting.values()) each.reject(error);
    waiting.clear();
    worker = undefined;
  });
  // A waiting worker alone must not keep a script alive.
  started.unref();
  worker = started;
  return started;
}

function ask(question: { password: string; hash?: string }): Promise<string | boolean> {
  const id = nextId++;
  return new Promise((resolve, reject) => {
    const current = passwordWorker();
    current.ref();
    const settle = () => {
      if (waiting.size === 0) current.unref();
    };
    waiting.set(id, {
      resolve: (answer) => { resolve(answer); queueMicrotask(settle); },
      reject: (error) => { reject(error); queueMicrotask(settle); },
    });
    current.postMessage({ id, ...question });
  });
}

/** Hashes a password for storage: fixed length first, then bcrypt at cost 12, off the request thread. */
export async function hashPassword(password: string): Promise<string> {
  return String(await ask({ password }));
}

/** Whether a password is the one behind a stored hash. */
export async function passwordMatches(password: string, hash: string): Promise<boolean> {
  return (await ask({ password, hash })) === true;
}

let nobody: Promise<string> | undefined;

/** A hash of a secret nobody has, compared against when no such account exists, so that both answers take as long. */
export function hashOfNobody(): Promise<string> {
  nobody ??= hashPassword(randomUUID());
  return nobody;
}
