'use client';

import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { v7 } from 'uuid';
import { fieldError, fieldIdOf, ProblemSummary } from '@/components/form/problem-summary';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Field } from '@/components/ui/field';
import { TextInput } from '@/components/ui/text-input';
import { useOperation } from '@/lib/client/use-operation';
import { useWho } from '@/lib/client/who';
import type { ReplantAnswer } from '@/lib/schemas/replant';
import type { DecisionChoice } from '@/lib/schemas/vocabulary';
import { decisionTexts } from '@/lib/texts/decision-texts';
import { basisChanges } from './basis-facts';

type SignDialogProps = {
  choice: DecisionChoice;
  /** What stood on the screen when the button was pressed: this is signed, not what may have come in since. */
  read: ReplantAnswer;
  /** What stands now. */
  current: ReplantAnswer;
  onClose: () => void;
  onSigned: () => void;
};

const formId = 'sign-decision';

/** The name is typed and the decision signed. If the numbers moved meanwhile nothing is signed, and it says what moved. */
export function SignDialog({ choice, read, current, onClose, onSigned }: SignDialogProps) {
  const { units } = useWho();
  const queries = useQueryClient();
  const [name, setName] = useState('');
  const [attempt, setAttempt] = useState(0);
  const [decisionId] = useState(() => v7());
  const operation = useOperation({ onApplied: onSigned });
  const { error } = operation;
  const texts = decisionTexts;
  const { basis, basisHash } = read;
  const recommendation = basis.answer.kind === 'value' ? basis.answer.recommendation : 'cannot-tell';
  const isAgainst = (recommendation === 'keep' || recommendation === 'replant') && recommendation !== choice;
  const hasChanged = error?.problem.code === 'basis-changed';
  const sign = () => {
    setAttempt(attempt + 1);
    operation.mutate(
      {
        noun: 'decisions',
        kind: 'decision.sign',
        thingId: decisionId,
        body: {
          plantingId: basis.plantingId,
          zoneId: basis.zone?.id ?? null,
          decided: choice,
          signedName: name,
          basisHash,
        },
      },
      {
        onError: (refused) =>
          refused.problem.code === 'basis-changed'
            ? void queries.invalidateQueries({ queryKey: ['replant'] })
            : undefined,
      },
    );
  };
  const actions = hasChanged ? (
    <Button onClick={onClose}>{texts.readAnew}</Button>
  ) : (
    <>
      <Button type="submit" form={formId} pending={operation.isPending} pendingText={texts.signing}>
        {texts.sign[choice]}
      </Button>
      <Button look="secondary" onClick={onClose}>
        {texts.back}
      </Button>
    </>
  );
  return (
    <Dialog open onClose={onClose} title={texts.dialogTitle[choice]} actions={actions}>
      <ProblemSummary error={error} attempt={attempt} />
      {hasChanged ? (
        <Changes lines={current.basisHash === basisHash ? [] : basisChanges(basis, current.basis, units)} />
      ) : (
        <form
          id={formId}
          noValidate
          className="flex flex-col gap-4"
          onSubmit={(event) => {
            event.preventDefault();
            sign();
          }}
        >
          <p>
            {texts.answerRead} <strong>{basis.sentences?.[units].first}</strong>
          </p>
          {isAgainst ? <p className="border-l-6 border-flag pl-4">{texts.againstAnswer}</p> : null}
          {basis.zone ? <p>{texts.otherPart(basis.zone.name)}</p> : null}
          <p>{texts.freezes}</p>
          <Field
            label={texts.name}
            hint={texts.nameHint}
            id={fieldIdOf('signedName')}
            error={fieldError(error, 'signedName')}
          >
            {(wiring) => (
              <TextInput
                {...wiring}
                autoComplete="name"
                value={name}
                onChange={(event) => setName(event.target.value)}
              />
            )}
          </Field>
        </form>
      )}
    </Dialog>
  );
}

function Changes({ lines }: { lines: readonly string[] }) {
  if (lines.length === 0) return null;
  return (
    <div>
      <h3 className="text-15">{decisionTexts.changedTitle}</h3>
      <ul className="mt-1 flex flex-col gap-1">
        {lines.map((line) => (
          <li key={line}>{line}</li>
        ))}
      </ul>
    </div>
  );
}
