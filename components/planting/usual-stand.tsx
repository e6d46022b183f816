'use client';

import { Button } from '@/components/ui/button';
import { usualFinalStandPerAcre } from '@/lib/agronomy/usual-final-stand';
import { plantsPerAreaText } from '@/lib/format/plants-per-area-text';
import { tagGerminationRule, seedingRateRule } from '@/lib/schemas/planting';
import { parseReading, readingIn } from '@/lib/schemas/reading';
import { unitRule } from '@/lib/schemas/reading-schema';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { plantingFormTexts } from '@/lib/texts/planting-form-texts';
import type { PlantingDraft } from './planting-draft';

type UsualStandProps = { draft: PlantingDraft; units: UnitSystem; onTake: (typed: string) => void };

/** The stand that the seed usually makes, offered and never filled in by itself; nothing while seeds or germination are missing. */
export function UsualStand({ draft, units, onTake }: UsualStandProps) {
  const rate = parseReading(draft.seedingRate.typed, unitRule(seedingRateRule, draft.seedingRate.unit));
  const germination = parseReading(draft.tagGermination.typed, tagGerminationRule);
  if (!rate.ok || !germination.ok) return null;
  const perAcre = usualFinalStandPerAcre(readingIn(rate.reading, 'per-acre'), readingIn(germination.reading, 'percent') / 100);
  const typed = plantsPerAreaText(perAcre, units, { nearest: 100, withUnit: false });
  return (
    <div className="flex flex-wrap items-center gap-x-3 text-13">
      <span>{plantingFormTexts.usualStand(plantsPerAreaText(perAcre, units, { nearest: 100 }))}</span>
      <Button look="quiet" onClick={() => onTake(typed)}>
        {plantingFormTexts.takeUsual}
      </Button>
    </div>
  );
}
