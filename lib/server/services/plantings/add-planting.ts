import 'server-only';
import { AppError, badField } from '@/lib/errors/app-error';
import { addPlantingSchema, type AddPlantingInput } from '@/lib/schemas/planting';
import { insertPlanting } from '../../data/planting';
import { insertZones } from '../../data/planting-zone';
import { askAbout } from '../../operations/ask-about';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { originColumns } from '../../operations/origin-columns';
import { readingColumns, readingOf } from '../../operations/reading-columns';
import { holdField } from '../fields/hold-field';
import { latestPlantingDay } from './latest-planting-day';
import { plantingColumns } from './planting-columns';
import { zoneQuestions } from './zone-questions';

async function service(context: WriteContext, body: AddPlantingInput): Promise<Written> {
  const { tx, operation, clock } = context;
  const { field, farm } = await holdField(context, body.fieldId);
  if (body.plantedOn > latestPlantingDay(clock.today(farm.timeZone))) {
    throw badField('plantedOn', 'This planting date is more than a year ahead. Check the year.');
  }
  askAbout(zoneQuestions(body.zones, readingOf(field.areaTyped, field.areaUnit, field.areaThousandths)), operation.confirmations);
  const added = await insertPlanting(tx, { id: operation.thingId, fieldId: field.id, ...plantingColumns(body), ...originColumns(context) });
  if (!added) throw new AppError('operation-reused');
  await insertZones(
    tx,
    body.zones.map((zone) => ({ id: zone.id, plantingId: operation.thingId, name: zone.name, ...readingColumns('area', zone.area), ...originColumns(context) })),
  );
  return { version: 1 };
}

export const addPlanting = defineOperation({ kind: 'planting.add', version: 1, action: 'plantings.write', body: addPlantingSchema, service });
