import { DateInput } from '@/components/ui/date-input';
import { Field } from '@/components/ui/field';
import { Select } from '@/components/ui/select';
import { dateText } from '@/lib/format/date-text';
import { daysAfter } from '@/lib/format/days-after';
import { countTexts } from '@/lib/texts/count-texts';
import { tapeSheetTexts } from '@/lib/texts/tape-sheet-texts';
import type { RowSheetData } from '../count/row-sheet-types';
import type { TapeSheetDraft } from './tape-sheet-draft';

type TapeVisitProps = { data: RowSheetData; draft: TapeSheetDraft; onChange: (draft: TapeSheetDraft) => void; error: string | undefined };

/** At which visit the sheet was read: one that stands, or one of its own. */
export function TapeVisit({ data, draft, onChange, error }: TapeVisitProps) {
  const { counts, plantedOn, people } = data;
  const dayOf = (date: string) => String(daysAfter(plantedOn, date));
  const replaced = draft.replaces?.visit;
  const visits = [
    ...counts.map((count) => ({ value: count.visitId, label: tapeSheetTexts.visitOf(dateText(count.visitedOn, 'day-and-month'), dayOf(count.visitedOn), count.personName) })),
    ...(replaced && !counts.some((count) => count.visitId === replaced.id)
      ? [{ value: replaced.id, label: countTexts.visitHead(dateText(replaced.on, 'day-and-month'), dayOf(replaced.on)) }]
      : []),
  ];
  const standing = visits.some((visit) => visit.value === draft.visitId);
  return (
    <div className="flex max-w-form flex-col gap-3">
      {visits.length > 0 ? (
        <Field label={tapeSheetTexts.visit} error={standing ? error : undefined}>
          {(wiring) => (
            <Select
              {...wiring}
              options={[...visits.reverse(), { value: '', label: tapeSheetTexts.anotherDay }]}
              value={standing ? draft.visitId : ''}
              onChange={(event) => onChange({ ...draft, visitId: event.target.value })}
            />
          )}
        </Field>
      ) : null}
      {standing ? null : (
        <div className="grid gap-3 sm:grid-cols-2">
          <Field label={tapeSheetTexts.date} error={error}>
            {(wiring) => <DateInput {...wiring} value={draft.date} onChange={(event) => onChange({ ...draft, date: event.target.value })} />}
          </Field>
          {people.length > 1 ? (
            <Field label={tapeSheetTexts.readByPerson}>
              {(wiring) => (
                <Select
                  {...wiring}
                  options={people.map((person) => ({ value: person.id, label: person.name }))}
                  value={draft.personId}
                  onChange={(event) => onChange({ ...draft, personId: event.target.value })}
                />
              )}
            </Field>
          ) : null}
        </div>
      )}
    </div>
  );
}
