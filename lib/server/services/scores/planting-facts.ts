import { readingIn } from '@/lib/schemas/reading';
import type { PlantingFacts } from '@/lib/schemas/planting-facts';
import type { CoreSamples } from './core-samples';

/** What a screen of figures says of their planting, written out field by field. */
export function plantingFacts({ planting, field, farm }: Pick<CoreSamples, 'planting' | 'field' | 'farm'>): PlantingFacts {
  const { areaUnit, areaThousandths } = field;
  return {
    plantingId: planting.id,
    farmName: farm.name,
    fieldName: field.name,
    fieldAcres: areaUnit && areaThousandths !== null ? readingIn({ unit: areaUnit, thousandths: areaThousandths }, 'acres') : null,
    crop: planting.crop,
    plantedOn: planting.plantedOn,
    plantedAt: planting.plantedAt,
    previousCrop: planting.previousCrop,
    tillage: planting.tillage,
    rowSpacingInches: readingIn({ unit: planting.rowSpacingUnit, thousandths: planting.rowSpacingThousandths }, 'in'),
    seedsPerAcre: readingIn({ unit: planting.seedingRateUnit, thousandths: planting.seedingRateThousandths }, 'per-acre'),
    intendedPlantsPerAcre: readingIn({ unit: planting.intendedStandUnit, thousandths: planting.intendedStandThousandths }, 'per-acre'),
    lateLimits: { slowDays: planting.slowAfterDays, lateDays: planting.lateAfterDays, veryLateDays: planting.veryLateAfterDays },
  };
}
