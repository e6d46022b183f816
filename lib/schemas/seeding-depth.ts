import { depthInchesMost } from './field-limits';
import { parseReading, type ParsedReading, type ReadingRule } from './reading';
import type { DepthUnit } from './vocabulary';

const centimetersPerInch = 2.54;

/** How deep a seed may lie, from the soil surface to the seed, in the unit the ruler shows. */
export const seedingDepthRule = (unit: DepthUnit): ReadingRule => ({
  unit,
  least: 0,
  most: unit === 'in' ? depthInchesMost : depthInchesMost * centimetersPerInch,
  name: 'seeding depth',
});

/** Reads one depth as typed, such as 1 3/4 or 4.5. Plain, so that a phone asks the same as the server. */
export const parseSeedingDepth = (typed: string, unit: DepthUnit): ParsedReading => parseReading(typed, seedingDepthRule(unit));
