import pg from 'pg';
import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { connect, inOrganisation, type Database } from '@/db/connection';
import { eraseOrganisation } from '@/db/erase-organisation';
import { erasableTables, tablesWithoutOrganisation } from '@/db/grants';
import { sql } from 'drizzle-orm';
import { fillDemo } from '@/db/demo/fill-demo';
import { makeTestDatabase, type TestDatabase } from '../support/test-database';

let own: TestDatabase;
let db: Database;
let catalogue: pg.Client;

beforeAll(async () => {
  own = await makeTestDatabase();
  process.env.SESSION_SECRET ??= 'a secret of the tests, long enough to be one';
  process.env.DATABASE_URL = own.appUrl;
  db = connect(own.appUrl);
  catalogue = new pg.Client({ connectionString: own.migratorUrl });
  await catalogue.connect();
  await fillDemo(db);
}, 120_000);

afterAll(async () => {
  await catalogue.end();
  await db.$client.end();
  await own.drop();
});

const column = async (query: string, values: unknown[] = []) => (await catalogue.query<{ value: string }>(query, values)).rows.map((row) => row.value);

const tables = () => column(`select tablename as value from pg_tables where schemaname = 'public' order by 1`);
const tenantTables = async () => (await tables()).filter((table) => !tablesWithoutOrganisation.includes(table) && table !== 'organisation');

describe('the catalogue of the database', () => {
  it('begins the key of every tenant table with the organisation', async () => {
    const first = await catalogue.query<{ table: string; column: string }>(`
      select c.relname as table, a.attname as column from pg_constraint k
      join pg_class c on c.oid = k.conrelid join pg_namespace n on n.oid = c.relnamespace and n.nspname = 'public'
      join pg_attribute a on a.attrelid = c.oid and a.attnum = k.conkey[1] where k.contype = 'p'`);
    const firstOf = new Map(first.rows.map((row) => [row.table, row.column]));
    for (const table of await tenantTables()) expect([table, firstOf.get(table)]).toEqual([table, 'organisation_id']);
    expect(firstOf.get('organisation')).toBe('id');
  });

  it('has row security switched on and forced, with a policy, on every tenant table', async () => {
    const guarded = await column(`
      select c.relname as value from pg_class c join pg_namespace n on n.oid = c.relnamespace and n.nspname = 'public'
      where c.relkind = 'r' and c.relrowsecurity and c.relforcerowsecurity and exists (select 1 from pg_policy p where p.polrelid = c.oid)`);
    expect([...guarded].sort()).toEqual([...(await tenantTables()), 'organisation'].sort());
  });

  it('carries the organisation in every foreign key between tenant tables', async () => {
    const broken = await column(`
      select k.conname as value from pg_constraint k join pg_class c on c.oid = k.conrelid join pg_class f on f.oid = k.confrelid
      where k.contype = 'f' and f.relname <> 'person' and not exists (
        select 1 from unnest(k.conkey, k.confkey) as pair(own, other)
        join pg_attribute a on a.attrelid = c.oid and a.attnum = pair.own and a.attname = 'organisation_id'
        join pg_attribute b on b.attrelid = f.oid and b.attnum = pair.other and b.attname in ('organisation_id', 'id'))`);
    expect(broken).toEqual([]);
  });

  it('keeps every name whole and uses no sequence', async () => {
    expect(await column(`select conname as value from pg_constraint where length(conname) >= 63`)).toEqual([]);
    expect(await column(`select sequencename as value from pg_sequences where schemaname = 'public'`)).toEqual([]);
  });

  it('gives the application nothing to own or to bypass, and no deleting of plans or changing of observations', async () => {
    expect(await column(`select rolname as value from pg_roles where rolname in ('rowrise_app', 'rowrise_eraser') and (rolsuper or rolbypassrls or rolcreatedb or rolcreaterole)`)).toEqual([]);
    expect(await column(`select c.relname as value from pg_class c join pg_roles r on r.oid = c.relowner where r.rolname in ('rowrise_app', 'rowrise_eraser')`)).toEqual([]);
    const may = (right: string) =>
      column(`select relname as value from pg_class where relkind = 'r' and relnamespace = 'public'::regnamespace and has_table_privilege('rowrise_app', oid, $1) order by 1`, [right]);
    expect(await may('DELETE')).toEqual(['throttle']);
    const observations = ['count', 'tape_sheet', 'visit', 'residue_reading', 'withdrawal', 'decision', 'replant_sheet', 'strip_as_planted', 'audit_event', 'audit_seal'];
    expect((await may('UPDATE')).filter((table) => observations.includes(table))).toEqual([]);
  });

  it('can erase every table that a tenant has rows in', async () => {
    expect([...erasableTables].sort()).toEqual([...(await tenantTables()), 'organisation'].sort());
  });
});

