import 'server-only';
import { AppError, badField } from '@/lib/errors/app-error';
import { dateText } from '@/lib/format/date-text';
import { saveReplantSheetSchema, type SaveReplantSheetInput } from '@/lib/schemas/replant-sheet';
import { listZones } from '../../data/planting-zone';
import { insertReplantSheet } from '../../data/replant-sheet';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { originColumns } from '../../operations/origin-columns';
import { findSeenPlanting } from '../plantings/find-seen-planting';
import { isAfterPlanting } from '../replant/replant-terms';

async function service(
  context: WriteContext,
  { plantingId, zoneId, inputs }: SaveReplantSheetInput,
): Promise<Written> {
  const { tx, actor, operation } = context;
  const { organisationId } = actor;
  const { planting } = await findSeenPlanting(context, plantingId);
  if (zoneId !== null) {
    const zones = await listZones(tx, { organisationId, plantingId });
    if (!zones.some(({ id }) => id === zoneId)) throw new AppError('not-found');
  }
  if (inputs.replantOn !== null && !isAfterPlanting(inputs.replantOn, planting.plantedOn)) {
    throw badField('inputs.replantOn', replantDaySentence(planting.plantedOn));
  }
  const added = await insertReplantSheet(tx, {
    id: operation.thingId,
    plantingId,
    zoneId,
    inputs,
    ...originColumns(context),
  });
  if (!added) throw new AppError('operation-reused');
  return { version: 1 };
}

function replantDaySentence(plantedOn: string): string {
  return `This was planted on ${dateText(plantedOn)}. Give a later day of the same year.`;
}

export const saveReplantSheet = defineOperation({
  kind: 'replant-sheet.save',
  version: 1,
  action: 'replant.write',
  body: saveReplantSheetSchema,
  service,
});
