import { sql } from 'drizzle-orm';
import { check, foreignKey, integer, pgTable, primaryKey, text, uniqueIndex, uuid } from 'drizzle-orm/pg-core';
import {
  comparisonRules, layoutKinds, mainFigures, type ComparisonRule, type LayoutKind, type MainFigure,
} from '@/lib/schemas/vocabulary';
import { instant, oneOf, organisationId, origin, originChecks, planned, thingId } from './columns';
import { planting } from './planting';
import { setting } from './setting';
import { study } from './study';

/** One row is a study laid out in one planting: its main figure, reference and seed, locked before planting. */
export const trial = pgTable(
  'trial',
  {
    organisationId: organisationId(),
    id: thingId(),
    studyId: uuid('study_id').notNull(),
    plantingId: uuid('planting_id').notNull(),
    layout: text('layout').$type<LayoutKind>().notNull(),
    mainFigure: text('main_figure').$type<MainFigure>().notNull(),
    comparisonRule: text('comparison_rule').$type<ComparisonRule>().notNull(),
    referenceSettingId: uuid('reference_setting_id').notNull(),
    randomSeed: integer('random_seed').notNull(),
    lockedAt: instant('locked_at'),
    lockedBy: uuid('locked_by'),
    ...planned(),
    ...origin(),
  },
  (t) => [
    primaryKey({ name: 'trial_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'trial_study_fk', columns: [t.organisationId, t.studyId], foreignColumns: [study.organisationId, study.id] }),
    foreignKey({ name: 'trial_planting_fk', columns: [t.organisationId, t.plantingId], foreignColumns: [planting.organisationId, planting.id] }),
    foreignKey({ name: 'trial_reference_fk', columns: [t.organisationId, t.referenceSettingId], foreignColumns: [setting.organisationId, setting.id] }),
    // A planting carries one standing trial; a layout drawn again removes the one before it.
    uniqueIndex('trial_planting_unique').on(t.organisationId, t.plantingId).where(sql`${t.removedAt} is null`),
    oneOf('trial_layout_known', t.layout, layoutKinds),
    oneOf('trial_main_figure_known', t.mainFigure, mainFigures),
    oneOf('trial_comparison_rule_known', t.comparisonRule, comparisonRules),
    check('trial_lock_complete', sql`(${t.lockedAt} is null) = (${t.lockedBy} is null)`),
    ...originChecks('trial', t),
  ],
);
