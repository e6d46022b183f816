'use client';

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { v7 } from 'uuid';
import { z } from 'zod';
import { apiPaths } from '@/lib/paths/paths';
import { answerSchema, type Answer } from '@/lib/schemas/operation';
import { deviceId, nextDeviceSequence } from './device';
import type { ProblemError } from './problem-error';
import { postJson } from './request';
import type { OperationInput } from './use-operation';
import { useWho } from './who';

const answersSchema = z.object({ answers: z.array(answerSchema) });

/** What each thing was answered with, by its id. */
export type BatchAnswers = Map<string, Answer>;

/**
 * Sends several writes at once, in the order given; each is answered for itself, so that one that is refused does not hold
 * up the others. After silence they may be sent again: the services know a thing that stands by its id.
 */
export function useOperationBatch() {
  const who = useWho();
  const router = useRouter();
  const queries = useQueryClient();
  return useMutation<BatchAnswers, ProblemError, readonly OperationInput[]>({
    mutationFn: async (inputs) => {
      const operations = inputs.map((input) => ({
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
      }));
      const { answers } = answersSchema.parse(await postJson(apiPaths.operations(who.organisationId), { operations }));
      const thingOf = new Map(operations.map((operation) => [operation.operationId, operation.thingId]));
      return new Map(answers.map((answer) => [thingOf.get(answer.operationId) ?? '', answer]));
    },
    onSuccess: async () => {
      await queries.invalidateQueries();
      router.refresh();
    },
  });
}
