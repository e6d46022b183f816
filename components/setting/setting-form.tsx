'use client';

import { FormButtons } from '@/components/form/form-buttons';
import { fieldError, fieldIdOf } from '@/components/form/problem-summary';
import { ReadingField } from '@/components/form/reading-field';
import { Refusal } from '@/components/form/refusal';
import { Field } from '@/components/ui/field';
import { Select } from '@/components/ui/select';
import { TextArea } from '@/components/ui/text-area';
import { TextInput } from '@/components/ui/text-input';
import { useThingForm } from '@/lib/client/use-thing-form';
import { useWho } from '@/lib/client/who';
import { adjustedFromPlaces, cleanerKinds, pressureDirections, wheelKinds } from '@/lib/schemas/vocabulary';
import { formTexts } from '@/lib/texts/form-texts';
import { settingTexts } from '@/lib/texts/setting-texts';
import { settingBody, settingDraft, type SettingDraft, type SettingFacts } from './setting-draft';

type ChoiceKey = 'cleaner' | 'wheels' | 'pressureDirection' | 'adjustedFrom';

const choices: Record<ChoiceKey, { label: string; options: { value: string; label: string }[] }> = {
  cleaner: { label: settingTexts.cleaner, options: cleanerKinds.map((value) => ({ value, label: settingTexts.cleaners[value] })) },
  wheels: { label: settingTexts.wheels, options: wheelKinds.map((value) => ({ value, label: settingTexts.wheelKinds[value] })) },
  pressureDirection: {
    label: settingTexts.pressureDirection,
    options: pressureDirections.map((value) => ({ value, label: settingTexts.directions[value] })),
  },
  adjustedFrom: { label: settingTexts.adjustedFrom, options: adjustedFromPlaces.map((value) => ({ value, label: settingTexts.places[value] })) },
};

/** Describes a setting of the row cleaners, or changes one. */
export function SettingForm({ setting, onDone }: { setting?: SettingFacts; onDone?: () => void }) {
  const { units } = useWho();
  const form = useThingForm<SettingDraft>({
    standing: settingDraft(setting, units),
    thing: setting,
    input: (draft) => ({ noun: 'settings', kind: setting ? 'setting.change' : 'setting.add', body: settingBody(draft) }),
    onApplied: onDone,
  });
  const { draft, change, operation } = form;
  const { error } = operation;
  const hintOf = (key: Exclude<keyof SettingDraft, 'pressure' | 'workingDepth'>, hint?: string) => {
    const standing = form.standing(key);
    return standing === undefined ? hint : formTexts.standsNow(standing === '' ? formTexts.nothing : standing);
  };
  const choice = (key: ChoiceKey) => (
    <Field
      key={key}
      label={choices[key].label}
      id={fieldIdOf(key)}
      error={fieldError(error, key)}
      hint={hintOf(key)}
      {...(key === 'cleaner' ? {} : { optionalText: formTexts.optional })}
    >
      {(wiring) => (
        <Select {...wiring} emptyLabel={settingTexts.notGiven} options={choices[key].options} value={draft[key]} onChange={(event) => change({ [key]: event.target.value })} />
      )}
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
      <Field label={settingTexts.name} id={fieldIdOf('name')} error={fieldError(error, 'name')} hint={hintOf('name', settingTexts.nameHint)}>
        {(wiring) => <TextInput {...wiring} value={draft.name} onChange={(event) => change({ name: event.target.value })} />}
      </Field>
      <Field label={settingTexts.phrase} id={fieldIdOf('phrase')} error={fieldError(error, 'phrase')} hint={hintOf('phrase', settingTexts.phraseHint)}>
        {(wiring) => <TextInput {...wiring} value={draft.phrase} onChange={(event) => change({ phrase: event.target.value })} />}
      </Field>
      {draft.phrase.trim() === '' ? null : (
        <p className="text-15">
          {settingTexts.previewLead} <span className="font-bold">{settingTexts.preview(draft.phrase.trim())}</span>
        </p>
      )}
      {choice('cleaner')}
      {choice('wheels')}
      {choice('pressureDirection')}
      <ReadingField label={settingTexts.pressure} path="pressure" optional hint={settingTexts.pressureHint} value={draft.pressure} onChange={(pressure) => change({ pressure })} error={error} standing={form.standing('pressure')} />
      <ReadingField label={settingTexts.workingDepth} path="workingDepth" optional hint={settingTexts.workingDepthHint} value={draft.workingDepth} onChange={(workingDepth) => change({ workingDepth })} error={error} standing={form.standing('workingDepth')} />
      {choice('adjustedFrom')}
      <Field label={settingTexts.note} id={fieldIdOf('note')} error={fieldError(error, 'note')} hint={hintOf('note')} optionalText={formTexts.optional}>
        {(wiring) => <TextArea {...wiring} value={draft.note} onChange={(event) => change({ note: event.target.value })} />}
      </Field>
      <FormButtons label={setting ? settingTexts.save : settingTexts.add} pending={operation.isPending} onCancel={onDone} />
    </form>
  );
}
