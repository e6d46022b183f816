import { sql } from 'drizzle-orm';
import { v7 } from 'uuid';
import { inOrganisation } from '@/db/connection';
import { layout } from '@/lib/agronomy/layout';
import type { Answer } from '@/lib/schemas/operation';
import { readFarm } from '@/lib/server/services/farms/read-farm';
import { readFarms } from '@/lib/server/services/farms/read-farms';
import { readField } from '@/lib/server/services/fields/read-field';
import { readPlan } from '@/lib/server/services/plantings/read-plan';
import { readSettings } from '@/lib/server/services/settings/read-settings';
import type { DecideScene } from './decide-scene';
import { readAs } from './trial-scene';

export type Body = Record<string, unknown>;

let made = 0;
/** Names are unique within an organisation where a picture would confuse them. */
export const newName = (what: string) => `${what} ${(made += 1)}`;

export const farmBody = (more: Body = {}): Body => ({ name: newName('Farm'), timeZone: 'America/Chicago', ...more });
export const fieldBody = (more: Body = {}): Body => ({ name: newName('Field'), area: { typed: '62' }, ...more });
export const plantingBody = (more: Body = {}): Body => ({
  plantedOn: '2026-05-07',
  plantedAt: '09:00',
  crop: 'corn',
  rowSpacing: { typed: '30' },
  seedingRate: { typed: '34,000' },
  tagGermination: { typed: '95' },
  intendedStand: { typed: '31,500' },
  fullYield: { typed: '200' },
  previousCrop: 'soybean',
  tillage: 'no-till',
  slowAfterDays: 2,
  lateAfterDays: 7,
  veryLateAfterDays: 14,
  zones: [{ id: v7(), name: 'low', area: { typed: '18' } }],
  ...more,
});
export const settingBody = (more: Body = {}): Body => ({
  name: newName('Setting'),
  phrase: 'the cleaners as a test has them',
  cleaner: 'floating',
  wheels: 'toothed',
  pressureDirection: 'down',
  pressure: { typed: '40' },
  workingDepth: { typed: '1/2' },
  adjustedFrom: 'cab',
  note: null,
  ...more,
});
export const rowSampleBody = (more: Body = {}): Body => ({
  stripId: null,
  zoneId: null,
  label: newName('R'),
  planterRow: 3,
  length: { typed: '17 ft 5 in' },
  startEnd: 'mark',
  farEnd: 'plant',
  ...more,
});

/** A layout as the seed draws it; `more` spoils it. */
export function drawnBody(plantingId: string, settingIds: readonly string[], { blocks = 4, seed = 7, more = {} as Body } = {}): Body & { blocks: LaidBlock[] } {
  const drawn = layout({ settings: settingIds, blocks, seed });
  return {
    plantingId,
    replacesTrialId: null,
    studyId: v7(),
    studyName: 'Test study',
    layout: drawn.design,
    mainFigure: 'spread-days',
    comparisonRule: 'tukey',
    settingIds,
    referenceSettingId: settingIds[0],
    randomSeed: seed,
    blocks: drawn.blocks.map((block) => ({ id: v7(), strips: block.strips.map((strip) => ({ id: v7(), settingId: strip.setting })) })),
    ...more,
  };
}
export type LaidBlock = { id: string; strips: { id: string; settingId: string }[] };

/** The same thing with what lies at a path set to something else; undefined leaves it out. */
export function withAt<Thing>(thing: Thing, path: string, value: unknown): Thing {
  const [step = '', ...rest] = path.split('.');
  const copy = (Array.isArray(thing) ? [...thing] : { ...thing }) as Record<string, unknown>;
  if (rest.length > 0) copy[step] = withAt(copy[step], rest.join('.'), value);
  else if (value === undefined) delete copy[step];
  else copy[step] = value;
  return copy as Thing;
}

export type PlanKind = 'farm' | 'field' | 'planting' | 'setting' | 'row-sample';

/** The writes of a plan, each sent as an operation, and what the pages then read. Today is 20 May 2026. */
export class PlanScene {
  /** Stand throughout, to hang new things on. */
  fieldId = '';
  plantingId = '';

  constructor(readonly scene: DecideScene) {}

  async settle(): Promise<this> {
    this.fieldId = await this.addField();
    this.plantingId = await this.addPlanting({ fieldId: this.fieldId });
    return this;
  }

