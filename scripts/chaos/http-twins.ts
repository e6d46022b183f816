import pg from 'pg';
import { say } from '../say.mjs';
import { chanceFrom } from './chance';
import { sendingTo, signIn } from './http-send';
import { balances, countByLedger } from './ledger';
import { makeEntries } from './make-entries';
import type { Cluster } from './prepare';
import { settleScene } from './scene';
import { standingServer } from './web-servers';

const keys = 200;
const twins = 50;

/** Each of two hundred entries is sent fifty times at once to two servers: one is told applied, forty-nine duplicate. */
export async function httpTwins(cluster: Cluster, seed: number): Promise<boolean> {
  const chance = chanceFrom(seed);
  const { adminUrl, appUrl, env } = await cluster.database();
  const scene = await settleScene(appUrl, chance, { scouts: 2, plantings: 1, rowsEach: 40 });
  const servers = [
    await standingServer({ env, logFile: cluster.log('server-1'), broken: null }),
    await standingServer({ env, logFile: cluster.log('server-2'), broken: null }),
  ];
  const admin = new pg.Client({ connectionString: adminUrl });
  await admin.connect();
  try {
    const { made } = makeEntries(scene, 0, keys, chance.branch());
    const addresses = servers.map(({ address }) => address);
    const cookie = await signIn(addresses[0] ?? '', scene.scouts[0]?.email ?? '');
    const send = sendingTo(addresses, scene, cookie, chance.branch());
    const told = { applied: 0, duplicate: 0, other: 0 };
    let evenly = 0;
    const startedAt = performance.now();
    for (const { entry } of made) {
      const replies = await Promise.all(Array.from({ length: twins }, (_, way) => send([entry], { way, abandon: false })));
      const outcomes = replies.map(({ text }) => (JSON.parse(text) as { answers?: { outcome: string }[] }).answers?.[0]?.outcome ?? 'none');
      const applied = outcomes.filter((outcome) => outcome === 'applied').length;
      const duplicate = outcomes.filter((outcome) => outcome === 'duplicate').length;
      told.applied += applied;
      told.duplicate += duplicate;
      told.other += twins - applied - duplicate;
      if (applied === 1 && duplicate === twins - 1) evenly += 1;
    }
    const ledger = await countByLedger(admin, scene.organisationId, made);
    say(`  ${keys} entries × ${twins} at once to two servers in ${((performance.now() - startedAt) / 1000).toFixed(0)} s: ${told.applied} applied, ${told.duplicate} duplicate, ${told.other} otherwise; ${evenly} of ${keys} entries with one applied and ${twins - 1} duplicates`);
    say(`  by SQL: ${ledger.lost} lost, ${ledger.doubled} doubled, ${ledger.invented} invented, ${ledger.altered} altered, ${ledger.apart} apart`);
    return balances(ledger) && evenly === keys;
  } finally {
    await admin.end();
    await Promise.all(servers.map((server) => server.stop()));
  }
}
