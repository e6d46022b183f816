'use client';

import type { ReactNode } from 'react';
import { Field } from '@/components/ui/field';
import { NumberInput } from '@/components/ui/number-input';
import { readingText } from '@/lib/format/reading-text';
import { readingUnitText } from '@/lib/format/reading-unit-text';
import type { ProblemError } from '@/lib/client/problem-error';
import type { ReadingUnit } from '@/lib/schemas/vocabulary';
import { formTexts } from '@/lib/texts/form-texts';
import { fieldError, fieldIdOf } from './problem-summary';
import type { ReadingDraft } from './reading-draft';

type ReadingFieldProps = {
  label: string;
  /** The reading's place in the body: "rowSpacing". */
  path: string;
  value: ReadingDraft;
  onChange: (value: ReadingDraft) => void;
  error: ProblemError | null;
  hint?: ReactNode;
  optional?: boolean;
  /** What stands now where it differs, after somebody else's edit. */
  standing?: ReadingDraft | undefined;
};

/** A measured number as it is typed: its unit stands in the label, and another may be typed after the number. */
export function ReadingField({ label, path, value, onChange, error, hint, optional = false, standing }: ReadingFieldProps) {
  return (
    <Field
      label={label}
      unit={readingUnitText(value.unit)}
      id={fieldIdOf(path)}
      error={fieldError(error, path)}
      hint={standing ? standingHint(standing) : hint}
      {...(optional ? { optionalText: formTexts.optional } : {})}
    >
      {(wiring) => (
        <NumberInput
          {...wiring}
          inputMode={isLength(value.unit) ? 'text' : 'decimal'}
          value={value.typed}
          onChange={(event) => onChange({ ...value, typed: event.target.value })}
        />
      )}
    </Field>
  );
}

/** A length may hold words, as in "17 ft 5 in", which a number pad does not have. */
const isLength = (unit: ReadingUnit) => ['in', 'ft', 'cm', 'm', 'mm'].includes(unit);

const standingHint = (standing: ReadingDraft) =>
  formTexts.standsNow(standing.typed === '' ? formTexts.nothing : readingText(standing));
