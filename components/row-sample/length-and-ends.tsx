'use client';

import { fieldIdOf } from '@/components/form/problem-summary';
import { Field } from '@/components/ui/field';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import { rowSampleTexts } from '@/lib/texts/row-sample-texts';
import type { Ends } from './row-length-draft';

type LengthAndEndsProps = {
  length: string;
  unitText: string;
  ends: Ends;
  onChange: (part: { length?: string; ends?: Ends }) => void;
  lengthError: string | undefined;
  hint: string;
  id: string;
};

const kinds = Object.entries(rowSampleTexts.endKinds).map(([value, label]) => ({ value, label }));

/** How long the measured row is and where the tape begins and ends: an end at a plant changes the count by half a plant. */
export function LengthAndEnds({ length, unitText, ends, onChange, lengthError, hint, id }: LengthAndEndsProps) {
  return (
    <>
      <Field label={rowSampleTexts.length} unit={unitText} hint={hint} id={fieldIdOf(`${id}length`)} error={lengthError}>
        {(wiring) => <TextInput {...wiring} value={length} onChange={(event) => onChange({ length: event.target.value })} />}
      </Field>
      <Field label={rowSampleTexts.ends} hint={rowSampleTexts.endsHint} id={fieldIdOf(`${id}ends`)}>
        {(wiring) => (
          <Select
            {...wiring}
            value={ends}
            options={kinds}
            onChange={(event) => onChange({ ends: kinds.find((kind) => kind.value === event.target.value)?.value as Ends })}
          />
        )}
      </Field>
    </>
  );
}
