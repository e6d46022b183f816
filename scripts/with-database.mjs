// Runs one command with the addresses of the local database that `npm start` or `npm run dev` keeps open:
// node scripts/with-database.mjs npx tsx scripts/migrate.ts
import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { databaseUrls } from './databases.mjs';
import { homeFolder } from './local-database.mjs';
import { checkout } from './places.mjs';
import { runningPostmaster } from './postgres-cluster.mjs';
import { readSecrets } from './secrets.mjs';

const home = homeFolder();
const secrets = readSecrets(join(home, 'secrets.json'));
const postmaster = existsSync(join(home, 'postgres')) ? runningPostmaster(join(home, 'postgres')) : undefined;
const [command, ...args] = process.argv.slice(2);

if (!command || !secrets || !postmaster) {
  process.stderr.write(
    'The local database is not running (start it with npm run dev), or no command was given.\n',
  );
  process.exit(1);
}
const urls = databaseUrls(postmaster.port, secrets, 'rowrise');
const result = spawnSync(command, args, {
  cwd: checkout,
  stdio: 'inherit',
  env: {
    ...process.env,
    DATABASE_URL: urls.app,
    MIGRATION_DATABASE_URL: urls.migrator,
    ERASER_DATABASE_URL: urls.eraser,
    SESSION_SECRET: secrets.session,
  },
});
process.exit(result.status ?? 1);
