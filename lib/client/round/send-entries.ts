import { apiPaths } from '@/lib/paths/paths';
import type { EntryAnswer, KeptEntry } from './entry';
import type { RoundStore } from './round-store';

/** Where sending has come to an end, for now. */
export type SendOutcome =
  | { to: 'done' }
  /** No answer, or one that is none of ours: no network, a server that is away, a page of a network that wants a sign-in. */
  | { to: 'no-answer' }
  | { to: 'signed-out' }
  /** Signed in, but no member of the organisation any more. */
  | { to: 'shut-out' }
  | { to: 'busy'; retryAfterSeconds: number | null };

type Sending = {
  store: RoundStore;
  fetch: typeof fetch;
  personId: string;
  organisationId: string;
  now: () => number;
  onChange: (entries: readonly KeptEntry[]) => void;
  /** What is on its way at this moment, by operation. */
  onSending?: (operationIds: readonly string[]) => void;
};

export const batchMost = 40;
const patienceMilliseconds = 30_000;
/** Refusals that will pass by themselves: the entry stays as it is and is sent again. */
const passing = new Set(['busy', 'unexpected', 'not-signed-in', 'not-author', 'too-many-tries']);

/**
 * Sends what waits of one person and organisation, oldest first, in batches; each entry is settled by its own answer and
 * by nothing else. An answer counts only if it is ours from end to end: status, JSON, every entry named. Whatever else
 * comes back, every entry stays.
 */
export async function sendEntries(sending: Sending): Promise<SendOutcome> {
  let size = batchMost;
  /** Entries this pass has given up on, so that one that cannot be sent does not hold up those behind it. */
  const passed = new Set<string>();
  for (;;) {
    const waiting = (await waitingEntries(sending.store, sending)).filter((entry) => !passed.has(entry.operationId));
    const batch = waiting.slice(0, size);
    if (batch.length === 0) return passed.size === 0 ? { to: 'done' } : { to: 'busy', retryAfterSeconds: null };
    await markTried(sending.store, batch);
    sending.onSending?.(batch.map((entry) => entry.operationId));
    const answer = await post(sending, batch);
    sending.onSending?.([]);
    if (answer.kind === 'answers') {
      const changed = await settle(sending, batch, answer.answers);
      sending.onChange(changed);
      for (const entry of changed) if (entry.state === 'kept') passed.add(entry.operationId);
      size = batchMost;
    } else if (answer.kind === 'refused-whole') {
      // Something in it that the server cannot take even as a batch: halved until the one is found.
      if (batch.length > 1) size = Math.ceil(batch.length / 2);
      else {
        const [only] = batch;
        if (only && answer.final) sending.onChange([await lookAt(sending, only, answer.answer)]);
        else if (only) passed.add(only.operationId);
        size = batchMost;
      }
    } else {
      return answer.outcome;
    }
  }
}

export async function waitingEntries(store: RoundStore, { personId, organisationId }: { personId: string; organisationId: string }): Promise<KeptEntry[]> {
  const entries = await store.entries.where('[personId+organisationId+state]').equals([personId, organisationId, 'kept']).toArray();
  return entries.sort((a, b) => a.deviceSequence - b.deviceSequence);
}

/** Written down before anything leaves: an entry that may have arrived is never taken back by simply forgetting it. */
async function markTried(store: RoundStore, batch: readonly KeptEntry[]) {
  await store.transaction('rw', store.entries, async () => {
    for (const entry of batch) if (!entry.tried) await store.entries.update(entry.operationId, { tried: true });
  });
}

type Posted =
  | { kind: 'answers'; answers: Map<string, EntryAnswer> }
  | { kind: 'refused-whole'; final: boolean; answer: EntryAnswer }
  | { kind: 'stop'; outcome: SendOutcome };

const stop = (outcome: SendOutcome): Posted => ({ kind: 'stop', outcome });

