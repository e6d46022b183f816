import type { ConditionRow } from '../../data/condition';
import type { FieldTransectRow } from '../../data/field-transect';
import type { NoteRow } from '../../data/note';

/** The records that a row sample's page and a planting's page both show, written out field by field. */
export const shownCondition = ({ id, observedOn, observedAt, growthStage, soilTemperatureTyped, soilTemperatureUnit, soilMoisture, personName }: ConditionRow) => ({
  id, observedOn, observedAt, growthStage, soilMoisture, personName,
  soilTemperature: soilTemperatureTyped === null || soilTemperatureUnit === null ? null : { typed: soilTemperatureTyped, unit: soilTemperatureUnit },
});
export const shownNote = ({ id, notedOn, notedAt, text, personName }: NoteRow) => ({ id, notedOn, notedAt, text, personName });
export const shownTransect = ({ id, readOn, marksRead, marksCovered, personName }: FieldTransectRow) => ({ id, readOn, marksRead, marksCovered, personName });
