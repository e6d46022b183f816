import { v7 } from 'uuid';
import { sql } from 'drizzle-orm';
import { connect, inOrganisation, type Database } from '@/db/connection';
import type { Answer } from '@/lib/schemas/operation';
import type { OriginKind, Role } from '@/lib/schemas/vocabulary';
import { withActor } from '@/lib/server/operations/actor-context';
import { allOperations } from '@/lib/server/operations/all-operations';
import { applyOperation } from '@/lib/server/operations/apply-operation';
import { readReplant } from '@/lib/server/services/replant/read-replant';
import { makeTestDatabase } from './test-database';

type Person = { id: string; role: Role };
export type ReplantInputsSent = Record<string, unknown>;

const today = new Date('2026-05-20T15:00:00Z');

/** The figures of the published example: 200 bu, replanted 25 May at 30,000; the price and costs are this test's own. */
export const purdueInputs: ReplantInputsSent = {
  fullYield: { typed: '200', unit: 'bu/ac' },
  pricePerBushel: '4.00',
  replantOn: '2026-05-25',
  replantStand: { typed: '30,000' },
  costs: [
    { label: 'Seed', dollarsPerAcre: '30' },
    { label: 'Planting', dollarsPerAcre: '10' },
  ],
  extraDryingPerAcre: '0',
  insurancePaymentPerAcre: '0',
  gapLossPercent: 0,
  unevenLossPercent: 0,
  poorSecondStandChancePercent: 0,
  poorSecondStandYieldPercent: null,
};

/** One organisation with its people, and the few writes that a decision needs, each sent as an operation. */
export class DecideScene {
  readonly organisationId = v7();
  readonly farmId = v7();
  readonly people: Record<Role | 'neighbor', Person> = {
    owner: { id: v7(), role: 'owner' },
    agronomist: { id: v7(), role: 'agronomist' },
    scout: { id: v7(), role: 'scout' },
    grower: { id: v7(), role: 'grower' },
    /** A grower of the same organisation who belongs to another farm. */
    neighbor: { id: v7(), role: 'grower' },
  };
  private sequence = 0;

  constructor(readonly db: Database) {}

  async settle(): Promise<this> {
    const { organisationId, people } = this;
    await inOrganisation(this.db, { organisationId }, async (tx) => {
      await tx.execute(
        sql`insert into organisation (id, name, time_zone) values (${organisationId}, 'Test account', 'America/Chicago')`,
      );
      for (const { id, role } of Object.values(people)) {
        await tx.execute(
          sql`insert into person (id, email, name, password_hash) values (${id}, ${`${id}@example.test`}, ${`Test ${role}`}, 'none')`,
        );
        await tx.execute(
          sql`insert into membership (organisation_id, person_id, role) values (${organisationId}, ${id}, ${role})`,
        );
      }
    });
    await this.must('owner', 'farm.add', this.farmId, { name: 'Test farm', timeZone: 'America/Chicago' });
    const otherFarm = v7();
    await this.must('owner', 'farm.add', otherFarm, { name: 'Next farm', timeZone: 'America/Chicago' });
    await inOrganisation(this.db, { organisationId }, async (tx) => {
      for (const [personId, farmId] of [
        [people.grower.id, this.farmId],
        [people.scout.id, this.farmId],
        [people.neighbor.id, otherFarm],
      ]) {
        await tx.execute(
          sql`insert into farm_person (organisation_id, farm_id, person_id) values (${organisationId}, ${farmId}, ${personId})`,
        );
      }
    });
    return this;
  }

  send(
    who: Role | 'neighbor',
    kind: string,
    thingId: string,
    body: Record<string, unknown>,
    more: Record<string, unknown> = {},
  ): Promise<Answer> {
    return this.sendAs('form', who, kind, thingId, body, more);
  }

  /** As a phone sends it from its round. */
  sendFromPhone(...sent: Parameters<DecideScene['send']>): Promise<Answer> {
    return this.sendAs('phone', ...sent);
  }

