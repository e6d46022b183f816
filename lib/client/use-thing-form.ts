'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { v7 } from 'uuid';
import { useAskedOperation, type AskedOperation } from './use-asked-operation';
import type { OperationInput } from './use-operation';

type ThingFormOptions<Draft extends object> = {
  /** What stands now, or the empty draft of a new thing. */
  standing: Draft;
  /** The thing that is changed; left out for a new one. */
  thing?: { id: string; version: number } | undefined;
  input: (draft: Draft) => Pick<OperationInput, 'noun' | 'kind' | 'body'>;
  onApplied?: ((thingId: string) => void) | undefined;
};

export type ThingForm<Draft extends object> = {
  draft: Draft;
  change: (part: Partial<Draft>) => void;
  submit: () => void;
  operation: AskedOperation;
  /** After somebody else's edit was shown: what stands in a place where the draft differs. */
  standing: <Key extends keyof Draft>(key: Key) => Draft[Key] | undefined;
  showStanding: () => void;
};

/**
 * The draft of one thing, kept until the server has taken it. An edit names the version it was begun on, not the newest
 * one that happens to be on the page; only after the standing one was shown does saving again overwrite it.
 */
export function useThingForm<Draft extends object>({ standing, thing, input, onApplied }: ThingFormOptions<Draft>): ThingForm<Draft> {
  const router = useRouter();
  const [draft, setDraft] = useState(standing);
  const [newId, setNewId] = useState(() => v7());
  const [begunOn, setBegunOn] = useState(thing?.version ?? null);
  const [shown, setShown] = useState(false);
  const thingId = thing?.id ?? newId;
  const operation = useAskedOperation({
    onApplied: () => {
      if (!thing) {
        setDraft(standing);
        setNewId(v7());
      }
      setShown(false);
      onApplied?.(thingId);
    },
  });
  return {
    draft,
    change: (part) => setDraft((before) => ({ ...before, ...part })),
    submit: () => {
      const baseVersion = shown && thing ? thing.version : begunOn;
      setBegunOn(baseVersion);
      operation.send({ ...input(draft), thingId, baseVersion });
    },
    operation,
    standing: (key) => (shown && JSON.stringify(standing[key]) !== JSON.stringify(draft[key]) ? standing[key] : undefined),
    showStanding: () => {
      setShown(true);
      router.refresh();
    },
  };
}
