import { sql } from 'drizzle-orm';
import { drizzle } from 'drizzle-orm/node-postgres';
import pg from 'pg';

export type Database = ReturnType<typeof connect>;
export type Transaction = Parameters<Parameters<Database['transaction']>[0]>[0];

/** Opens a pool to one address. A dropped idle connection is the pool's to replace, not a reason to stop the server. */
export function connect(url: string, size = 10) {
  const pool = new pg.Pool({
    connectionString: url,
    max: size,
    connectionTimeoutMillis: 5_000,
    idle_in_transaction_session_timeout: 30_000,
    statement_timeout: 30_000,
  });
  pool.on('error', () => undefined);
  return drizzle(pool);
}

/**
 * Runs `work` in one transaction in which the organisation (and person) is named to the database, so that row security
 * lets through that tenant's rows and no other's.
 */
export function inOrganisation<T>(
  database: Database,
  who: { organisationId: string; personId?: string | undefined },
  work: (tx: Transaction) => Promise<T>,
): Promise<T> {
  return database.transaction(async (tx) => {
    await tx.execute(
      sql`select set_config('app.organisation_id', ${who.organisationId}, true), set_config('app.person_id', ${who.personId ?? ''}, true)`,
    );
    return work(tx);
  });
}

/** Runs `work` in a transaction that sees only what belongs to a person across organisations: where they are a member. */
export function asPerson<T>(database: Database, personId: string, work: (tx: Transaction) => Promise<T>): Promise<T> {
  return database.transaction(async (tx) => {
    await tx.execute(sql`select set_config('app.person_id', ${personId}, true)`);
    return work(tx);
  });
}
