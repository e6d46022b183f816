// The three roles differ in what row security means to them; each is checked before anything is done under it.
import pg from 'pg';
import type { Client } from 'pg';

/** The tables' rights are given to two roles by name; a server that is not ours has to have them. */
export async function assertRolesExist(client: Client): Promise<void> {
  const needed = ['rowrise_app', 'rowrise_eraser'];
  const found = await client.query<{ rolname: string }>(
    'select rolname from pg_roles where rolname = any($1)',
    [needed],
  );
  const known = found.rows.map((row) => row.rolname);
  const missing = needed.filter((name) => !known.includes(name));
  if (missing.length > 0) {
    throw new Error(
      `This PostgreSQL server has no role ${missing.join(' and no role ')}. An administrator makes each with: ` +
        "CREATE ROLE name LOGIN NOBYPASSRLS PASSWORD '…'.",
    );
  }
}

/** A migrator under row security would see no rows: its backfills would change nothing and report success. */
export async function assertMayBypassRowSecurity(client: Client): Promise<void> {
  const answer = await client.query<{ role: string; may: boolean; guarded: boolean }>(
    `select current_user as role, rolbypassrls or rolsuper as may,
       exists (select 1 from pg_class where relrowsecurity and relkind in ('r', 'p')) as guarded
     from pg_roles where rolname = current_user`,
  );
  const row = answer.rows[0];
  if (row?.guarded && !row.may) {
    throw new Error(
      `The role ${row.role} migrates the tables but may not pass row security. Give it BYPASSRLS.`,
    );
  }
}

/** A web server above row security would see every organisation's rows, whatever the queries say. */
export async function assertBoundByRowSecurity(url: string): Promise<void> {
  const client = new pg.Client({ connectionString: url });
  client.on('error', () => undefined);
  await client.connect();
  try {
    const answer = await client.query<{ role: string; above: boolean }>(
      `select current_user as role, rolbypassrls or rolsuper or exists (
         select 1 from pg_class where relowner = pg_roles.oid and relrowsecurity
       ) as above from pg_roles where rolname = current_user`,
    );
    const row = answer.rows[0];
    if (row?.above) {
      throw new Error(
        `DATABASE_URL names the role ${row.role}, which row security does not bind. Use rowrise_app, which owns nothing.`,
      );
    }
  } finally {
    await client.end();
  }
}
