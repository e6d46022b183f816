'use client';

import { FormButtons } from '@/components/form/form-buttons';
import { fieldError, fieldIdOf } from '@/components/form/problem-summary';
import { readingDraft, sentReading } from '@/components/form/reading-draft';
import { ReadingField } from '@/components/form/reading-field';
import { Refusal } from '@/components/form/refusal';
import { Field } from '@/components/ui/field';
import { TextInput } from '@/components/ui/text-input';
import { useThingForm } from '@/lib/client/use-thing-form';
import { useWho } from '@/lib/client/who';
import { fieldAreaRule } from '@/lib/schemas/field';
import type { ReadingUnit } from '@/lib/schemas/vocabulary';
import { fieldTexts } from '@/lib/texts/field-texts';
import { formTexts } from '@/lib/texts/form-texts';

type FieldFormProps = {
  farmId: string;
  field?: { id: string; name: string; area: { typed: string; unit: ReadingUnit } | null; version: number };
  onDone?: () => void;
};

/** Adds a field to a farm, or changes one. */
export function FieldForm({ farmId, field, onDone }: FieldFormProps) {
  const { units } = useWho();
  const form = useThingForm({
    standing: { name: field?.name ?? '', area: readingDraft(field?.area ?? null, fieldAreaRule, units) },
    thing: field,
    input: ({ name, area }) => ({
      noun: 'fields',
      kind: field ? 'field.change' : 'field.add',
      body: { name, area: sentReading(area), ...(field ? {} : { farmId }) },
    }),
    onApplied: onDone,
  });
  const { draft, change, operation } = form;
  const standingName = form.standing('name');
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
      <Field
        label={fieldTexts.name}
        id={fieldIdOf('name')}
        error={fieldError(operation.error, 'name')}
        hint={standingName === undefined ? undefined : formTexts.standsNow(standingName)}
      >
        {(wiring) => <TextInput {...wiring} value={draft.name} onChange={(event) => change({ name: event.target.value })} />}
      </Field>
      <ReadingField
        label={fieldTexts.area}
        path="area"
        optional
        hint={fieldTexts.areaHint}
        value={draft.area}
        onChange={(area) => change({ area })}
        error={operation.error}
        standing={form.standing('area')}
      />
      <FormButtons label={field ? fieldTexts.save : fieldTexts.add} pending={operation.isPending} onCancel={onDone} />
    </form>
  );
}
