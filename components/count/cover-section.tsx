'use client';

import { useState } from 'react';
import { v7 } from 'uuid';
import { z } from 'zod';
import { fieldError, fieldIdOf, ProblemSummary } from '@/components/form/problem-summary';
import { Button } from '@/components/ui/button';
import { DateInput } from '@/components/ui/date-input';
import { Field } from '@/components/ui/field';
import { NumberInput } from '@/components/ui/number-input';
import { Section } from '@/components/ui/section';
import { useKeptDraft } from '@/lib/client/use-kept-draft';
import { useOperation } from '@/lib/client/use-operation';
import { dateText } from '@/lib/format/date-text';
import { percentText } from '@/lib/format/percent-text';
import { countTexts } from '@/lib/texts/count-texts';
import type { RowSheetData } from './row-sheet-types';
import { TakeBack } from './take-back';

const coverDraftSchema = z.object({ id: z.string(), readOn: z.string(), marksRead: z.string(), marksCovered: z.string() });
type CoverDraft = z.infer<typeof coverDraftSchema>;

const wholeOrTyped = (text: string) => (/^\s*\d{1,9}\s*$/.test(text) ? Number(text) : text);

/** Residue in the seed row: what was read, and a form for one more reading. */
export function CoverSection({ data }: { data: RowSheetData }) {
  const { row, residueReadings, today, mayWrite } = data;
  const [kept, keep] = useKeptDraft<CoverDraft>(`cover ${row.id}`, coverDraftSchema);
  const [attempt, setAttempt] = useState(0);
  const operation = useOperation({ onApplied: () => keep(() => undefined) });
  const draft = kept ?? { id: '', readOn: today, marksRead: '', marksCovered: '' };
  // The reading's id is made with the first letter, so that the same reading sent again is the same one.
  const set = (changed: Partial<CoverDraft>) => keep(() => ({ ...draft, ...changed, id: draft.id === '' ? v7() : draft.id }));
  const send = () => {
    setAttempt(attempt + 1);
    const { readOn, marksRead, marksCovered } = draft;
    operation.mutate({
      noun: 'residue-readings',
      kind: 'residue.record',
      thingId: draft.id === '' ? v7() : draft.id,
      body: { rowSampleId: row.id, readOn, marksRead: wholeOrTyped(marksRead), marksCovered: wholeOrTyped(marksCovered) },
    });
  };
  return (
    <Section title={countTexts.coverSection} lead={countTexts.coverLead}>
      {residueReadings.length === 0 ? <p className="text-18">{countTexts.coverNone}</p> : null}
      <ul className="flex flex-col">
        {residueReadings.map((reading) => (
          <li key={reading.id} className="flex flex-wrap items-center justify-between gap-x-4 border-t border-rule py-2 text-18">
            <span>
              {dateText(reading.readOn)}: {countTexts.coverOf(String(reading.marksCovered), String(reading.marksRead), percentText(reading.marksCovered / reading.marksRead))}
            </span>
            {mayWrite ? <TakeBack targetKind="residue-reading" targetId={reading.id} what={countTexts.coverReading(dateText(reading.readOn))} /> : null}
          </li>
        ))}
      </ul>
      {mayWrite ? (
        <form
          noValidate
          className="flex max-w-reading flex-col gap-3"
          onSubmit={(event) => {
            event.preventDefault();
            send();
          }}
        >
          <ProblemSummary error={operation.error} attempt={attempt} />
          <div className="grid grid-cols-2 items-start gap-3 sm:grid-cols-3">
            <div className="col-span-2 sm:col-span-1">
              <Field label={countTexts.readOn} id={fieldIdOf('readOn')} error={fieldError(operation.error, 'readOn')}>
                {(wiring) => <DateInput {...wiring} value={draft.readOn} onChange={(event) => set({ readOn: event.target.value })} />}
              </Field>
            </div>
            <Field label={countTexts.marksRead} id={fieldIdOf('marksRead')} error={fieldError(operation.error, 'marksRead')}>
              {(wiring) => <NumberInput {...wiring} inputMode="numeric" value={draft.marksRead} onChange={(event) => set({ marksRead: event.target.value })} />}
            </Field>
            <Field label={countTexts.marksCovered} id={fieldIdOf('marksCovered')} error={fieldError(operation.error, 'marksCovered')}>
              {(wiring) => <NumberInput {...wiring} inputMode="numeric" value={draft.marksCovered} onChange={(event) => set({ marksCovered: event.target.value })} />}
            </Field>
          </div>
          <div>
            <Button type="submit" pending={operation.isPending}>
              {countTexts.saveCover}
            </Button>
          </div>
        </form>
      ) : null}
    </Section>
  );
}
