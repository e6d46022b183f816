import 'server-only';
import { connect, type Database } from '@/db/connection';
import { environment } from './environment';

// Kept on the global object so that a development reload does not leave pools behind.
const kept = globalThis as typeof globalThis & { rowriseDatabase?: Database };

/** The application's one pool, opened at first use under the role that owns nothing. */
export function database(): Database {
  kept.rowriseDatabase ??= connect(environment().DATABASE_URL);
  return kept.rowriseDatabase;
}
