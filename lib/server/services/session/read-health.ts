import 'server-only';
import { askDatabase } from '../../data/health';
import { database } from '../../database';

/** Whether the server answers and reaches its database; throws when it does not. */
export async function readHealth(): Promise<{ status: 'ok' }> {
  await askDatabase(database());
  return { status: 'ok' };
}
