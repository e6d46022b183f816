'use client';

import { useRouter } from 'next/navigation';
import { OpeningForm } from '@/components/form/opening-form';
import { RemoveThing } from '@/components/form/remove-thing';
import type { PlantingFacts as Facts } from '@/components/planting/planting-draft';
import { PlantingForm } from '@/components/planting/planting-form';
import { plantingLine } from '@/components/planting/planting-line';
import { Section } from '@/components/ui/section';
import { useWho } from '@/lib/client/who';
import { dateText } from '@/lib/format/date-text';
import { readingText } from '@/lib/format/reading-text';
import { paths } from '@/lib/paths/paths';
import type { ReadingUnit } from '@/lib/schemas/vocabulary';
import { planTexts } from '@/lib/texts/plan-texts';

type PlantingFactsProps = { fieldId: string; planting: Facts; mayWrite: boolean };

/** The facts of a planting, as typed; the form opens in their place. */
export function PlantingFacts({ fieldId, planting, mayWrite }: PlantingFactsProps) {
  const facts = <FactList planting={planting} />;
  const router = useRouter();
  const { organisationId } = useWho();
  return (
    <Section title={planTexts.factsTitle} lead={plantingLine(planting)}>
      {mayWrite ? (
        <>
          <OpeningForm label={planTexts.change} form={(close) => <PlantingForm fieldId={fieldId} planting={planting} onDone={close} />}>
            {facts}
          </OpeningForm>
          <div>
            <RemoveThing
              noun="plantings"
              kind="planting.remove"
              thing={planting}
              label={planTexts.remove}
              explanation={planTexts.removeExplanation}
              onRemoved={() => router.push(paths.field(organisationId, fieldId))}
            />
          </div>
        </>
      ) : (
        facts
      )}
    </Section>
  );
}

function FactList({ planting }: { planting: Facts }) {
  const typed = (reading: { typed: string; unit: ReadingUnit } | null) => (reading ? readingText(reading) : planTexts.notGiven);
  const facts = [
    { name: planTexts.plantedOn, text: `${dateText(planting.plantedOn)}${planting.plantedAt ? `, ${planting.plantedAt}` : ''}` },
    { name: planTexts.intendedStand, text: typed(planting.intendedStand) },
    { name: planTexts.tagGermination, text: typed(planting.tagGermination) },
    { name: planTexts.fullYield, text: typed(planting.fullYield) },
    {
      name: planTexts.limits,
      text: planTexts.limitsText(String(planting.slowAfterDays), String(planting.lateAfterDays), String(planting.veryLateAfterDays)),
    },
    ...(planting.zones.length > 0
      ? [{ name: planTexts.zones, text: planting.zones.map((zone) => `${zone.name}, ${readingText(zone.area)}`).join('; ') }]
      : []),
  ];
  return (
    <dl className="max-w-reading">
      {facts.map((fact) => (
        <div key={fact.name} className="flex flex-wrap justify-between gap-x-4 border-b border-rule py-2">
          <dt>{fact.name}</dt>
          <dd className="font-mono">{fact.text}</dd>
        </div>
      ))}
    </dl>
  );
}
