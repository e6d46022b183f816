'use client';

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { useRef } from 'react';
import { v7 } from 'uuid';
import { answerSchema, type Answer, type Confirmation } from '@/lib/schemas/operation';
import { apiPaths } from '@/lib/paths/paths';
import { deviceId, nextDeviceSequence } from './device';
import type { ProblemError } from './problem-error';
import { postJson } from './request';
import { useWho } from './who';

export type OperationInput = {
  /** The noun whose route takes it: "farms". */
  noun: string;
  kind: string;
  version?: number;
  thingId: string;
  baseVersion?: number | null;
  body: Record<string, unknown>;
  confirmations?: Confirmation[];
};

/**
 * Sends one write as an operation. Pages below read anew after it, whether they were made on the server or hold a query.
 * Pressed again after silence with the same input, the very same operation goes out once more: if the first had landed,
 * its receipt answers and nothing is written twice. Any other press is a new operation.
 */
export function useOperation(options: { onApplied?: (answer: Answer) => void } = {}) {
  const who = useWho();
  const router = useRouter();
  const queries = useQueryClient();
  const unanswered = useRef<{ input: string; envelope: object } | undefined>(undefined);
  return useMutation<Answer, ProblemError, OperationInput>({
    mutationFn: async (input) => {
      const sameInput = JSON.stringify(input);
      const envelope = unanswered.current?.input === sameInput ? unanswered.current.envelope : {
        operationId: v7(),
        organisationId: who.organisationId,
        personId: who.personId,
        deviceId: deviceId(),
        deviceSequence: nextDeviceSequence(),
        kind: input.kind,
        version: input.version ?? 1,
        thingId: input.thingId,
        baseVersion: input.baseVersion ?? null,
        follows: null,
        body: input.body,
        occurred: { date: who.today, time: null, zone: who.timeZone },
        confirmations: input.confirmations ?? [],
      };
      unanswered.current = { input: sameInput, envelope };
      return answerSchema.parse(await postJson(apiPaths.noun(who.organisationId, input.noun), envelope));
    },
    onError: (error) => {
      if (error.problem.status !== 0) unanswered.current = undefined;
    },
    onSuccess: async (answer) => {
      unanswered.current = undefined;
      await queries.invalidateQueries();
      router.refresh();
      options.onApplied?.(answer);
    },
  });
}
