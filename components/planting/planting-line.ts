import { dateText } from '@/lib/format/date-text';
import { namesItsUnit, readingText } from '@/lib/format/reading-text';
import { readingUnitText } from '@/lib/format/reading-unit-text';
import type { Crop, ReadingUnit, Tillage } from '@/lib/schemas/vocabulary';
import { plantingTexts } from '@/lib/texts/planting-texts';

export type PlantingLineFacts = {
  crop: Crop;
  previousCrop: string | null;
  tillage: Tillage | null;
  plantedOn: string;
  rowSpacing: { typed: string; unit: ReadingUnit };
  seedingRate: { typed: string; unit: ReadingUnit };
};

/** "Corn after corn, no-till, planted 7 May 2026, 30 in rows, 34,000 seeds per acre", from what was typed. */
export function plantingLine(planting: PlantingLineFacts): string {
  const crop = plantingTexts.crop[planting.crop];
  const what = planting.previousCrop ? plantingTexts.after(crop, planting.previousCrop) : crop;
  const { typed, unit } = planting.seedingRate;
  return [
    planting.tillage ? `${what}, ${plantingTexts.tillage[planting.tillage]}` : what,
    plantingTexts.planted(dateText(planting.plantedOn)),
    plantingTexts.rows(readingText(planting.rowSpacing)),
    namesItsUnit(typed) ? plantingTexts.seeds(typed) : plantingTexts.seedsPerArea(typed, readingUnitText(unit)),
  ].join(', ');
}
