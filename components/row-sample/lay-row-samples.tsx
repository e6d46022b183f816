'use client';

import { useState } from 'react';
import { v7 } from 'uuid';
import { FormButtons } from '@/components/form/form-buttons';
import { fieldIdOf } from '@/components/form/problem-summary';
import { Refusal } from '@/components/form/refusal';
import { Field } from '@/components/ui/field';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import { useAskedOperation } from '@/lib/client/use-asked-operation';
import { useWho } from '@/lib/client/who';
import { readingText } from '@/lib/format/reading-text';
import { readingUnitText } from '@/lib/format/reading-unit-text';
import { rowLengthRule } from '@/lib/schemas/row-sample';
import { unitOfPerson } from '@/lib/schemas/unit-of-person';
import type { ReadingUnit } from '@/lib/schemas/vocabulary';
import { formTexts } from '@/lib/texts/form-texts';
import { rowSampleTexts } from '@/lib/texts/row-sample-texts';
import { LengthAndEnds } from './length-and-ends';
import { endsBody, nextNumber, planterRowsOf, suggestedLength, type Ends } from './row-length-draft';

type LayRowSamplesProps = {
  plantingId: string;
  rowSpacing: { typed: string; unit: ReadingUnit; thousandths: number };
  /** The strips that get the same row samples each; none for samples free in the field. */
  strips: readonly { id: string; number: number }[];
  zones: readonly { id: string; name: string }[];
  labels: readonly string[];
};

/** Lays several row samples out at once: the same planter rows in every strip, or free places with running labels. */
export function LayRowSamples({ plantingId, rowSpacing, strips, zones, labels }: LayRowSamplesProps) {
  const { units } = useWho();
  const suggestion = suggestedLength(rowSpacing, units);
  const inStrips = strips.length > 0;
  const [draft, setDraft] = useState({ howMany: inStrips ? '2' : '6', rows: '', prefix: 'R', zoneId: '', length: suggestion, ends: 'mark-mark' as Ends });
  const [rowsError, setRowsError] = useState<string>();
  const operation = useAskedOperation();
  const change = (part: Partial<typeof draft>) => setDraft((before) => ({ ...before, ...part }));
  const unit = unitOfPerson(rowLengthRule, units);
  const send = () => {
    const count = Number(draft.howMany);
    const rows = planterRowsOf(draft.rows);
    if (rows === undefined || (rows.length > 0 && rows.length !== count)) {
      setRowsError(rowSampleTexts.badRows(count));
      return;
    }
    setRowsError(undefined);
    const common = { zoneId: draft.zoneId === '' ? null : draft.zoneId, length: { typed: draft.length, unit }, ...endsBody(draft.ends) };
    const first = nextNumber(labels, draft.prefix);
    const samples = inStrips
      ? strips.flatMap((strip) =>
          Array.from({ length: count }, (_, index) => ({ id: v7(), stripId: strip.id, label: `S${strip.number}-${index + 1}`, planterRow: rows[index] ?? null, ...common })),
        )
      : Array.from({ length: count }, (_, index) => ({ id: v7(), stripId: null, label: `${draft.prefix}${first + index}`, planterRow: rows[index] ?? null, ...common }));
    operation.send({ noun: 'row-samples', kind: 'row-samples.add', thingId: plantingId, body: { plantingId, samples } });
  };
  const fields = operation.error?.problem.fields ?? [];
  const hint = units === 'us' ? rowSampleTexts.suggestion : rowSampleTexts.suggestionMetric;
  const id = inStrips ? 'strip-' : 'free-';
  return (
    <form
      noValidate
      className="flex max-w-form flex-col gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        send();
      }}
    >
      <Refusal operation={operation} />
      <Field label={inStrips ? rowSampleTexts.perStrip : rowSampleTexts.howMany} id={fieldIdOf(`${id}howMany`)}>
        {(wiring) => (
          <Select
            {...wiring}
            value={draft.howMany}
            options={Array.from({ length: inStrips ? 6 : 30 }, (_, index) => ({ value: String(index + 1), label: String(index + 1) }))}
            onChange={(event) => change({ howMany: event.target.value })}
          />
        )}
      </Field>
      <Field label={rowSampleTexts.planterRows} hint={rowSampleTexts.planterRowsHint} optionalText={formTexts.optional} id={fieldIdOf(`${id}rows`)} error={rowsError ?? messageAt(fields, 'planterRow')}>
        {(wiring) => <TextInput {...wiring} value={draft.rows} onChange={(event) => change({ rows: event.target.value })} />}
      </Field>
      {inStrips ? null : (
        <Field label={rowSampleTexts.prefix} id={fieldIdOf(`${id}prefix`)} error={messageAt(fields, 'label')}>
          {(wiring) => <TextInput {...wiring} value={draft.prefix} onChange={(event) => change({ prefix: event.target.value })} />}
        </Field>
      )}
      {zones.length === 0 || inStrips ? null : (
        <Field label={rowSampleTexts.zone} id={fieldIdOf(`${id}zone`)} error={messageAt(fields, 'zoneId')}>
          {(wiring) => (
            <Select
              {...wiring}
              emptyLabel={rowSampleTexts.noZone}
              value={draft.zoneId}
              options={zones.map((zone) => ({ value: zone.id, label: zone.name }))}
              onChange={(event) => change({ zoneId: event.target.value })}
            />
          )}
        </Field>
      )}
      <LengthAndEnds
        id={id}
        length={draft.length}
        unitText={readingUnitText(unit)}
        ends={draft.ends}
        hint={hint(suggestion, readingText(rowSpacing))}
        lengthError={messageAt(fields, 'length')}
        onChange={change}
      />
      <FormButtons label={inStrips ? rowSampleTexts.addToStrips : rowSampleTexts.addFree} pending={operation.isPending} />
    </form>
  );
}

/** The samples share their fields here, so the first message about any of them stands at the one field. */
const messageAt = (fields: readonly { path: string; message: string }[], key: string) =>
  fields.find((field) => field.path.split('.').includes(key))?.message;
