import 'server-only';
import { database } from '../../database';
import { log } from '../../log';
import { sealAudit } from './seal-audit';

const everyMilliseconds = 60_000;
const kept = globalThis as typeof globalThis & { rowriseSealing?: NodeJS.Timeout };

/** Seals once a minute for as long as the server runs; several servers hold each other off in the database. */
export function sealInTheBackground(): void {
  if (kept.rowriseSealing || !process.env.DATABASE_URL) return;
  kept.rowriseSealing = setInterval(() => {
    sealAudit(database()).catch(() => log.warn('sealing waits for the database'));
  }, everyMilliseconds);
  kept.rowriseSealing.unref();
}
