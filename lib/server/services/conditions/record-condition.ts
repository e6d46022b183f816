import 'server-only';
import { recordConditionSchema, type RecordConditionInput } from '@/lib/schemas/condition';
import { findCondition, insertCondition, listCorrectionsOfCondition } from '../../data/condition';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { assertSeasonDay } from '../field-records/assert-season-day';
import { holdPlace } from '../field-records/hold-place';
import { keepRecord } from '../field-records/keep-record';

async function service(context: WriteContext, body: RecordConditionInput): Promise<Written> {
  const seen = await holdPlace(context, body);
  assertSeasonDay(context, seen, 'observedOn', body.observedOn);
  const { soilTemperature, ...plain } = body;
  const soilTemperatureTyped = soilTemperature?.typed ?? null;
  const soilTemperatureUnit = soilTemperature?.unit ?? null;
  const values = { ...plain, soilTemperatureTyped, soilTemperatureUnit, soilTemperatureThousandths: soilTemperature?.thousandths ?? null };
  return keepRecord(context, {
    find: findCondition,
    corrections: {
      replacesId: body.replacesId,
      list: listCorrectionsOfCondition,
      isHere: (row) => row.plantingId === body.plantingId,
      shown: (row) => ({ id: row.id, growthStage: row.growthStage, soilTemperature: row.soilTemperatureTyped, soilMoisture: row.soilMoisture, personName: row.personName, observedOn: row.observedOn, recordedAt: row.recordedAt }),
      noSuch: 'There is no such record of this planting to correct. Open the page again.',
    },
    isSame: (row) => Object.entries(values).every(([key, value]) => row[key as keyof typeof values] === value),
    insert: (columns) => insertCondition(context.tx, { ...columns, ...values, timeZone: seen.farm.timeZone }),
  });
}

export const recordCondition = defineOperation({ kind: 'condition.record', version: 1, action: 'observations.write', body: recordConditionSchema, service });
