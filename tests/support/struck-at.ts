import { setTimeout as pause } from 'node:timers/promises';
import { connect, type Database } from '@/db/connection';

/** The socket goes while the query is under way; the database refuses for the moment; its answer is late. */
export type Strike = 'drop' | 'throw' | 'delay';

type Querying = { query: (...args: unknown[]) => unknown; connection: { stream: { destroy: (error: Error) => void } } };

/** A pool of one connection whose n-th query is struck. */
export function struckAt(url: string, n: number, strike: Strike): { faulty: Database; struck: () => boolean } {
  const faulty = connect(url, 1);
  let queries = 0;
  let hit = false;
  faulty.$client.on('connect', (made) => {
    const client = made as unknown as Querying;
    const query = client.query.bind(client);
    client.query = (...args) => {
      queries += 1;
      if (queries !== n) return query(...args);
      hit = true;
      if (strike === 'throw') return Promise.reject(Object.assign(new Error('struck'), { code: '53300' }));
      if (strike === 'delay') return pause(30).then(() => query(...args));
      client.connection.stream.destroy(Object.assign(new Error('struck'), { code: 'ECONNRESET' }));
      return query(...args);
    };
  });
  return { faulty, struck: () => hit };
}
