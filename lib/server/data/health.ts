import 'server-only';
import { sql } from 'drizzle-orm';
import type { Database } from '@/db/connection';

/** Asks the database for nothing, to hear that it is there. */
export async function askDatabase(db: Database): Promise<void> {
  await db.execute(sql`select 1`);
}
