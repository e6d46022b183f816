import { inOrganisation, type Database } from '@/db/connection';
import { operationSchema, type Answer, type OperationEnvelope } from '@/lib/schemas/operation';
import { insertAuditEvent } from '@/lib/server/data/audit-event';
import { answerReceipt, claimReceipt, findReceipt } from '@/lib/server/data/receipt';
import { withActor } from '@/lib/server/operations/actor-context';
import { contentHash } from '@/lib/server/operations/content-hash';
import type { ReadContext } from '@/lib/server/operations/context';
import { handlerOf } from './scene';

/**
 * Two ways of taking an operation that are wrong, over the product's own services. They serve the harness alone: a run
 * against one of them has to go red, or its green counts for nothing.
 */
export type BrokenApply = (db: Database, sent: unknown) => Promise<Answer>;

const refused = (operation: OperationEnvelope, code: string): Answer => ({ operationId: operation.operationId, outcome: 'refused', code });
const answered = (operation: OperationEnvelope, outcome: 'applied' | 'duplicate'): Answer => ({ operationId: operation.operationId, outcome, thingId: operation.thingId });

async function change(context: ReadContext, operation: OperationEnvelope) {
  const handler = handlerOf(operation.kind, operation.version);
  if (!handler) throw new Error(`There is no ${operation.kind}.`);
  await handler.run({ ...context, operation, originKind: 'phone' }, handler.body.parse(operation.body));
  await insertAuditEvent(context.tx, { operation });
}

const senderOf = (operation: OperationEnvelope) => ({ organisationId: operation.organisationId, personId: operation.personId, now: () => new Date() });

/** Commits the receipt with its answer, and then makes the change in a second transaction. */
export const receiptBeforeChange: BrokenApply = async (db, sent) => {
  const operation = operationSchema.parse(sent);
  try {
    const claimed = await inOrganisation(db, operation, async (tx) => {
      const first = await claimReceipt(tx, { operation, contentHash: contentHash(operation) });
      if (first) await answerReceipt(tx, { organisationId: operation.organisationId, operationId: operation.operationId, answer: answered(operation, 'applied') });
      return first;
    });
    if (!claimed) return answered(operation, 'duplicate');
    await withActor(db, senderOf(operation), (context) => change(context, operation));
    return answered(operation, 'applied');
  } catch {
    return refused(operation, 'busy');
  }
};

/** Looks whether the receipt stands, and makes change and receipt when it does not: twins both look before either has written. */
export const checkThenInsert: BrokenApply = async (db, sent) => {
  const operation = operationSchema.parse(sent);
  try {
    return await withActor(db, senderOf(operation), async (context) => {
      if (await findReceipt(context.tx, operation)) return answered(operation, 'duplicate');
      await change(context, operation);
      await claimReceipt(context.tx, { operation, contentHash: contentHash(operation) });
      await answerReceipt(context.tx, { organisationId: operation.organisationId, operationId: operation.operationId, answer: answered(operation, 'applied') });
      return answered(operation, 'applied');
    });
  } catch {
    return refused(operation, 'busy');
  }
};
