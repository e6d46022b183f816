import 'server-only';
import { and, asc, eq, isNull } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { farmPerson } from '@/db/schema/farm-person';
import { membership } from '@/db/schema/membership';
import { organisation } from '@/db/schema/organisation';
import { person } from '@/db/schema/person';

/** A person's standing membership with the organisation's name, zone and demo day. */
export async function findMembership(tx: Transaction, params: { organisationId: string; personId: string }) {
  const rows = await tx
    .select({
      role: membership.role,
      version: membership.version,
      personName: person.name,
      organisationName: organisation.name,
      timeZone: organisation.timeZone,
      demoToday: organisation.demoToday,
    })
    .from(membership)
    .innerJoin(person, eq(person.id, membership.personId))
    .innerJoin(organisation, eq(organisation.id, membership.organisationId))
    .where(
      and(
        eq(membership.organisationId, params.organisationId),
        eq(membership.personId, params.personId),
        isNull(membership.removedAt),
        isNull(person.disabledAt),
      ),
    );
  return rows[0];
}

export async function listFarmIdsOfPerson(tx: Transaction, params: { organisationId: string; personId: string }) {
  const rows = await tx
    .select({ farmId: farmPerson.farmId })
    .from(farmPerson)
    .where(
      and(
        eq(farmPerson.organisationId, params.organisationId),
        eq(farmPerson.personId, params.personId),
        isNull(farmPerson.removedAt),
      ),
    );
  return rows.map((row) => row.farmId);
}

/** The organisations a person belongs to. Row security lets these through by the person named in the transaction. */
export async function listOrganisationsOfPerson(tx: Transaction, params: { personId: string }) {
  return tx
    .select({ organisationId: organisation.id, name: organisation.name, role: membership.role })
    .from(membership)
    .innerJoin(organisation, eq(organisation.id, membership.organisationId))
    .where(and(eq(membership.personId, params.personId), isNull(membership.removedAt)))
    .orderBy(asc(organisation.name));
}
