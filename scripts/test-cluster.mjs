// A cluster for one test run: nothing in it lasts, so it need not wait for the disk.
import {
  accessSync,
  chmodSync,
  constants,
  existsSync,
  mkdtempSync,
  readFileSync,
  readdirSync,
  rmSync,
  writeFileSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { databaseUrls, makeDatabase, makeRoles, withClient } from './databases.mjs';
import { beforeLeaving } from './interruption.mjs';
import { migrate } from './local-database.mjs';
import { everyoneMayPass } from './places.mjs';
import { makeCluster } from './postgres-cluster.mjs';
import { postgresPrograms } from './postgres-programs.mjs';
import { startPostgres } from './postgres-server.mjs';
import { bornAt } from './process-identity.mjs';
import { newSecrets } from './secrets.mjs';

export const templateName = 'rowrise_template';
const prefix = 'rowrise-test-';

// What a power cut would cost is of no interest here, and the waiting is most of the time of a small test.
const passing = { fsync: 'off', full_page_writes: 'off', synchronous_commit: 'off', max_connections: 200 };

function temporaryFolder() {
  const folder =
    [tmpdir(), '/tmp', '/var/tmp'].find((it) => existsSync(it) && everyoneMayPass(it)) ?? tmpdir();
  accessSync(folder, constants.W_OK);
  return folder;
}

/** A run that was killed outright could not clear its folder away; the next one does. */
function removeLeftovers(parent) {
  for (const name of readdirSync(parent).filter((it) => it.startsWith(prefix))) {
    const folder = join(parent, name);
    try {
      const owner = JSON.parse(readFileSync(join(folder, 'owner.json'), 'utf8'));
      if (bornAt(owner.pid) !== owner.born) rmSync(folder, { recursive: true, force: true });
    } catch {
      // Another user's folder, or one that is being made at this moment: not ours to judge.
    }
  }
}

/**
 * Starts the cluster with its roles and an empty, migrated template; answers with what is needed to use it. A harness that
 * stops PostgreSQL hard asks for a lasting one: it waits for the disk, as a real one does.
 */
export async function startTestCluster({ lasting = false } = {}) {
  const settings = lasting ? { max_connections: 200 } : passing;
  const parent = temporaryFolder();
  removeLeftovers(parent);
  const folder = mkdtempSync(join(parent, prefix));
  beforeLeaving(() => rmSync(folder, { recursive: true, force: true }));
  writeFileSync(join(folder, 'owner.json'), JSON.stringify({ pid: process.pid, born: bornAt(process.pid) }));
  // PostgreSQL's user passes through; everything inside has a mode of its own.
  chmodSync(folder, 0o711);
  const programs = await postgresPrograms();
  const secrets = newSecrets();
  const dataFolder = join(folder, 'postgres');
  await makeCluster({ programs, dataFolder, password: secrets.superuser, lasting });
  const logFile = join(folder, 'postgres.log');
  const port = await startPostgres({ programs, dataFolder, password: secrets.superuser, logFile, settings });
  await withClient(databaseUrls(port, secrets, 'postgres').admin, async (client) => {
    await makeRoles(client, secrets);
    await makeDatabase(client, templateName);
  });
  const template = databaseUrls(port, secrets, templateName);
  await migrate(template.migrator, template.app);
  return { port, secrets, folder, dataFolder };
}

/** What the database tests read from their environment. */
export function testEnvironment({ port, secrets }) {
  const urls = databaseUrls(port, secrets, templateName);
  return {
    TEST_ADMIN_URL: databaseUrls(port, secrets, 'postgres').admin,
    TEST_MIGRATOR_URL: urls.migrator,
    TEST_APP_URL: urls.app,
    TEST_ERASER_URL: urls.eraser,
    SESSION_SECRET: secrets.session,
  };
}
