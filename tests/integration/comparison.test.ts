import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { comparisonWords } from '@/components/comparison/comparison-words';
import { noteSentences } from '@/components/comparison/note-sentences';
import { can } from '@/lib/access/can';
import { comparisonSchema, type ComparedFigure, type TrialComparison } from '@/lib/schemas/comparison';
import { readComparison } from '@/lib/server/services/comparison/read-comparison';
import { makeDecideScenes, type DecideScene } from '../support/decide-scene';
import { readAs, TrialScene } from '../support/trial-scene';

let scene: DecideScene;
let other: DecideScene;
let close: () => Promise<void>;

beforeAll(async () => {
  const made = await makeDecideScenes(2);
  [scene, other] = made.scenes as [DecideScene, DecideScene];
  close = made.close;
});
afterAll(() => close());

const by = (comparison: TrialComparison, figure: ComparedFigure) => {
  const found = comparison.figures.find((each) => each.figure === figure);
  if (!found) throw new Error(figure);
  return found;
};

/** Strips in six pairs, in thousand plants per acre; the comparison is R's: t.test(paired = TRUE), R 4.2.2. */
const floatingOf = [29.1, 30.4, 28.7, 31.2, 30.0, 29.5];
const raisedOf = [27.8, 29.9, 27.1, 29.6, 29.2, 27.7];

async function sixPairs(options: Parameters<TrialScene['layOut']>[1] = {}): Promise<TrialScene> {
  const trial = await new TrialScene(scene).layOut(['raised', 'floating'], { blocks: 6, ...options });
  for (const strip of trial.strips) {
    const figure = (strip.setting === 'raised' ? raisedOf : floatingOf)[strip.block - 1] ?? 0;
    // A row sample of ten thousandths of an acre holds ten times the thousands.
    await trial.countStrip(strip, { 19: Math.round(figure * 10) });
  }
  return trial;
}

