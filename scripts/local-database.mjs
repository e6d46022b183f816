// The local database of this checkout, from nothing to migrated and filled.
import { copyFileSync, existsSync, mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { databaseUrls, makeDatabase, makeRoles, withClient } from './databases.mjs';
import { checkout, everyoneMayPass, localFolder, stateFolder } from './places.mjs';
import { majorOnDisk, makeCluster, refuseOtherMajor } from './postgres-cluster.mjs';
import { postgresPrograms } from './postgres-programs.mjs';
import { startPostgres } from './postgres-server.mjs';
import { keepSecrets, newSecrets, readSecrets } from './secrets.mjs';
import { Stop, say, step } from './say.mjs';
import { runScript } from './typescript.mjs';

/** The folder of cluster and secrets: in the checkout, or in the system's where the database's user cannot get there. */
export function homeFolder() {
  const inSystem = stateFolder();
  const cannotReach = process.getuid?.() === 0 && !everyoneMayPass(localFolder);
  if (!existsSync(join(localFolder, 'postgres')) && (cannotReach || existsSync(join(inSystem, 'postgres')))) {
    mkdirSync(inSystem, { recursive: true, mode: 0o711 });
    return inSystem;
  }
  return localFolder;
}

/** Finds PostgreSQL's programs and makes the cluster when there is none; this part needs no modules yet. */
export async function prepareLocalCluster() {
  const home = homeFolder();
  const dataFolder = join(home, 'postgres');
  const secretsFile = join(home, 'secrets.json');
  const programs = await postgresPrograms(majorOnDisk(dataFolder));
  let secrets = readSecrets(secretsFile);
  if (!existsSync(dataFolder)) {
    secrets ??= newSecrets();
    keepSecrets(secretsFile, secrets);
    await step(`Making the database cluster in ${dataFolder}`, () =>
      makeCluster({ programs, dataFolder, password: secrets.superuser }),
    );
  }
  if (!secrets) {
    throw new Stop(
      `The file ${secretsFile} with the database's passwords is missing, so ${dataFolder} cannot be opened. ` +
        'Put it back, or move that folder away to begin with a new database.',
    );
  }
  refuseOtherMajor(programs, dataFolder);
  return { programs, dataFolder, secrets, home };
}

/** Starts the cluster and adds its port to what is known of it. */
export async function startLocalCluster(cluster) {
  const { programs, dataFolder, secrets } = cluster;
  const logFile = join(localFolder, 'postgres.log');
  const port = await step(`Starting PostgreSQL ${programs.major}`, () =>
    startPostgres({ programs, dataFolder, password: secrets.superuser, logFile, settings: {} }),
  );
  return { ...cluster, port };
}

const beingFilled = 'Demo data is being filled in; a start that finds this note makes the database anew.';

async function isEmpty(client) {
  const tables = await client.query(
    `select format('%I.%I', schemaname, tablename) as name from pg_tables where schemaname = 'public'`,
  );
  for (const { name } of tables.rows) {
    if ((await client.query(`select 1 from ${name} limit 1`)).rowCount > 0) return false;
  }
  return true;
}

async function noteOn(client, database) {
  const found = await client.query(
    `select shobj_description(oid, 'pg_database') as note from pg_database where datname = $1`,
    [database],
  );
  return found.rows[0]?.note;
}

/** Makes and migrates one database of the cluster; with `demo`, an empty one is filled. */
export async function prepareDatabase({ port, secrets, home }, database, { demo }) {
  const urls = databaseUrls(port, secrets, database);
  const adminUrl = databaseUrls(port, secrets, 'postgres').admin;
  await withClient(adminUrl, async (client) => {
    await makeRoles(client, secrets);
    if ((await noteOn(client, database)) === beingFilled) {
      say('The demo data were left half filled in last time; they are made anew.');
      await client.query(`DROP DATABASE ${client.escapeIdentifier(database)} WITH (FORCE)`);
    }
    await makeDatabase(client, database);
  });
  await step('Bringing the tables up to date', () => migrate(urls.migrator, urls.app));
  if (demo) await fillDemo({ urls, adminUrl, database, secrets, home });
  return urls;
}

export function migrate(migratorUrl, appUrl) {
  return runScript('scripts/migrate.ts', [], {
    env: { MIGRATION_DATABASE_URL: migratorUrl, DATABASE_URL: appUrl },
    failure: 'The tables could not be brought up to date.',
  });
}

const fillScript = 'db/demo/fill.ts';

async function fillDemo({ urls, adminUrl, database, secrets, home }) {
  const people = join(localFolder, 'demo-people.json');
  const kept = join(home, 'demo-people.json');
  if (!existsSync(join(checkout, fillScript)))
    return say(`There are no demo data: ${fillScript} does not exist.`);
  if (!(await withClient(urls.admin, isEmpty))) {
    if (!existsSync(people) && existsSync(kept)) copyFileSync(kept, people);
    return undefined;
  }
  const note = (text) =>
    withClient(adminUrl, (client) =>
      client.query(`COMMENT ON DATABASE ${client.escapeIdentifier(database)} IS ${text}`),
    );
  await note(`'${beingFilled}'`);
  await step('Filling in the demo data', () =>
    runScript(fillScript, [], {
      env: {
        DATABASE_URL: urls.app,
        MIGRATION_DATABASE_URL: urls.migrator,
        SESSION_SECRET: secrets.session,
        ROWRISE_DEMO_PEOPLE_FILE: people,
      },
      failure: 'The demo data could not be filled in.',
    }),
  );
  await note('NULL');
  if (kept !== people && existsSync(people)) copyFileSync(people, kept);
}
