import 'server-only';
import { wallClock } from '../../clock';
import { findOpenLink } from '../../data/one-time-link';
import { findPersonByEmail } from '../../data/person';
import { database } from '../../database';
import { hashOfSecret } from '../../secret';

/** What the page of a one-time link has to ask; undefined for a link that is used, taken back, too old or none. Changes nothing. */
export async function readLink(secret: string) {
  const link = await findOpenLink(database(), { secretHash: hashOfSecret(secret), now: wallClock.now().toISOString() });
  if (!link) return undefined;
  const account = link.email ? await findPersonByEmail(database(), { email: link.email }) : undefined;
  return { purpose: link.purpose, name: link.name, email: link.email, hasAccount: account !== undefined };
}
