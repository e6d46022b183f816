import { sql } from 'drizzle-orm';
import { connect, inOrganisation, type Database } from '@/db/connection';
import { allOperations } from '@/lib/server/operations/all-operations';
import { applyOperation, type HandlerOf } from '@/lib/server/operations/apply-operation';
import { hashPassword } from '@/lib/server/session/password';
import type { Chance } from './chance';

export const password = 'a plain sentence of the harness';
export const plantedOn = '2026-05-07';
/** 17 ft 5 in of a 30-inch row at 34,000 seeds an acre hold 34 of them. */
export const lengthTyped = '17 ft 5 in';

export const handlerOf: HandlerOf = (kind, version) => allOperations.find((handler) => handler.kind === kind && handler.version === version);

export type Scout = { personId: string; email: string };
export type Planting = { id: string; rowIds: string[] };
export type Scene = { organisationId: string; farmId: string; scouts: Scout[]; plantings: Planting[] };

type Size = { scouts: number; plantings: number; rowsEach: number };

/** A small organisation: people by SQL, since an operation needs a member who sends it, and the plan through the operations. */
export async function settleScene(databaseUrl: string, chance: Chance, size: Size): Promise<Scene> {
  const db = connect(databaseUrl, 4);
  try {
    const organisationId = chance.id();
    const owner = { personId: chance.id(), email: `owner-${organisationId}@example.test` };
    const scouts = Array.from({ length: size.scouts }, (_, index) => ({ personId: chance.id(), email: `scout-${index + 1}-${organisationId}@example.test` }));
    const farmId = chance.id();
    await insertPeople(db, organisationId, [{ ...owner, role: 'owner' }, ...scouts.map((scout) => ({ ...scout, role: 'scout' }))]);
    const must = mustApply(db, { organisationId, personId: owner.personId, deviceId: chance.id() }, chance);
    await must('farm.add', farmId, { name: 'Harness farm', timeZone: 'America/Chicago' });
    await inOrganisation(db, { organisationId }, async (tx) => {
      for (const { personId } of scouts) {
        await tx.execute(sql`insert into farm_person (organisation_id, farm_id, person_id) values (${organisationId}, ${farmId}, ${personId})`);
      }
    });
    const plantings: Planting[] = [];
    for (let index = 0; index < size.plantings; index += 1) plantings.push(await addPlanting(must, chance, { farmId, index, rows: size.rowsEach }));
    return { organisationId, farmId, scouts, plantings };
  } finally {
    await db.$client.end();
  }
}

export async function insertPeople(db: Database, organisationId: string, people: readonly (Scout & { role: string })[]) {
  const passwordHash = await hashPassword(password);
  await inOrganisation(db, { organisationId }, async (tx) => {
    await tx.execute(sql`insert into organisation (id, name, time_zone) values (${organisationId}, 'Harness account', 'America/Chicago')`);
    for (const { personId, email, role } of people) {
      await tx.execute(sql`insert into person (id, email, name, password_hash) values (${personId}, ${email}, ${`Harness ${role}`}, ${passwordHash})`);
      await tx.execute(sql`insert into membership (organisation_id, person_id, role) values (${organisationId}, ${personId}, ${role})`);
    }
  });
}

export type Must = (kind: string, thingId: string, body: Record<string, unknown>) => Promise<void>;

export function mustApply(db: Database, who: { organisationId: string; personId: string; deviceId: string }, chance: Chance): Must {
  let deviceSequence = 0;
  return async (kind, thingId, body) => {
    deviceSequence += 1;
    const answer = await applyOperation(
      db,
      { organisationId: who.organisationId, sender: { personId: who.personId, now: () => new Date(), originKind: 'form' }, handlerOf },
      { operationId: chance.id(), ...who, deviceSequence, kind, version: 1, thingId, body, occurred: { date: plantedOn, time: null, zone: 'America/Chicago' } },
    );
    if (answer.outcome !== 'applied') throw new Error(`${kind} was not taken: ${JSON.stringify(answer)}`);
  };
}

async function addPlanting(must: Must, chance: Chance, { farmId, index, rows }: { farmId: string; index: number; rows: number }): Promise<Planting> {
  const id = chance.id();
  const fieldId = chance.id();
  await must('field.add', fieldId, { farmId, name: `Field ${index + 1}`, area: { typed: '40' } });
  await must('planting.add', id, {
    fieldId, plantedOn, plantedAt: null, crop: 'corn', rowSpacing: { typed: '30' }, seedingRate: { typed: '34,000' }, tagGermination: null,
    intendedStand: { typed: '32,000' }, fullYield: null, previousCrop: null, tillage: null, slowAfterDays: 2, lateAfterDays: 7, veryLateAfterDays: 14, zones: [],
  });
  const samples = Array.from({ length: rows }, (_, row) => ({
    id: chance.id(), stripId: null, zoneId: null, label: `P${index + 1}-${row + 1}`, planterRow: null, length: { typed: lengthTyped }, startEnd: 'mark', farEnd: 'mark',
  }));
  await must('row-samples.add', id, { plantingId: id, samples });
  return { id, rowIds: samples.map((sample) => sample.id) };
}
