'use client';

import { ProblemSummary } from '@/components/form/problem-summary';
import { QuestionList } from '@/components/form/question-list';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Select } from '@/components/ui/select';
import { countText } from '@/lib/format/count-text';
import type { Answer } from '@/lib/schemas/operation';
import { countTexts } from '@/lib/texts/count-texts';
import { CountLineFields, plantsFieldId } from './count-line-fields';
import type { CountSheetState } from './use-count-sheet';

type CountEntryProps = { sheet: CountSheetState; people: readonly { id: string; name: string }[] };

const fieldPaths = ['visit.visitedOn', 'visit.visitedAt', 'visit.marker', 'plants', 'doubtful', 'countedAs'];

export const focusLine = (countId: string) =>
  // The field stands only after the next drawing.
  setTimeout(() => document.getElementById(plantsFieldId(countId))?.focus(), 0);

/** A paper sheet being typed in, one line a visit. */
export function CountEntry({ sheet, people }: CountEntryProps) {
  const addLine = () => focusLine(sheet.add());
  const unsaved = sheet.lines.filter((line) => sheet.answers.has(line.countId)).length;
  return (
    <form
      noValidate
      className="flex flex-col gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        void sheet.save();
      }}
    >
      <ProblemSummary error={sheet.error} attempt={sheet.error ? 1 : 0} />
      {people.length > 1 ? (
        <div className="max-w-form">
          <Field label={countTexts.countedBy}>
            {(wiring) => (
              <Select
                {...wiring}
                options={people.map((person) => ({ value: person.id, label: person.name }))}
                value={sheet.personId}
                onChange={(event) => sheet.setPerson(event.target.value)}
              />
            )}
          </Field>
        </div>
      ) : null}
      <ol className="flex flex-col">
        {sheet.lines.map((line, index) => {
          const answer = sheet.answers.get(line.countId);
          return (
            <li key={index} aria-label={countTexts.lineName(String(index + 1))} className="flex flex-col gap-2 border-t border-rule py-4">
              {line.corrects ? <p className="font-bold">{line.corrects.said}</p> : null}
              <CountLineFields
                line={line}
                number={index + 1}
                errors={new Map(answer?.fields?.map((field) => [field.path, field.message]) ?? [])}
                onChange={(changed) => sheet.change(index, changed)}
                onRemove={sheet.lines.length > 1 || line.corrects ? () => sheet.remove(index) : undefined}
                onEnter={addLine}
              />
              {answer ? <LineAnswer answer={answer} pending={sheet.isPending} onConfirm={(given) => void sheet.confirm(line, given)} /> : null}
            </li>
          );
        })}
      </ol>
      <div className="flex flex-wrap gap-3 border-t border-rule pt-4">
        <Button look="secondary" onClick={addLine}>
          {countTexts.addLine}
        </Button>
        <Button type="submit" pending={sheet.isPending} pendingText={countTexts.saving}>
          {countTexts.save(countText(sheet.toSave.length, 'count'))}
        </Button>
      </div>
      <p role="status" className="text-18 font-bold">
        {sheet.savedLines > 0 ? countTexts.saved(countText(sheet.savedLines, 'count')) : ''}
        {unsaved > 0 ? ` ${countTexts.left(countText(unsaved, 'line'))}` : ''}
      </p>
    </form>
  );
}

type LineAnswerProps = { answer: Answer; pending: boolean; onConfirm: React.ComponentProps<typeof QuestionList>['onConfirm'] };

/** Why a line was not taken, where no field of it says so already. */
function LineAnswer({ answer, pending, onConfirm }: LineAnswerProps) {
  if (answer.code === 'needs-confirmation') return <QuestionList questions={answer.questions ?? []} onConfirm={onConfirm} pending={pending} />;
  const named = answer.fields?.filter((field) => fieldPaths.includes(field.path)) ?? [];
  const others = answer.fields?.filter((field) => !fieldPaths.includes(field.path)) ?? [];
  if (named.length > 0 && others.length === 0) return null;
  return (
    <p role="alert" className="border-l-4 border-flag pl-2 font-bold text-flag-text">
      {others.length > 0 ? others.map((field) => field.message).join(' ') : answer.sentence}
    </p>
  );
}
