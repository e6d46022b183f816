import { join } from 'node:path';
import { build, buildIsCurrent } from '../build.mjs';
import { databaseUrls, makeDatabase, withClient } from '../databases.mjs';
import { runningPostmaster } from '../postgres-cluster.mjs';
import { say, step } from '../say.mjs';
import { startTestCluster, templateName } from '../test-cluster.mjs';

export type Cluster = Awaited<ReturnType<typeof makeChaosCluster>>;

/** A cluster of the harness's own that waits for the disk, since it is going to be stopped hard. */
export async function makeChaosCluster() {
  const { port, secrets, folder, dataFolder } = await step('Making a PostgreSQL cluster', () => startTestCluster({ lasting: true }));
  let made = 0;
  let stops = 0;
  return {
    folder,
    stops: () => stops,
    databases: () => made,
    log: (name: string) => join(folder, `${name}.log`),
    /** A fresh copy of the migrated template: its addresses, and the environment of a server on it. */
    database: async () => {
      made += 1;
      const name = `chaos_${made}`;
      await withClient(databaseUrls(port, secrets, 'postgres').admin, (client: never) => makeDatabase(client, name, { template: templateName }));
      const urls = databaseUrls(port, secrets, name);
      return { adminUrl: urls.admin, appUrl: urls.app, env: { DATABASE_URL: urls.app, SESSION_SECRET: secrets.session } };
    },
    /** What `pg_ctl stop -m immediate` does; the watch over the cluster starts PostgreSQL again. */
    stopHard: () => {
      const postmaster = runningPostmaster(dataFolder);
      if (!postmaster) return;
      stops += 1;
      process.kill(postmaster.pid, 'SIGQUIT');
    },
  };
}

/** The production build, made where it is missing or older than the sources. */
export async function ensureBuild(): Promise<void> {
  if (!buildIsCurrent()) await step('Building', () => build());
  else say('The build is current.');
}
