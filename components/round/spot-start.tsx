'use client';

import { v7 } from 'uuid';
import { usualFinalStandPerAcre } from '@/lib/agronomy/usual-final-stand';
import { useRound } from '@/lib/client/round/use-round';
import { useScreenDraft } from '@/lib/client/round/use-screen-draft';
import { plantsPerAreaText } from '@/lib/format/plants-per-area-text';
import { parseReading, readingIn, type ReadingRule } from '@/lib/schemas/reading';
import { intendedStandRule, rowSpacingRule, seedingRateRule } from '@/lib/schemas/reading-rules';
import { Button } from '@/components/ui/button';
import { DateInput } from '@/components/ui/date-input';
import { Field } from '@/components/ui/field';
import { NumberInput } from '@/components/ui/number-input';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import { spotTexts } from '@/lib/texts/round-spot-texts';
import { Screen } from './screen';

const newField = 'new';
const nameLettersMost = 80;
const draftName = 'spot start';

const messageOf = (typed: string, rule: ReadingRule) => {
  const parsed = parseReading(typed, rule);
  return parsed.ok ? undefined : parsed.message;
};

/** What a count needs to know of its field: nothing that is not used. */
export function SpotStart({ onBegun }: { onBegun: (plantingId: string) => void }) {
  const round = useRound();
  const today = round.now().date;
  const farms = round.day?.farms ?? [];
  const units = round.me?.units ?? 'us';
  const { draft, change } = useScreenDraft(draftName, {
    farmId: farms.length === 1 ? (farms[0]?.id ?? '') : '', fieldId: newField, fieldName: '', plantedOn: '', rowSpacing: units === 'us' ? '30' : '76 cm', seedingRate: '', intended: '',
  });
  const fields = round.day?.fields.filter((field) => field.farmId === draft.farmId) ?? [];
  const fieldId = draft.fieldId !== newField && !fields.some((field) => field.id === draft.fieldId) ? newField : draft.fieldId;
  const rate = parseReading(draft.seedingRate, seedingRateRule);
  const usual = rate.ok ? usualFinalStandPerAcre(readingIn(rate.reading, 'per-acre'), 1) : undefined;
  const begin = async () => {
    const intended = draft.intended.trim() === '' && usual !== undefined ? plantsPerAreaText(usual, 'us', { nearest: 100, withUnit: false }) : draft.intended;
    const problems = [
      draft.farmId === '' ? spotTexts.needFarm : undefined,
      fieldId === newField && draft.fieldName.trim() === '' ? spotTexts.needField : undefined,
      draft.plantedOn === '' || draft.plantedOn > today ? spotTexts.needDate : undefined,
      messageOf(draft.rowSpacing, rowSpacingRule),
      messageOf(draft.seedingRate, seedingRateRule),
      rate.ok ? messageOf(intended, intendedStandRule) : undefined,
    ].filter((problem) => problem !== undefined);
    if (problems.length > 0) return problems;
    const plantingId = v7();
    const body = {
      farmId: draft.farmId,
      field: fieldId === newField ? { id: v7(), name: draft.fieldName.trim() } : { id: fieldId, name: null },
      plantedOn: draft.plantedOn,
      crop: 'corn',
      rowSpacing: { typed: draft.rowSpacing.trim() },
      seedingRate: { typed: draft.seedingRate.trim() },
      intendedStand: { typed: intended.trim() },
    };
    await round.keep([{ kind: 'spot-count.start', thingId: plantingId, body, about: { plantingId, rowSampleId: null } }], { clearDrafts: [draftName] });
    onBegun(plantingId);
    return 'stay';
  };
  return (
    <Screen title={spotTexts.title} onKeep={begin} keepText={spotTexts.begin}>
      <p className="text-15">{farms.length === 0 ? spotTexts.noFarm : spotTexts.how}</p>
      <Field label={spotTexts.farm}>
        {(wiring) => (
          <Select {...wiring} value={draft.farmId} emptyLabel={spotTexts.chooseFarm} onChange={(event) => change({ farmId: event.target.value })} options={farms.map((farm) => ({ value: farm.id, label: farm.name }))} />
        )}
      </Field>
      {fields.length > 0 ? (
        <Field label={spotTexts.field}>
          {(wiring) => (
            <Select {...wiring} value={fieldId} onChange={(event) => change({ fieldId: event.target.value })} options={[{ value: newField, label: spotTexts.newField }, ...fields.map((field) => ({ value: field.id, label: field.name }))]} />
          )}
        </Field>
      ) : null}
      {fieldId === newField ? (
        <Field label={spotTexts.fieldName}>{(wiring) => <TextInput {...wiring} maxLength={nameLettersMost} value={draft.fieldName} onChange={(event) => change({ fieldName: event.target.value })} />}</Field>
      ) : null}
      <Field label={spotTexts.plantedOn}>{(wiring) => <DateInput {...wiring} max={today} value={draft.plantedOn} onChange={(event) => change({ plantedOn: event.target.value })} />}</Field>
      <div className="grid grid-cols-2 items-end gap-3">
        <Field label={spotTexts.rowSpacing} unit="in">{(wiring) => <NumberInput {...wiring} value={draft.rowSpacing} onChange={(event) => change({ rowSpacing: event.target.value })} />}</Field>
        <Field label={spotTexts.seedingRate} unit="/ac">{(wiring) => <NumberInput {...wiring} value={draft.seedingRate} onChange={(event) => change({ seedingRate: event.target.value })} />}</Field>
      </div>
      <Field label={spotTexts.intended} unit="/ac" hint={usual === undefined ? undefined : spotTexts.intendedHint(plantsPerAreaText(usual, units, { nearest: 100 }))}>
        {(wiring) => <NumberInput {...wiring} value={draft.intended} onChange={(event) => change({ intended: event.target.value })} />}
      </Field>
      {usual !== undefined && draft.intended === '' ? (
        <Button look="secondary" onClick={() => change({ intended: plantsPerAreaText(usual, 'us', { nearest: 100, withUnit: false }) })}>
          {spotTexts.takeUsual}
        </Button>
      ) : null}
    </Screen>
  );
}
