'use client';

import { FormButtons } from '@/components/form/form-buttons';
import { fieldError, fieldIdOf } from '@/components/form/problem-summary';
import { readingDraft, type ReadingDraft } from '@/components/form/reading-draft';
import { Refusal } from '@/components/form/refusal';
import { Field } from '@/components/ui/field';
import { NumberInput } from '@/components/ui/number-input';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import { useThingForm } from '@/lib/client/use-thing-form';
import { useWho } from '@/lib/client/who';
import { readingUnitText } from '@/lib/format/reading-unit-text';
import { rowLengthRule } from '@/lib/schemas/row-sample';
import type { ReadingUnit, RowEnd } from '@/lib/schemas/vocabulary';
import { formTexts } from '@/lib/texts/form-texts';
import { rowSampleTexts } from '@/lib/texts/row-sample-texts';
import { LengthAndEnds } from './length-and-ends';
import { endsBody, type Ends } from './row-length-draft';

export type PlannedRowSample = {
  id: string;
  version: number;
  stripId: string | null;
  zoneId: string | null;
  label: string;
  planterRow: number | null;
  length: { typed: string; unit: ReadingUnit };
  startEnd: RowEnd;
  farEnd: RowEnd;
  visited: boolean;
};

type Draft = { label: string; planterRow: string; zoneId: string; length: ReadingDraft; ends: Ends };
type RowSampleFormProps = { sample: PlannedRowSample; zones: readonly { id: string; name: string }[]; onDone: () => void };

/** Changes one row sample; its strip stays, since its counts belong there. */
export function RowSampleForm({ sample, zones, onDone }: RowSampleFormProps) {
  const { units } = useWho();
  const form = useThingForm<Draft>({
    standing: {
      label: sample.label,
      planterRow: sample.planterRow === null ? '' : String(sample.planterRow),
      zoneId: sample.zoneId ?? '',
      length: readingDraft(sample.length, rowLengthRule, units),
      ends: `${sample.startEnd}-${sample.farEnd}`,
    },
    thing: sample,
    input: (draft) => ({
      noun: 'row-samples',
      kind: 'row-sample.change',
      body: {
        stripId: sample.stripId,
        zoneId: draft.zoneId === '' ? null : draft.zoneId,
        label: draft.label,
        planterRow: draft.planterRow.trim() === '' ? null : /^\d+$/.test(draft.planterRow.trim()) ? Number(draft.planterRow) : draft.planterRow,
        length: draft.length,
        ...endsBody(draft.ends),
      },
    }),
    onApplied: onDone,
  });
  const { draft, change, operation } = form;
  const { error } = operation;
  const standingHint = (key: 'label' | 'planterRow') => {
    const standing = form.standing(key);
    return standing === undefined ? undefined : formTexts.standsNow(standing === '' ? formTexts.nothing : standing);
  };
  return (
    <form
      noValidate
      className="flex max-w-form flex-col gap-4 py-2"
      onSubmit={(event) => {
        event.preventDefault();
        form.submit();
      }}
    >
      <Refusal operation={operation} onShowStanding={form.showStanding} />
      <Field label={rowSampleTexts.label} id={fieldIdOf('label')} error={fieldError(error, 'label')} hint={standingHint('label')}>
        {(wiring) => <TextInput {...wiring} value={draft.label} onChange={(event) => change({ label: event.target.value })} />}
      </Field>
      <Field label={rowSampleTexts.planterRow} id={fieldIdOf('planterRow')} error={fieldError(error, 'planterRow')} hint={standingHint('planterRow')} optionalText={formTexts.optional}>
        {(wiring) => <NumberInput {...wiring} inputMode="numeric" value={draft.planterRow} onChange={(event) => change({ planterRow: event.target.value })} />}
      </Field>
      {zones.length === 0 ? null : (
        <Field label={rowSampleTexts.zone} id={fieldIdOf('zoneId')} error={fieldError(error, 'zoneId')}>
          {(wiring) => (
            <Select {...wiring} emptyLabel={rowSampleTexts.noZone} value={draft.zoneId} options={zones.map((zone) => ({ value: zone.id, label: zone.name }))} onChange={(event) => change({ zoneId: event.target.value })} />
          )}
        </Field>
      )}
      <LengthAndEnds
        id=""
        length={draft.length.typed}
        unitText={readingUnitText(draft.length.unit)}
        ends={draft.ends}
        hint=""
        lengthError={fieldError(error, 'length')}
        onChange={({ length, ends }) => change({ ...(length === undefined ? {} : { length: { ...draft.length, typed: length } }), ...(ends === undefined ? {} : { ends }) })}
      />
      <FormButtons label={rowSampleTexts.save} pending={operation.isPending} onCancel={onDone} />
    </form>
  );
}
