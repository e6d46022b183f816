import { setTimeout as pause } from 'node:timers/promises';
import pg from 'pg';
import { connect, type Database } from '@/db/connection';
import { applyOperation } from '@/lib/server/operations/apply-operation';
import type { Answer } from '@/lib/schemas/operation';
import { chanceFrom } from '../../scripts/chaos/chance';
import type { Entry } from '../../scripts/chaos/entry';
import { countByLedger, type Ledger } from '../../scripts/chaos/ledger';
import { makeEntries } from '../../scripts/chaos/make-entries';
import { Phone, type Habits, type Send } from '../../scripts/chaos/phone';
import { handlerOf, settleScene } from '../../scripts/chaos/scene';
import { makeTestDatabase } from './test-database';

export type Apply = (db: Database, sent: unknown) => Promise<Answer>;

type Plan = {
  phones: number;
  entriesEach: number;
  faultMs: number;
  apply?: Apply;
  breakDatabase?: readonly string[];
  habits?: Partial<Habits>;
  /** The share of answers in whose place a network's own page comes. */
  portalShare?: number;
};

export type ChaosOutcome = { ledger: Ledger; waiting: number; complaints: string[]; dropped: number };

const asServed: Apply = (db, sent) => {
  const { organisationId, personId } = sent as Entry;
  return applyOperation(db, { organisationId, sender: { personId, now: () => new Date(), originKind: 'phone' }, handlerOf }, sent);
};

/** Ends connections of the application's role in the middle of whatever they do, until it is over. */
async function dropConnections(url: string, over: () => boolean, chance: ReturnType<typeof chanceFrom>): Promise<number> {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  let dropped = 0;
  try {
    while (!over()) {
      await pause(chance.whole(40, 160));
      const ended = await client.query(
        `select pg_terminate_backend(pid) from pg_stat_activity where datname = current_database() and usename = 'rowrise_app' and state <> 'idle' order by random() limit 2`,
      );
      dropped += ended.rowCount ?? 0;
    }
  } finally {
    await client.end();
  }
  return dropped;
}

/**
 * The chaos harness without servers: phones against two pools of one database, connections dropped under them, answers
 * lost, batches resent, shuffled and doubled; counted by SQL like the full one.
 */
export async function chaosInProcess(plan: Plan): Promise<ChaosOutcome> {
  const own = await makeTestDatabase();
  process.env.SESSION_SECRET = 'a secret of the tests, long enough to be one';
  const adminUrl = new URL(own.migratorUrl);
  const admin = new URL(process.env.TEST_ADMIN_URL ?? '');
  adminUrl.username = admin.username;
  adminUrl.password = admin.password;
  const chance = chanceFrom(20_260_507);
  const pools = [connect(own.appUrl), connect(own.appUrl)];
  const underWay = new Set<Promise<unknown>>();
  try {
    const scene = await settleScene(own.appUrl, chance, { scouts: plan.phones, plantings: 2, rowsEach: 40 });
    const client = new pg.Client({ connectionString: own.migratorUrl });
    await client.connect();
    for (const statement of plan.breakDatabase ?? []) await client.query(statement);
    const apply = plan.apply ?? asServed;
    let startedAt = performance.now();
    const habits: Habits = { ways: 2, batchMost: 12, resentShare: 0.15, abandonShare: 0.2, twinShare: 0.2, madeWithinMs: plan.faultMs * 0.8, calm: () => performance.now() - startedAt > plan.faultMs, forgetsOnAny2xx: false, ...plan.habits };

    const sendWith = (own: ReturnType<typeof chanceFrom>): Send => async (operations, { way, abandon }) => {
      const serve = async () => {
        const answers: Answer[] = [];
        for (const each of [...operations].sort((a, b) => a.deviceSequence - b.deviceSequence)) answers.push(await apply(pools[way] as Database, each));
        return answers;
      };
      const serving = serve();
      underWay.add(serving);
      serving.then(() => underWay.delete(serving), () => underWay.delete(serving));
      if (abandon) {
        await pause(own.whole(0, 60));
        throw new Error('The phone hung up.');
      }
      if (own.happens(plan.portalShare ?? 0)) return { status: 200, contentType: 'text/html', text: '<!doctype html><title>Sign in to this network</title>' };
      return { status: 200, contentType: 'application/json', text: JSON.stringify({ answers: await serving }) };
    };

    const scouts = Array.from({ length: plan.phones }, (_, index) => makeEntries(scene, index, plan.entriesEach, chance.branch()));
    const phones = scouts.map((scout) => new Phone(scout, sendWith(chance.branch()), habits, chance.branch()));
    startedAt = performance.now();
    const [dropped] = await Promise.all([
      dropConnections(adminUrl.href, () => performance.now() - startedAt > plan.faultMs, chance.branch()),
      ...phones.map((phone) => phone.walk(() => performance.now() - startedAt > plan.faultMs + 30_000)),
    ]);
    await Promise.allSettled([...underWay]);
    const ledger = await countByLedger(client, scene.organisationId, scouts.flatMap(({ made }) => made), new Set(phones.flatMap((phone) => phone.stillKept)));
    await client.end();
    return {
      ledger,
      dropped: dropped ?? 0,
      waiting: phones.reduce((sum, phone) => sum + phone.left, 0),
      complaints: phones.flatMap((phone) => [...phone.complaints.values()]),
    };
  } finally {
    await Promise.all(pools.map((pool) => pool.$client.end()));
    await own.drop();
  }
}
