import 'server-only';
import { RateLimiterPostgres } from 'rate-limiter-flexible';
import { AppError } from '@/lib/errors/app-error';
import { database } from '../database';

const limits = {
  /** Wrong passwords for one account. */
  account: { points: 10, duration: 900 },
  /** Wrong passwords and wrong links from one socket address; a whole office may share one. */
  address: { points: 100, duration: 900 },
} as const;

const limiters = new Map<keyof typeof limits, RateLimiterPostgres>();

function limiter(kind: keyof typeof limits): RateLimiterPostgres {
  const standing = limiters.get(kind);
  if (standing) return standing;
  const made = new RateLimiterPostgres({
    storeClient: database().$client,
    storeType: 'pool',
    tableName: 'throttle',
    tableCreated: true,
    keyPrefix: kind,
    // Old keys are cleared by a timer inside the library; a test's process must still be able to end.
    clearExpiredByTimeout: false,
    ...limits[kind],
  });
  limiters.set(kind, made);
  return made;
}

type Key = { kind: keyof typeof limits; key: string };

/** Stops a caller who has failed too often. */
export async function assertNotThrottled(keys: readonly Key[]): Promise<void> {
  for (const { kind, key } of keys) {
    const state = await limiter(kind).get(key);
    if (state && state.consumedPoints >= limits[kind].points) throw new AppError('too-many-tries');
  }
}

/** Notes one failure under each key. */
export async function noteFailure(keys: readonly Key[]): Promise<void> {
  for (const { kind, key } of keys) await limiter(kind).penalty(key, 1);
}

export async function forgetFailures({ kind, key }: Key): Promise<void> {
  await limiter(kind).delete(key);
}
