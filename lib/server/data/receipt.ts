import 'server-only';
import { and, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { receipt } from '@/db/schema/receipt';
import type { Answer, OperationEnvelope } from '@/lib/schemas/operation';

/**
 * Claims an operation: inserts its receipt, or waits for a twin under way and says that it stands already. The primary
 * key decides, never a look beforehand.
 */
export async function claimReceipt(tx: Transaction, params: { operation: OperationEnvelope; contentHash: string }) {
  const { operation } = params;
  const claimed = await tx
    .insert(receipt)
    .values({
      organisationId: operation.organisationId,
      operationId: operation.operationId,
      personId: operation.personId,
      deviceId: operation.deviceId,
      deviceSequence: operation.deviceSequence,
      kind: operation.kind,
      thingId: operation.thingId,
      contentHash: params.contentHash,
    })
    .onConflictDoNothing()
    .returning({ operationId: receipt.operationId });
  return claimed.length === 1;
}

export async function findReceipt(tx: Transaction, params: { organisationId: string; operationId: string }) {
  const rows = await tx
    .select({ contentHash: receipt.contentHash, personId: receipt.personId, thingId: receipt.thingId, answer: receipt.answer })
    .from(receipt)
    .where(and(eq(receipt.organisationId, params.organisationId), eq(receipt.operationId, params.operationId)));
  const row = rows[0];
  return row && { ...row, answer: row.answer as Answer | null };
}

export async function answerReceipt(tx: Transaction, params: { organisationId: string; operationId: string; answer: Answer }) {
  await tx
    .update(receipt)
    .set({ answer: params.answer })
    .where(and(eq(receipt.organisationId, params.organisationId), eq(receipt.operationId, params.operationId)));
}
