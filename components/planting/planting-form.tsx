'use client';

import { FormButtons } from '@/components/form/form-buttons';
import { fieldError, fieldIdOf } from '@/components/form/problem-summary';
import { ReadingField } from '@/components/form/reading-field';
import { Refusal } from '@/components/form/refusal';
import { DateInput } from '@/components/ui/date-input';
import { Field } from '@/components/ui/field';
import { NumberInput } from '@/components/ui/number-input';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import { useThingForm } from '@/lib/client/use-thing-form';
import { useWho } from '@/lib/client/who';
import { crops, tillages } from '@/lib/schemas/vocabulary';
import { formTexts } from '@/lib/texts/form-texts';
import { plantingFormTexts } from '@/lib/texts/planting-form-texts';
import { plantingTexts } from '@/lib/texts/planting-texts';
import { plantingBody, plantingDraft, type PlantingDraft, type PlantingFacts } from './planting-draft';
import { UsualStand } from './usual-stand';
import { ZoneFields } from './zone-fields';

type PlantingFormProps = {
  fieldId: string;
  planting?: PlantingFacts;
  onDone?: () => void;
  /** Where to go with a planting that was added. */
  onAdded?: (plantingId: string) => void;
};

type ReadingKey = 'rowSpacing' | 'seedingRate' | 'tagGermination' | 'intendedStand' | 'fullYield';
type TextKey = 'plantedAt' | 'previousCrop' | 'slowAfterDays' | 'lateAfterDays' | 'veryLateAfterDays';

/** Describes what was planted: the facts that every figure of the stand is worked out against. */
export function PlantingForm({ fieldId, planting, onDone, onAdded }: PlantingFormProps) {
  const { units } = useWho();
  const form = useThingForm<PlantingDraft>({
    standing: plantingDraft(planting, units),
    thing: planting,
    input: (draft) => ({
      noun: 'plantings',
      kind: planting ? 'planting.change' : 'planting.add',
      body: { ...plantingBody(draft), ...(planting ? {} : { fieldId }) },
    }),
    onApplied: (plantingId) => {
      onDone?.();
      if (!planting) onAdded?.(plantingId);
    },
  });
  const { draft, change, operation } = form;
  const { error } = operation;
  const standingText = (key: TextKey | 'plantedOn' | 'crop' | 'tillage', hint?: string) => {
    const text = form.standing(key);
    return text === undefined ? hint : formTexts.standsNow(text === '' ? formTexts.nothing : text);
  };
  const reading = (key: ReadingKey, more: { hint?: string; optional?: boolean } = {}) => (
    <ReadingField
      label={plantingFormTexts[key]}
      path={key}
      value={draft[key]}
      onChange={(value) => change({ [key]: value })}
      error={error}
      standing={form.standing(key)}
      {...more}
    />
  );
  const text = (key: TextKey, label: string, more: { hint?: string; optional?: boolean } = {}) => (
    <Field
      label={label}
      id={fieldIdOf(key)}
      error={fieldError(error, key)}
      hint={standingText(key, more.hint)}
      {...(more.optional ? { optionalText: formTexts.optional } : {})}
    >
      {(wiring) =>
        key === 'previousCrop' ? (
          <TextInput {...wiring} value={draft[key]} onChange={(event) => change({ [key]: event.target.value })} />
        ) : (
          <NumberInput {...wiring} inputMode={key === 'plantedAt' ? 'text' : 'numeric'} value={draft[key]} onChange={(event) => change({ [key]: event.target.value })} />
        )
      }
    </Field>
  );
  return (
    <form
      noValidate
      className="flex max-w-form flex-col gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        form.submit();
      }}
    >
      <Refusal operation={operation} onShowStanding={form.showStanding} />
      <Field label={plantingFormTexts.plantedOn} id={fieldIdOf('plantedOn')} error={fieldError(error, 'plantedOn')} hint={standingText('plantedOn')}>
        {(wiring) => <DateInput {...wiring} value={draft.plantedOn} onChange={(event) => change({ plantedOn: event.target.value })} />}
      </Field>
      {text('plantedAt', plantingFormTexts.plantedAt, { hint: plantingFormTexts.plantedAtHint, optional: true })}
      <Field label={plantingFormTexts.crop} id={fieldIdOf('crop')} error={fieldError(error, 'crop')} hint={standingText('crop', plantingFormTexts.cropHint)}>
        {(wiring) => (
          <Select {...wiring} value={draft.crop} options={crops.map((crop) => ({ value: crop, label: plantingTexts.crop[crop] }))} onChange={(event) => change({ crop: event.target.value })} />
        )}
      </Field>
      {reading('rowSpacing')}
      {reading('seedingRate')}
      {reading('tagGermination', { optional: true })}
      {reading('intendedStand', { hint: plantingFormTexts.intendedStandHint })}
      <UsualStand draft={draft} units={units} onTake={(typed) => change({ intendedStand: { typed, unit: units === 'us' ? 'per-acre' : 'per-ha' } })} />
      {reading('fullYield', { hint: plantingFormTexts.fullYieldHint, optional: true })}
      {text('previousCrop', plantingFormTexts.previousCrop, { optional: true })}
      <Field label={plantingFormTexts.tillage} id={fieldIdOf('tillage')} error={fieldError(error, 'tillage')} hint={standingText('tillage')} optionalText={formTexts.optional}>
        {(wiring) => (
          <Select
            {...wiring}
            emptyLabel={plantingFormTexts.notGiven}
            value={draft.tillage}
            options={tillages.map((tillage) => ({ value: tillage, label: plantingTexts.tillage[tillage] }))}
            onChange={(event) => change({ tillage: event.target.value })}
          />
        )}
      </Field>
      <fieldset className="flex flex-col gap-3 border-t border-rule pt-3">
        <legend className="sr-only">{plantingFormTexts.limitsTitle}</legend>
        <p className="font-bold">{plantingFormTexts.limitsTitle}</p>
        <p className="text-13 text-ink-soft">{plantingFormTexts.limitsLead}</p>
        {text('slowAfterDays', plantingFormTexts.slow)}
        {text('lateAfterDays', plantingFormTexts.late)}
        {text('veryLateAfterDays', plantingFormTexts.veryLate)}
      </fieldset>
      <fieldset className="flex flex-col gap-3 border-t border-rule pt-3">
        <legend className="sr-only">{plantingFormTexts.zonesTitle}</legend>
        <p className="font-bold">{plantingFormTexts.zonesTitle}</p>
        <p className="text-13 text-ink-soft">{plantingFormTexts.zonesLead}</p>
        <ZoneFields zones={draft.zones} units={units} onChange={(zones) => change({ zones })} error={error} />
      </fieldset>
      <FormButtons label={planting ? plantingFormTexts.save : plantingFormTexts.add} pending={operation.isPending} onCancel={onDone} />
    </form>
  );
}
