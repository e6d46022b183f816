import 'server-only';
import { and, asc, eq, isNull } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { membership } from '@/db/schema/membership';
import { person } from '@/db/schema/person';

/** The people of an organisation by name, and nothing else of them: who may have stood at a row. */
export async function listMemberNames(tx: Transaction, params: { organisationId: string }) {
  return tx
    .select({ id: person.id, name: person.name })
    .from(membership)
    .innerJoin(person, eq(person.id, membership.personId))
    .where(and(eq(membership.organisationId, params.organisationId), isNull(membership.removedAt), isNull(person.disabledAt)))
    .orderBy(asc(person.name));
}
