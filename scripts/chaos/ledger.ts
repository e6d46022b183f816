import type pg from 'pg';
import type { Made } from './entry';

export type Ledger = { made: number; visits: number; lost: number; doubled: number; invented: number; altered: number; apart: number; told: string[] };

type Noun = { kind: string; table: string; differs: string };

const visitDiffers = `not exists (
  select 1 from visit v where v.organisation_id = t.organisation_id and v.id = t.visit_id and v.row_sample_id = t.row_sample_id and v.person_id = m.person_id
  and v.id = (m.body -> 'visit' ->> 'id')::uuid and v.visited_on = (m.body -> 'visit' ->> 'visitedOn')::date
  and v.visited_at is not distinct from m.body -> 'visit' ->> 'visitedAt' and v.marker is not distinct from m.body -> 'visit' ->> 'marker')`;

const placesAs = (type: string, value: string) =>
  `(select array_agg((${value})::${type} order by p.n) from jsonb_array_elements(m.body -> 'places') with ordinality as p (it, n))`;

/** What the places or depths come to, worked out by the harness and not by the server's parser. */
const meantThousandths = `(select array_agg(p.it::int order by p.n) from jsonb_array_elements_text(m.meant -> 'thousandths') with ordinality as p (it, n))`;

/** Which table an entry of a kind comes to rest in, and when its row is not what the phone entered. */
const nouns: readonly Noun[] = [
  {
    kind: 'count.record',
    table: 'count',
    differs: `(t.row_sample_id, t.counted_as, t.plants, t.doubtful) is distinct from ((m.body ->> 'rowSampleId')::uuid, m.body ->> 'countedAs', (m.body ->> 'plants')::int, (m.body ->> 'doubtful')::int)
      or t.replaces_id is distinct from (m.body ->> 'replacesId')::uuid or ${visitDiffers}`,
  },
  {
    kind: 'residue.record',
    table: 'residue_reading',
    differs: `(t.row_sample_id, t.read_on, t.marks_read, t.marks_covered) is distinct from ((m.body ->> 'rowSampleId')::uuid, (m.body ->> 'readOn')::date, (m.body ->> 'marksRead')::int, (m.body ->> 'marksCovered')::int)`,
  },
  {
    kind: 'tape-sheet.record',
    table: 'tape_sheet',
    differs: `(t.row_sample_id, t.tape_unit) is distinct from ((m.body ->> 'rowSampleId')::uuid, m.body ->> 'tapeUnit') or t.replaces_id is distinct from (m.body ->> 'replacesId')::uuid
      or t.places_typed is distinct from ${placesAs('text', `p.it ->> 'typed'`)} or t.kinds is distinct from ${placesAs('text', `p.it ->> 'kind'`)}
      or t.markers is distinct from ${placesAs('text', `coalesce(p.it ->> 'marker', '')`)} or t.leaf_stage_tenths is distinct from ${placesAs('int', `coalesce((p.it ->> 'leafStage')::numeric * 10, -1)`)}
      or t.places_thousandths is distinct from ${meantThousandths} or ${visitDiffers}`,
  },
  {
    kind: 'depth.record',
    table: 'depth_reading',
    differs: `(t.row_sample_id, t.unit) is distinct from ((m.body ->> 'rowSampleId')::uuid, m.body ->> 'unit')
      or t.depths_typed is distinct from (select array_agg(p.it order by p.n) from jsonb_array_elements_text(m.body -> 'depths') with ordinality as p (it, n))
      or t.depths_thousandths is distinct from ${meantThousandths} or ${visitDiffers}`,
  },
  {
    kind: 'crust.record',
    table: 'crust_reading',
    differs: `(t.row_sample_id, t.sprouts_sound, t.sprouts_dead, t.crust) is distinct from ((m.body ->> 'rowSampleId')::uuid, (m.body ->> 'sproutsSound')::int, (m.body ->> 'sproutsDead')::int, m.body ->> 'crust') or ${visitDiffers}`,
  },
  {
    kind: 'markers.record',
    table: 'marker_tally',
    differs: `(t.row_sample_id, t.happened_on, t.event, t.markers) is distinct from ((m.body ->> 'rowSampleId')::uuid, (m.body ->> 'happenedOn')::date, m.body ->> 'event', (m.body ->> 'markers')::int)`,
  },
  {
    kind: 'note.record',
    table: 'note',
    differs: `(t.planting_id, t.row_sample_id, t.noted_on, t.noted_at, t.text) is distinct from ((m.body ->> 'plantingId')::uuid, (m.body ->> 'rowSampleId')::uuid, (m.body ->> 'notedOn')::date, m.body ->> 'notedAt', m.body ->> 'text')`,
  },
  {
    kind: 'photo.record',
    table: 'photo',
    differs: `(t.planting_id, t.row_sample_id, t.taken_on, t.taken_at, t.sha256, t.bytes) is distinct from ((m.body ->> 'plantingId')::uuid, (m.body ->> 'rowSampleId')::uuid, (m.body ->> 'takenOn')::date, m.body ->> 'takenAt', m.body ->> 'sha256', (m.body ->> 'bytes')::int)
      or (t.latitude_degrees, t.longitude_degrees, t.accuracy_meters) is distinct from ((m.body #>> '{place,latitude}')::float8, (m.body #>> '{place,longitude}')::float8, (m.body #>> '{place,accuracyMeters}')::float8)`,
  },
  {
    kind: 'observation.withdraw',
    table: 'withdrawal',
    differs: `(t.target_kind, t.target_id, t.reason) is distinct from (m.body ->> 'targetKind', (m.body ->> 'targetId')::uuid, m.body ->> 'reason')`,
  },
];

