import { v7 } from 'uuid';
import type { RoundDay, RoundPlanting, RoundRow } from '@/lib/schemas/round-day';
import type { NewEntry } from '@/lib/client/round/entry';

/** An invented day of an invented organisation, for the phone's own tests. */
export const me = { id: '01900000-0000-7000-8000-000000000001', name: 'Tansy Okafor-Reed' };
export const other = { id: '01900000-0000-7000-8000-000000000002', name: 'Bram Holloway' };
export const organisationId = '01900000-0000-7000-8000-0000000000aa';

export function aRow(label: string, more: Partial<RoundRow> = {}): RoundRow {
  return {
    id: v7(), label, stripId: null, stripNumber: null, blockNumber: null, zoneName: null, planterRow: null, length: { typed: '17 ft 5 in', unit: 'ft', inches: 209 },
    startEnd: 'mark', farEnd: 'mark', seeds: 34, counts: [], tapeSheets: [], depths: [], cover: [], digs: [], crusts: [], markers: [], ...more,
  };
}

export function aCount(visitedOn: string, plants: number, more: Partial<RoundRow['counts'][number]> = {}): RoundRow['counts'][number] {
  return { id: v7(), visitId: v7(), visitedOn, visitedAt: '08:00', marker: null, personId: me.id, personName: me.name, countedAs: 'so-far', plants, plantsUp: plants, doubtful: 0, used: true, ...more };
}

export function aPlanting(rows: RoundRow[], more: Partial<RoundPlanting> = {}): RoundPlanting {
  return {
    id: v7(), fieldId: v7(), plantedOn: '2026-05-01', plantedAt: null, crop: 'corn', rowSpacingInches: 30, seedsPerAcre: 34_000, hasTrial: false, strips: [], transects: [],
    conditions: [], notes: [], rows, ...more,
  };
}

export function aDay(plantings: RoundPlanting[], more: Partial<RoundDay> = {}): RoundDay {
  return {
    what: 'rowrise-round-day', version: 1, organisation: { id: organisationId, name: 'Sorrel Gap Scouting', timeZone: 'America/Chicago', demoToday: null },
    person: { id: me.id, name: me.name, role: 'scout' }, readAt: '2026-05-20T12:00:00Z', farms: [],
    fields: plantings.map((planting) => ({ id: planting.fieldId, farmId: v7(), name: 'Back forty', restrictions: [] })), plantings, ...more,
  };
}

export function countOf(row: RoundRow, planting: RoundPlanting, plants: number): NewEntry {
  return {
    kind: 'count.record', thingId: v7(), about: { plantingId: planting.id, rowSampleId: row.id },
    body: { rowSampleId: row.id, visit: { id: v7(), personId: null, visitedOn: '2026-05-20', visitedAt: '09:00', marker: null }, countedAs: 'so-far', plants, doubtful: 0, replacesId: null },
  };
}

export const json = (body: unknown, status = 200, headers: Record<string, string> = {}) => Response.json(body, { status, headers });
export const portal = () => new Response('<html>Welcome to the truck stop. Accept our terms.</html>', { status: 200, headers: { 'Content-Type': 'text/html' } });

/** A server that the phone talks to: it keeps what it took, once each, and answers as the test says. */
export class FakeServer {
  readonly taken = new Map<string, { personId: string; body: unknown }>();
  applied = 0;
  signedIn: { id: string; name: string } | null = me;
  day: RoundDay;
  /** Asked before each batch is looked at; an answer of its own stands in the place of the server's, a throw is silence. */
  before: (operations: Record<string, unknown>[]) => Response | undefined = () => undefined;
  /** Asked after the batch was carried out: the answer may get lost. */
  after: () => Response | undefined = () => undefined;
  refuse: (operation: Record<string, unknown>) => Record<string, unknown> | undefined = () => undefined;

  constructor(day: RoundDay) {
    this.day = day;
  }

  readonly fetch: typeof fetch = async (input, init) => {
    const path = String(input);
    if (path.endsWith('/api/sign-out')) {
      this.signedIn = null;
      return json({});
    }
    if (!this.signedIn) return json({ code: 'not-signed-in', title: 'Sign in first.' }, 401);
    if (path === '/api/round') return json({ what: 'rowrise-round-person', version: 1, person: { ...this.signedIn, units: 'us' }, organisations: [{ id: organisationId, name: 'Sorrel Gap Scouting', role: 'scout' }] });
    if (path.endsWith('/round-day')) return json(this.day);
    const { operations } = JSON.parse(String(init?.body)) as { operations: Record<string, unknown>[] };
    const instead = this.before(operations);
    if (instead) return instead;
    const answers = operations.map((operation) => this.answer(operation));
    return this.after() ?? json({ answers });
  };

  private answer(operation: Record<string, unknown>) {
    const operationId = String(operation.operationId);
    if (operation.personId !== this.signedIn?.id) return { operationId, outcome: 'refused', code: 'not-author' };
    const refused = this.refuse(operation);
    if (refused) return { operationId, ...refused };
    if (this.taken.has(operationId)) return { operationId, outcome: 'duplicate', thingId: operation.thingId, version: 1 };
    this.applied += 1;
    this.taken.set(operationId, { personId: String(operation.personId), body: operation.body });
    return { operationId, outcome: 'applied', thingId: operation.thingId, version: 1 };
  }
}