  /** The body that adds a thing of this kind, sound as it stands. */
  body(kind: PlanKind): Body {
    if (kind === 'farm') return farmBody();
    if (kind === 'field') return fieldBody({ farmId: this.scene.farmId });
    if (kind === 'planting') return plantingBody({ fieldId: this.fieldId });
    if (kind === 'setting') return settingBody();
    return { plantingId: this.plantingId, samples: [rowSampleBody({ id: v7() })] };
  }

  /** Row samples are added many at a time, to their planting. */
  send(kind: PlanKind, body: Body, more: Body = {}, who: Parameters<DecideScene['send']>[0] = 'agronomist'): Promise<Answer> {
    return kind === 'row-sample'
      ? this.scene.send(who, 'row-samples.add', this.plantingId, body, more)
      : this.scene.send(who, `${kind}.add`, v7(), body, more);
  }

  private async added(kind: string, body: Body): Promise<string> {
    const id = v7();
    await this.scene.must('agronomist', kind, id, body);
    return id;
  }

  addFarm = (more: Body = {}) => this.added('farm.add', farmBody(more));
  addField = (more: Body = {}) => this.added('field.add', fieldBody({ farmId: this.scene.farmId, ...more }));
  addSetting = (more: Body = {}) => this.added('setting.add', settingBody(more));

  async addPlanting(more: Body = {}): Promise<string> {
    const fieldId = more.fieldId ?? (await this.addField());
    return this.added('planting.add', plantingBody({ fieldId, ...more }));
  }

  async addRowSample(plantingId: string, more: Body = {}): Promise<string> {
    const id = v7();
    await this.scene.must('agronomist', 'row-samples.add', plantingId, { plantingId, samples: [rowSampleBody({ id, ...more })] });
    return id;
  }

  /** A planting with a trial of settings made for it. */
  async addTrial({ settings = 2, blocks = 4, plantingId = '' } = {}) {
    const ownPlantingId = plantingId || (await this.addPlanting());
    const settingIds: string[] = [];
    for (let index = 0; index < settings; index += 1) settingIds.push(await this.addSetting());
    const trialId = v7();
    const body = drawnBody(ownPlantingId, settingIds, { blocks });
    await this.scene.must('agronomist', 'trial.lay-out', trialId, body);
    return { plantingId: ownPlantingId, settingIds, trialId, body, strips: body.blocks.flatMap((block) => block.strips) };
  }

  async addLockedTrial(plan: Parameters<PlanScene['addTrial']>[0] = {}) {
    const laid = await this.addTrial(plan);
    await this.scene.must('agronomist', 'trial.lock', laid.trialId, {}, { baseVersion: 1 });
    return laid;
  }

  farms = () => readAs(this.scene, 'agronomist', (context) => readFarms(context));
  farm = (farmId: string) => readAs(this.scene, 'agronomist', (context) => readFarm(context, farmId));
  field = (fieldId: string) => readAs(this.scene, 'agronomist', (context) => readField(context, fieldId));
  plan = (plantingId: string, who: 'agronomist' | 'scout' | 'grower' = 'agronomist') => readAs(this.scene, who, (context) => readPlan(context, plantingId));
  settings = () => readAs(this.scene, 'agronomist', (context) => readSettings(context));

  async setting(settingId: string) {
    return (await this.settings()).find((each) => each.id === settingId);
  }

  rows<Row extends Record<string, unknown>>(query: ReturnType<typeof sql>) {
    return inOrganisation(this.scene.db, { organisationId: this.scene.organisationId }, async (tx) => (await tx.execute<Row>(query)).rows);
  }

  /** What was kept of the edits of a thing that lost, as they were sent. */
  async lost(thingId: string) {
    const kept = await this.rows<{ kind: string; body: Body; base_version: number; standing_version: number }>(
      sql`select kind, body, base_version, standing_version from losing_edit where thing_id = ${thingId}`,
    );
    return kept.map(({ kind, body, base_version: baseVersion, standing_version: standingVersion }) => ({ kind, body, baseVersion, standingVersion }));
  }

  /** Whether a row stands, was removed, or never came. */
  async stands(table: string, id: string): Promise<'stands' | 'removed' | 'never came'> {
    const [row] = await this.rows<{ removed_at: string | null }>(sql`select removed_at from ${sql.identifier(table)} where id = ${id}`);
    if (!row) return 'never came';
    return row.removed_at === null ? 'stands' : 'removed';
  }
}

export const refusedAt = (answer: Answer) => ({ outcome: answer.outcome, code: answer.code, paths: [...new Set(answer.fields?.map((field) => field.path))] });
export const atField = (...paths: string[]) => ({ outcome: 'refused', code: 'bad-input', paths });
