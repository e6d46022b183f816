import { v7 } from 'uuid';
import { inOrganisation } from '@/db/connection';
import type { Answer } from '@/lib/schemas/operation';
import { readObservations } from '@/lib/server/services/counts/read-observations';
import type { DecideScene } from './decide-scene';

type Who = Parameters<DecideScene['send']>[0];
type Sent = Record<string, unknown>;

export type CountSent = {
  on: string;
  plants: unknown;
  at?: string | null;
  as?: 'so-far' | 'new';
  doubtful?: unknown;
  marker?: string | null;
  visitId?: string;
  personId?: string | null;
  replacesId?: string | null;
  countId?: string;
  confirmations?: Sent[];
};

/** A planting of 7 May with row samples, and the writes of counting, each sent as an operation. Today is 20 May. */
export class CountScene {
  plantingId = '';
  readonly rows = new Map<string, string>();

  constructor(readonly scene: DecideScene) {}

  async settle(labels: readonly string[] = ['A-1', 'A-2'], length = '17 ft 5 in', end: 'mark' | 'plant' = 'mark'): Promise<this> {
    this.plantingId = await this.scene.plant({ plantedOn: '2026-05-07' });
    const samples = labels.map((label) => ({ id: v7(), stripId: null, zoneId: null, label, planterRow: null, length: { typed: length }, startEnd: end, farEnd: end }));
    // A planting takes at most 400 row samples at once.
    for (let from = 0; from < samples.length; from += 400) {
      await this.scene.must('agronomist', 'row-samples.add', this.plantingId, { plantingId: this.plantingId, samples: samples.slice(from, from + 400) });
    }
    samples.forEach(({ id, label }) => this.rows.set(label, id));
    return this;
  }

  row(label: string): string {
    const id = this.rows.get(label);
    if (id === undefined) throw new Error(`There is no row sample ${label}.`);
    return id;
  }

  count(label: string, sent: CountSent, who: Who = 'scout'): Promise<Answer> {
    const { on, at = null, as = 'so-far', plants, doubtful = 0, marker = null, visitId = v7(), personId = null, replacesId = null, countId = v7(), confirmations = [] } = sent;
    return this.scene.send(
      who,
      'count.record',
      countId,
      { rowSampleId: this.row(label), visit: { id: visitId, personId, visitedOn: on, visitedAt: at, marker }, countedAs: as, plants, doubtful, replacesId },
      { confirmations },
    );
  }

  async mustCount(label: string, sent: CountSent, who: Who = 'scout'): Promise<string> {
    const countId = sent.countId ?? v7();
    const answer = await this.count(label, { ...sent, countId }, who);
    if (answer.outcome !== 'applied') throw new Error(JSON.stringify(answer));
    return countId;
  }

  tape(label: string, places: readonly (string | Sent)[], more: Sent = {}, who: Who = 'scout'): Promise<Answer> {
    const { sheetId = v7(), on = '2026-05-19', tapeUnit = 'in', replacesId = null, confirmations = [], visit = {}, laid } = more;
    return this.scene.send(
      who,
      'tape-sheet.record',
      String(sheetId),
      {
        rowSampleId: this.row(label),
        visit: { id: v7(), personId: null, visitedOn: on, visitedAt: null, marker: null, ...(visit as Sent) },
        tapeUnit,
        places: places.map((place) => ({ kind: 'plant', marker: null, leafStage: null, ...(typeof place === 'string' ? { typed: place } : place) })),
        ...(laid as Sent | undefined),
        replacesId,
      },
      { confirmations, version: laid === undefined ? 1 : 2 },
    );
  }

  takeBack(targetKind: string, targetId: string, reason = 'Counted the wrong row', who: Who = 'scout'): Promise<Answer> {
    return this.scene.send(who, 'observation.withdraw', v7(), { targetKind, targetId, reason });
  }

  take(text: string, more: { importKind?: string; importId?: string; confirmations?: Sent[]; fileName?: string } = {}, who: Who = 'scout'): Promise<Answer> {
    const { importKind = 'counts', importId = v7(), confirmations = [], fileName = 'sheet.csv' } = more;
    return this.scene.send(who, 'import.take', importId, { plantingId: this.plantingId, importKind, fileName, text }, { confirmations });
  }

  observations() {
    const { organisationId } = this.scene;
    return inOrganisation(this.scene.db, { organisationId }, (tx) => readObservations(tx, { organisationId, plantingId: this.plantingId }));
  }

  async standing(label: string) {
    const { counts } = await this.observations();
    return counts.filter((count) => count.rowSampleId === this.row(label));
  }
}

/** The answers that say yes to everything that was asked. */
export const yesTo = (answer: Answer) => (answer.questions ?? []).map(({ rule, about }) => ({ rule, about, answer: 'yes' }));
