import 'server-only';
import { AppError, badField } from '@/lib/errors/app-error';
import { dateText } from '@/lib/format/date-text';
import { startSpotCountSchema, type StartSpotCountInput } from '@/lib/schemas/spot-count';
import { findField, insertField } from '../../data/field';
import { findPlanting, insertPlanting } from '../../data/planting';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { originColumns } from '../../operations/origin-columns';
import { holdFarm } from '../farms/hold-farm';
import { holdField } from '../fields/hold-field';
import { latestPlantingDay } from '../plantings/latest-planting-day';
import { plantingColumns } from '../plantings/planting-columns';
import { spotPlanting } from './spot-planting';

/** A scout may start one on a farm they are attached to, although plans are otherwise made by others: it holds places to count and no setting. */
async function service(context: WriteContext, body: StartSpotCountInput): Promise<Written> {
  const { tx, actor, operation, clock, originKind } = context;
  const farm = await holdFarm(context, body.farmId);
  const today = clock.today(farm.timeZone);
  // The phone's day may be ahead of ours; a stand that is counted has been planted all the same.
  if (originKind !== 'phone' && body.plantedOn > today) throw badField('plantedOn', `This day has not come yet; today is ${dateText(today)}. Check the date.`);
  if (body.plantedOn > latestPlantingDay(today)) throw badField('plantedOn', 'This planting date is more than a year ahead. Check the year.');
  await keepField(context, farm.id, body.field);
  const { field } = await holdField(context, body.field.id);
  const columns = { fieldId: field.id, ...plantingColumns(spotPlanting(body)) };
  const twin = await findPlanting(tx, { organisationId: actor.organisationId, plantingId: operation.thingId });
  if (twin) {
    if (!Object.entries(columns).every(([key, value]) => twin[key as keyof typeof columns] === value)) throw new AppError('operation-reused');
    return { version: twin.version };
  }
  if (!(await insertPlanting(tx, { id: operation.thingId, ...columns, ...originColumns(context) }))) throw new AppError('operation-reused');
  return { version: 1 };
}

/** Makes the field where the scout named a new one; one that stands under its id already has to be on this farm. */
async function keepField(context: WriteContext, farmId: string, { id, name }: StartSpotCountInput['field']): Promise<void> {
  const { tx, actor } = context;
  if (name !== null) await insertField(tx, { id, farmId, name, ...originColumns(context) });
  const standing = await findField(tx, { organisationId: actor.organisationId, fieldId: id });
  if (standing?.farmId !== farmId) throw badField('field.id', 'This field is not on the farm. Choose one that is, or name a new one.');
}

export const startSpotCount = defineOperation({ kind: 'spot-count.start', version: 1, action: 'observations.write', body: startSpotCountSchema, service });
