import { foreignKey, index, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { instant } from './columns';
import { person } from './person';

/** One row is a signed-in browser. The cookie carries a random secret; only its hash stands here, so a copied table signs nobody in. */
export const session = pgTable(
  'session',
  {
    secretHash: text('secret_hash').primaryKey(),
    personId: uuid('person_id').notNull(),
    createdAt: instant('created_at').notNull().defaultNow(),
    lastSeenAt: instant('last_seen_at').notNull().defaultNow(),
    expiresAt: instant('expires_at').notNull(),
    revokedAt: instant('revoked_at'),
  },
  (t) => [
    foreignKey({ name: 'session_person_fk', columns: [t.personId], foreignColumns: [person.id] }),
    // Revoking all sessions of a person, after a changed password, needs them by person.
    index('session_person_index').on(t.personId),
  ],
);
