import 'server-only';
import { z } from 'zod';
import { AppError } from '@/lib/errors/app-error';
import { errorCatalogue, type ErrorCode } from '@/lib/errors/error-catalogue';
import { problemOf } from '@/lib/errors/problem';
import { batchSchema, type Answer } from '@/lib/schemas/operation';
import { inOrganisation } from '@/db/connection';
import { wallClock } from '../clock';
import { database } from '../database';
import { can } from '@/lib/access/can';
import { withActor } from '../operations/actor-context';
import { findMembership } from '../data/membership';
import { applyOperation, operationIdIn, type HandlerOf, type Sender } from '../operations/apply-operation';
import type { OperationHandler } from '../operations/define-operation';
import { currentPerson } from '../session/current-person';
import { parse, parseIds } from './parse';
import { readJson } from './read-json';
import { answering, respond } from './respond';
import { assertSameOrigin } from './same-origin';

type Context = { params: Promise<Record<string, string | string[] | undefined>> };

const organisationSchema = z.object({ org: z.uuid() });

export const handlerAmong = (handlers: readonly OperationHandler[]): HandlerOf => (kind, version) =>
  handlers.find((handler) => handler.kind === kind && handler.version === version);

async function senderOf(request: Request, context: Context): Promise<{ organisationId: string; sender: Sender }> {
  assertSameOrigin(request);
  const person = await currentPerson();
  if (!person) throw new AppError('not-signed-in');
  const { org } = parseIds(organisationSchema, await context.params);
  return { organisationId: org, sender: { personId: person.personId, now: wallClock.now, originKind: 'form' } };
}

/** A noun's writing route: one envelope of one of the noun's kinds, answered as one answer or one problem document. */
export function operationRoute(handlers: readonly OperationHandler[]) {
  return (request: Request, context: Context) =>
    answering(async () => {
      const { organisationId, sender } = await senderOf(request, context);
      const sent = await readJson(request);
      const answer = await applyOperation(database(), { organisationId, sender, handlerOf: handlerAmong(handlers) }, sent);
      return answer.code ? respondRefusal(answer, answer.code as ErrorCode) : respond(answer);
    });
}

/** The batch route: every kind, up to 500 at once, in the order of each device's own sequence; each is answered for itself. */
export function batchRoute(handlerOf: HandlerOf) {
  return (request: Request, context: Context) =>
    answering(async () => {
      const { organisationId, sender } = await senderOf(request, context);
      await assertMember(organisationId, sender.personId);
      const { operations, from } = parse(batchSchema, await readJson(request));
      const asSent: Sender = from === 'field' ? { ...sender, originKind: 'phone' } : sender;
      const apply = (sent: unknown) => applyOperation(database(), { organisationId, sender: asSent, handlerOf }, sent);
      return respond({ answers: await answersTo(inDeviceOrder(operations), apply) });
    });
}

/**
 * A file that a phone saved, read in at the office: each entry is carried out as its author's, with who brought it in
 * beside it in the audit. Only what is recorded in the field may come this way: nobody signs for somebody else.
 */
export function keptFileRoute(handlerOf: HandlerOf) {
  const fieldHandlerOf: HandlerOf = (kind, version) => {
    const handler = handlerOf(kind, version);
    return handler?.action === 'observations.write' ? handler : undefined;
  };
  return (request: Request, context: Context) =>
    answering(async () => {
      const { organisationId, sender } = await senderOf(request, context);
      await withActor(database(), { organisationId, ...sender }, async ({ actor }) => {
        if (!can(actor, 'kept-files.read-in')) throw new AppError('forbidden');
      });
      const { operations } = parse(batchSchema, await readJson(request));
      const apply = (sent: unknown) => {
        const author = authorIn(sent);
        const asAuthor: Sender = { ...sender, personId: author ?? sender.personId, originKind: 'phone', readInBy: sender.personId };
        return applyOperation(database(), { organisationId, sender: asAuthor, handlerOf: fieldHandlerOf }, sent);
      };
      return respond({ answers: await answersTo(inDeviceOrder(operations), apply) });
    });
}

const authorIn = (sent: unknown): string | undefined => {
  const author = sent !== null && typeof sent === 'object' && 'personId' in sent ? z.uuid().safeParse(sent.personId) : undefined;
  return author?.success ? author.data : undefined;
};

/**
 * Carries a batch out one by one. After two in a row that the database did not answer, the rest is told so without waiting
 * anew: forty waits outlast every phone, and one entry alone must not hold up those behind it. Where nothing at all was
 * carried out, the whole request is told to come again.
 */
async function answersTo(operations: readonly unknown[], apply: (sent: unknown) => Promise<Answer>): Promise<Answer[]> {
  const answers: Answer[] = [];
  let busyInARow = 0;
  for (const sent of operations) {
    const last = answers.at(-1);
    const answer: Answer = last && busyInARow >= 2 ? { ...last, operationId: operationIdIn(sent) } : await apply(sent);
    busyInARow = answer.code === 'busy' ? busyInARow + 1 : 0;
    answers.push(answer);
  }
  if (answers.every(({ code }) => code === 'busy')) throw new AppError('busy');
  return answers;
}

/** A stranger to the organisation learns nothing from a batch, not even how its entries would have been answered. */
function assertMember(organisationId: string, personId: string) {
  return inOrganisation(database(), { organisationId, personId }, async (tx) => {
    if (!(await findMembership(tx, { organisationId, personId }))) throw new AppError('not-found');
  });
}

function inDeviceOrder(operations: readonly unknown[]): unknown[] {
  const sequenceOf = (sent: unknown) => {
    const sequence = sent !== null && typeof sent === 'object' && 'deviceSequence' in sent ? Number(sent.deviceSequence) : Number.NaN;
    return Number.isFinite(sequence) ? sequence : Number.MAX_SAFE_INTEGER;
  };
  return [...operations].sort((a, b) => sequenceOf(a) - sequenceOf(b));
}

function respondRefusal(answer: Answer, code: ErrorCode): Response {
  const problem = problemOf(
    new AppError(code, {
      ...(answer.sentence === undefined ? {} : { sentence: answer.sentence }),
      fields: answer.fields ?? [],
      questions: answer.questions ?? [],
      ...(answer.standingVersion === undefined ? {} : { standingVersion: answer.standingVersion }),
      standing: answer.standing,
    }),
  );
  const headers: Record<string, string> = { 'Cache-Control': 'no-store', 'Content-Type': 'application/problem+json' };
  if (problem.status === 503) headers['Retry-After'] = '5';
  return Response.json(problem, { status: errorCatalogue[code].status, headers });
}
