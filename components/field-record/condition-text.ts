import { fieldRecordTexts } from '@/lib/texts/field-record-texts';
import type { ConditionRecord } from './record-types';

/** "stage V2, soil 52.5 °F, soil moist", as far as it was noted. */
export function conditionText({ growthStage, soilTemperature, soilMoisture }: ConditionRecord): string {
  return [
    ...(growthStage === null ? [] : [fieldRecordTexts.stage(growthStage)]),
    ...(soilTemperature === null ? [] : [fieldRecordTexts.soilTemperature(`${soilTemperature.typed} °${soilTemperature.unit}`)]),
    ...(soilMoisture === null ? [] : [fieldRecordTexts.soilMoisture(fieldRecordTexts.moistures[soilMoisture])]),
  ].join(', ');
}
