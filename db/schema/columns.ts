import { sql } from 'drizzle-orm';
import { bigint, check, date, integer, text, timestamp, uuid } from 'drizzle-orm/pg-core';
import type { AnyPgColumn } from 'drizzle-orm/pg-core';
import { originKinds, readingUnits } from '@/lib/schemas/vocabulary';

/** Columns that recur, written once so that every table spells them alike. */

export const organisationId = () => uuid('organisation_id').notNull();
export const thingId = () => uuid('id').notNull();
export const calendarDay = (name: string) => date(name, { mode: 'string' });
export const instant = (name: string) => timestamp(name, { withTimezone: true, mode: 'string' });

/**
 * A reading keeps what was typed, the unit it was typed in, and the same number as a whole number of thousandths
 * of that unit, so that it comes back exactly and sums exactly.
 */
export const readingTyped = (name: string) => text(`${name}_typed`);
export const readingUnit = (name: string) => text(`${name}_unit`).$type<(typeof readingUnits)[number]>();
export const readingThousandths = (name: string) => bigint(`${name}_thousandths`, { mode: 'number' });

/** Where a row came from and which operation made it. */
export const origin = () => ({
  originKind: text('origin_kind').$type<(typeof originKinds)[number]>().notNull(),
  importId: uuid('import_id'),
  operationId: uuid('operation_id').notNull(),
  createdBy: uuid('created_by').notNull(),
  createdAt: instant('created_at').notNull().defaultNow(),
});

/** A plan can be changed and removed; an observation has neither of these. */
export const planned = () => ({
  version: integer('version').notNull().default(1),
  removedAt: instant('removed_at'),
});

/** A check that a text column holds one word of a closed list (null passes where the column allows it). */
export const oneOf = (name: string, column: AnyPgColumn, words: readonly string[]) =>
  check(name, sql`${column} in (${sql.raw(words.map((word) => `'${word}'`).join(', '))})`);

export const originChecks = (table: string, columns: { originKind: AnyPgColumn; importId: AnyPgColumn }) => [
  oneOf(`${table}_origin_kind_known`, columns.originKind, originKinds),
  check(
    `${table}_import_named`,
    sql`(${columns.originKind} = 'import') = (${columns.importId} is not null)`,
  ),
];

export const readingCheck = (
  name: string,
  columns: { typed: AnyPgColumn; unit: AnyPgColumn; thousandths: AnyPgColumn },
) =>
  check(
    name,
    sql`num_nonnulls(${columns.typed}, ${columns.unit}, ${columns.thousandths}) in (0, 3) and (${columns.unit} is null or ${columns.unit} in (${sql.raw(readingUnits.map((unit) => `'${unit}'`).join(', '))})) and ${columns.thousandths} >= 0`,
  );
