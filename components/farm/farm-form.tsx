'use client';

import { FormButtons } from '@/components/form/form-buttons';
import { fieldError, fieldIdOf } from '@/components/form/problem-summary';
import { Refusal } from '@/components/form/refusal';
import { Field } from '@/components/ui/field';
import { TextInput } from '@/components/ui/text-input';
import { useThingForm } from '@/lib/client/use-thing-form';
import { farmTexts } from '@/lib/texts/farm-texts';
import { formTexts } from '@/lib/texts/form-texts';

type FarmFormProps = {
  timeZone: string;
  farm?: { id: string; name: string; timeZone: string; version: number };
  onDone?: () => void;
};

/** Adds a farm, or changes one. What was typed stays until the server has taken it. */
export function FarmForm({ timeZone, farm, onDone }: FarmFormProps) {
  const form = useThingForm({
    standing: { name: farm?.name ?? '', timeZone: farm?.timeZone ?? timeZone },
    thing: farm,
    input: (body) => ({ noun: 'farms', kind: farm ? 'farm.change' : 'farm.add', body }),
    onApplied: onDone,
  });
  const { draft, change, operation } = form;
  const standing = (key: keyof typeof draft, hint?: string) => {
    const text = form.standing(key);
    return text === undefined ? hint : formTexts.standsNow(text);
  };
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
      <Field label={farmTexts.name} id={fieldIdOf('name')} error={fieldError(operation.error, 'name')} hint={standing('name')}>
        {(wiring) => <TextInput {...wiring} value={draft.name} onChange={(event) => change({ name: event.target.value })} />}
      </Field>
      <Field
        label={farmTexts.timeZone}
        hint={standing('timeZone', farmTexts.timeZoneHint)}
        id={fieldIdOf('timeZone')}
        error={fieldError(operation.error, 'timeZone')}
      >
        {(wiring) => (
          <TextInput {...wiring} value={draft.timeZone} onChange={(event) => change({ timeZone: event.target.value })} />
        )}
      </Field>
      <FormButtons label={farm ? farmTexts.save : farmTexts.add} pending={operation.isPending} onCancel={onDone} />
    </form>
  );
}
