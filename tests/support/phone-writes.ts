import { readFileSync } from 'node:fs';
import { sql } from 'drizzle-orm';
import { v7 } from 'uuid';
import { inOrganisation, type Database } from '@/db/connection';
import type { Answer } from '@/lib/schemas/operation';
import { allOperations } from '@/lib/server/operations/all-operations';
import { applyOperation } from '@/lib/server/operations/apply-operation';
import { yesTo } from './count-scene';
import { type DecideScene } from './decide-scene';

type Body = Record<string, unknown>;
type Kind = { kind: string; version: number; name: string };
/** One write as a phone has it ready: sent as it is, it is applied. */
export type PhoneWrite = { operationId: string; kind: string; version: number; thingId: string; body: Body; confirmations: Body[] };

const folder = 'tests/fixtures/operations/';
const today = new Date('2026-05-20T15:00:00Z');
/** A phone sends what is observed, and starts spot counts. */
const sentByPhone = ({ kind, action }: { kind: string; action: string }) => action === 'observations.write' || kind.startsWith('spot-');

/** Every kind and version that a phone sends or once sent, from the payloads that have landed. */
export const phoneKinds: readonly Kind[] = allOperations
  .filter(sentByPhone)
  .map(({ kind, version }) => ({ kind, version, name: `${kind}.v${version}` }));

/**
 * Puts landed payloads into a scene of its own: the ids and days in them become ones that exist there, everything else
 * stays as it landed. Each write gets a row sample of its own, so that one does not bear upon the next.
 */
export class PhoneWrites {
  private made = 0;
  private rowIds: string[] = [];
  private tables: string[] = [];
  private readonly unasked = new Set<string>();
  private plantingId = '';
  private fieldId = '';
  readonly deviceId = v7();

  constructor(readonly scene: DecideScene) {}

  async settle(rows = 2_000): Promise<this> {
    this.plantingId = await this.scene.plant({ plantedOn: '2026-05-07' });
    const found = await inOrganisation(this.scene.db, this.scene, async (tx) => (await tx.execute<{ field_id: string }>(sql`select field_id from planting where id = ${this.plantingId}`)).rows);
    this.fieldId = found[0]?.field_id ?? '';
    const samples = Array.from({ length: rows }, (_, index) => ({ id: v7(), stripId: null, zoneId: null, label: `W-${index + 1}`, planterRow: null, length: { typed: '17 ft 5 in' }, startEnd: 'mark', farEnd: 'mark' }));
    // A planting takes at most 400 row samples at once.
    for (let from = 0; from < rows; from += 400) {
      await this.scene.must('agronomist', 'row-samples.add', this.plantingId, { plantingId: this.plantingId, samples: samples.slice(from, from + 400) });
    }
    this.rowIds = samples.map(({ id }) => id);
    return this;
  }

  private freshRow(): string {
    const id = this.rowIds[this.made];
    if (id === undefined) throw new Error('The scene has no more row samples of its own for each write.');
    return id;
  }

  private async make({ kind, version, name }: Kind): Promise<PhoneWrite> {
    const landed = JSON.parse(readFileSync(`${folder}${name}.json`, 'utf8')) as Body;
    const before = await this.standsBefore(kind);
    this.made += 1;
    return { operationId: v7(), kind, version, thingId: v7(), body: this.placed(landed, before), confirmations: [] };
  }

  /** A write of this kind that is applied as it stands, with what it would be asked about confirmed. */
  async ready(kind: Kind): Promise<PhoneWrite> {
    const tried = await this.make(kind);
    if (this.unasked.has(kind.name)) return tried;
    const answer = await this.send(this.scene.db, tried);
    // One that is asked about has left no trace; one that was taken is used up, and its like is made anew.
    if (answer.code === 'needs-confirmation') return { ...tried, confirmations: yesTo(answer) };
    if (answer.outcome !== 'applied') throw new Error(`${kind.name}: ${JSON.stringify(answer)}`);
    this.unasked.add(kind.name);
    return this.make(kind);
  }

  /** What this kind rests on, recorded first. */
  private async standsBefore(kind: string): Promise<Body> {
    if (kind === 'observation.withdraw') {
      const counted = await this.applied({ kind: 'count.record', version: 1, name: 'count.record.v1' });
      return { targetKind: 'count', targetId: counted.thingId };
    }
    if (kind === 'entry-exception.record') {
      const restricted = await this.applied({ kind: 'entry-restriction.record', version: 1, name: 'entry-restriction.record.v1' });
      return { restrictionId: restricted.thingId };
    }
    return {};
  }

  private async applied(kind: Kind): Promise<PhoneWrite> {
    const write = await this.make(kind);
    const answer = await this.send(this.scene.db, write);
    if (answer.outcome !== 'applied') throw new Error(`${kind.name}: ${JSON.stringify(answer)}`);
    return write;
  }

  private placed(landed: Body, before: Body): Body {
    const ids: Body = {
      rowSampleId: this.freshRow(), plantingId: this.plantingId, fieldId: this.fieldId, farmId: this.scene.farmId, pairId: v7(),
      stripId: null, zoneId: null, replacesId: null, digId: null, personId: null, label: `S-${this.made}`, ...before,
    };
    const put = (key: string, value: unknown): unknown => {
      if (key === 'visit') return { ...(value as Body), id: v7(), personId: null, visitedOn: '2026-05-19' };
      if (key === 'field') return { id: v7(), name: `Spot field ${this.made}` };
      if (key === 'plantedOn') return '2026-05-07';
      if (/^[a-z]+On$/.test(key)) return '2026-05-19';
      return key in ids ? ids[key] : value;
    };
    return Object.fromEntries(Object.entries(landed).map(([key, value]) => [key, put(key, value)]));
  }

  /** Sends a write as the scout's phone does; more than once is the same entry again. */
  send(db: Database, write: PhoneWrite): Promise<Answer> {
    const { organisationId, people } = this.scene;
    const { scout } = people;
    return applyOperation(
      db,
      { organisationId, sender: { personId: scout.id, now: () => today, originKind: 'phone' }, handlerOf: (kind, version) => allOperations.find((each) => each.kind === kind && each.version === version) },
      { ...write, organisationId, personId: scout.id, deviceId: this.deviceId, deviceSequence: 1, baseVersion: null, follows: null, occurred: { date: '2026-05-19', time: '08:00', zone: 'America/Chicago' } },
    );
  }

  /** How many rows each table holds of one operation. */
  async standing(operationId: string): Promise<Record<string, number>> {
    return inOrganisation(this.scene.db, this.scene, async (tx) => {
      if (this.tables.length === 0) {
        const found = await tx.execute<{ name: string }>(sql`select table_name as name from information_schema.columns where table_schema = 'public' and column_name = 'operation_id' order by 1`);
        this.tables = found.rows.map(({ name }) => name);
      }
      const parts = [...this.tables.map((name) => ({ name, id: 'operation_id' })), { name: 'audit_event', id: 'id' }].map(
        ({ name, id }) => sql`select ${name} as name, count(*)::int as n from ${sql.identifier(name)} where ${sql.identifier(id)} = ${operationId}`,
      );
      const { rows } = await tx.execute<{ name: string; n: number }>(sql.join(parts, sql` union all `));
      return Object.fromEntries(rows.filter(({ n }) => n > 0).map(({ name, n }) => [name, n]));
    });
  }
}
