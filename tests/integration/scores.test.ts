import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { scoresFinding } from '@/components/scores/scores-finding';
import { inOrganisation } from '@/db/connection';
import { can } from '@/lib/access/can';
import type { Outcome } from '@/lib/agronomy/outcome';
import { scoresSchema } from '@/lib/schemas/scores';
import { updatePlanting } from '@/lib/server/data/planting';
import { CountScene } from '../support/count-scene';
import { makeDecideScenes, type DecideScene } from '../support/decide-scene';
import { scoresOf, TrialScene } from '../support/trial-scene';

let scene: DecideScene;
let other: DecideScene;
let close: () => Promise<void>;

beforeAll(async () => {
  const made = await makeDecideScenes(2);
  [scene, other] = made.scenes as [DecideScene, DecideScene];
  close = made.close;
});
afterAll(() => close());

function valueOf<T>(outcome: Outcome<T>): T {
  if (outcome.kind === 'insufficient') throw new Error(JSON.stringify(outcome));
  return outcome.value;
}

const printedReadings = ['0', '2', '17', '33', '38', '39', '44', '52', '55', '60', '68'];

/** A tape sheet with every `everyth` plant marked blue, the others red. */
const markedPlaces = (plants: number, isLate: (index: number) => boolean) =>
  Array.from({ length: plants }, (_, index) => ({ typed: String(8 + index * 8), marker: isLate(index) ? 'blue' : 'red' }));