describe('row security', () => {
  const rowsSeen = async (run: (query: string) => Promise<number>) => {
    const seen: Record<string, number> = {};
    for (const table of await tenantTables()) seen[table] = await run(table);
    return seen;
  };
  const countIn = (table: string) => sql.raw(`select count(*)::int as rows from "${table}"`);

  it('shows nothing where no organisation is named, though rows stand', async () => {
    const seen = await rowsSeen(async (table) => (await db.execute<{ rows: number }>(countIn(table))).rows[0]?.rows ?? -1);
    expect(Object.entries(seen).filter(([, rows]) => rows !== 0)).toEqual([]);
    expect(Number((await column('select count(*)::text as value from count'))[0])).toBeGreaterThan(500);
  });

  it('shows an organisation its own rows and no other’s', async () => {
    for (const organisationId of await column('select id::text as value from organisation')) {
      const seen = await inOrganisation(db, { organisationId }, (tx) =>
        rowsSeen(async (table) => (await tx.execute<{ rows: number }>(sql.raw(`select count(*)::int as rows from "${table}" where organisation_id <> '${organisationId}'`))).rows[0]?.rows ?? -1),
      );
      expect(Object.entries(seen).filter(([, rows]) => rows !== 0)).toEqual([]);
    }
  });

  it('refuses a row written for another organisation', async () => {
    const [first, second] = await column('select id::text as value from organisation order by 1');
    const written = inOrganisation(db, { organisationId: first ?? '' }, (tx) =>
      tx.execute(sql`insert into farm (organisation_id, id, name, time_zone, origin_kind, operation_id, created_by) values (${second}, ${v7()}, 'Elsewhere', 'UTC', 'form', ${v7()}, ${v7()})`),
    );
    await expect(written).rejects.toMatchObject({ cause: { code: '42501' } });
  });
});

describe('the eraser', () => {
  it('deletes one organisation whole and leaves the others as they were', async () => {
    const [gone, ...others] = await column('select id::text as value from organisation order by name desc');
    const countAll = async () => {
      const counted: Record<string, string | undefined> = {};
      for (const table of await tenantTables()) counted[table] = (await column(`select count(*)::text as value from "${table}" where organisation_id = any($1)`, [others]))[0];
      return counted;
    };
    const before = await countAll();
    const name = (await column('select name as value from organisation where id = $1', [gone]))[0] ?? '';
    await expect(eraseOrganisation(own.eraserUrl, { organisationId: gone ?? '', name: 'Another name' })).rejects.toThrow('Nothing was deleted');
    expect(await column('select id::text as value from organisation where id = $1', [gone])).toEqual([gone]);
    expect(await eraseOrganisation(own.eraserUrl, { organisationId: gone ?? '', name })).toBeGreaterThan(5);
    expect(await countAll()).toEqual(before);
    for (const table of await tenantTables()) expect(await column(`select 1::text as value from "${table}" where organisation_id = $1 limit 1`, [gone])).toEqual([]);
    expect(await column('select id::text as value from organisation where id = $1', [gone])).toEqual([]);
  });
});
