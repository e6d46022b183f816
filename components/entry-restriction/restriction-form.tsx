'use client';

import { FormButtons } from '@/components/form/form-buttons';
import { fieldError, fieldIdOf } from '@/components/form/problem-summary';
import { Refusal } from '@/components/form/refusal';
import { DateInput } from '@/components/ui/date-input';
import { Field } from '@/components/ui/field';
import { NumberInput } from '@/components/ui/number-input';
import { TextInput } from '@/components/ui/text-input';
import { useThingForm } from '@/lib/client/use-thing-form';
import { entryRestrictionTexts as texts } from '@/lib/texts/entry-restriction-texts';
import type { RestrictionData } from './restriction-types';

type RestrictionFormProps = {
  fieldId: string;
  today: string;
  /** The one whose interval is corrected; what stands now is appended anew beside it. */
  corrects?: RestrictionData;
  onDone: () => void;
};

const numberOrTyped = (text: string) => (/^\s*\d{1,6}([.,]\d{1,3})?\s*$/.test(text) ? Number(text.replace(',', '.')) : text);

/** Records an application and its restricted-entry interval, or corrects one. */
export function RestrictionForm({ fieldId, today, corrects, onDone }: RestrictionFormProps) {
  const { draft, change, submit, operation } = useThingForm({
    standing: { product: corrects?.product ?? '', endedOn: corrects?.endedOn ?? today, endedAt: corrects?.endedAt ?? '', hours: corrects ? String(corrects.hours) : '' },
    input: ({ hours, ...rest }) => ({
      noun: 'entry-restrictions',
      kind: 'entry-restriction.record',
      body: { ...rest, fieldId, hours: numberOrTyped(hours), replacesId: corrects?.id ?? null },
    }),
    onApplied: onDone,
  });
  const { error } = operation;
  return (
    <form
      noValidate
      className="flex max-w-form flex-col gap-4 py-2"
      onSubmit={(event) => {
        event.preventDefault();
        submit();
      }}
    >
      <Refusal operation={operation} />
      <Field label={texts.product} id={fieldIdOf('product')} error={fieldError(error, 'product')}>
        {(wiring) => <TextInput {...wiring} maxLength={80} value={draft.product} onChange={(event) => change({ product: event.target.value })} />}
      </Field>
      <div className="grid grid-cols-[3fr_2fr] items-start gap-3">
        <Field label={texts.endedOn} id={fieldIdOf('endedOn')} error={fieldError(error, 'endedOn')}>
          {(wiring) => <DateInput {...wiring} value={draft.endedOn} onChange={(event) => change({ endedOn: event.target.value })} />}
        </Field>
        <Field label={texts.endedAt} id={fieldIdOf('endedAt')} error={fieldError(error, 'endedAt')}>
          {(wiring) => <TextInput {...wiring} type="time" value={draft.endedAt} onChange={(event) => change({ endedAt: event.target.value })} />}
        </Field>
      </div>
      <Field label={texts.hours} id={fieldIdOf('hours')} error={fieldError(error, 'hours')}>
        {(wiring) => <NumberInput {...wiring} value={draft.hours} onChange={(event) => change({ hours: event.target.value })} />}
      </Field>
      <FormButtons label={corrects ? texts.saveCorrection : texts.save} pending={operation.isPending} onCancel={onDone} />
    </form>
  );
}
