'use client';

import { Button } from '@/components/ui/button';
import type { AskedOperation } from '@/lib/client/use-asked-operation';
import { formTexts } from '@/lib/texts/form-texts';
import { ProblemSummary } from './problem-summary';
import { QuestionList } from './question-list';

type RefusalProps = {
  operation: AskedOperation;
  /** How this form says yes to what is asked. */
  yes?: string;
  /** Fetches what stands now, after somebody else's edit came first. */
  onShowStanding?: () => void;
};

/** Why a form was not taken: questions to answer, somebody else's edit to look at, or fields to mend. What was typed stays. */
export function Refusal({ operation, yes, onShowStanding }: RefusalProps) {
  const { error, attempt, isPending } = operation;
  if (!error) return null;
  if (error.problem.code === 'needs-confirmation') {
    return (
      <QuestionList
        questions={error.problem.questions}
        onConfirm={operation.confirm}
        pending={isPending}
        {...(yes === undefined ? {} : { yes })}
      />
    );
  }
  return (
    <div className="flex flex-col gap-2">
      <ProblemSummary error={error} attempt={attempt} />
      {error.problem.code === 'conflict' && onShowStanding ? (
        <div className="flex max-w-reading flex-col items-start gap-2 pl-6">
          <p>{formTexts.standingShown}</p>
          <Button look="secondary" onClick={onShowStanding}>
            {formTexts.showStanding}
          </Button>
        </div>
      ) : null}
    </div>
  );
}
