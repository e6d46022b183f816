import { foreignKey, index, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { roles, type Role } from '@/lib/schemas/vocabulary';
import { instant, oneOf, organisationId, planned } from './columns';
import { organisation } from './organisation';
import { person } from './person';

/** One row is a person's place in an organisation. Also readable by the person's own id, to list where they belong. */
export const membership = pgTable(
  'membership',
  {
    organisationId: organisationId(),
    personId: uuid('person_id').notNull(),
    role: text('role').$type<Role>().notNull(),
    createdAt: instant('created_at').notNull().defaultNow(),
    ...planned(),
  },
  (t) => [
    primaryKey({ name: 'membership_pk', columns: [t.organisationId, t.personId] }),
    foreignKey({ name: 'membership_organisation_fk', columns: [t.organisationId], foreignColumns: [organisation.id] }),
    foreignKey({ name: 'membership_person_fk', columns: [t.personId], foreignColumns: [person.id] }),
    index('membership_person_index').on(t.personId),
    oneOf('membership_role_known', t.role, roles),
  ],
);
