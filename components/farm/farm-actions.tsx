'use client';

import { useRouter } from 'next/navigation';
import { OpeningForm } from '@/components/form/opening-form';
import { RemoveThing } from '@/components/form/remove-thing';
import { useWho } from '@/lib/client/who';
import { paths } from '@/lib/paths/paths';
import { farmTexts } from '@/lib/texts/farm-texts';
import { FarmForm } from './farm-form';

type FarmActionsProps = { farm: { id: string; name: string; timeZone: string; version: number } };

/** Changes or removes the farm that the page shows. */
export function FarmActions({ farm }: FarmActionsProps) {
  const router = useRouter();
  const { organisationId } = useWho();
  return (
    <div className="flex flex-wrap items-start gap-2">
      <OpeningForm label={farmTexts.change} form={(close) => <FarmForm timeZone={farm.timeZone} farm={farm} onDone={close} />} />
      <RemoveThing
        noun="farms"
        kind="farm.remove"
        thing={farm}
        label={farmTexts.remove(farm.name)}
        explanation={farmTexts.removeExplanation}
        onRemoved={() => router.push(paths.farms(organisationId))}
      />
    </div>
  );
}
