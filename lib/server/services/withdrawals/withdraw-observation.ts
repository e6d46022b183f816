import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { dateText } from '@/lib/format/date-text';
import { withdrawSchema, type WithdrawInput } from '@/lib/schemas/observation';
import { lockField } from '../../data/field';
import { lockPlanting } from '../../data/planting';
import { lockRowSamples } from '../../data/row-sample';
import { insertWithdrawal, listWithdrawnIds } from '../../data/withdrawal';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { originColumns } from '../../operations/origin-columns';
import { readObservations } from '../counts/read-observations';
import { findWithdrawable } from './find-withdrawable';

/** Counts of new plants rest on those before them: what is left must still be able to be. */
async function assertRestPossible(context: WriteContext, plantingId: string, rowSampleIds: readonly string[]): Promise<void> {
  const only = rowSampleIds.length === 1 ? rowSampleIds[0] : undefined;
  const { counts } = await readObservations(context.tx, { organisationId: context.actor.organisationId, plantingId, ...(only === undefined ? {} : { rowSampleId: only }) });
  const upset = counts.find((count) => count.doubtful > count.plantsUp);
  if (upset) {
    throw new AppError('in-use', {
      sentence: `The count of ${dateText(upset.visitedOn)} adds to this one and would have more doubtful plants than plants. Take that one back first.`,
    });
  }
}

async function service(context: WriteContext, body: WithdrawInput): Promise<Written> {
  const { tx, actor, operation } = context;
  const { organisationId } = actor;
  const { plantingId, fieldId, rowSampleIds } = await findWithdrawable(context, body);
  // Held in the same order as whoever adds an observation does.
  if (fieldId !== null) await lockField(tx, { organisationId, fieldId });
  if (plantingId !== null && rowSampleIds.length === 0) await lockPlanting(tx, { organisationId, plantingId });
  await lockRowSamples(tx, { organisationId, rowSampleIds });
  // Taken back by two people at once, or again after a lost answer, it is taken back once.
  if ((await listWithdrawnIds(tx, { organisationId })).has(body.targetId)) return { version: 1 };
  await insertWithdrawal(tx, { id: operation.thingId, ...body, ...originColumns(context) });
  if (plantingId !== null && rowSampleIds.length > 0) await assertRestPossible(context, plantingId, rowSampleIds);
  return { version: 1 };
}

export const withdrawObservation = defineOperation({ kind: 'observation.withdraw', version: 1, action: 'observations.write', body: withdrawSchema, service });
