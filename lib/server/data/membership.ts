import 'server-only';
import { and, asc, eq, isNull, sql } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { farmPerson } from '@/db/schema/farm-person';
import { membership } from '@/db/schema/membership';
import { organisation } from '@/db/schema/organisation';
import { person } from '@/db/schema/person';
import type { Role } from '@/lib/schemas/vocabulary';

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

/** The people of an organisation, those who were removed left out. */
export async function listMembers(tx: Transaction, params: { organisationId: string }) {
  return tx
    .select({
      personId: membership.personId,
      name: person.name,
      email: person.email,
      role: membership.role,
      version: membership.version,
    })
    .from(membership)
    .innerJoin(person, eq(person.id, membership.personId))
    .where(and(eq(membership.organisationId, params.organisationId), isNull(membership.removedAt)))
    .orderBy(asc(person.name));
}

export async function listFarmsOfPeople(tx: Transaction, params: { organisationId: string }) {
  return tx
    .select({ personId: farmPerson.personId, farmId: farmPerson.farmId })
    .from(farmPerson)
    .where(and(eq(farmPerson.organisationId, params.organisationId), isNull(farmPerson.removedAt)));
}

/** Makes somebody a member, or again a member where they were removed. */
export async function joinOrganisation(tx: Transaction, params: { organisationId: string; personId: string; role: Role }) {
  await tx
    .insert(membership)
    .values(params)
    .onConflictDoUpdate({
      target: [membership.organisationId, membership.personId],
      set: { role: params.role, removedAt: null, version: sql`${membership.version} + 1` },
    });
}

/** Changes a membership that still stands at the version the edit was made on; says whether it did. */
export async function updateMembership(
  tx: Transaction,
  params: { organisationId: string; personId: string; version: number; values: { role?: Role; removed?: true } },
) {
  const changed = await tx
    .update(membership)
    .set({
      ...(params.values.role ? { role: params.values.role } : {}),
      ...(params.values.removed ? { removedAt: sql`now()` } : {}),
      version: params.version + 1,
    })
    .where(
      and(
        eq(membership.organisationId, params.organisationId),
        eq(membership.personId, params.personId),
        eq(membership.version, params.version),
        isNull(membership.removedAt),
      ),
    )
    .returning({ personId: membership.personId });
  return changed.length === 1;
}

/** Holds the organisation's owners still until the transaction ends, so that the last two cannot leave at once. */
export async function lockOwners(tx: Transaction, params: { organisationId: string }) {
  return tx
    .select({ personId: membership.personId })
    .from(membership)
    .where(and(eq(membership.organisationId, params.organisationId), eq(membership.role, 'owner'), isNull(membership.removedAt)))
    .for('update');
}

/** Attaches a person to exactly these farms. */
export async function setFarmsOfPerson(tx: Transaction, params: { organisationId: string; personId: string; farmIds: readonly string[] }) {
  const { organisationId, personId, farmIds } = params;
  await tx
    .update(farmPerson)
    .set({ removedAt: sql`now()` })
    .where(and(eq(farmPerson.organisationId, organisationId), eq(farmPerson.personId, personId), isNull(farmPerson.removedAt)));
  if (farmIds.length === 0) return;
  await tx
    .insert(farmPerson)
    .values(farmIds.map((farmId) => ({ organisationId, farmId, personId })))
    .onConflictDoUpdate({ target: [farmPerson.organisationId, farmPerson.farmId, farmPerson.personId], set: { removedAt: null } });
}

/** How many organisations have ever had this person, standing memberships only. A function of the database answers over all tenants. */
export async function countOrganisationsOfPerson(tx: Transaction, params: { personId: string }): Promise<number> {
  const found = await tx.execute<{ organisations: number }>(sql`select organisations_of_person(${params.personId}) as organisations`);
  return found.rows[0]?.organisations ?? 0;
}
