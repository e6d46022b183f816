import { problemSchema, type Problem } from '@/lib/errors/problem';

/** What a request was answered with when it was refused, or what happened when there was no answer at all. */
export class ProblemError extends Error {
  readonly problem: Problem;
  constructor(problem: Problem) {
    super(problem.title);
    this.name = 'ProblemError';
    this.problem = problem;
  }
}

export function problemFrom(body: unknown, status: number): ProblemError {
  const parsed = problemSchema.safeParse(body);
  return new ProblemError(
    parsed.success
      ? parsed.data
      : { type: 'about:blank', title: 'The answer could not be read. Nothing you typed is lost; try again.', status, code: 'unreadable', fields: [], questions: [] },
  );
}

export const noAnswer = () =>
  new ProblemError({ type: 'about:blank', title: 'No answer from the server. What you typed is still here; try again when there is a connection.', status: 0, code: 'no-answer', fields: [], questions: [] });