async function post({ fetch, organisationId }: Sending, batch: readonly KeptEntry[]): Promise<Posted> {
  let response: Response;
  let body: unknown;
  try {
    response = await fetch(apiPaths.operations(organisationId), {
      method: 'POST',
      headers: { 'Content-Type': 'application/json' },
      // A network's sign-in page must not be followed to and taken for an answer.
      redirect: 'error',
      cache: 'no-store',
      body: JSON.stringify({ from: 'field', operations: batch.map(envelopeOf) }),
      signal: AbortSignal.timeout(patienceMilliseconds),
    });
    if (!/^application\/(problem\+)?json\b/i.test(response.headers.get('content-type') ?? '')) return stop({ to: 'no-answer' });
    body = await response.json();
  } catch {
    return stop({ to: 'no-answer' });
  }
  const code = isObject(body) && typeof body.code === 'string' ? body.code : undefined;
  if (response.status === 401 && code === 'not-signed-in') return stop({ to: 'signed-out' });
  if (response.ok) {
    const answers = answersOf(body);
    return answers ? { kind: 'answers', answers } : stop({ to: 'no-answer' });
  }
  if ([400, 413, 422, 500].includes(response.status) && code !== undefined) {
    return { kind: 'refused-whole', final: response.status !== 500, answer: { outcome: 'refused', code, sentence: isObject(body) && typeof body.title === 'string' ? body.title : '' } };
  }
  if ((response.status === 403 || response.status === 404) && code !== undefined) return stop({ to: 'shut-out' });
  const retryAfter = Number(response.headers.get('retry-after'));
  return stop({ to: 'busy', retryAfterSeconds: Number.isFinite(retryAfter) && retryAfter > 0 ? retryAfter : null });
}

/** The envelope as the server takes it; what the phone knows besides stays on the phone. */
export function envelopeOf(entry: KeptEntry) {
  const { operationId, organisationId, personId, deviceId, deviceSequence, kind, version, thingId, baseVersion, follows, body, occurred, confirmations } = entry;
  return { operationId, organisationId, personId, deviceId, deviceSequence, kind, version, thingId, baseVersion, follows, body, occurred, confirmations };
}

const isObject = (value: unknown): value is Record<string, unknown> => typeof value === 'object' && value !== null;
const outcomes = new Set(['applied', 'duplicate', 'conflict', 'refused']);

function answersOf(body: unknown): Map<string, EntryAnswer> | undefined {
  if (!isObject(body) || !Array.isArray(body.answers)) return undefined;
  const answers = new Map<string, EntryAnswer>();
  for (const answer of body.answers as unknown[]) {
    if (!isObject(answer) || typeof answer.operationId !== 'string' || typeof answer.outcome !== 'string' || !outcomes.has(answer.outcome)) return undefined;
    answers.set(answer.operationId, answer as unknown as EntryAnswer);
  }
  return answers;
}

/** Settles each entry of a batch by the answer that names it; one without an answer of its own stays as it was. */
async function settle(sending: Sending, batch: readonly KeptEntry[], answers: Map<string, EntryAnswer>): Promise<KeptEntry[]> {
  const changed: KeptEntry[] = [];
  await sending.store.transaction('rw', sending.store.entries, async () => {
    for (const entry of batch) {
      const standing = await sending.store.entries.get(entry.operationId);
      // Settled by another tab meanwhile.
      if (!standing || standing.state !== 'kept') continue;
      const settled = settledBy(standing, answers.get(entry.operationId), sending.now());
      if (settled !== standing) await sending.store.entries.put(settled);
      changed.push(settled);
    }
  });
  return changed;
}

function settledBy(entry: KeptEntry, answer: EntryAnswer | undefined, now: number): KeptEntry {
  if (answer === undefined) return entry;
  if (answer.outcome === 'applied' || answer.outcome === 'duplicate') return { ...entry, state: 'sent', sentAt: now, answer };
  if (answer.code !== undefined && passing.has(answer.code)) return entry;
  return { ...entry, state: 'needs-look', answer };
}

async function lookAt({ store }: Sending, entry: KeptEntry, answer: EntryAnswer): Promise<KeptEntry> {
  const looked: KeptEntry = { ...entry, tried: true, state: 'needs-look', answer };
  await store.entries.put(looked);
  return looked;
}
