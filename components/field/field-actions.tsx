'use client';

import { useRouter } from 'next/navigation';
import { OpeningForm } from '@/components/form/opening-form';
import { RemoveThing } from '@/components/form/remove-thing';
import { useWho } from '@/lib/client/who';
import { paths } from '@/lib/paths/paths';
import type { ReadingUnit } from '@/lib/schemas/vocabulary';
import { fieldTexts } from '@/lib/texts/field-texts';
import { FieldForm } from './field-form';

type FieldActionsProps = {
  farmId: string;
  field: { id: string; name: string; area: { typed: string; unit: ReadingUnit } | null; version: number };
};

/** Changes or removes the field that the page shows. */
export function FieldActions({ farmId, field }: FieldActionsProps) {
  const router = useRouter();
  const { organisationId } = useWho();
  return (
    <div className="flex flex-wrap items-start gap-2">
      <OpeningForm label={fieldTexts.change} form={(close) => <FieldForm farmId={farmId} field={field} onDone={close} />} />
      <RemoveThing
        noun="fields"
        kind="field.remove"
        thing={field}
        label={fieldTexts.remove(field.name)}
        explanation={fieldTexts.removeExplanation}
        onRemoved={() => router.push(paths.farm(organisationId, farmId))}
      />
    </div>
  );
}
