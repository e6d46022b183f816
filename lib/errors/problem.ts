import { z } from 'zod';
import type { AppError } from './app-error';
import { errorCatalogue } from './error-catalogue';

/** The wire form of a refusal: RFC 9457 problem details, with the offending fields and open questions named. */
export const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.number(),
  code: z.string(),
  fields: z.array(z.object({ path: z.string(), message: z.string() })),
  questions: z.array(z.object({ rule: z.string(), about: z.string(), sentence: z.string() })),
  standingVersion: z.number().optional(),
  standing: z.record(z.string(), z.unknown()).optional(),
});
export type Problem = z.infer<typeof problemSchema>;

export function problemOf(error: AppError): Problem {
  return {
    type: `urn:rowrise:problem:${error.code}`,
    title: error.message,
    status: errorCatalogue[error.code].status,
    code: error.code,
    fields: error.fields,
    questions: error.questions,
    ...(error.standingVersion === undefined ? {} : { standingVersion: error.standingVersion }),
    ...(error.standing === undefined ? {} : { standing: error.standing }),
  };
}
