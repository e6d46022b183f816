'use client';

import { useState } from 'react';
import { v7 } from 'uuid';
import { fieldError, fieldIdOf, ProblemSummary } from '@/components/form/problem-summary';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Field } from '@/components/ui/field';
import { TextInput } from '@/components/ui/text-input';
import { useOperation } from '@/lib/client/use-operation';
import type { WithdrawableKind } from '@/lib/schemas/vocabulary';
import { countTexts } from '@/lib/texts/count-texts';

type TakeBackProps = {
  targetKind: WithdrawableKind;
  targetId: string;
  /** "the count of 18 May 2026, 24 plants": what is taken back, in the question and for who only hears the button. */
  what: string;
  look?: 'quiet' | 'secondary';
};

/** Takes an observation, or a whole import, out of the figures, with a reason. */
export function TakeBack({ targetKind, targetId, what, look = 'quiet' }: TakeBackProps) {
  const [open, setOpen] = useState(false);
  const [reason, setReason] = useState('');
  const [attempt, setAttempt] = useState(0);
  const operation = useOperation({ onApplied: () => setOpen(false) });
  const send = () => {
    setAttempt(attempt + 1);
    operation.mutate({ noun: 'withdrawals', kind: 'observation.withdraw', thingId: v7(), body: { targetKind, targetId, reason } });
  };
  return (
    <>
      <Button look={look} aria-label={countTexts.takeBackOf(what)} onClick={() => setOpen(true)}>
        {countTexts.takeBack}
      </Button>
      <Dialog
        open={open}
        onClose={() => setOpen(false)}
        title={countTexts.takeBackTitle(what)}
        actions={
          <>
            <Button pending={operation.isPending} onClick={send}>
              {countTexts.takeBack}
            </Button>
            <Button look="secondary" onClick={() => setOpen(false)}>
              {countTexts.takeBackKeep}
            </Button>
          </>
        }
      >
        <ProblemSummary error={operation.error} attempt={attempt} />
        <p>{countTexts.takeBackHelp}</p>
        <Field label={countTexts.takeBackReason} id={fieldIdOf('reason')} error={fieldError(operation.error, 'reason')}>
          {(wiring) => <TextInput {...wiring} maxLength={300} value={reason} onChange={(event) => setReason(event.target.value)} />}
        </Field>
      </Dialog>
    </>
  );
}
