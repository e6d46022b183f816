import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { dateText } from '@/lib/format/date-text';
import { withdrawSchema, type WithdrawInput } from '@/lib/schemas/observation';
import { findCount } from '../../data/count';
import { findImportFile } from '../../data/import-file';
import { findResidueReading } from '../../data/residue-reading';
import { listRowSamples, lockRowSamples } from '../../data/row-sample';
import { findTapeSheet } from '../../data/tape-sheet';
import { insertWithdrawal, listWithdrawnIds } from '../../data/withdrawal';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { originColumns } from '../../operations/origin-columns';
import { readObservations } from '../counts/read-observations';
import { findSeenPlanting } from '../plantings/find-seen-planting';
import { findSeenRowSample } from '../row-samples/find-seen-row-sample';

/** The planting and row samples that the thing to take back touches; not found for one the person does not see. */
async function findTarget(context: WriteContext, { targetKind, targetId }: WithdrawInput): Promise<{ plantingId: string; rowSampleIds: string[] }> {
  const { tx, actor } = context;
  const { organisationId } = actor;
  if (targetKind === 'import') {
    const found = await findImportFile(tx, { organisationId, importId: targetId });
    if (!found) throw new AppError('not-found');
    const { planting } = await findSeenPlanting(context, found.plantingId);
    const samples = await listRowSamples(tx, { organisationId, plantingId: planting.id });
    return { plantingId: planting.id, rowSampleIds: samples.map((sample) => sample.id) };
  }
  const find = {
    count: () => findCount(tx, { organisationId, countId: targetId }),
    'tape-sheet': () => findTapeSheet(tx, { organisationId, tapeSheetId: targetId }),
    'residue-reading': () => findResidueReading(tx, { organisationId, residueReadingId: targetId }),
  }[targetKind];
  const target = await find();
  if (!target) throw new AppError('not-found');
  const { planting } = await findSeenRowSample(context, target.rowSampleId);
  return { plantingId: planting.id, rowSampleIds: [target.rowSampleId] };
}

/** Counts of new plants rest on those before them: what is left must still be able to be. */
async function assertRestPossible(context: WriteContext, plantingId: string): Promise<void> {
  const { counts } = await readObservations(context.tx, { organisationId: context.actor.organisationId, plantingId });
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
  const { plantingId, rowSampleIds } = await findTarget(context, body);
  await lockRowSamples(tx, { organisationId, rowSampleIds });
  // Taken back by two people at once, or again after a lost answer, it is taken back once.
  if ((await listWithdrawnIds(tx, { organisationId })).has(body.targetId)) return { version: 1 };
  await insertWithdrawal(tx, { id: operation.thingId, ...body, ...originColumns(context) });
  await assertRestPossible(context, plantingId);
  return { version: 1 };
}

export const withdrawObservation = defineOperation({ kind: 'observation.withdraw', version: 1, action: 'observations.write', body: withdrawSchema, service });
