import { z } from 'zod';
import type { Outcome } from '@/lib/agronomy/outcome';

/** An answer of the core as it travels: a value, or insufficient with what was needed and had. The impossible is thrown, never sent. */
export const outcomeSchema = <T>(value: z.ZodType<T>): z.ZodType<Outcome<T>> =>
  z.union([
    z.object({ kind: z.literal('value'), value }),
    z.object({ kind: z.literal('insufficient'), reason: z.string(), needed: z.string(), had: z.string() }),
  ]);
