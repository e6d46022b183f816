import { noAnswer, problemFrom } from './problem-error';

const patienceMilliseconds = 60_000;

async function answerOf(response: Response): Promise<unknown> {
  const body: unknown = await response.json().catch(() => undefined);
  if (!response.ok) throw problemFrom(body, response.status);
  return body;
}

/** Sends JSON and reads the answer; a refusal is thrown as a ProblemError, and so is silence. */
export async function postJson(path: string, body: unknown): Promise<unknown> {
  const response = await fetch(path, {
    method: 'POST',
    headers: { 'Content-Type': 'application/json' },
    body: JSON.stringify(body),
    signal: AbortSignal.timeout(patienceMilliseconds),
  }).catch(() => {
    throw noAnswer();
  });
  return answerOf(response);
}

export async function getJson(path: string, signal?: AbortSignal): Promise<unknown> {
  const response = await fetch(path, signal ? { signal } : {}).catch((error: unknown) => {
    // The query library cancels what nobody waits for any more; that is no failure.
    if (error instanceof DOMException && error.name === 'AbortError') throw error;
    throw noAnswer();
  });
  return answerOf(response);
}
