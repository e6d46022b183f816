import 'server-only';
import { sql } from 'drizzle-orm';
import { database } from '../../database';

/** Whether the server answers and reaches its database; throws when it does not. */
export async function readHealth(): Promise<{ status: 'ok' }> {
  await database().execute(sql`select 1`);
  return { status: 'ok' };
}
