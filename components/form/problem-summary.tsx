'use client';

import { FormError } from '@/components/ui/form-error';
import type { ProblemError } from '@/lib/client/problem-error';

/** The refusal of a form, above it: what happened, and each named field with a way to it. Field ids are the body's paths. */
export function ProblemSummary({ error, attempt }: { error: ProblemError | null; attempt: number }) {
  if (!error) return null;
  const items = error.problem.fields.map((field) => ({
    text: field.message,
    ...(field.path ? { fieldId: fieldIdOf(field.path) } : {}),
  }));
  return <FormError title={error.problem.title} items={items} attempt={attempt} />;
}

/** The id of the control that stands for a path of the body. A reading's error may name its text inside. */
export const fieldIdOf = (path: string) => `field-${path.replace(/\.typed$/, '')}`;

/** The message for a field, wherever in it the problem lies. */
export function fieldError(error: ProblemError | null, path: string): string | undefined {
  return error?.problem.fields.find((field) => field.path === path || field.path === `${path}.typed`)?.message;
}
