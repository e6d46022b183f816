import { spawn } from 'node:child_process';
import { cpSync, appendFileSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import pg from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { assertMigrationsAgree } from '@/scripts/migration-check';
import { assertBoundByRowSecurity, assertMayBypassRowSecurity } from '@/scripts/role-check';
import { makeTestDatabase, type TestDatabase } from '../support/test-database';

interface Journal {
  entries: { idx: number; when: number; tag: string }[];
}

let database: TestDatabase;
let client: pg.Client;
const folders: string[] = [];

beforeAll(async () => {
  database = await makeTestDatabase();
  client = new pg.Client({ connectionString: database.migratorUrl });
  await client.connect();
});

afterAll(async () => {
  await client.end();
  await database.drop();
  for (const folder of folders) rmSync(folder, { recursive: true });
});

/** A copy of the migrations with its journal changed, so that the real ones stay as they are. */
function changedMigrations(change: (journal: Journal, folder: string) => void): string {
  const folder = mkdtempSync(join(tmpdir(), 'rowrise-migrations-'));
  folders.push(folder);
  cpSync('migrations', folder, { recursive: true });
  const path = join(folder, 'meta/_journal.json');
  const journal = JSON.parse(readFileSync(path, 'utf8')) as Journal;
  change(journal, folder);
  writeFileSync(path, JSON.stringify(journal));
  return folder;
}

function migrate(url: string): Promise<{ code: number | null; told: string }> {
  const child = spawn(
    process.execPath,
    ['--conditions=react-server', '--import', 'tsx', 'scripts/migrate.ts'],
    {
      env: { PATH: process.env.PATH, MIGRATION_DATABASE_URL: url, NODE_ENV: 'test' },
      stdio: ['ignore', 'ignore', 'pipe'],
    },
  );
  let told = '';
  child.stderr.on('data', (text: Buffer) => (told += text.toString()));
  return new Promise((resolve) => child.on('close', (code) => resolve({ code, told })));
}

describe('the history of the tables', () => {
  it('is accepted as it landed', async () => {
    await expect(assertMigrationsAgree(client, './migrations')).resolves.toBeUndefined();
  });

  it('refuses a migration that was edited after it had been applied', async () => {
    const folder = changedMigrations((journal, copy) => {
      appendFileSync(join(copy, `${journal.entries[0]?.tag}.sql`), '\n-- edited\n');
    });
    await expect(assertMigrationsAgree(client, folder)).rejects.toThrow(/was edited after/);
  });

  it('refuses a new migration that is older than what was applied', async () => {
    const folder = changedMigrations((journal, copy) => {
      const first = journal.entries[0];
      if (!first) throw new Error('There is no migration.');
      journal.entries.unshift({ idx: -1, when: first.when - 1, tag: 'late_comer' });
      writeFileSync(join(copy, 'late_comer.sql'), 'select 1;');
    });
    await expect(assertMigrationsAgree(client, folder)).rejects.toThrow(/late_comer is older/);
  });

  it('refuses a journal whose times do not rise', async () => {
    const folder = changedMigrations((journal, copy) => {
      const last = journal.entries.at(-1);
      if (!last) throw new Error('There is no migration.');
      journal.entries.push({ idx: 999, when: last.when, tag: 'same_moment' });
      writeFileSync(join(copy, 'same_moment.sql'), 'select 1;');
    });
    await expect(assertMigrationsAgree(client, folder)).rejects.toThrow(/same_moment carries an older time/);
  });

  it('refuses a database that is ahead of the code', async () => {
    const folder = changedMigrations((journal) => journal.entries.pop());
    await expect(assertMigrationsAgree(client, folder)).rejects.toThrow(/does not know/);
  });

  it('is the same when two migrators begin at once on an empty database', async () => {
    const tables = () =>
      client.query(`select relname from pg_class where relkind = 'r' and relnamespace >= 2200 order by 1`);
    const before = await tables();
    await client.query('drop schema public cascade; drop schema drizzle cascade; create schema public');
    const runs = await Promise.all([migrate(database.migratorUrl), migrate(database.migratorUrl)]);
    expect(runs).toEqual([
      { code: 0, told: '' },
      { code: 0, told: '' },
    ]);
    expect((await tables()).rows.map((row) => row.relname)).toEqual(before.rows.map((row) => row.relname));
  });

  it('refuses to migrate under a role that row security binds', async () => {
    const bound = new pg.Client({ connectionString: database.appUrl });
    await bound.connect();
    await expect(assertMayBypassRowSecurity(bound)).rejects.toThrow(/rowrise_app .* BYPASSRLS/);
    await bound.end();
  });

  it('refuses to serve under a role that row security does not bind', async () => {
    await expect(assertBoundByRowSecurity(database.migratorUrl)).rejects.toThrow(/rowrise_migrator/);
    await expect(assertBoundByRowSecurity(database.appUrl)).resolves.toBeUndefined();
  });
});
