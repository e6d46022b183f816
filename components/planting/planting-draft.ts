import { readingDraft, sentReading, type ReadingDraft } from '@/components/form/reading-draft';
import { fieldAreaRule } from '@/lib/schemas/field';
import { fullYieldRule, intendedStandRule, rowSpacingRule, seedingRateRule, tagGerminationRule } from '@/lib/schemas/planting';
import type { Crop, ReadingUnit, Tillage, UnitSystem } from '@/lib/schemas/vocabulary';

type Typed = { typed: string; unit: ReadingUnit };

/** A planting as a form begins with it; what the server gives for a standing one fits. */
export type PlantingFacts = {
  id: string;
  version: number;
  plantedOn: string;
  plantedAt: string | null;
  crop: Crop;
  rowSpacing: Typed;
  seedingRate: Typed;
  tagGermination: Typed | null;
  intendedStand: Typed;
  fullYield: Typed | null;
  previousCrop: string | null;
  tillage: Tillage | null;
  slowAfterDays: number;
  lateAfterDays: number;
  veryLateAfterDays: number;
  zones: readonly { id: string; name: string; area: Typed }[];
};

export type PlantingDraft = {
  plantedOn: string;
  plantedAt: string;
  crop: string;
  rowSpacing: ReadingDraft;
  seedingRate: ReadingDraft;
  tagGermination: ReadingDraft;
  intendedStand: ReadingDraft;
  fullYield: ReadingDraft;
  previousCrop: string;
  tillage: string;
  slowAfterDays: string;
  lateAfterDays: string;
  veryLateAfterDays: string;
  zones: { id: string; name: string; area: ReadingDraft }[];
};

export function plantingDraft(planting: PlantingFacts | undefined, units: UnitSystem): PlantingDraft {
  return {
    plantedOn: planting?.plantedOn ?? '',
    plantedAt: planting?.plantedAt ?? '',
    crop: planting?.crop ?? 'corn',
    rowSpacing: readingDraft(planting?.rowSpacing ?? null, rowSpacingRule, units),
    seedingRate: readingDraft(planting?.seedingRate ?? null, seedingRateRule, units),
    tagGermination: readingDraft(planting?.tagGermination ?? null, tagGerminationRule, units),
    intendedStand: readingDraft(planting?.intendedStand ?? null, intendedStandRule, units),
    fullYield: readingDraft(planting?.fullYield ?? null, fullYieldRule, units),
    previousCrop: planting?.previousCrop ?? '',
    tillage: planting?.tillage ?? '',
    slowAfterDays: String(planting?.slowAfterDays ?? 2),
    lateAfterDays: String(planting?.lateAfterDays ?? 7),
    veryLateAfterDays: String(planting?.veryLateAfterDays ?? 14),
    zones: (planting?.zones ?? []).map((zone) => ({ id: zone.id, name: zone.name, area: readingDraft(zone.area, fieldAreaRule, units) })),
  };
}

const orNull = (text: string) => (text.trim() === '' ? null : text.trim());

/** What is sent. A number that is none goes as it was typed, so that the server names its field. */
export function plantingBody(draft: PlantingDraft): Record<string, unknown> {
  const days = (text: string) => (/^\d+$/.test(text.trim()) ? Number(text) : text);
  return {
    ...draft,
    plantedAt: orNull(draft.plantedAt),
    tagGermination: sentReading(draft.tagGermination),
    fullYield: sentReading(draft.fullYield),
    previousCrop: orNull(draft.previousCrop),
    tillage: orNull(draft.tillage),
    slowAfterDays: days(draft.slowAfterDays),
    lateAfterDays: days(draft.lateAfterDays),
    veryLateAfterDays: days(draft.veryLateAfterDays),
  };
}
