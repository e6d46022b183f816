import 'server-only';
import { AppError, badField } from '@/lib/errors/app-error';
import { asPlantedSchema, type AsPlantedInput } from '@/lib/schemas/trial';
import { lockSettings } from '../../data/setting';
import { insertStripsAsPlanted, listStrips } from '../../data/strip';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { originColumns } from '../../operations/origin-columns';
import { holdSeenTrial } from './hold-seen-trial';

async function service(context: WriteContext, body: AsPlantedInput): Promise<Written> {
  const { tx, actor, operation } = context;
  const { organisationId } = actor;
  const { trial } = await holdSeenTrial(context, operation.thingId);
  if (!trial.lockedAt) throw new AppError('bad-input', { sentence: 'Lock the plan first; what was planted is held against it.' });
  const strips = await listStrips(tx, { organisationId, trialId: trial.id });
  const settingIds = body.strips.flatMap((planted) => (planted.settingId === null ? [] : [planted.settingId]));
  const known = await lockSettings(tx, { organisationId, settingIds });
  if (new Set(body.strips.map((planted) => planted.stripId)).size !== body.strips.length) throw badField('strips', 'Name each strip once.');
  body.strips.forEach((planted, index) => {
    const strip = strips.find((each) => each.id === planted.stripId);
    if (!strip) throw badField(`strips.${index}.stripId`, 'This strip is not in the trial.');
    if (planted.settingId !== null && !known.has(planted.settingId)) throw badField(`strips.${index}.settingId`, 'Choose one of the settings.');
    if (planted.settingId !== strip.plannedSettingId && planted.reason === null) {
      throw badField(`strips.${index}.reason`, 'Say why the strip was planted otherwise than planned.');
    }
  });
  await insertStripsAsPlanted(tx, body.strips.map((planted) => ({ ...planted, ...originColumns(context) })));
  return { version: trial.version };
}

export const recordAsPlanted = defineOperation({ kind: 'trial.as-planted', version: 1, action: 'trials.write', body: asPlantedSchema, service });
