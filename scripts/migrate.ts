// Brings the tables of MIGRATION_DATABASE_URL up to what the migrations folder says, one process at a time.
import { existsSync } from 'node:fs';
import { drizzle } from 'drizzle-orm/node-postgres';
import { migrate } from 'drizzle-orm/node-postgres/migrator';
import pg from 'pg';
import { applyGrants } from '../db/grants.ts';
import { assertMigrationsAgree } from './migration-check.ts';
import { assertBoundByRowSecurity, assertMayBypassRowSecurity, assertRolesExist } from './role-check.ts';

const folder = './migrations';
// Any number does, as long as every process takes the same one.
const advisoryLockKey = 7_203_114_901;

async function main() {
  const url = process.env.MIGRATION_DATABASE_URL;
  if (!url)
    throw new Error('MIGRATION_DATABASE_URL is needed: the address for the role that owns the tables.');
  if (!existsSync(`${folder}/meta/_journal.json`)) return;
  const client = new pg.Client({ connectionString: url });
  client.on('error', () => {});
  await client.connect();
  try {
    await client.query('select pg_advisory_lock($1)', [advisoryLockKey]);
    await assertRolesExist(client);
    await assertMigrationsAgree(client, folder);
    await assertMayBypassRowSecurity(client);
    await migrate(drizzle(client), { migrationsFolder: folder, migrationsSchema: 'drizzle' });
    await assertMayBypassRowSecurity(client);
    // In one transaction, so that a server that is running meanwhile never finds its rights taken away.
    await client.query('BEGIN');
    await applyGrants(client);
    await client.query('COMMIT');
  } finally {
    await client.end();
  }
  if (process.env.DATABASE_URL) await assertBoundByRowSecurity(process.env.DATABASE_URL);
}

try {
  await main();
} catch (error) {
  // The ORM's message carries the whole statement; the database's own, kept as the cause, is the shorter and safer one.
  const cause = error instanceof Error && error.cause instanceof Error ? error.cause : error;
  // Two refused addresses of one host come as a bundle without a message of its own.
  const told = cause instanceof AggregateError ? cause.errors[0] : cause;
  process.stderr.write(`${told instanceof Error ? told.message : String(told)}\n`);
  process.exitCode = 1;
}
