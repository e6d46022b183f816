import type { z } from 'zod';
import type { FieldProblem } from './app-error';

/** zod's issues as fields on the wire: the path with dots, and the sentence. */
export function fieldProblems(error: z.ZodError): FieldProblem[] {
  return error.issues.map((issue) => ({ path: issue.path.join('.'), message: issue.message }));
}
