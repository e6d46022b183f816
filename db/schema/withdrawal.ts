import { index, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { withdrawableKinds, type WithdrawableKind } from '@/lib/schemas/vocabulary';
import { oneOf, organisationId, origin, originChecks, thingId } from './columns';

/** One row takes an observation, or all that an import brought, out of the figures, with the reason. The observation itself stays. */
export const withdrawal = pgTable(
  'withdrawal',
  {
    organisationId: organisationId(),
    id: thingId(),
    targetKind: text('target_kind').$type<WithdrawableKind>().notNull(),
    /** No foreign key: the target stands in one of several tables, and the service has found it within the organisation. */
    targetId: uuid('target_id').notNull(),
    reason: text('reason').notNull(),
    ...origin(),
  },
  (t) => [
    primaryKey({ name: 'withdrawal_pk', columns: [t.organisationId, t.id] }),
    index('withdrawal_target_index').on(t.organisationId, t.targetId),
    oneOf('withdrawal_target_kind_known', t.targetKind, withdrawableKinds),
    ...originChecks('withdrawal', t),
  ],
);
