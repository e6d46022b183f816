// Brings Rowrise up from a clone: modules, database, tables, demo, build, server. Run by `npm start` and `npm run dev`.
import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { build, buildIsCurrent } from './build.mjs';
import {
  Interrupted,
  beforeLeaving,
  leave,
  listenForSignals,
  onInterruption,
  together,
} from './interruption.mjs';
import { takeLock } from './lock.mjs';
import { migrate, prepareDatabase, prepareLocalCluster, startLocalCluster } from './local-database.mjs';
import { installModules } from './modules.mjs';
import { localFolder, lockPath, makeLocalFolder } from './places.mjs';
import { freePort } from './port.mjs';
import { Stop, say, secondsSince, step } from './say.mjs';
import { runScript } from './typescript.mjs';
import { startWebServer } from './web-server.mjs';

const startedAt = performance.now();

function readOptions() {
  const known = new Set(['--dev', '--empty']);
  const unknown = process.argv.slice(2).find((argument) => !known.has(argument));
  if (unknown) throw new Stop(`${unknown} is not an option. There are --dev and --empty.`);
  return { dev: process.argv.includes('--dev'), empty: process.argv.includes('--empty') };
}

function readEnvironment() {
  const { DATABASE_URL, MIGRATION_DATABASE_URL, SESSION_SECRET, HOST, PORT } = process.env;
  const port = Number(PORT || 3000);
  if (!Number.isInteger(port) || port < 1 || port > 65_535)
    throw new Stop(`PORT is ${PORT}, which is not a port number.`);
  if (DATABASE_URL && !SESSION_SECRET) {
    throw new Stop(
      'DATABASE_URL is given, so SESSION_SECRET is needed too: at least 32 characters, the same on every server.',
    );
  }
  if (SESSION_SECRET && SESSION_SECRET.length < 32)
    throw new Stop('SESSION_SECRET is too short: it needs at least 32 characters.');
  if (DATABASE_URL && !MIGRATION_DATABASE_URL) {
    throw new Stop(
      'DATABASE_URL is given, so MIGRATION_DATABASE_URL is needed too: the address for the role that owns the tables.',
    );
  }
  return {
    port,
    host: HOST || '127.0.0.1',
    given: DATABASE_URL,
    givenMigrator: MIGRATION_DATABASE_URL,
    session: SESSION_SECRET,
  };
}

function holdLock(about) {
  const lock = takeLock(lockPath, about);
  if (lock.holder) {
    const where = lock.holder.address ? ` at ${lock.holder.address}` : '';
    throw new Stop(
      `Rowrise is already running${where} (process ${lock.holder.pid}). Stop it before starting it again.`,
    );
  }
  beforeLeaving(() => lock.release());
  return lock;
}

async function prepareLocal(parts, { empty }) {
  const cluster = await startLocalCluster(parts);
  const urls = await prepareDatabase(cluster, empty ? 'rowrise_empty' : 'rowrise', { demo: !empty });
  return { app: urls.app, migrator: urls.migrator, session: cluster.secrets.session };
}

async function prepareGiven({ given, givenMigrator, session }) {
  await step('Bringing the tables up to date', () => migrate(givenMigrator, given));
  return { app: given, migrator: givenMigrator, session };
}

function sayWhoCanSignIn() {
  const file = join(localFolder, 'demo-people.json');
  if (!existsSync(file)) return;
  say('\nWho can sign in (invented people of invented organisations):');
  for (const { name, role, email, password, organisation } of JSON.parse(readFileSync(file, 'utf8'))) {
    say(`  ${email}  ${password}  ${name}, ${role}, ${organisation}`);
  }
}

async function sayFirstOwnerLink(database, address) {
  const { printed } = await runScript('scripts/first-owner-link.ts', ['--address', address], {
    env: {
      DATABASE_URL: database.app,
      MIGRATION_DATABASE_URL: database.migrator,
      SESSION_SECRET: database.session,
    },
    failure: 'The link for the first owner could not be made.',
  });
  say(`\n${printed.trim()}`);
}

async function main() {
  const options = readOptions();
  const environment = readEnvironment();
  makeLocalFolder();
  const lock = holdLock({ dev: options.dev });
  const { host } = environment;
  const port = await freePort(environment.port, host);
  if (port !== environment.port) say(`Port ${environment.port} is taken, so ${port} is used.`);
  // Modules and packages come from elsewhere, so that fetching both at once saves a third of the first start.
  const [, parts] = await together(
    installModules(),
    environment.given ? Promise.resolve() : prepareLocalCluster(),
  );
  const [database] = await together(
    parts ? prepareLocal(parts, options) : prepareGiven(environment),
    options.dev || buildIsCurrent() ? Promise.resolve() : step('Building', () => build()),
  );
  const server = await step('Starting the web server', () =>
    startWebServer({
      dev: options.dev,
      host,
      port,
      env: { DATABASE_URL: database.app, SESSION_SECRET: database.session },
    }),
  );
  lock.note({ dev: options.dev, address: server.address });
  if (options.empty) await sayFirstOwnerLink(database, process.env.ORIGIN || server.address);
  else if (!environment.given) sayWhoCanSignIn();
  say(`\nRowrise is at ${server.address} (ready after ${secondsSince(startedAt)} s). Ctrl-C stops it.`);
  await new Promise((resolve, reject) => {
    onInterruption(reject);
    void server.over.then(() =>
      reject(new Stop('The web server has ended unexpectedly, so everything is stopped.')),
    );
  });
}

listenForSignals();
let exitCode = 0;
try {
  await main();
} catch (error) {
  exitCode = error instanceof Interrupted ? error.exitCode : 1;
  if (error instanceof Interrupted) say('Stopping.');
  else process.stderr.write(`${error instanceof Stop ? error.message : error.stack}\n`);
}
await leave();
process.exit(exitCode);
