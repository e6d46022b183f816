import pg from 'pg';
import type { FieldScene } from './scene';
import type { Entered } from './walk';

type Rows = Record<string, unknown>[];

/** What the database holds of the organisation, read by SQL alone, in the shape and order of what was entered. */
async function held(client: pg.Client, organisationId: string) {
  const rows = async (sql: string): Promise<Rows> => (await client.query<Record<string, unknown>>(sql, [organisationId])).rows;
  const counts = await rows(`select r.label, v.visited_on::text as on, c.counted_as as "countedAs", c.plants, c.doubtful, v.marker from count c join visit v on v.organisation_id = c.organisation_id and v.id = c.visit_id join row_sample r on r.organisation_id = c.organisation_id and r.id = c.row_sample_id where c.organisation_id = $1`);
  const tapeSheets = await rows(`select r.label, v.visited_on::text as on, t.places_typed as places from tape_sheet t join visit v on v.organisation_id = t.organisation_id and v.id = t.visit_id join row_sample r on r.organisation_id = t.organisation_id and r.id = t.row_sample_id where t.organisation_id = $1`);
  const depths = await rows(`select r.label, d.depths_typed as depths from depth_reading d join row_sample r on r.organisation_id = d.organisation_id and r.id = d.row_sample_id where d.organisation_id = $1`);
  const cover = await rows(`select r.label, d.marks_read as "marksRead", d.marks_covered as "marksCovered" from residue_reading d join row_sample r on r.organisation_id = d.organisation_id and r.id = d.row_sample_id where d.organisation_id = $1`);
  const transects = await rows(`select marks_read as "marksRead", marks_covered as "marksCovered" from field_transect where organisation_id = $1`);
  const digs = await rows(`select r.label, d.plant, d.depth_typed as depth from dig d join row_sample r on r.organisation_id = d.organisation_id and r.id = d.row_sample_id where d.organisation_id = $1`);
  const photos = await rows(`select p.id, f.photo_id as stored from photo p left join photo_file f on f.organisation_id = p.organisation_id and f.photo_id = p.id where p.organisation_id = $1`);
  const receipts = await rows(`select count(*)::int as receipts, count(distinct operation_id)::int as operations from receipt where organisation_id = $1 and answer is not null and device_sequence > 0 and kind not in ('farm.add','field.add','planting.add','setting.add','trial.lay-out','row-samples.add')`);
  return { counts, tapeSheets, depths, cover, transects, digs, photos, receipts };
}

const lines = (things: readonly unknown[]) => things.map((thing) => JSON.stringify(Object.fromEntries(Object.entries(thing as object).sort(([a], [b]) => (a < b ? -1 : 1))))).sort();

/** Says every difference between what was entered and what is held, as lost or invented; nothing where they are equal. */
export async function differences(databaseUrl: string, scene: FieldScene, entered: Entered): Promise<{ found: string[]; sums: string }> {
  const client = new pg.Client({ connectionString: databaseUrl });
  await client.connect();
  try {
    const there = await held(client, scene.organisationId);
    const found: string[] = [];
    for (const noun of ['counts', 'tapeSheets', 'depths', 'cover', 'transects', 'digs'] as const) {
      const [mine, theirs] = [lines(entered[noun]), lines(there[noun])];
      const left = [...theirs];
      for (const line of mine) {
        const at = left.indexOf(line);
        if (at === -1) found.push(`lost ${noun}: ${line}`);
        else left.splice(at, 1);
      }
      found.push(...left.map((line) => `invented or doubled ${noun}: ${line}`));
    }
    const stored = there.photos.filter((photo) => photo.stored !== null).length;
    if (there.photos.length !== entered.photos || stored !== entered.photos) found.push(`photos: ${entered.photos} taken, ${there.photos.length} recorded, ${stored} stored`);
    const sums = `${there.counts.length} counts, ${there.tapeSheets.length} tape sheets, ${there.depths.length} depth readings, ${there.cover.length} in-row covers, ${there.transects.length} transects, ${there.digs.length} digs, ${stored} photos; ${JSON.stringify(there.receipts[0])}`;
    return { found, sums };
  } finally {
    await client.end();
  }
}
