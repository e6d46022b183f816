import pg from 'pg';
import { erasableTables } from './grants';

/**
 * Deletes every row of one organisation in one transaction, children before parents, and says how many there were.
 * Throws where no organisation has this id and this very name: the name is the second look before what cannot be undone.
 */
export async function eraseOrganisation(url: string, { organisationId, name }: { organisationId: string; name: string }): Promise<number> {
  const client = new pg.Client({ connectionString: url });
  client.on('error', () => undefined);
  await client.connect();
  try {
    await client.query('begin');
    await client.query("select set_config('app.organisation_id', $1, true)", [organisationId]);
    const found = await client.query('select 1 from organisation where id::text = $1 and name = $2', [organisationId, name]);
    if (found.rowCount !== 1) throw new Error('No organisation has this id and this name. Nothing was deleted.');
    let erased = 0;
    for (const table of erasableTables) {
      const key = table === 'organisation' ? 'id' : 'organisation_id';
      const gone = await client.query(`delete from "${table}" where ${key} = $1`, [organisationId]);
      erased += gone.rowCount ?? 0;
    }
    await client.query('commit');
    return erased;
  } finally {
    await client.end();
  }
}
