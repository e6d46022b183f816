import 'server-only';
import type { z } from 'zod';
import { AppError } from '@/lib/errors/app-error';
import { fieldProblems } from '@/lib/errors/field-problems';

/** Parses what came in; what does not fit is said by field. */
export function parse<Schema extends z.ZodType>(schema: Schema, sent: unknown): z.output<Schema> {
  const parsed = schema.safeParse(sent);
  if (!parsed.success) throw new AppError('bad-input', { fields: fieldProblems(parsed.error) });
  return parsed.data;
}

/** Parses the ids of an address; one that is no id names nothing that exists. */
export function parseIds<Schema extends z.ZodType>(schema: Schema, sent: unknown): z.output<Schema> {
  const parsed = schema.safeParse(sent);
  if (!parsed.success) throw new AppError('not-found');
  return parsed.data;
}