describe('the comparison of settings', () => {
  it('finds the difference, its interval and p of six pairs as R does, and says it', async () => {
    const trial = await sixPairs();
    await trial.lock();
    const comparison = await trial.trial();
    const { differences, analysis, means } = by(comparison, 'plants-per-acre');
    const [pair] = differences;
    const sign = pair?.first === trial.settingIds.get('floating') ? 1 : -1;
    expect((pair?.difference ?? 0) * sign).toBeCloseTo(1266.67, 1);
    expect(Math.min(Math.abs(pair?.lower ?? 0), Math.abs(pair?.upper ?? 0))).toBeCloseTo(729, 0);
    expect(Math.max(Math.abs(pair?.lower ?? 0), Math.abs(pair?.upper ?? 0))).toBeCloseTo(1805, 0);
    expect(analysis).toMatchObject({ kind: 'value', value: { errorDegreesOfFreedom: 5, blocks: 6, missingStrips: 0 } });
    // All six pairs lie one way: 2 of 64 arrangements, by hand.
    expect(comparison.randomization).toMatchObject({ kind: 'value', value: { method: 'exact', arrangements: 64, asExtreme: 2, p: 0.03125 } });
    expect(means.map(({ letters }) => letters).sort()).toEqual(['a', 'b']);
    const words = comparisonWords(comparison, 'us');
    expect(words.headline).toBe('With the cleaners floating, the stand was 1,300 plants per acre thicker than with the cleaners raised.');
    expect(words.sub[0]).toBe('The 95 % interval is 700 to 1,800 plants per acre, from 6 blocks.');
    expect(words.more).toContain('Only 5 degrees of freedom stand behind the error: how far strips vary is itself hardly known.');
    expect(comparisonWords(comparison, 'metric').headline).toContain('3,100 plants per hectare thicker');
    expect(by(comparison, 'spread-days').means).toEqual([]);
    expect(by(comparison, 'share-of-seed').means.map(({ letters }) => letters)).toEqual([null, null]);
  });

  it('claims nothing while the main figure is not locked', async () => {
    const comparison = await (await sixPairs()).trial();
    expect(comparison.trial.isLocked).toBe(false);
    const { headline, more } = comparisonWords(comparison, 'us');
    expect(headline).toBe('The main figure is not locked, so nothing is claimed.');
    expect(more).toEqual([]);
  });

  it('says "so far" of a spread while a strip is still counted, and that it is a bound', async () => {
    const trial = await new TrialScene(scene).layOut(['raised', 'floating'], { blocks: 4, mainFigure: 'spread-days' });
    for (const strip of trial.strips) {
      // All plants between two visits: eight tenths of the days between them are the spread.
      const to = strip.setting === 'raised' ? 14 : 11;
      const last = strip.block === 1 ? { [to]: 300 } : { [to]: 300, 16: 300, 17: 300 };
      await trial.countStrip(strip, { [8 + (strip.block % 2)]: 0, ...last });
    }
    await trial.lock();
    const comparison = await trial.trial();
    const spread = by(comparison, 'spread-days');
    const of = (setting: string, block: number) => spread.strips.find((strip) => strip.stripId === trial.strip(block, setting).id)?.value;
    // (14 − 8) × 0.8 = 4.8 and (11 − 9) × 0.8 = 1.6 days, by hand.
    expect(of('raised', 2)).toEqual({ kind: 'value', value: { figure: expect.closeTo(4.8, 9), isBound: false } });
    expect(of('floating', 1)).toEqual({ kind: 'value', value: { figure: expect.closeTo(1.6, 9), isBound: true } });
    // Every pair differs by 2.4 days exactly: strips that do not vary show no error to hold a difference against.
    expect(comparisonWords(comparison, 'us').headline).toBe('The strips do not vary as measured strips do: nothing to compare.');
    expect(comparison.notes.stillCounting).toEqual(trial.strips.filter((strip) => strip.block === 1).map((strip) => strip.number));
    expect(noteSentences(comparison, 'us')[0]).toMatch(/^Counting has not ended in 2 strips of 8 \(1, 2\): there the emergence spread is only a bound\.$/);
  });

  it('has nothing to compare in one block, and nothing at all before the first count', async () => {
    const one = await new TrialScene(scene).layOut(['raised', 'floating'], { blocks: 1 });
    expect(comparisonWords(await one.trial(), 'us').headline).toBe('Nothing has been counted yet.');
    for (const strip of one.strips) await one.countStrip(strip, { 19: 300 });
    await one.lock();
    expect(comparisonWords(await one.trial(), 'us').headline).toBe('One block: nothing to compare yet.');
  });

  it('compares a strip as what it ran, leaves a lost one out, and says both', async () => {
    const trial = await sixPairs();
    await trial.lock();
    const [lost, changed] = [trial.strip(1, 'raised'), trial.strip(2, 'raised')];
    const planted = [
      { stripId: lost.id, settingId: null, reason: 'Washed out' },
      { stripId: changed.id, settingId: trial.settingIds.get('floating') ?? '', reason: 'Switch stuck' },
    ];
    const sent = await trial.asPlanted(planted);
    expect(sent.outcome, JSON.stringify(sent)).toBe('applied');
    const comparison = await trial.trial();
    expect(comparison.settings.map(({ name, strips }) => [name, strips])).toEqual([['raised', 4], ['floating', 7]]);
    expect(comparison.notes.blocksNotAsDealt).toEqual([2]);
    // Blocks 3 to 6 were run as dealt with both strips standing: 2 of 16 arrangements, by hand.
    expect(comparison.randomization).toMatchObject({ kind: 'value', value: { arrangements: 16, asExtreme: 2 } });
    const sentences = noteSentences(comparison, 'us');
    expect(sentences).toContain(`Strip ${changed.number} ran floating where raised was planned (Switch stuck); it counts as what it ran.`);
    expect(sentences).toContain(`Strip ${lost.number} was lost (Washed out); left out with it: 1 row sample.`);
    expect(sentences).toContain('Nobody has said what was really run in 10 strips; the plan is taken.');
  });

  it('compares with the reference only where that was planned, without letters', async () => {
    const trial = await sixPairs({ rule: 'holm' });
    await trial.lock();
    const comparison = await trial.trial();
    const { means, differences } = by(comparison, 'plants-per-acre');
    expect(means.every(({ letters }) => letters === null)).toBe(true);
    expect(differences).toHaveLength(1);
    expect(differences[0]).toMatchObject({ second: trial.settingIds.get('raised'), toldApart: true });
    expect(differences[0]?.difference).toBeCloseTo(1266.67, 1);
  });

  it('adds in-row cover of a strip over all marks read in it', async () => {
    const trial = await new TrialScene(scene).layOut(['raised', 'floating'], { blocks: 2 });
    for (const strip of trial.strips) {
      const row = await trial.countStrip(strip, { 19: 300 });
      const marksCovered = strip.setting === 'raised' ? 72 : 18;
      await scene.must('scout', 'residue.record', v7(), { rowSampleId: row, readOn: '2026-05-12', marksRead: 100, marksCovered });
    }
    const cover = by(await trial.trial(), 'in-row-cover');
    expect(cover.means.map(({ mean }) => mean).sort()).toEqual([0.18, 0.72]);
  });

  it('travels just as its schema has it', async () => {
    const trial = await sixPairs();
    const read = await trial.compare();
    expect(comparisonSchema.parse(JSON.parse(JSON.stringify(read)))).toEqual(read);
  });
});

describe('who may read a comparison', () => {
  it('is not for scouts', () => {
    const scout = { personId: '', name: '', organisationId: '', role: 'scout' as const, farmIds: [] };
    expect(can(scout, 'scores.read')).toBe(true);
    expect(can(scout, 'comparison.read')).toBe(false);
  });

  it('does not find the trial of another organisation or another farm', async () => {
    const trial = await new TrialScene(scene).layOut(['raised', 'floating'], { blocks: 2 });
    const ask = (from: DecideScene, who: 'owner' | 'neighbor') =>
      readAs(from, who, (context) => readComparison(context, { planting: trial.plantingId }));
    await expect(ask(other, 'owner')).rejects.toMatchObject({ code: 'not-found' });
    await expect(ask(scene, 'neighbor')).rejects.toMatchObject({ code: 'not-found' });
  });

  it('says that there is no trial in a planting without one', async () => {
    const planting = await scene.plant();
    const comparison = await readAs(scene, 'grower', (context) => readComparison(context, { planting }));
    expect(comparison.kind).toBe('no-trial');
  });
});
