import type { ReadingRule } from './reading';

/** What the measures of a planting and its row samples may be, as plain rules: shared by the schemas and the phone. */
export const rowSpacingRule: ReadingRule = { unit: 'in', otherUnits: ['cm', 'm', 'ft'], least: 4, most: 80, name: 'row spacing' };
export const seedingRateRule: ReadingRule = { unit: 'per-acre', otherUnits: ['per-ha'], least: 1_000, most: 500_000, thousandsComma: true, name: 'seeding rate' };
export const intendedStandRule: ReadingRule = { unit: 'per-acre', otherUnits: ['per-ha'], least: 1_000, most: 500_000, thousandsComma: true, name: 'intended final stand' };
export const rowLengthRule: ReadingRule = { unit: 'ft', otherUnits: ['in', 'm', 'cm'], least: 0.5, most: 1_000, name: 'row length' };
