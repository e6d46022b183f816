import type { Database } from '@/db/connection';
import type { Answer, Confirmation } from '@/lib/schemas/operation';
import { allOperations } from '@/lib/server/operations/all-operations';
import { applyOperation } from '@/lib/server/operations/apply-operation';
import { demoId } from './demo-id';
import type { DemoOrganisation } from './demo-people';
import { organisationIdOf, personIdOf } from './insert-account';

export type DemoOperation = {
  kind: string;
  /** The thing's id. */
  thingId: string;
  body: Record<string, unknown>;
  /** The key of the person who sends it. */
  by: string;
  /** The local day on which it happened. */
  on: string;
  baseVersion?: number;
  /** Rules that may ask about it; whoever sends it then answers that it was seen so. */
  seenSo?: readonly string[];
};

export type DemoWriter = (operation: DemoOperation) => Promise<void>;

/**
 * Writes as the demo's people would have: every change is an operation that goes through the same door as a form's, under
 * their name, on the day it happened. A refusal stops the filling and says why.
 */
export function demoWriter(db: Database, account: DemoOrganisation): DemoWriter {
  const organisationId = organisationIdOf(account);
  const sequences = new Map<string, number>();
  const handlerOf = (kind: string, version: number) => allOperations.find((each) => each.kind === kind && each.version === version);
  const send = (sent: DemoOperation, confirmations: Confirmation[]): Promise<Answer> => {
    const { kind, thingId, body, by, on, baseVersion = null } = sent;
    const personId = personIdOf(account, by);
    const deviceSequence = (sequences.get(by) ?? 0) + 1;
    sequences.set(by, deviceSequence);
    const sender = { personId, originKind: 'demo' as const, now: () => new Date(`${on}T21:00:00Z`) };
    return applyOperation(db, { organisationId, sender, handlerOf }, {
      operationId: demoId(`${account.key} ${kind} ${thingId} ${baseVersion ?? ''}`),
      organisationId,
      personId,
      deviceId: demoId(`${account.key}/${by}/device`),
      deviceSequence,
      kind,
      version: 1,
      thingId,
      baseVersion,
      body,
      occurred: { date: on, time: '16:00', zone: account.timeZone },
      confirmations,
    });
  };
  return async (sent) => {
    const first = await send(sent, []);
    const asked = first.questions ?? [];
    const isSeenSo = asked.length > 0 && asked.every(({ rule }) => sent.seenSo?.includes(rule));
    const answer = isSeenSo ? await send(sent, asked.map(({ rule, about }) => ({ rule, about, answer: 'yes' as const }))) : first;
    if (answer.outcome === 'applied') return;
    const why = [answer.sentence, ...(answer.fields ?? []).map(({ path, message }) => `${path}: ${message}`), ...(answer.questions ?? []).map(({ sentence }) => sentence)];
    throw new Error(`${sent.kind} of ${account.key} was ${answer.outcome}: ${why.join(' ')}`);
  };
}
