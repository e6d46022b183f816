import { bigint, integer, pgTable, text } from 'drizzle-orm/pg-core';

/** One row counts tries under a key (an account, a socket address); the layout is the rate-limit library's own. */
export const throttle = pgTable('throttle', {
  key: text('key').primaryKey(),
  points: integer('points').notNull().default(0),
  expire: bigint('expire', { mode: 'number' }),
});
