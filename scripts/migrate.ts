// Brings the tables of MIGRATION_DATABASE_URL up to what the migrations folder says, one process at a time.
import { existsSync } from 'node:fs';
import { drizzle } from 'drizzle-orm/node-postgres';
import { migrate } from 'drizzle-orm/node-postgres/migrator';
import pg from 'pg';
import { assertMayBypassRowSecurity, assertMigrationsAgree } from './migration-check.ts';

const folder = './migrations';
// Any number does, as long as every process takes the same one.
const advisoryLockKey = 7_203_114_901;

async function main() {
  const url = process.env.MIGRATION_DATABASE_URL;
  if (!url) throw new Error('MIGRATION_DATABASE_URL is needed: the address for the role that owns the tables.');
  if (!existsSync(`${folder}/meta/_journal.json`)) return;
  const client = new pg.Client({ connectionString: url });
  client.on('error', () => {});
  await client.connect();
  try {
    await client.query('select pg_advisory_lock($1)', [advisoryLockKey]);
    await assertMigrationsAgree(client, folder);
    await assertMayBypassRowSecurity(client);
    await migrate(drizzle(client), { migrationsFolder: folder, migrationsSchema: 'drizzle' });
    await assertMayBypassRowSecurity(client);
    if (existsSync('./db/grants.ts')) {
      const grants: string = '../db/grants.ts';
      const { applyGrants } = await import(grants);
      await applyGrants(client);
    }
  } finally {
    await client.end();
  }
}

try {
  await main();
} catch (error) {
  // The ORM's message carries the whole statement; the database's own, kept as the cause, is the shorter and safer one.
  const told = error instanceof Error && error.cause instanceof Error ? error.cause : error;
  process.stderr.write(`${told instanceof Error ? told.message : String(told)}\n`);
  process.exitCode = 1;
}
