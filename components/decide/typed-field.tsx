'use client';

import type { ReactNode } from 'react';
import { fieldError, fieldIdOf } from '@/components/form/problem-summary';
import { DateInput } from '@/components/ui/date-input';
import { Field } from '@/components/ui/field';
import { NumberInput } from '@/components/ui/number-input';
import type { ProblemError } from '@/lib/client/problem-error';

type TypedFieldProps = {
  label: string;
  /** The figure's place in the body. */
  path: string;
  value: string;
  onChange: (value: string) => void;
  error: ProblemError | null;
  hint?: ReactNode;
  isDate?: boolean;
};

/** One figure of the sheet, typed as a number or chosen as a day. */
export function TypedField({ label, path, value, onChange, error, hint, isDate = false }: TypedFieldProps) {
  const Control = isDate ? DateInput : NumberInput;
  return (
    <Field label={label} id={fieldIdOf(path)} hint={hint} error={fieldError(error, path)}>
      {(wiring) => <Control {...wiring} value={value} onChange={(event) => onChange(event.target.value)} />}
    </Field>
  );
}