  private async sendAs(
    originKind: OriginKind,
    who: Role | 'neighbor',
    kind: string,
    thingId: string,
    body: Record<string, unknown>,
    more: Record<string, unknown> = {},
  ): Promise<Answer> {
    this.sequence += 1;
    const { id: personId } = this.people[who];
    const { organisationId } = this;
    return applyOperation(
      this.db,
      {
        organisationId,
        sender: { personId, now: () => today, originKind },
        handlerOf: (each, version) =>
          allOperations.find((handler) => handler.kind === each && handler.version === version),
      },
      {
        operationId: v7(),
        organisationId,
        personId,
        deviceId: organisationId,
        deviceSequence: this.sequence,
        kind,
        version: 1,
        thingId,
        body,
        occurred: { date: '2026-05-20', time: null, zone: 'America/Chicago' },
        ...more,
      },
    );
  }

  async must(...sent: Parameters<DecideScene['send']>): Promise<Answer> {
    const answer = await this.send(...sent);
    if (answer.outcome !== 'applied') throw new Error(`${sent[1]}: ${JSON.stringify(answer)}`);
    return answer;
  }

  /** A field with its planting of 30 April, by default without zones. */
  async plant({
    plantedOn = '2026-04-30',
    crop = 'corn',
    acres = '62',
    fullYield = null as string | null,
    zones = [] as { id: string; name: string; area: { typed: string } }[],
  } = {}) {
    const fieldId = v7();
    const plantingId = v7();
    await this.must('owner', 'field.add', fieldId, {
      farmId: this.farmId,
      name: `Field ${plantingId.slice(-4)}`,
      area: acres === '' ? null : { typed: acres },
    });
    await this.must('owner', 'planting.add', plantingId, {
      fieldId,
      plantedOn,
      plantedAt: null,
      crop,
      rowSpacing: { typed: '30' },
      seedingRate: { typed: '34,000' },
      tagGermination: null,
      intendedStand: { typed: '32,000' },
      fullYield: fullYield === null ? null : { typed: fullYield },
      previousCrop: null,
      tillage: null,
      slowAfterDays: 2,
      lateAfterDays: 7,
      veryLateAfterDays: 14,
      zones,
    });
    return plantingId;
  }

  /** Row samples of exactly 1/1000 acre, 17.424 ft of a 30-inch row, each with one count of 18 May. */
  async count(plantingId: string, plants: readonly number[], zoneId: string | null = null) {
    const samples = plants.map((_, index) => ({
      id: v7(),
      stripId: null,
      zoneId,
      label: `${zoneId ? zoneId.slice(-3) : 'R'}-${index + 1}`,
      planterRow: index + 1,
      length: { typed: '17.424 ft' },
      startEnd: 'mark',
      farEnd: 'mark',
    }));
    await this.must('agronomist', 'row-samples.add', plantingId, { plantingId, samples });
    for (const [index, each] of plants.entries())
      await this.countAgain(samples[index]?.id ?? '', each, '2026-05-18');
    return samples.map(({ id }) => id);
  }

  async countAgain(rowSampleId: string, plants: number, visitedOn: string) {
    return this.must('scout', 'count.record', v7(), {
      rowSampleId,
      countedAs: 'so-far',
      plants,
      doubtful: 0,
      replacesId: null,
      visit: { id: v7(), personId: null, visitedOn, visitedAt: null, marker: null },
    });
  }

  save(who: Role | 'neighbor', plantingId: string, inputs: ReplantInputsSent, zoneId: string | null = null) {
    return this.send(who, 'replant-sheet.save', v7(), { plantingId, zoneId, inputs });
  }

  sign(who: Role | 'neighbor', plantingId: string, basisHash: string, more: Record<string, unknown> = {}) {
    return this.send(who, 'decision.sign', v7(), {
      plantingId,
      zoneId: null,
      decided: 'keep',
      signedName: 'Test Grower',
      basisHash,
      ...more,
    });
  }

  read(who: Role | 'neighbor', plantingId: string, zone?: string) {
    const { organisationId } = this;
    return withActor(
      this.db,
      { organisationId, personId: this.people[who].id, now: () => today },
      (context) => readReplant(context, { planting: plantingId, zone }),
    );
  }
}

/** A database of its own with `organisations` settled in it; closed and dropped by the answer's `close`. */
export async function makeDecideScenes(organisations: number) {
  const made = await makeTestDatabase();
  const db = connect(made.appUrl, 4);
  const scenes: DecideScene[] = [];
  for (let index = 0; index < organisations; index += 1) scenes.push(await new DecideScene(db).settle());
  const close = async () => {
    await db.$client.end();
    await made.drop();
  };
  return { scenes, close };
}
