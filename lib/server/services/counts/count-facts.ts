import 'server-only';
import { rowAreaAcres } from '@/lib/agronomy/stand';
import { readingIn } from '@/lib/schemas/reading';
import type { PlantingRow } from '../../data/planting';
import type { RowSampleRow } from '../../data/row-sample';

/** What a row sample's planting says of it, in the units that rules and figures are worked out in. */
export function rowSampleFacts(planting: PlantingRow, rowSample: RowSampleRow) {
  const rowSpacingInches = readingIn({ unit: planting.rowSpacingUnit, thousandths: planting.rowSpacingThousandths }, 'in');
  const seedsPerAcre = readingIn({ unit: planting.seedingRateUnit, thousandths: planting.seedingRateThousandths }, 'per-acre');
  const intendedPlantsPerAcre = readingIn({ unit: planting.intendedStandUnit, thousandths: planting.intendedStandThousandths }, 'per-acre');
  const lengthInches = readingIn({ unit: rowSample.lengthUnit, thousandths: rowSample.lengthThousandths }, 'in');
  const seeds = seedsPerAcre * rowAreaAcres(lengthInches, rowSpacingInches);
  return { rowSpacingInches, seedsPerAcre, intendedPlantsPerAcre, lengthInches, seeds };
}
