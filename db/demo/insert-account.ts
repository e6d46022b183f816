import { inOrganisation, type Database } from '@/db/connection';
import { farmPerson } from '@/db/schema/farm-person';
import { membership } from '@/db/schema/membership';
import { organisation } from '@/db/schema/organisation';
import { person } from '@/db/schema/person';
import { hashPassword } from '@/lib/server/session/password';
import { demoId } from './demo-id';
import type { DemoOrganisation } from './demo-people';

export const organisationIdOf = (account: { key: string }) => demoId(account.key);
export const personIdOf = (account: { key: string }, personKey: string) => demoId(`${account.key}/${personKey}`);

/** Makes an organisation with its people. They are no operation, since an operation needs a member who sends it. */
export async function insertAccount(db: Database, account: DemoOrganisation): Promise<void> {
  const organisationId = organisationIdOf(account);
  const people = await Promise.all(
    account.people.map(async ({ key, name, email, password }) => ({ id: personIdOf(account, key), name, email, passwordHash: await hashPassword(password) })),
  );
  await inOrganisation(db, { organisationId }, async (tx) => {
    const { name, timeZone, demoToday } = account;
    await tx.insert(organisation).values({ id: organisationId, name, timeZone, demoToday });
    await tx.insert(person).values(people);
    await tx.insert(membership).values(account.people.map(({ key, role }) => ({ organisationId, personId: personIdOf(account, key), role })));
  });
}

/** Attaches scouts and growers to the farms they may see. */
export async function attachToFarms(db: Database, account: DemoOrganisation, farmsOf: Record<string, readonly string[]>): Promise<void> {
  const organisationId = organisationIdOf(account);
  const rows = Object.entries(farmsOf).flatMap(([key, farmIds]) => farmIds.map((farmId) => ({ organisationId, farmId, personId: personIdOf(account, key) })));
  await inOrganisation(db, { organisationId }, (tx) => tx.insert(farmPerson).values(rows));
}
