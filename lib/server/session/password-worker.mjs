// Runs bcrypt off the request thread: even its asynchronous form blocks the event loop for a fifth of a second.
import { createHash } from 'node:crypto';
import { parentPort } from 'node:worker_threads';
import bcrypt from 'bcryptjs';

const cost = 12;
// bcrypt reads no more than 72 bytes, so a long password is brought to a fixed length first; nothing of it is ignored.
const toFixedLength = (password) => createHash('sha512').update(password, 'utf8').digest('base64').slice(0, 71);

parentPort.on('message', async ({ id, password, hash }) => {
  const fixed = toFixedLength(password);
  const answer = hash === undefined ? await bcrypt.hash(fixed, cost) : await bcrypt.compare(fixed, hash);
  parentPort.postMessage({ id, answer });
});
