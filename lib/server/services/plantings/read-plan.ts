import 'server-only';
import { can } from '@/lib/access/can';
import { listZones } from '../../data/planting-zone';
import { listVisitedRowSampleIds } from '../../data/planting-progress';
import { listRowSamples } from '../../data/row-sample';
import { listSettings } from '../../data/setting';
import { listStrips } from '../../data/strip';
import { findStudy, findTrialOfPlanting } from '../../data/trial';
import type { ReadContext } from '../../operations/context';
import { readingOf } from '../../operations/reading-columns';
import { settingView } from '../settings/setting-view';
import { findSeenPlanting } from './find-seen-planting';
import { plantingView } from './planting-view';

/** The plan of a planting: its facts and zones, the trial laid out in it, and the places that are counted. */
export async function readPlan(context: ReadContext, plantingId: string) {
  const { tx, actor } = context;
  const { organisationId } = actor;
  const { planting, field, farm } = await findSeenPlanting(context, plantingId);
  const of = { organisationId, plantingId };
  const trial = await findTrialOfPlanting(tx, of);
  const strips = trial ? await listStrips(tx, { organisationId, trialId: trial.id }) : [];
  const study = trial ? await findStudy(tx, { organisationId, studyId: trial.studyId }) : undefined;
  const visited = new Set(await listVisitedRowSampleIds(tx, { organisationId, plantingIds: [plantingId] }));
  // Whoever counts must not know which setting a strip has, or the counts lean towards what is expected.
  const showTrial = can(actor, 'comparison.read');
  return {
    farmId: farm.id,
    field: { id: field.id, name: field.name, area: readingOf(field.areaTyped, field.areaUnit, field.areaThousandths) },
    planting: plantingView(planting, await listZones(tx, of)),
    settings: showTrial ? (await listSettings(tx, { organisationId })).map(settingView) : [],
    strips: strips.map(({ id, number }) => ({ id, number })),
    trial: trial && showTrial
      ? {
          id: trial.id,
          version: trial.version,
          studyId: trial.studyId,
          studyName: study?.name ?? '',
          layout: trial.layout,
          mainFigure: trial.mainFigure,
          comparisonRule: trial.comparisonRule,
          referenceSettingId: trial.referenceSettingId,
          randomSeed: trial.randomSeed,
          lockedAt: trial.lockedAt,
          strips,
        }
      : null,
    rowSamples: (await listRowSamples(tx, of)).map((sample) => ({
      id: sample.id,
      version: sample.version,
      stripId: sample.stripId,
      zoneId: sample.zoneId,
      label: sample.label,
      planterRow: sample.planterRow,
      length: { typed: sample.lengthTyped, unit: sample.lengthUnit, thousandths: sample.lengthThousandths },
      startEnd: sample.startEnd,
      farEnd: sample.farEnd,
      visited: visited.has(sample.id),
    })),
    may: { write: can(actor, 'plantings.write'), layOut: can(actor, 'trials.write'), showTrial },
  };
}
export type Plan = Awaited<ReturnType<typeof readPlan>>;
