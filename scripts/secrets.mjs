// The local cluster's passwords and the session secret: random, and readable by one user only.
import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync, renameSync, writeFileSync } from 'node:fs';

export function newSecrets() {
  const secret = () => randomBytes(24).toString('hex');
  return { superuser: secret(), migrator: secret(), app: secret(), eraser: secret(), session: secret() };
}

/** The secrets kept in this file, or undefined when there is none. */
export function readSecrets(path) {
  return existsSync(path) ? JSON.parse(readFileSync(path, 'utf8')) : undefined;
}

export function keepSecrets(path, secrets) {
  const draft = `${path}.${process.pid}`;
  writeFileSync(draft, `${JSON.stringify(secrets, null, 2)}\n`, { mode: 0o600 });
  renameSync(draft, path);
}
