import { apiPaths } from '@/lib/paths/paths';
import { roundDayMark, roundDayVersion, roundPersonMark, type RoundDay, type RoundPerson } from '@/lib/schemas/round-day';

export type Asked<T> = { to: 'answer'; answer: T; serverTime: number | null } | { to: 'no-answer' } | { to: 'signed-out' } | { to: 'update-needed' } | { to: 'shut-out' };

const patienceMilliseconds = 20_000;

/** Asks for one of our own documents; whatever does not carry its mark is no answer. */
async function ask<T>(path: string, mark: string, fetch: typeof globalThis.fetch): Promise<Asked<T>> {
  try {
    const response = await fetch(path, { redirect: 'error', cache: 'no-store', signal: AbortSignal.timeout(patienceMilliseconds) });
    if (!/json/i.test(response.headers.get('content-type') ?? '')) return { to: 'no-answer' };
    const body: unknown = await response.json();
    if (typeof body !== 'object' || body === null) return { to: 'no-answer' };
    if (response.status === 401 && 'code' in body && body.code === 'not-signed-in') return { to: 'signed-out' };
    if ((response.status === 403 || response.status === 404) && 'code' in body) return { to: 'shut-out' };
    if (!response.ok || !('what' in body) || body.what !== mark) return { to: 'no-answer' };
    if (!('version' in body) || body.version !== roundDayVersion) return { to: 'update-needed' };
    const date = Date.parse(response.headers.get('date') ?? '');
    return { to: 'answer', answer: body as T, serverTime: Number.isNaN(date) ? null : date };
  } catch {
    return { to: 'no-answer' };
  }
}

export const askPerson = (fetch: typeof globalThis.fetch) => ask<RoundPerson>(apiPaths.round, roundPersonMark, fetch);
export const askDay = (organisationId: string, fetch: typeof globalThis.fetch) => ask<RoundDay>(apiPaths.roundDay(organisationId), roundDayMark, fetch);
