import { sql } from 'drizzle-orm';
import { v7 } from 'uuid';
import { connect, inOrganisation } from '@/db/connection';
import { layout } from '@/lib/agronomy/layout';
import type { Chance } from '../chaos/chance';
import { insertPeople, lengthTyped, mustApply } from '../chaos/scene';

export type FieldScene = { organisationId: string; plantingId: string; scout: { personId: string; email: string }; strips: number; rows: { label: string; id: string }[] };

/** A trial of four settings in complete blocks with two row samples a strip, and one scout who belongs to its farm. */
export async function settleTrial(databaseUrl: string, chance: Chance, { blocks, plantedOn }: { blocks: number; plantedOn: string }): Promise<FieldScene> {
  const db = connect(databaseUrl, 2);
  try {
    const organisationId = chance.id();
    const owner = { personId: chance.id(), email: `owner-${organisationId}@example.test`, role: 'owner' };
    const scout = { personId: chance.id(), email: `scout-${organisationId}@example.test`, role: 'scout' };
    await insertPeople(db, organisationId, [owner, scout]);
    const must = mustApply(db, { organisationId, personId: owner.personId, deviceId: v7() }, chance);
    const [farmId, fieldId, plantingId, trialId] = [chance.id(), chance.id(), chance.id(), chance.id()];
    await must('farm.add', farmId, { name: 'Harness farm', timeZone: 'America/Chicago' });
    await inOrganisation(db, { organisationId }, (tx) => tx.execute(sql`insert into farm_person (organisation_id, farm_id, person_id) values (${organisationId}, ${farmId}, ${scout.personId})`));
    await must('field.add', fieldId, { farmId, name: 'Harness field', area: { typed: '40' } });
    await must('planting.add', plantingId, {
      fieldId, plantedOn, plantedAt: null, crop: 'corn', rowSpacing: { typed: '30' }, seedingRate: { typed: '34,000' }, tagGermination: null, intendedStand: { typed: '32,000' }, fullYield: null,
      previousCrop: null, tillage: null, slowAfterDays: 2, lateAfterDays: 7, veryLateAfterDays: 14, zones: [],
    });
    const settingIds = await Promise.all(['one', 'two', 'three', 'four'].map(async (name) => {
      const id = chance.id();
      await must('setting.add', id, { name: `CANARYSETTING ${name}`, phrase: `cleaners as ${name}`, cleaner: 'none', wheels: null, pressureDirection: null, pressure: null, workingDepth: null, adjustedFrom: null, note: null });
      return id;
    }));
    const stripsOf = layout({ settings: settingIds, blocks, seed: 1 }).blocks.map((block) => ({ id: chance.id(), strips: block.strips.map(({ setting }) => ({ id: chance.id(), settingId: setting })) }));
    await must('trial.lay-out', trialId, {
      plantingId, studyId: chance.id(), studyName: 'Harness study', replacesTrialId: null, layout: 'complete-blocks', mainFigure: 'spread-days', comparisonRule: 'tukey', settingIds, referenceSettingId: settingIds[0], randomSeed: 1, blocks: stripsOf,
    });
    const samples = stripsOf.flatMap((block) => block.strips).flatMap((strip, index) =>
      [1, 2].map((line) => ({ id: chance.id(), stripId: strip.id, zoneId: null, label: `S${index + 1}-${line}`, planterRow: 3, length: { typed: lengthTyped }, startEnd: 'mark', farEnd: 'mark' })),
    );
    await must('row-samples.add', plantingId, { plantingId, samples });
    return { organisationId, plantingId, scout, strips: blocks * settingIds.length, rows: samples.map(({ label, id }) => ({ label, id })) };
  } finally {
    await db.$client.end();
  }
}
