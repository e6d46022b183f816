import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { appErrorFromDatabase } from '@/lib/errors/database-error';
import { problemOf } from '@/lib/errors/problem';
import { log } from '../log';

// Nothing that is computed for one person may be kept by anything in between.
const headers = { 'Cache-Control': 'no-store', 'X-Content-Type-Options': 'nosniff' };

export function respond(body: unknown, status = 200): Response {
  return Response.json(body, { status, headers });
}

export function respondProblem(error: AppError): Response {
  const problem = problemOf(error);
  const retry: Record<string, string> = problem.status === 503 ? { 'Retry-After': '5' } : problem.status === 429 ? { 'Retry-After': '300' } : {};
  return Response.json(problem, { status: problem.status, headers: { ...headers, ...retry, 'Content-Type': 'application/problem+json' } });
}

/** Runs a handler; what it throws becomes a problem document, and what nobody expected is logged without its parameters. */
export async function answering(work: () => Promise<Response>): Promise<Response> {
  try {
    return await work();
  } catch (thrown) {
    const error = thrown instanceof AppError ? thrown : appErrorFromDatabase(thrown);
    if (error) return respondProblem(error);
    log.error({ error: thrown instanceof Error ? thrown.name : 'unknown', stack: thrown instanceof Error ? thrown.stack?.split('\n').slice(1, 6) : undefined }, 'request failed');
    return respondProblem(new AppError('unexpected'));
  }
}
