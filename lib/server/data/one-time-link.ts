import 'server-only';
import { and, desc, eq, gt, isNull, sql } from 'drizzle-orm';
import type { Database, Transaction } from '@/db/connection';
import { oneTimeLink } from '@/db/schema/one-time-link';

const columns = {
  id: oneTimeLink.id,
  purpose: oneTimeLink.purpose,
  organisationId: oneTimeLink.organisationId,
  personId: oneTimeLink.personId,
  email: oneTimeLink.email,
  name: oneTimeLink.name,
  role: oneTimeLink.role,
  farmIds: oneTimeLink.farmIds,
  createdBy: oneTimeLink.createdBy,
  createdAt: oneTimeLink.createdAt,
  expiresAt: oneTimeLink.expiresAt,
};

export type OneTimeLinkRow = NonNullable<Awaited<ReturnType<typeof findOpenLink>>>;

const open = (now: string) => and(isNull(oneTimeLink.usedAt), isNull(oneTimeLink.revokedAt), gt(oneTimeLink.expiresAt, now));

/** A link that can still be opened: neither used, taken back nor too old. */
export async function findOpenLink(db: Database | Transaction, params: { secretHash: string; now: string }) {
  const rows = await db.select(columns).from(oneTimeLink).where(and(eq(oneTimeLink.secretHash, params.secretHash), open(params.now)));
  return rows[0];
}

/** Uses a link up. The first of several that open it at once wins; the others are told that it did not. */
export async function claimLink(tx: Transaction, params: { linkId: string; now: string }) {
  const used = await tx
    .update(oneTimeLink)
    .set({ usedAt: params.now })
    .where(and(eq(oneTimeLink.id, params.linkId), open(params.now)))
    .returning({ id: oneTimeLink.id });
  return used.length === 1;
}

export async function insertLink(db: Database | Transaction, values: typeof oneTimeLink.$inferInsert) {
  await db.insert(oneTimeLink).values(values);
}

export async function listOpenLinks(tx: Transaction, params: { organisationId: string; now: string }) {
  return tx
    .select(columns)
    .from(oneTimeLink)
    .where(and(eq(oneTimeLink.organisationId, params.organisationId), open(params.now)))
    .orderBy(desc(oneTimeLink.createdAt));
}

export async function revokeLink(tx: Transaction, params: { organisationId: string; linkId: string }) {
  const revoked = await tx
    .update(oneTimeLink)
    .set({ revokedAt: sql`now()` })
    .where(and(eq(oneTimeLink.organisationId, params.organisationId), eq(oneTimeLink.id, params.linkId), isNull(oneTimeLink.usedAt), isNull(oneTimeLink.revokedAt)))
    .returning({ id: oneTimeLink.id });
  return revoked.length === 1;
}
