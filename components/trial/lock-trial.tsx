'use client';

import { useState } from 'react';
import { Refusal } from '@/components/form/refusal';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { useAskedOperation } from '@/lib/client/use-asked-operation';
import { formTexts } from '@/lib/texts/form-texts';
import { trialTexts } from '@/lib/texts/trial-texts';

/** Locks the plan after asking once, because it cannot be unlocked. */
export function LockTrial({ trial }: { trial: { id: string; version: number } }) {
  const [open, setOpen] = useState(false);
  const operation = useAskedOperation({ onApplied: () => setOpen(false) });
  return (
    <>
      <Button onClick={() => setOpen(true)}>{trialTexts.lock}</Button>
      <Dialog
        open={open}
        onClose={() => {
          setOpen(false);
          operation.reset();
        }}
        title={trialTexts.lockQuestion}
        actions={
          <>
            <Button
              pending={operation.isPending}
              onClick={() => operation.send({ noun: 'trials', kind: 'trial.lock', thingId: trial.id, baseVersion: trial.version, body: {} })}
            >
              {trialTexts.lockYes}
            </Button>
            <Button look="secondary" onClick={() => setOpen(false)}>
              {formTexts.cancel}
            </Button>
          </>
        }
      >
        <p>{trialTexts.lockExplained}</p>
        <Refusal operation={operation} yes={formTexts.save} />
      </Dialog>
    </>
  );
}
