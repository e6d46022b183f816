'use client';

import { OpeningForm } from '@/components/form/opening-form';
import { Section } from '@/components/ui/section';
import { entryRestrictionTexts as texts } from '@/lib/texts/entry-restriction-texts';
import { RestrictionForm } from './restriction-form';
import { RestrictionLine } from './restriction-line';
import type { RestrictionData } from './restriction-types';

type RestrictionsSectionProps = { fieldId: string; today: string; restrictions: readonly RestrictionData[]; mayWrite: boolean };

/** Applications in a field that keep people out of it, recorded and corrected here. */
export function RestrictionsSection({ fieldId, today, restrictions, mayWrite }: RestrictionsSectionProps) {
  return (
    <Section title={texts.section} lead={texts.lead}>
      {restrictions.length === 0 ? <p className="text-18">{texts.none}</p> : null}
      <ul className="flex flex-col">
        {restrictions.map((restriction) => (
          <RestrictionLine key={restriction.id} fieldId={fieldId} today={today} restriction={restriction} mayWrite={mayWrite} />
        ))}
      </ul>
      {mayWrite ? <OpeningForm label={texts.record} form={(close) => <RestrictionForm fieldId={fieldId} today={today} onDone={close} />} /> : null}
    </Section>
  );
}
