'use client';

import { v7 } from 'uuid';
import { useRound } from '@/lib/client/round/use-round';
import { useScreenDraft } from '@/lib/client/round/use-screen-draft';
import type { RoundField, RoundPlanting, RoundRow } from '@/lib/schemas/round-day';
import { parseSoilTemperature } from '@/lib/schemas/soil-temperature';
import { growthStages, soilMoistures, type GrowthStage, type SoilMoisture, type TemperatureUnit } from '@/lib/schemas/vocabulary';
import { Field } from '@/components/ui/field';
import { NumberInput } from '@/components/ui/number-input';
import { conditionTexts } from '@/lib/texts/round-condition-texts';
import { digTexts } from '@/lib/texts/round-dig-texts';
import { Choice } from './choice';
import { Screen } from './screen';

type ConditionDraft = { stage: GrowthStage | null; temperature: string; unit: TemperatureUnit; moisture: SoilMoisture | null };

/** Growth stage, soil temperature and soil moisture of a planting or at one row. */
export function ConditionScreen({ planting, field, row }: { planting: RoundPlanting; field: RoundField; row: RoundRow | null }) {
  const round = useRound();
  const name = `condition ${row?.id ?? planting.id}`;
  const { draft, change } = useScreenDraft<ConditionDraft>(name, { stage: null, temperature: '', unit: 'F', moisture: null });
  const keep = async () => {
    const parsed = draft.temperature.trim() === '' ? null : parseSoilTemperature(draft.temperature, draft.unit);
    if (parsed && !parsed.ok) return [parsed.message];
    if (draft.stage === null && !parsed && draft.moisture === null) return [conditionTexts.needOne];
    const { date, time } = round.now();
    const body = {
      plantingId: planting.id, rowSampleId: row?.id ?? null, observedOn: date, observedAt: time, growthStage: draft.stage,
      soilTemperature: parsed ? { typed: draft.temperature.trim(), unit: draft.unit } : null, soilMoisture: draft.moisture, replacesId: null,
    };
    await round.keep([{ kind: 'condition.record', thingId: v7(), body, about: { plantingId: planting.id, rowSampleId: null } }], { clearDrafts: [name] });
    return [];
  };
  return (
    <Screen title={conditionTexts.title} where={[row?.label, field.name].filter(Boolean).join(', ')} onKeep={keep}>
      <p className="text-15">{conditionTexts.how}</p>
      <Choice legend={conditionTexts.stage} options={growthStages.map((value) => ({ value, label: value }))} chosen={draft.stage ? [draft.stage] : []} onPress={(stage) => change({ stage: stage === draft.stage ? null : stage })} />
      <Field label={conditionTexts.temperature} unit={`°${draft.unit}`}>
        {(wiring) => <NumberInput {...wiring} value={draft.temperature} onChange={(event) => change({ temperature: event.target.value })} />}
      </Field>
      <Choice
        legend={conditionTexts.unit}
        columns={2}
        options={[
          { value: 'F', label: conditionTexts.fahrenheit },
          { value: 'C', label: conditionTexts.celsius },
        ]}
        chosen={[draft.unit]}
        onPress={(unit) => change({ unit })}
      />
      <Choice legend={conditionTexts.moisture} options={soilMoistures.map((value) => ({ value, label: digTexts.moistures[value] }))} chosen={draft.moisture ? [draft.moisture] : []} onPress={(moisture) => change({ moisture: moisture === draft.moisture ? null : moisture })} />
    </Screen>
  );
}
