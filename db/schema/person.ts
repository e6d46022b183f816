import { sql } from 'drizzle-orm';
import { check, pgTable, text, uniqueIndex, uuid } from 'drizzle-orm/pg-core';
import { unitSystems, type UnitSystem } from '@/lib/schemas/vocabulary';
import { instant, oneOf } from './columns';

/** One row is a human being who signs in; not a tenant's row, since a person may belong to several organisations. */
export const person = pgTable(
  'person',
  {
    id: uuid('id').primaryKey(),
    email: text('email').notNull(),
    name: text('name').notNull(),
    passwordHash: text('password_hash').notNull(),
    units: text('units').$type<UnitSystem>().notNull().default('us'),
    disabledAt: instant('disabled_at'),
    createdAt: instant('created_at').notNull().defaultNow(),
  },
  (t) => [
    uniqueIndex('person_email_unique').on(t.email),
    check('person_email_lower', sql`${t.email} = lower(${t.email})`),
    oneOf('person_units_known', t.units, unitSystems),
  ],
);
