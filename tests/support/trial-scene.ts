import { v7 } from 'uuid';
import { layout } from '@/lib/agronomy/layout';
import type { Comparison, TrialComparison } from '@/lib/schemas/comparison';
import type { ScoreLevel, Scores } from '@/lib/schemas/scores';
import type { ComparisonRule, MainFigure } from '@/lib/schemas/vocabulary';
import { withActor } from '@/lib/server/operations/actor-context';
import { readComparison } from '@/lib/server/services/comparison/read-comparison';
import { readScores } from '@/lib/server/services/scores/read-scores';
import type { DecideScene } from './decide-scene';

type Who = Parameters<DecideScene['send']>[0];
type LaidStrip = { id: string; number: number; block: number; setting: string };

const settingsOf = new WeakMap<DecideScene, Map<string, string>>();

const now = () => new Date('2026-05-20T15:00:00Z');

/** A planting with a trial in it, and the reads that scores and comparisons are made by. Today is 20 May. */
export class TrialScene {
  plantingId = '';
  trialId = '';
  readonly settingIds = new Map<string, string>();
  strips: LaidStrip[] = [];

  constructor(readonly scene: DecideScene) {}

  /** Lays the named settings out, the first of them the reference. */
  async layOut(
    names: readonly string[],
    { blocks = 4, mainFigure = 'plants-per-acre' as MainFigure, rule = 'tukey' as ComparisonRule, plantedOn = '2026-05-07' } = {},
  ): Promise<this> {
    this.plantingId = await this.scene.plant({ plantedOn });
    for (const name of names) this.settingIds.set(name, await this.setting(name));
    const settingIds = names.map((name) => this.settingIds.get(name) ?? '');
    const drawn = layout({ settings: settingIds, blocks, seed: 7 });
    const laid = drawn.blocks.map((block) => ({
      id: v7(),
      strips: block.strips.map((strip) => ({ id: v7(), settingId: strip.setting, number: strip.stripNumber })),
    }));
    this.strips = laid.flatMap((block, index) =>
      block.strips.map((strip) => ({ id: strip.id, number: strip.number, block: index + 1, setting: this.nameOf(strip.settingId) })),
    );
    this.trialId = v7();
    await this.scene.must('agronomist', 'trial.lay-out', this.trialId, {
      plantingId: this.plantingId,
      replacesTrialId: null,
      studyId: v7(),
      studyName: 'Test study',
      layout: drawn.design,
      mainFigure,
      comparisonRule: rule,
      settingIds,
      referenceSettingId: settingIds[0],
      randomSeed: 7,
      blocks: laid.map((block) => ({ id: block.id, strips: block.strips.map(({ id, settingId }) => ({ id, settingId })) })),
    });
    return this;
  }

  /** A setting of the organisation under this name, made when it is first asked for: names are unique there. */
  private async setting(name: string): Promise<string> {
    const made = settingsOf.get(this.scene) ?? new Map<string, string>();
    settingsOf.set(this.scene, made);
    const standing = made.get(name);
    if (standing) return standing;
    const id = v7();
    await this.scene.must('agronomist', 'setting.add', id, {
      name,
      phrase: `the cleaners ${name}`,
      cleaner: 'floating',
      wheels: null,
      pressureDirection: null,
      pressure: null,
      workingDepth: null,
      adjustedFrom: null,
      note: null,
    });
    made.set(name, id);
    return id;
  }

  nameOf(settingId: string): string {
    return [...this.settingIds].find(([, id]) => id === settingId)?.[0] ?? settingId;
  }

  strip(block: number, setting: string): LaidStrip {
    const found = this.strips.find((strip) => strip.block === block && strip.setting === setting);
    if (!found) throw new Error(`No strip of ${setting} in block ${block}.`);
    return found;
  }

  /** Asked about after planting, which every test day is; the answer is yes. */
  async lock(): Promise<void> {
    const sent = ['agronomist', 'trial.lock', this.trialId, {}, { baseVersion: 1 }] as const;
    const answer = await this.scene.send(...sent);
    if (answer.outcome === 'applied') return;
    const confirmations = (answer.questions ?? []).map(({ rule, about }) => ({ rule, about, answer: 'yes' }));
    await this.scene.must('agronomist', 'trial.lock', this.trialId, {}, { baseVersion: 1, confirmations });
  }

  /** One row sample in a strip, with plants up so far by day in May. */
  async countStrip(strip: LaidStrip, counts: Readonly<Record<number, number>>, { length = '174.24 ft', label = `S${strip.number}` } = {}): Promise<string> {
    const id = v7();
    await this.scene.must('agronomist', 'row-samples.add', this.plantingId, {
      plantingId: this.plantingId,
      samples: [{ id, stripId: strip.id, zoneId: null, label, planterRow: 1, length: { typed: length }, startEnd: 'mark', farEnd: 'mark' }],
    });
    for (const [day, plants] of Object.entries(counts)) {
      await this.scene.countAgain(id, plants, `2026-05-${day.padStart(2, '0')}`);
    }
    return id;
  }

  asPlanted(strips: readonly { stripId: string; settingId: string | null; reason: string | null }[]) {
    return this.scene.send('agronomist', 'trial.as-planted', this.trialId, { strips: strips.map((strip) => ({ id: v7(), ...strip })) });
  }

  compare(who: Who = 'agronomist'): Promise<Comparison> {
    return readAs(this.scene, who, (context) => readComparison(context, { planting: this.plantingId }));
  }

  async trial(): Promise<TrialComparison> {
    const comparison = await this.compare();
    if (comparison.kind !== 'trial') throw new Error('There is no trial.');
    return comparison;
  }

  scores(level: ScoreLevel = 'planting', who: Who = 'agronomist'): Promise<Scores> {
    return scoresOf(this.scene, this.plantingId, level, who);
  }
}

export function readAs<T>(scene: DecideScene, who: Who, work: Parameters<typeof withActor<T>>[2]): Promise<T> {
  return withActor(scene.db, { organisationId: scene.organisationId, personId: scene.people[who].id, now }, work);
}

export function scoresOf(scene: DecideScene, planting: string, level: ScoreLevel = 'planting', who: Who = 'agronomist'): Promise<Scores> {
  return readAs(scene, who, (context) => readScores(context, { planting, level }));
}