/**
 * Holds the database against what the phones made, by SQL alone: rows, receipts and audit events each against the entries,
 * one to one, and every value. The phones' own counters have no say. What a phone still keeps is no loss yet; a run in
 * which something waits at the end is red for that.
 */
export async function countByLedger(client: pg.Client, organisationId: string, made: readonly Made[], stillKept: ReadonlySet<string> = new Set()): Promise<Ledger> {
  await client.query(`create temp table made (operation_id uuid primary key, person_id uuid, device_id uuid, device_sequence bigint, kind text, version int, thing_id uuid, body jsonb, occurred jsonb, meant jsonb, still_kept boolean)`);
  const rows = made.map(({ entry: e, meant }) => ({ operation_id: e.operationId, person_id: e.personId, device_id: e.deviceId, device_sequence: e.deviceSequence, kind: e.kind, version: e.version, thing_id: e.thingId, body: e.body, occurred: e.occurred, meant, still_kept: stillKept.has(e.operationId) }));
  await client.query(`insert into made select * from jsonb_populate_recordset(null::made, $1)`, [JSON.stringify(rows)]);
  await client.query('analyze made');
  const ledger: Ledger = { made: made.length, visits: 0, lost: 0, doubled: 0, invented: 0, altered: 0, apart: 0, told: [] };
  const note = async (what: 'lost' | 'doubled' | 'invented' | 'altered' | 'apart', where: string, query: string) => {
    const found = Number((await client.query<{ n: string }>(query, query.includes('$1') ? [organisationId] : [])).rows[0]?.n);
    ledger[what] += found;
    if (found > 0) ledger.told.push(`${found} ${what}: ${where}`);
  };
  const kinds = [...new Set(made.map(({ entry }) => entry.kind))];
  const without = kinds.filter((kind) => !nouns.some((noun) => noun.kind === kind));
  if (without.length > 0) throw new Error(`The ledger has no table for ${without.join(', ')}.`);

  for (const { kind, table, differs } of nouns) {
    const pair = `from made m join ${table} t on t.organisation_id = $1 and t.id = m.thing_id where m.kind = '${kind}'`;
    await note('lost', table, `select count(*) as n from made m where m.kind = '${kind}' and not m.still_kept and not exists (select 1 from ${table} t where t.organisation_id = $1 and t.id = m.thing_id)`);
    await note('doubled', table, `select count(*) - count(distinct id) as n from ${table} where organisation_id = $1`);
    await note('invented', table, `select count(*) as n from ${table} t where t.organisation_id = $1 and not exists (select 1 from made m where m.thing_id = t.id and m.kind = '${kind}')`);
    await note('altered', table, `select count(*) as n ${pair} and (t.operation_id <> m.operation_id or t.created_by <> m.person_id or t.origin_kind <> 'phone' or ${differs})`);
  }
  const named = `(select (body -> 'visit' ->> 'id')::uuid as id, bool_and(still_kept) as still_kept from made where body -> 'visit' is not null group by 1)`;
  await note('lost', 'visit', `select count(*) as n from ${named} m where not m.still_kept and not exists (select 1 from visit t where t.organisation_id = $1 and t.id = m.id)`);
  await note('doubled', 'visit', `select count(*) - count(distinct id) as n from visit where organisation_id = $1`);
  await note('invented', 'visit', `select count(*) as n from visit t where t.organisation_id = $1 and not exists (select 1 from ${named} m where m.id = t.id)`);

  // The plan was made through operations of other kinds.
  const ofPhones = `organisation_id = $1 and kind in (${nouns.map(({ kind }) => `'${kind}'`).join(', ')})`;
  for (const [table, id] of [['receipt', 'operation_id'], ['audit_event', 'id']] as const) {
    await note('lost', table, `select count(*) as n from made m where not m.still_kept and not exists (select 1 from ${table} t where t.organisation_id = $1 and t.${id} = m.operation_id)`);
    await note('doubled', table, `select count(*) - count(distinct ${id}) as n from ${table} where ${ofPhones}`);
    await note('invented', table, `select count(*) as n from ${table} t where ${ofPhones} and not exists (select 1 from made m where m.operation_id = t.${id})`);
    await note('altered', table, `select count(*) as n from made m join ${table} t on t.organisation_id = $1 and t.${id} = m.operation_id where (t.person_id, t.device_id, t.device_sequence, t.kind, t.thing_id) is distinct from (m.person_id, m.device_id, m.device_sequence, m.kind, m.thing_id)`);
  }
  await note('altered', 'audit_event body', `select count(*) as n from made m join audit_event t on t.organisation_id = $1 and t.id = m.operation_id where t.body <> m.body or t.occurred <> m.occurred`);
  await note('apart', 'receipt without an applied answer', `select count(*) as n from receipt where ${ofPhones} and (answer ->> 'outcome') is distinct from 'applied'`);
  await note('apart', 'receipt without its audit event, or the other way round', `select count(*) as n from (select operation_id from receipt where ${ofPhones}) r full join (select id from audit_event where ${ofPhones}) a on a.id = r.operation_id where r.operation_id is null or a.id is null`);
  ledger.visits = Number((await client.query<{ n: string }>(`select count(*) as n from visit where organisation_id = $1`, [organisationId])).rows[0]?.n);
  await client.query('drop table made');
  return ledger;
}

export const balances = (ledger: Ledger) => ledger.lost + ledger.doubled + ledger.invented + ledger.altered + ledger.apart === 0;
