import 'server-only';
import { AppError, badField } from '@/lib/errors/app-error';
import { layOutTrialSchema, type LayOutTrialInput } from '@/lib/schemas/trial';
import { listRowSamples } from '../../data/row-sample';
import { lockSettings } from '../../data/setting';
import { insertBlocks, insertStrips } from '../../data/strip';
import { findTrialOfPlanting, insertStudyOnce, insertTrial, removeTrial } from '../../data/trial';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { originColumns } from '../../operations/origin-columns';
import { holdPlanting } from '../plantings/hold-planting';
import { assertDrawn } from './assert-drawn';

async function service(context: WriteContext, body: LayOutTrialInput): Promise<Written> {
  const { tx, actor, operation } = context;
  const { organisationId } = actor;
  const { planting } = await holdPlanting(context, body.plantingId);
  const standing = await findTrialOfPlanting(tx, { organisationId, plantingId: planting.id });
  if (standing?.lockedAt) throw new AppError('locked');
  if ((standing?.id ?? null) !== body.replacesTrialId) throw new AppError('conflict', { standingVersion: standing?.version ?? 0 });
  const samples = await listRowSamples(tx, { organisationId, plantingId: planting.id });
  if (standing && samples.some((sample) => sample.stripId !== null)) {
    throw new AppError('in-use', { sentence: 'Row samples lie in these strips. Remove them before drawing the layout again.' });
  }
  const known = await lockSettings(tx, { organisationId, settingIds: body.settingIds });
  if (!body.settingIds.every((each) => known.has(each))) throw badField('settingIds', 'A chosen setting is not there any more. Choose again.');
  assertDrawn(body);
  if (standing) await removeTrial(tx, { organisationId, trialId: standing.id });
  await insertStudyOnce(tx, { id: body.studyId, name: body.studyName, ...originColumns(context) });
  await insertTrial(tx, {
    id: operation.thingId,
    studyId: body.studyId,
    plantingId: planting.id,
    layout: body.layout,
    mainFigure: body.mainFigure,
    comparisonRule: body.comparisonRule,
    referenceSettingId: body.referenceSettingId,
    randomSeed: body.randomSeed,
    ...originColumns(context),
  });
  await insertBlocks(tx, body.blocks.map((block, index) => ({ organisationId, id: block.id, trialId: operation.thingId, number: index + 1 })));
  await insertStrips(
    tx,
    body.blocks.flatMap((block, index) =>
      block.strips.map((strip, place) => ({
        organisationId,
        id: strip.id,
        blockId: block.id,
        number: index * body.settingIds.length + place + 1,
        plannedSettingId: strip.settingId,
      })),
    ),
  );
  return { version: 1 };
}

export const layOutTrial = defineOperation({ kind: 'trial.lay-out', version: 1, action: 'trials.write', body: layOutTrialSchema, service });
