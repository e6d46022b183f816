// The servers that the browser tests visit: the real build over a demo-filled database, and over an empty one.
import { closeSync, existsSync, openSync } from 'node:fs';
import { join } from 'node:path';
import { databaseUrls, makeDatabase, withClient } from './databases.mjs';
import { checkout, localFolder } from './places.mjs';
import { freePort } from './port.mjs';
import { step } from './say.mjs';
import { templateName } from './test-cluster.mjs';
import { runScript } from './typescript.mjs';
import { startWebServer } from './web-server.mjs';

const firstPort = 4700;

async function copyOfTemplate({ port, secrets }, database) {
  await withClient(databaseUrls(port, secrets, 'postgres').admin, (client) =>
    makeDatabase(client, database, { template: templateName }),
  );
  const urls = databaseUrls(port, secrets, database);
  return { DATABASE_URL: urls.app, MIGRATION_DATABASE_URL: urls.migrator, SESSION_SECRET: secrets.session };
}

async function serve({ DATABASE_URL, SESSION_SECRET }, name) {
  const log = openSync(join(localFolder, `${name}.log`), 'w');
  try {
    return await startWebServer({
      host: '127.0.0.1',
      port: await freePort(firstPort, '127.0.0.1'),
      env: { DATABASE_URL, SESSION_SECRET, ORIGIN: undefined },
      stdio: ['ignore', log, log],
    });
  } finally {
    closeSync(log);
  }
}

async function serveDemo(cluster) {
  const env = await copyOfTemplate(cluster, 'rowrise_demo');
  const people = join(cluster.folder, 'demo-people.json');
  await runScript('db/demo/fill.ts', [], {
    env: { ...env, ROWRISE_DEMO_PEOPLE_FILE: people },
    failure: 'The demo data could not be filled in.',
  });
  const server = await serve(env, 'test-demo-server');
  return { ...server, env: { ROWRISE_URL: server.address, ROWRISE_DEMO_PEOPLE_FILE: people } };
}

async function serveEmpty(cluster) {
  if (!existsSync(join(checkout, 'scripts/first-owner-link.ts'))) return { env: {}, stop: async () => {} };
  const env = await copyOfTemplate(cluster, 'rowrise_first_owner');
  const server = await serve(env, 'test-empty-server');
  const { printed } = await runScript('scripts/first-owner-link.ts', ['--address', server.address], {
    env,
    failure: 'The link for the first owner could not be made.',
  });
  const link = /https?:\/\/\S+/.exec(printed)?.[0];
  return { ...server, env: { ROWRISE_EMPTY_URL: server.address, ROWRISE_FIRST_OWNER_LINK: link } };
}

/** Starts both servers, hands their addresses to `work` as environment, and ends them. */
export async function withBrowserServers(cluster, work) {
  const [demo, empty] = await step('Filling in the demo data and starting the servers', async () => [
    await serveDemo(cluster),
    await serveEmpty(cluster),
  ]);
  try {
    return await work({ ...demo.env, ...empty.env });
  } finally {
    await demo.stop();
    await empty.stop();
  }
}
