import { foreignKey, pgTable, primaryKey, text } from 'drizzle-orm/pg-core';
import {
  adjustedFromPlaces, cleanerKinds, pressureDirections, wheelKinds,
  type AdjustedFrom, type CleanerKind, type PressureDirection, type WheelKind,
} from '@/lib/schemas/vocabulary';
import {
  oneOf, organisationId, origin, originChecks, planned, readingCheck, readingThousandths, readingTyped, readingUnit, thingId,
} from './columns';
import { organisation } from './organisation';

/** One row is a residue setting of the planter's row cleaners. It belongs to the organisation, so that seasons pool. */
export const setting = pgTable(
  'setting',
  {
    organisationId: organisationId(),
    id: thingId(),
    name: text('name').notNull(),
    /** How the headline says it, after "with": "the cleaners floating, light down". */
    phrase: text('phrase').notNull(),
    cleaner: text('cleaner').$type<CleanerKind>().notNull(),
    wheels: text('wheels').$type<WheelKind>(),
    pressureDirection: text('pressure_direction').$type<PressureDirection>(),
    pressureTyped: readingTyped('pressure'),
    pressureUnit: readingUnit('pressure'),
    pressureThousandths: readingThousandths('pressure'),
    workingDepthTyped: readingTyped('working_depth'),
    workingDepthUnit: readingUnit('working_depth'),
    workingDepthThousandths: readingThousandths('working_depth'),
    adjustedFrom: text('adjusted_from').$type<AdjustedFrom>(),
    note: text('note'),
    ...planned(),
    ...origin(),
  },
  (t) => [
    primaryKey({ name: 'setting_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'setting_organisation_fk', columns: [t.organisationId], foreignColumns: [organisation.id] }),
    oneOf('setting_cleaner_known', t.cleaner, cleanerKinds),
    oneOf('setting_wheels_known', t.wheels, wheelKinds),
    oneOf('setting_pressure_direction_known', t.pressureDirection, pressureDirections),
    oneOf('setting_adjusted_from_known', t.adjustedFrom, adjustedFromPlaces),
    readingCheck('setting_pressure_reading', { typed: t.pressureTyped, unit: t.pressureUnit, thousandths: t.pressureThousandths }),
    readingCheck('setting_working_depth_reading', { typed: t.workingDepthTyped, unit: t.workingDepthUnit, thousandths: t.workingDepthThousandths }),
    ...originChecks('setting', t),
  ],
);
