import 'server-only';
import type { Database, Transaction } from '@/db/connection';
import { can } from '@/lib/access/can';
import { AppError } from '@/lib/errors/app-error';
import { appErrorFromDatabase } from '@/lib/errors/database-error';
import { fieldProblems } from '@/lib/errors/field-problems';
import { operationSchema, type Answer, type OperationEnvelope } from '@/lib/schemas/operation';
import type { OriginKind } from '@/lib/schemas/vocabulary';
import { insertAuditEvent } from '../data/audit-event';
import { insertLosingEdit } from '../data/losing-edit';
import { answerReceipt, claimReceipt, findReceipt } from '../data/receipt';
import { log } from '../log';
import { withActor } from './actor-context';
import { contentHash } from './content-hash';
import type { ReadContext } from './context';
import type { OperationHandler } from './define-operation';

export type Sender = {
  /** The author, as whom everything is done. */
  personId: string;
  now: () => Date;
  originKind: OriginKind;
  /** Who brought it in at the office out of a file that the author's phone saved; left out where the phone sent it. */
  readInBy?: string;
};
export type HandlerOf = (kind: string, version: number) => OperationHandler | undefined;

type Asked = { organisationId: string; sender: Sender; handlerOf: HandlerOf };

/**
 * Carries out one operation: claim its receipt, change, audit and answer in one transaction. Sent again, it gets the
 * answer it got; on an older version it is kept as a losing edit; refused, it leaves no trace and may be sent again.
 * Never throws for what the sender can mend: the answer says it.
 */
export async function applyOperation(db: Database, asked: Asked, sent: unknown): Promise<Answer> {
  const parsed = operationSchema.safeParse(sent);
  if (!parsed.success) {
    return refusal(operationIdIn(sent), new AppError('bad-input', { fields: fieldProblems(parsed.error) }));
  }
  const operation = parsed.data;
  try {
    return await carryOut(db, asked, operation);
  } catch (thrown) {
    const error = thrown instanceof AppError ? thrown : appErrorFromDatabase(thrown);
    if (!error) {
      log.error({ kind: operation.kind, operationId: operation.operationId, error: thrown instanceof Error ? thrown.name : 'unknown', stack: thrown instanceof Error ? thrown.stack?.split('\n').slice(1, 6) : undefined }, 'operation failed');
      return refusal(operation.operationId, new AppError('unexpected'));
    }
    if (error.code === 'conflict') await keepLosingEdit(db, asked, operation, error.standingVersion ?? 0);
    return refusal(operation.operationId, error);
  }
}

/** The id under which whatever was sent is answered, sound or not. */
export const operationIdIn = (sent: unknown) =>
  sent !== null && typeof sent === 'object' && 'operationId' in sent ? String(sent.operationId).slice(0, 60) : '';

function carryOut(db: Database, asked: Asked, operation: OperationEnvelope): Promise<Answer> {
  if (operation.organisationId !== asked.organisationId) throw new AppError('not-found');
  if (operation.personId !== asked.sender.personId) throw new AppError('not-author');
  const handler = asked.handlerOf(operation.kind, operation.version);
  if (!handler) throw new AppError('unknown-kind');
  return withActor(db, { ...asked.sender, organisationId: asked.organisationId }, async (context) => {
    const hash = contentHash(operation);
    if (!(await claimReceipt(context.tx, { operation, contentHash: hash }))) {
      return repeated(context.tx, handler, operation, hash);
    }
    if (!can(context.actor, handler.action)) throw new AppError('forbidden');
    const body = handler.body.safeParse(operation.body);
    if (!body.success) throw new AppError('bad-input', { fields: fieldProblems(body.error) });
    const written = await handler.run(
      { ...context, operation: await onItsBase(context, operation), originKind: asked.sender.originKind },
      body.data,
    );
    await insertAuditEvent(context.tx, { operation, readInBy: asked.sender.readInBy ?? null });
    const answer: Answer = { operationId: operation.operationId, outcome: 'applied', thingId: operation.thingId, ...written };
    await answerReceipt(context.tx, { organisationId: asked.organisationId, operationId: operation.operationId, answer });
    return revealed(handler, operation, answer);
  });
}

/** An edit that follows an unsent one is made on whatever version that one became. */
async function onItsBase({ tx }: ReadContext, operation: OperationEnvelope): Promise<OperationEnvelope> {
  if (!operation.follows) return operation;
  const followed = await findReceipt(tx, { organisationId: operation.organisationId, operationId: operation.follows });
  if (!followed?.answer || followed.personId !== operation.personId) throw new AppError('follows-unknown');
  return { ...operation, baseVersion: followed.answer.version ?? operation.baseVersion };
}

async function repeated(tx: Transaction, handler: OperationHandler, operation: OperationEnvelope, hash: string): Promise<Answer> {
  const standing = await findReceipt(tx, operation);
  if (!standing?.answer || standing.contentHash !== hash) throw new AppError('operation-reused');
  return revealed(handler, operation, { ...standing.answer, outcome: 'duplicate' });
}

function revealed(handler: OperationHandler, operation: OperationEnvelope, answer: Answer): Answer {
  return handler.reveal ? { ...answer, result: { ...answer.result, ...handler.reveal(operation) } } : answer;
}

async function keepLosingEdit(db: Database, asked: Asked, operation: OperationEnvelope, standingVersion: number) {
  await withActor(db, { ...asked.sender, organisationId: asked.organisationId }, ({ tx }) =>
    insertLosingEdit(tx, { operation, standingVersion }),
  );
}

function refusal(operationId: string, error: AppError): Answer {
  return {
    operationId,
    outcome: error.code === 'conflict' ? 'conflict' : 'refused',
    code: error.code,
    sentence: error.message,
    fields: error.fields,
    questions: error.questions,
    ...(error.standingVersion === undefined ? {} : { standingVersion: error.standingVersion }),
    ...(error.standing === undefined ? {} : { standing: error.standing }),
  };
}
