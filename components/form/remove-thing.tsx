'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { useAskedOperation } from '@/lib/client/use-asked-operation';
import { formTexts } from '@/lib/texts/form-texts';
import { Refusal } from './refusal';

type RemoveThingProps = {
  noun: string;
  kind: string;
  thing: { id: string; version: number };
  /** The button and the question: "Remove the field North Forty". */
  label: string;
  /** What goes with it, and what stays. */
  explanation: string;
  onRemoved?: () => void;
};

/** Removes one thing after asking once; a refusal says why it stays. */
export function RemoveThing({ noun, kind, thing, label, explanation, onRemoved }: RemoveThingProps) {
  const [open, setOpen] = useState(false);
  const operation = useAskedOperation({
    onApplied: () => {
      setOpen(false);
      onRemoved?.();
    },
  });
  const close = () => {
    setOpen(false);
    operation.reset();
  };
  return (
    <>
      <Button look="quiet" aria-label={label} onClick={() => setOpen(true)}>
        {formTexts.remove}
      </Button>
      <Dialog
        open={open}
        onClose={close}
        title={label}
        actions={
          <>
            <Button
              pending={operation.isPending}
              pendingText={formTexts.removing}
              onClick={() => operation.send({ noun, kind, thingId: thing.id, baseVersion: thing.version, body: {} })}
            >
              {formTexts.remove}
            </Button>
            <Button look="secondary" onClick={close}>
              {formTexts.cancel}
            </Button>
          </>
        }
      >
        <Refusal operation={operation} />
        <p>{explanation}</p>
      </Dialog>
    </>
  );
}
