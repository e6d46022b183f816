import { pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { calendarDay, instant } from './columns';

/** One row is a tenant: the account that owns farms, trials and people. Its id is the organisation of every other row. */
export const organisation = pgTable('organisation', {
  id: uuid('id').primaryKey(),
  name: text('name').notNull(),
  timeZone: text('time_zone').notNull(),
  /** A demo organisation has a today of its own; null everywhere else. */
  demoToday: calendarDay('demo_today'),
  createdAt: instant('created_at').notNull().defaultNow(),
});
