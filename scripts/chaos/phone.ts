import { setTimeout as pause } from 'node:timers/promises';
import type { Chance } from './chance';
import type { Entry, Made } from './entry';
import type { PhoneOfScout } from './make-entries';

export type Reply = { status: number; contentType: string; text: string; retryAfter?: string | null };
/** Sends a batch by one of the ways; throws when nothing came back. With `abandon` the phone hangs up in flight. */
export type Send = (operations: readonly Entry[], by: { way: number; abandon: boolean }) => Promise<Reply>;

export type Habits = {
  ways: number;
  batchMost: number;
  resentShare: number;
  abandonShare: number;
  twinShare: number;
  /** Over how long the entries are made; a scout does not make a day's work at once. */
  madeWithinMs: number;
  /** Once the faults are over nobody hangs up or doubles any more; what was sent before still comes again. */
  calm: () => boolean;
  /** The broken phone of a control: it forgets a batch on any 2xx, whatever is in it. */
  forgetsOnAny2xx: boolean;
};

export type Tally = { requests: number; abandoned: number; unanswered: number; kept: Record<string, number>; resent: number; sent: number; applied: number; duplicate: number };

/** What the server says of a moment and not of the entry; it is sent again and nobody is bothered. */
const passing = new Set(['busy', 'unexpected', 'not-signed-in']);

/** A phone of the harness: keeps every entry until the receipt for it has come, and sends what waits in shuffled batches. */
export class Phone {
  readonly tally: Tally = { requests: 0, abandoned: 0, unanswered: 0, kept: {}, resent: 0, sent: 0, applied: 0, duplicate: 0 };
  readonly complaints = new Map<string, string>();
  private readonly waiting = new Map<string, Made>();
  private readonly done: Entry[] = [];
  private unmade: Made[];
  private readonly startedAt = performance.now();

  constructor(
    readonly scout: PhoneOfScout,
    private readonly send: Send,
    private readonly habits: Habits,
    private readonly chance: Chance,
  ) {
    this.unmade = [...scout.made];
  }

  get left(): number {
    return this.waiting.size + this.unmade.length;
  }

  /** What it still has, sent or unsent, without a receipt. */
  get stillKept(): string[] {
    return [...this.waiting.keys(), ...this.unmade.map(({ entry }) => entry.operationId)];
  }

  /** Goes on until everything has its receipt, or until it is told to stop. */
  async walk(over: () => boolean): Promise<void> {
    while (this.left > 0 && !over()) {
      this.makeMore();
      const batch = this.nextBatch();
      if (batch.length === 0) {
        await pause(20);
        continue;
      }
      const way = this.chance.whole(0, this.habits.ways - 1);
      const twins = this.chance.happens(this.habits.calm() ? 0 : this.habits.twinShare) ? [way, (way + 1) % this.habits.ways] : [way];
      const came = await Promise.all(twins.map((each) => this.sendOnce(batch, each)));
      // After silence a phone waits a little; the network or the server is away.
      if (!came.some(Boolean)) await pause(this.chance.whole(20, 200));
    }
  }

  private makeMore() {
    const share = Math.min(1, (performance.now() - this.startedAt) / this.habits.madeWithinMs);
    const due = Math.ceil(this.scout.made.length * share) - (this.scout.made.length - this.unmade.length);
    for (const made of this.unmade.splice(0, Math.max(0, due))) this.waiting.set(made.entry.operationId, made);
  }

  private nextBatch(): Entry[] {
    const size = this.chance.whole(1, this.habits.batchMost);
    const batch = new Map<string, Entry>();
    for (const { entry, restsOn } of this.chance.shuffled([...this.waiting.values()])) {
      if (batch.size >= size) break;
      const old = this.done.length > 0 && this.chance.happens(this.habits.resentShare) ? this.chance.pick(this.done) : undefined;
      if (old) batch.set(old.operationId, old);
      // What rests on another is sent after it or in one batch with it; the server takes a batch in the device's order.
      if (restsOn === null || !this.waiting.has(restsOn) || batch.has(restsOn)) batch.set(entry.operationId, entry);
    }
    return this.chance.shuffled([...batch.values()]);
  }

  private async sendOnce(batch: readonly Entry[], way: number): Promise<boolean> {
    const abandon = this.chance.happens(this.habits.calm() ? 0 : this.habits.abandonShare);
    this.tally.requests += 1;
    this.tally.sent += batch.length;
    this.tally.resent += batch.filter(({ operationId }) => !this.waiting.has(operationId)).length;
    try {
      this.take(batch, await this.send(batch, { way, abandon }));
      return true;
    } catch {
      if (abandon) this.tally.abandoned += 1;
      else this.tally.unanswered += 1;
      return false;
    }
  }

  /** An entry is forgotten on the receipt for it and on nothing else; every other reply leaves it waiting. */
  private take(batch: readonly Entry[], reply: Reply) {
    if (this.habits.forgetsOnAny2xx && reply.status >= 200 && reply.status < 300) {
      for (const { operationId } of batch) this.forget(operationId);
      return;
    }
    const answers = reply.status === 200 && reply.contentType.startsWith('application/json') ? answersIn(reply.text) : undefined;
    if (!answers) {
      const what = reply.status === 200 ? '200 that is no receipt' : String(reply.status);
      this.tally.kept[what] = (this.tally.kept[what] ?? 0) + 1;
      return;
    }
    for (const { operationId, outcome, code, sentence, fields, questions } of answers) {
      if (outcome === 'applied' || outcome === 'duplicate') {
        this.tally[outcome] += 1;
        this.forget(operationId);
      } else if (code !== undefined && passing.has(code)) {
        this.tally.kept[code] = (this.tally.kept[code] ?? 0) + 1;
      } else {
        this.complaints.set(operationId, JSON.stringify({ outcome, code, sentence, fields, questions }));
      }
    }
  }

  private forget(operationId: string) {
    const made = this.waiting.get(operationId);
    this.complaints.delete(operationId);
    if (!made) return;
    this.waiting.delete(operationId);
    this.done.push(made.entry);
  }
}

type AnswerTold = { operationId: string; outcome: string; code?: string; sentence?: string; fields?: unknown; questions?: unknown };

function answersIn(text: string): AnswerTold[] | undefined {
  try {
    const told = JSON.parse(text) as { answers?: AnswerTold[] };
    return Array.isArray(told.answers) ? told.answers : undefined;
  } catch {
    return undefined;
  }
}
