import type { Client } from 'pg';

/**
 * What each database role may do, applied after every migration. The application owns nothing and bypasses nothing:
 * it may add observations but never change or delete one, change plans but never delete one.
 */
const appended = [
  'block', 'strip', 'strip_as_planted', 'visit', 'count', 'tape_sheet', 'residue_reading', 'withdrawal', 'import_file',
  'depth_reading', 'dig', 'crust_reading', 'field_transect', 'condition', 'note', 'marker_tally', 'entry_restriction',
  'entry_exception', 'photo', 'photo_file', 'replant_sheet', 'decision', 'audit_event', 'audit_seal', 'losing_edit',
];
const changeable = [
  'organisation', 'membership', 'farm', 'farm_person', 'field', 'planting', 'planting_zone', 'setting', 'study', 'trial',
  'row_sample', 'receipt', 'person', 'session', 'one_time_link',
];
const free = ['throttle'];

/** Tables that belong to no tenant; a test holds that every other table begins its key with the organisation. */
export const tablesWithoutOrganisation = ['person', 'session', 'one_time_link', 'throttle'];

/** Tenant tables in an order in which their rows can be deleted, children before parents. */
export const erasableTables = [
  'audit_seal', 'audit_event', 'receipt', 'losing_edit', 'decision', 'replant_sheet', 'withdrawal', 'import_file',
  'photo_file', 'photo', 'entry_exception', 'entry_restriction', 'marker_tally', 'note', 'condition', 'field_transect',
  'crust_reading', 'dig', 'depth_reading', 'residue_reading', 'tape_sheet', 'count', 'visit', 'row_sample', 'strip_as_planted', 'strip', 'block', 'trial', 'study',
  'setting', 'planting_zone', 'planting', 'field', 'farm_person', 'farm', 'membership', 'organisation',
];

export async function applyGrants(client: Client): Promise<void> {
  const list = (tables: string[]) => tables.map((table) => `"${table}"`).join(', ');
  await client.query('REVOKE ALL ON SCHEMA public FROM PUBLIC');
  await client.query('GRANT USAGE ON SCHEMA public TO rowrise_app, rowrise_eraser');
  await client.query('REVOKE ALL ON ALL TABLES IN SCHEMA public FROM rowrise_app, rowrise_eraser');
  await client.query(`GRANT SELECT, INSERT ON ${list(appended)} TO rowrise_app`);
  await client.query(`GRANT SELECT, INSERT, UPDATE ON ${list(changeable)} TO rowrise_app`);
  await client.query(`GRANT SELECT, INSERT, UPDATE, DELETE ON ${list(free)} TO rowrise_app`);
  await client.query('GRANT EXECUTE ON FUNCTION organisations_with_unsealed_events() TO rowrise_app');
  await client.query('GRANT EXECUTE ON FUNCTION organisations_of_person(uuid) TO rowrise_app');
  await client.query(`GRANT SELECT, DELETE ON ${list(erasableTables)} TO rowrise_eraser`);
}