describe('scores of a planting', () => {
  it('finds 30,748 plants per acre, 6.8 and 5.1 in and 12.5 bu in the printed tape readings', async () => {
    const counted = await new CountScene(scene).settle(['T-1'], '68 in', 'plant');
    expect((await counted.tape('T-1', printedReadings)).outcome).toBe('applied');
    const scores = await scoresOf(scene, counted.plantingId, 'row-sample');
    const { figures, penalties } = scores.rowSamples[0]?.scored ?? (undefined as never);
    // Readings, mean, SD and loss as printed with the SSMG-37 guide; 10 spaces of 6.8 in are 30,748 an acre.
    expect(valueOf(figures.plantsPerAcre).plantsPerAcre).toBeCloseTo(30_748, 0);
    expect(valueOf(figures.spacingInchesMean)).toBeCloseTo(6.8, 9);
    expect(valueOf(figures.spacingInchesSd)).toBeCloseTo(5.116, 3);
    expect(valueOf(penalties['carlson-doerge-clay']).lossLow).toBeCloseTo(12.5, 1);
    expect(scoresFinding(scores, 'us').headline).toBe('30,748 plants per acre stand, 90 % of the seed.');
  });

  it('counts 31 plants in 17 ft 5 in by the formula', async () => {
    const counted = await new CountScene(scene).settle(['A-1']);
    await counted.mustCount('A-1', { on: '2026-05-19', plants: 31 });
    const { whole } = await scoresOf(scene, counted.plantingId);
    // 31 × 43,560 / (17.4167 × 2.5), about 31,000 (extension services); the length is an inch's fraction short of 1/1000 acre.
    expect(valueOf(whole.figures.plantsPerAcre).plantsPerAcre).toBeCloseTo(31_013, 0);
    // 31 of 34 by Wilson: 26 to 33 plants (R 4.2.2, prop.test).
    const interval = valueOf(whole.figures.plantsPerAcreInterval);
    expect(interval.plantsPerAcreLower / 1000).toBeCloseTo(26.2, 0);
    expect(interval.plantsPerAcreUpper / 1000).toBeCloseTo(33, 0);
    expect(interval.basis).toBe('counting-only');
    expect(whole.figures.spreadDays.kind).toBe('insufficient');
  });

  it('reads 93.2 % where a quarter of the plants came up 10 to 12 days late', async () => {
    const counted = await new CountScene(scene).settle(['L-1'], '30 ft');
    // Planted 7 May: nothing on day 1, 30 plants on day 2, the other 10 between days 11 and 13; the first flush is day 1.13.
    for (const [on, plants, marker] of [
      ['2026-05-08', 0, null],
      ['2026-05-09', 30, 'red'],
      ['2026-05-18', 30, null],
      ['2026-05-20', 40, 'blue'],
    ] as const) {
      await counted.mustCount('L-1', { on, plants, marker });
    }
    const sent = await counted.tape('L-1', markedPlaces(40, (index) => index % 4 === 3), { on: '2026-05-20' });
    expect(sent.outcome, JSON.stringify(sent)).toBe('applied');
    const { whole } = await scoresOf(scene, counted.plantingId);
    const late = valueOf(whole.figures.lateShare);
    expect(late).toMatchObject({ share: 0.25, latePlants: 10, source: 'tape-sheet' });
    expect(valueOf(late.lateDelayDaysMean)).toBeCloseTo(12 - (1 + 4 / 30), 9);
    // Nafziger, Carter and Graham 1991: 93.2 % of the even early stand.
    const penalty = valueOf(whole.penalties['nafziger-1991']);
    expect(100 - penalty.lossLow).toBeCloseTo(93.2, 9);
    expect(penalty.basis).toBe('measured');
  });

  it('reads 78 % where every other plant came up three weeks late', async () => {
    const planting = await scene.plant({ plantedOn: '2026-04-18' });
    const counted = new CountScene(scene);
    counted.plantingId = planting;
    const rowId = v7();
    counted.rows.set('H-1', rowId);
    await scene.must('agronomist', 'row-samples.add', planting, {
      plantingId: planting,
      samples: [{ id: rowId, stripId: null, zoneId: null, label: 'H-1', planterRow: null, length: { typed: '30 ft' }, startEnd: 'mark', farEnd: 'mark' }],
    });
    for (const [on, plants, marker] of [
      ['2026-04-26', 0, null],
      ['2026-04-27', 20, 'red'],
      ['2026-05-18', 20, null],
      ['2026-05-20', 40, 'blue'],
    ] as const) {
      await counted.mustCount('H-1', { on, plants, marker });
    }
    await counted.tape('H-1', markedPlaces(40, (index) => index % 2 === 1), { on: '2026-05-20' });
    const { whole } = await scoresOf(scene, planting);
    // Nafziger, Carter and Graham 1991: half alternating, 21 to 27 days late, 78.0 %.
    expect(100 - valueOf(whole.penalties['nafziger-1991']).lossLow).toBeCloseTo(78, 9);
  });

  it('weighs the stand by the acres of its zones, the rest of the field among them', async () => {
    const low = v7();
    const planting = await scene.plant({ zones: [{ id: low, name: 'Low ground', area: { typed: '18' } }] });
    await scene.count(planting, [13, 13], low);
    await scene.count(planting, [24, 24]);
    const scores = await scoresOf(scene, planting);
    // (18 × 13,000 + 44 × 24,000) / 62 acres, by hand.
    expect(valueOf(scores.whole.figures.plantsPerAcre).plantsPerAcre).toBeCloseTo(20_806.45, 1);
    expect(valueOf(scores.whole.figures.shareOfSeed).share).toBeCloseTo(20_806.45 / 34_000, 4);
    expect(scores.zones.map(({ name, acres }) => [name, acres])).toEqual([['Low ground', 18], [null, 44]]);
    expect(valueOf(scores.whole.figures.scoreStand).points).toBeCloseTo(((20_806.45 / 32_000 - 0.5) / 0.5) * 100, 2);
  });

  it('says so instead of weighing when a zone was not counted', async () => {
    const [low, high] = [v7(), v7()];
    const zones = [{ id: low, name: 'Low', area: { typed: '18' } }, { id: high, name: 'High', area: { typed: '44' } }];
    const planting = await scene.plant({ zones });
    await scene.count(planting, [13, 13], low);
    const { whole, zoneStand } = await scoresOf(scene, planting);
    expect(zoneStand?.stand).toMatchObject({ kind: 'insufficient', reason: 'zone-not-counted' });
    expect(valueOf(whole.figures.plantsPerAcre).plantsPerAcre).toBeCloseTo(13_000, 6);
  });

  it('sets apart a row sample whose visit lies before a planting date moved since, and scores the others', async () => {
    const counted = await new CountScene(scene).settle(['M-1', 'M-2']);
    await counted.mustCount('M-1', { on: '2026-05-12', plants: 3 });
    await counted.mustCount('M-2', { on: '2026-05-19', plants: 30 });
    const { organisationId } = scene;
    await inOrganisation(scene.db, { organisationId }, (tx) =>
      updatePlanting(tx, { organisationId, plantingId: counted.plantingId, version: 1, values: { plantedOn: '2026-05-14' } }),
    );
    const scores = await scoresOf(scene, counted.plantingId);
    expect(scores.notes.impossible).toEqual([{ label: 'M-1', field: 'days' }]);
    expect(valueOf(scores.whole.figures.plantsPerAcre).plantsHeld).toBe(30);
  });

  it('uses the first of two counts of one visit and says how many it did not', async () => {
    const counted = await new CountScene(scene).settle(['D-1']);
    await counted.mustCount('D-1', { on: '2026-05-19', plants: 30 }, 'scout');
    await counted.mustCount('D-1', { on: '2026-05-19', plants: 28 }, 'agronomist');
    const { whole, notes } = await scoresOf(scene, counted.plantingId);
    expect(valueOf(whole.figures.plantsPerAcre).plantsHeld).toBe(30);
    expect(notes.countsNotUsed).toBe(1);
  });

  it('says that nothing was counted, and guesses nothing', async () => {
    const planting = await scene.plant();
    const scores = await scoresOf(scene, planting);
    expect(scoresFinding(scores, 'us')).toEqual({ headline: 'Nothing has been counted yet.', details: [] });
    expect(Object.values(scores.whole.figures).every(({ kind }) => kind === 'insufficient' || kind === 'value')).toBe(true);
    expect(scores.whole.figures.score.kind).toBe('insufficient');
  });

  it('leaves the row samples of a lost strip out of the settings', async () => {
    const trial = await new TrialScene(scene).layOut(['raised', 'floating'], { blocks: 2 });
    for (const strip of trial.strips) await trial.countStrip(strip, { 19: 300 });
    await trial.lock();
    const lost = trial.strip(1, 'raised');
    const planted = await trial.asPlanted([{ stripId: lost.id, settingId: null, reason: 'Washed out' }]);
    expect(planted.outcome, JSON.stringify(planted)).toBe('applied');
    const { settings, notes } = await trial.scores('setting');
    expect(settings.map(({ name, pooled }) => [name, pooled.rowSamples])).toEqual([['raised', 1], ['floating', 2]]);
    expect(notes.rowSamplesOfLostStrips).toBe(1);
    const { strips } = await trial.scores('strip');
    expect(strips.find((strip) => strip.stripId === lost.id)).toMatchObject({ settingBasis: 'lost', settingId: null });
  });
});

