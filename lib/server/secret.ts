import 'server-only';
import { createHash, createHmac, randomBytes } from 'node:crypto';
import { environment } from './environment';

/** A new secret nobody can guess: 256 random bits as text that fits an address. */
export const newSecret = () => randomBytes(32).toString('base64url');

/** What stands in the database instead of a secret. */
export const hashOfSecret = (secret: string) => createHash('sha256').update(secret).digest('hex');

/**
 * The secret of a one-time link made by an operation, the same for the same operation: a resent request gets the same
 * link, and the link itself is stored nowhere.
 */
export const linkSecretOf = (operationId: string) =>
  createHmac('sha256', environment().SESSION_SECRET).update(`one-time-link:${operationId}`).digest('base64url');
