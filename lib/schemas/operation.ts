import { z } from 'zod';
import { unstorablePlaces } from './storable';

/**
 * The one envelope of every write. A phone, a form and an import send the same; what it may hold is said by `kind` and
 * `version`, and every version that has landed stays accepted.
 */
export const confirmationSchema = z.object({
  rule: z.string().min(1).max(60),
  about: z.string().max(200),
  answer: z.literal('yes'),
});
export type Confirmation = z.infer<typeof confirmationSchema>;

export const calendarDaySchema = z.iso.date('Give a date as year, month and day.');
export const timeOfDaySchema = z
  .string()
  .regex(/^([01]\d|2[0-3]):[0-5]\d$/, 'Give a time of day such as 07:30.');

export const timeZoneSchema = z
  .string()
  .max(60)
  .refine((zone) => {
    try {
      new Intl.DateTimeFormat('en', { timeZone: zone });
      return true;
    } catch {
      return false;
    }
  }, 'Give a time zone such as America/Chicago.');

export const occurredSchema = z.object({
  date: calendarDaySchema,
  time: timeOfDaySchema.nullable(),
  zone: timeZoneSchema,
});

export const operationSchema = z
  .object({
    operationId: z.uuid(),
    organisationId: z.uuid(),
    personId: z.uuid(),
    deviceId: z.uuid(),
    deviceSequence: z.number().int().min(0).max(Number.MAX_SAFE_INTEGER),
    kind: z.string().min(1).max(60),
    version: z.number().int().min(1).max(1000),
    thingId: z.uuid(),
    /** The version of the thing this edit was made on; null for a new thing. */
    baseVersion: z.number().int().min(1).nullable().default(null),
    /** The operation this one builds on, where the thing was still unsent when it was edited again. */
    follows: z.uuid().nullable().default(null),
    body: z.record(z.string(), z.unknown()),
    occurred: occurredSchema,
    confirmations: z.array(confirmationSchema).max(500).default([]),
  })
  .superRefine(({ body, confirmations }, refinement) => {
    // Looked at before anything else, because the body is also kept as it was sent when an edit loses.
    for (const place of [...unstorablePlaces(body), ...unstorablePlaces(confirmations, ['confirmations'])]) {
      refinement.addIssue({ code: 'custom', ...place });
    }
  });
export type OperationEnvelope = z.infer<typeof operationSchema>;

export const batchLimit = 500;
export const batchSchema = z.object({
  operations: z.array(z.unknown()).min(1).max(batchLimit),
  /** Sent by a phone from its round: its clock may be wrong, so a day to come is taken and looked at later. */
  from: z.literal('field').optional(),
});

/** How each operation of a batch was answered; the batch itself always succeeds. */
export const answerSchema = z.object({
  operationId: z.string(),
  outcome: z.enum(['applied', 'duplicate', 'conflict', 'refused']),
  code: z.string().optional(),
  sentence: z.string().optional(),
  fields: z.array(z.object({ path: z.string(), message: z.string() })).optional(),
  questions: z.array(z.object({ rule: z.string(), about: z.string(), sentence: z.string() })).optional(),
  thingId: z.string().optional(),
  version: z.number().optional(),
  standingVersion: z.number().optional(),
  /** What stands in the place of an entry that lost, as its noun writes it out. */
  standing: z.record(z.string(), z.unknown()).optional(),
  result: z.record(z.string(), z.unknown()).optional(),
});
export type Answer = z.infer<typeof answerSchema>;
