import { sql } from 'drizzle-orm';
import { drizzle, type NodePgDatabase } from 'drizzle-orm/node-postgres';
import pg from 'pg';

export type Database = ReturnType<typeof connect>;
export type Transaction = NodePgDatabase<Record<string, never>>;

/** Opens a pool to one address. A dropped idle connection is the pool's to replace, not a reason to stop the server. */
export function connect(url: string, size = 10) {
  const pool = new pg.Pool({
    connectionString: url,
    max: size,
    connectionTimeoutMillis: 5_000,
    idle_in_transaction_session_timeout: 30_000,
    statement_timeout: 30_000,
    // A phone gives a request up after twenty seconds; whoever waits for another's lock is told before that.
    lock_timeout: 8_000,
  });
  pool.on('error', () => undefined);
  // The pool listens while a connection is idle only. One that drops inside a transaction rejects its query, and says so
  // a second time as an event; without a listener that event would end the process.
  pool.on('connect', (client) => {
    client.on('error', () => undefined);
  });
  return drizzle(pool);
}

/**
 * Runs `work` in one transaction. The mapper's own does not give the connection back when its first statement fails, so
 * that a database that goes away would use the pool up for good; here every way out gives it back, and a connection that
 * cannot be rolled back is thrown away.
 */
export async function inTransaction<T>(database: Database, work: (tx: Transaction) => Promise<T>): Promise<T> {
  const client = await database.$client.connect();
  let broken = false;
  try {
    await client.query('begin');
    const done = await work(drizzle(client));
    await client.query('commit');
    return done;
  } catch (error) {
    await client.query('rollback').catch(() => {
      broken = true;
    });
    throw error;
  } finally {
    client.release(broken);
  }
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
  return inTransaction(database, async (tx) => {
    await tx.execute(
      sql`select set_config('app.organisation_id', ${who.organisationId}, true), set_config('app.person_id', ${who.personId ?? ''}, true)`,
    );
    return work(tx);
  });
}

/** Runs `work` in a transaction that sees only what belongs to a person across organisations: where they are a member. */
export function asPerson<T>(database: Database, personId: string, work: (tx: Transaction) => Promise<T>): Promise<T> {
  return inTransaction(database, async (tx) => {
    await tx.execute(sql`select set_config('app.person_id', ${personId}, true)`);
    return work(tx);
  });
}
