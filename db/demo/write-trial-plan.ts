import { layoutSeed } from './chosen-seeds';
import { dayAfter } from './day-after';
import { fieldIds } from './demo-farms';
import { demoId } from './demo-id';
import { settingIdOf } from './demo-settings';
import type { DemoWriter } from './demo-writer';
import { trialId, trialPlantingId } from './trial-ids';
import type { LaidBlock } from './trial-layout';
import { trialPlan, trialTruth } from './trial-truth';

/** The trial until it is planted: the planting, a drawn and locked layout, every strip run as planned, and its row samples. */
export async function writeTrialPlan(write: DemoWriter, blocks: readonly LaidBlock[]): Promise<void> {
  const { plantedOn } = trialPlan;
  const planned = { by: 'agronomist', on: '2026-03-12' };
  const strips = blocks.flatMap((block) => block.strips);
  await write({ ...planned, kind: 'planting.add', thingId: trialPlantingId, body: plantingBody() });
  await write({ ...planned, kind: 'trial.lay-out', thingId: trialId, body: layoutBody(blocks) });
  await write({ ...planned, kind: 'trial.lock', thingId: trialId, body: {}, baseVersion: 1 });
  const asPlanted = strips.map(({ id, number, settingId }) => ({ id: demoId(`quillfern/as-planted/${number}`), stripId: id, settingId, reason: null }));
  await write({ by: 'agronomist', on: plantedOn, kind: 'trial.as-planted', thingId: trialId, body: { strips: asPlanted } });
  const samples = strips.flatMap((strip) =>
    strip.rows.map(({ id, label, planterRow }) => ({ id, stripId: strip.id, zoneId: null, label, planterRow, length: { typed: '17 ft 5 in' }, startEnd: 'mark', farEnd: 'mark' })),
  );
  await write({ by: 'agronomist', on: dayAfter(plantedOn, 1), kind: 'row-samples.add', thingId: trialPlantingId, body: { plantingId: trialPlantingId, samples } });
}

function plantingBody() {
  const { plantedOn, lateLimits } = trialPlan;
  return {
    fieldId: fieldIds.northHalf,
    plantedOn,
    plantedAt: null,
    crop: 'corn',
    rowSpacing: { typed: '30' },
    seedingRate: { typed: '34,000' },
    tagGermination: { typed: '95' },
    intendedStand: { typed: '31,500' },
    fullYield: { typed: '215' },
    previousCrop: 'corn',
    tillage: 'no-till',
    slowAfterDays: lateLimits.slowDays,
    lateAfterDays: lateLimits.lateDays,
    veryLateAfterDays: lateLimits.veryLateDays,
    zones: [],
  };
}

function layoutBody(blocks: readonly LaidBlock[]) {
  return {
    plantingId: trialPlantingId,
    studyId: demoId('quillfern/study'),
    studyName: 'Cleaner settings in corn after corn',
    layout: 'complete-blocks',
    mainFigure: 'spread-days',
    comparisonRule: 'tukey',
    settingIds: trialTruth.map(({ key }) => settingIdOf(key)),
    referenceSettingId: settingIdOf('raised'),
    randomSeed: layoutSeed,
    blocks: blocks.map(({ id, strips }) => ({ id, strips: strips.map((strip) => ({ id: strip.id, settingId: strip.settingId })) })),
  };
}
