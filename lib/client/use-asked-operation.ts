'use client';

import { useState } from 'react';
import type { Answer, Confirmation } from '@/lib/schemas/operation';
import { useOperation, type OperationInput } from './use-operation';

export type AskedOperation = {
  error: ReturnType<typeof useOperation>['error'];
  isPending: boolean;
  /** Counts the presses, so that a second refusal brings the reader back to its sentence. */
  attempt: number;
  send: (input: OperationInput) => void;
  /** Sends the same again with what was asked now answered. */
  confirm: (confirmations: readonly Confirmation[]) => void;
  reset: () => void;
};

/**
 * A write that the server may ask about before it takes it. Answers given once hold for the input they were given to:
 * one question may follow another, but a changed input is asked about anew.
 */
export function useAskedOperation(options: { onApplied?: (answer: Answer) => void } = {}): AskedOperation {
  const operation = useOperation(options);
  const [sent, setSent] = useState<{ input: OperationInput; confirmations: Confirmation[] }>();
  const [attempt, setAttempt] = useState(0);
  const carry = (input: OperationInput, confirmations: Confirmation[]) => {
    setAttempt(attempt + 1);
    setSent({ input, confirmations });
    operation.mutate({ ...input, confirmations });
  };
  return {
    error: operation.error,
    isPending: operation.isPending,
    attempt,
    send: (input) => {
      const isSame = sent !== undefined && JSON.stringify(sent.input) === JSON.stringify(input);
      carry(input, isSame ? sent.confirmations : []);
    },
    confirm: (confirmations) => {
      if (sent) carry(sent.input, [...sent.confirmations, ...confirmations]);
    },
    reset: () => {
      setSent(undefined);
      operation.reset();
    },
  };
}
