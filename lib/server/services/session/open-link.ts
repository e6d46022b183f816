import 'server-only';
import type { Transaction } from '@/db/connection';
import { inOrganisation, inTransaction } from '@/db/connection';
import { v7 } from 'uuid';
import { AppError, badField } from '@/lib/errors/app-error';
import type { OpenLinkInput } from '@/lib/schemas/session';
import { wallClock } from '../../clock';
import { joinOrganisation, setFarmsOfPerson } from '../../data/membership';
import { findOpenLink, claimLink, type OneTimeLinkRow } from '../../data/one-time-link';
import { insertOrganisation } from '../../data/organisation';
import { findPersonByEmail, insertPerson, updatePassword } from '../../data/person';
import { revokeSessionsOfPerson } from '../../data/session';
import { database } from '../../database';
import type { Caller } from '../../http/person-route';
import { hashOfSecret } from '../../secret';
import { hashPassword } from '../../session/password';
import { assertNotThrottled, noteFailure } from '../../session/throttle';
import { checkCredentials } from './check-credentials';
import { auditJoining } from './audit-joining';

/** Opens a one-time link: makes the first owner, lets an invited person in, or sets a new password. Returns whose session to start. */
export async function openLink(input: OpenLinkInput, caller: Caller): Promise<string> {
  const keys = [{ kind: 'address' as const, key: caller.socketAddress }];
  await assertNotThrottled(keys);
  const now = wallClock.now().toISOString();
  const link = await findOpenLink(database(), { secretHash: hashOfSecret(input.secret), now });
  if (!link) {
    await noteFailure(keys);
    throw new AppError('link-used');
  }
  const byPurpose = { 'first-owner': makeFirstOwner, invitation: letIn, 'password-reset': resetPassword };
  return byPurpose[link.purpose](link, input, caller, now);
}

async function takeLink(tx: Transaction, link: OneTimeLinkRow, now: string) {
  if (!(await claimLink(tx, { linkId: link.id, now }))) throw new AppError('link-used');
}

async function makeFirstOwner(link: OneTimeLinkRow, input: OpenLinkInput, _caller: Caller, now: string): Promise<string> {
  const { name, email, organisationName, timeZone } = input;
  if (!name) throw badField('name', 'Type your name.');
  if (!email) throw badField('email', 'Type your e-mail.');
  if (!organisationName) throw badField('organisationName', 'Name the account, such as the crop service or farm.');
  if (!timeZone) throw badField('timeZone', 'Give the time zone, such as America/Chicago.');
  const [personId, organisationId] = [v7(), v7()];
  const passwordHash = await hashPassword(input.password);
  await inOrganisation(database(), { organisationId, personId }, async (tx) => {
    await takeLink(tx, link, now);
    await insertPerson(tx, { id: personId, email, name, passwordHash });
    await insertOrganisation(tx, { id: organisationId, name: organisationName, timeZone });
    await joinOrganisation(tx, { organisationId, personId, role: 'owner' });
    await auditJoining(tx, { organisationId, personId, linkId: link.id, role: 'owner', now: wallClock.now() });
  });
  return personId;
}

/** A link never hands over an account that stands already: its owner proves who they are with their own password. */
async function letIn(link: OneTimeLinkRow, input: OpenLinkInput, caller: Caller, now: string): Promise<string> {
  const { organisationId, email, role, farmIds } = link;
  if (!organisationId || !email || !role) throw new AppError('link-used');
  const account = await findPersonByEmail(database(), { email });
  const name = input.name ?? link.name;
  if (!account && !name) throw badField('name', 'Type your name.');
  const personId = account ? await checkCredentials({ email, password: input.password }, caller) : v7();
  const passwordHash = account ? undefined : await hashPassword(input.password);
  await inOrganisation(database(), { organisationId, personId }, async (tx) => {
    await takeLink(tx, link, now);
    if (passwordHash !== undefined) await insertPerson(tx, { id: personId, email, name: name ?? email, passwordHash });
    await joinOrganisation(tx, { organisationId, personId, role });
    await setFarmsOfPerson(tx, { organisationId, personId, farmIds });
    await auditJoining(tx, { organisationId, personId, linkId: link.id, role, now: wallClock.now() });
  });
  return personId;
}

async function resetPassword(link: OneTimeLinkRow, input: OpenLinkInput, _caller: Caller, now: string): Promise<string> {
  const { personId } = link;
  if (!personId) throw new AppError('link-used');
  const passwordHash = await hashPassword(input.password);
  await inTransaction(database(), async (tx) => {
    await takeLink(tx, link, now);
    await updatePassword(tx, { personId, passwordHash });
    await revokeSessionsOfPerson(tx, { personId });
  });
  return personId;
}