describe('who may read scores', () => {
  it('shows a scout the strips and not which setting stands in them', async () => {
    const trial = await new TrialScene(scene).layOut(['raised', 'floating'], { blocks: 2 });
    for (const strip of trial.strips) await trial.countStrip(strip, { 19: 300 });
    expect(can({ ...scoutActor() }, 'scores.read')).toBe(true);
    const settings = await trial.scores('setting', 'scout');
    expect(settings.settings).toEqual([]);
    expect(settings.things.setting).toBe(0);
    const { strips } = await trial.scores('strip', 'scout');
    expect(strips.map(({ settingId, settingName }) => [settingId, settingName])).toEqual(strips.map(() => [null, null]));
    const rows = await trial.scores('row-sample', 'scout');
    expect(JSON.stringify([strips, rows.rowSamples])).not.toMatch(/raised|floating/);
  });

  it('does not find the planting of another organisation or another farm', async () => {
    const planting = await scene.plant();
    await expect(scoresOf(other, planting, 'planting', 'owner')).rejects.toMatchObject({ code: 'not-found' });
    await expect(scoresOf(scene, planting, 'planting', 'neighbor')).rejects.toMatchObject({ code: 'not-found' });
  });

  it.each(['planting', 'setting', 'strip', 'row-sample'] as const)('sends the %s level just as its schema has it', async (level) => {
    const trial = await new TrialScene(scene).layOut(['raised', 'floating'], { blocks: 2 });
    for (const strip of trial.strips) await trial.countStrip(strip, { 17: 0, 18: 200, 19: 300 });
    const read = await trial.scores(level);
    expect(scoresSchema.parse(JSON.parse(JSON.stringify(read)))).toEqual(read);
  });
});

function scoutActor() {
  return { personId: '', name: '', organisationId: '', role: 'scout' as const, farmIds: [] };
}
