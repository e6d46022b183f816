import { foreignKey, index, jsonb, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { decisionChoices, type DecisionChoice } from '@/lib/schemas/vocabulary';
import { instant, oneOf, organisationId, origin, originChecks, thingId } from './columns';
import { planting } from './planting';
import { plantingZone } from './planting-zone';

/** One row is a signed decision, frozen with everything it rested on. A later change of mind is a new row. */
export const decision = pgTable(
  'decision',
  {
    organisationId: organisationId(),
    id: thingId(),
    plantingId: uuid('planting_id').notNull(),
    zoneId: uuid('zone_id'),
    recommended: text('recommended').notNull(),
    decided: text('decided').$type<DecisionChoice>().notNull(),
    signedName: text('signed_name').notNull(),
    signedAt: instant('signed_at').notNull(),
    /** Inputs, numbers, sentences, table and formula versions as they stood on the screen. */
    frozen: jsonb('frozen').notNull(),
    /** A hash over the frozen basis, so that a page opened earlier cannot sign other numbers. */
    basisHash: text('basis_hash').notNull(),
    ...origin(),
  },
  (t) => [
    primaryKey({ name: 'decision_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'decision_planting_fk', columns: [t.organisationId, t.plantingId], foreignColumns: [planting.organisationId, planting.id] }),
    foreignKey({ name: 'decision_zone_fk', columns: [t.organisationId, t.zoneId], foreignColumns: [plantingZone.organisationId, plantingZone.id] }),
    index('decision_planting_index').on(t.organisationId, t.plantingId),
    oneOf('decision_decided_known', t.decided, decisionChoices),
    oneOf('decision_recommended_known', t.recommended, ['keep', 'replant', 'too-close', 'cannot-tell']),
    ...originChecks('decision', t),
  ],
);
