import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import type { WithdrawInput } from '@/lib/schemas/observation';
import { findCondition } from '../../data/condition';
import { findCount } from '../../data/count';
import { findCrustReading } from '../../data/crust-reading';
import { findDepthReading } from '../../data/depth-reading';
import { findDig } from '../../data/dig';
import { findEntryException } from '../../data/entry-exception';
import { findEntryRestriction } from '../../data/entry-restriction';
import { findFieldTransect } from '../../data/field-transect';
import { findImportFile } from '../../data/import-file';
import { findMarkerTally } from '../../data/marker-tally';
import { findNote } from '../../data/note';
import { findPhoto } from '../../data/photo';
import { findResidueReading } from '../../data/residue-reading';
import { listRowSamples } from '../../data/row-sample';
import { findTapeSheet } from '../../data/tape-sheet';
import type { WriteContext } from '../../operations/context';
import { findSeenField } from '../fields/find-seen-field';
import { findSeenPlanting } from '../plantings/find-seen-planting';
import { findSeenRowSample } from '../row-samples/find-seen-row-sample';

/** What a withdrawal touches: the planting and its row samples, or the field, which are held while it is written. */
export type Withdrawable = { plantingId: string | null; fieldId: string | null; rowSampleIds: string[] };

/** Where the thing to take back stands; not found for one the person does not see. */
export async function findWithdrawable(context: WriteContext, { targetKind, targetId }: WithdrawInput): Promise<Withdrawable> {
  const { tx, actor } = context;
  const params = { organisationId: actor.organisationId, id: targetId };
  switch (targetKind) {
    case 'import':
      return allOfPlanting(context, await findImportFile(tx, { ...params, importId: targetId }));
    case 'count':
      return atRow(context, await findCount(tx, { ...params, countId: targetId }));
    case 'tape-sheet':
      return atRow(context, await findTapeSheet(tx, { ...params, tapeSheetId: targetId }));
    case 'residue-reading':
      return atRow(context, await findResidueReading(tx, { ...params, residueReadingId: targetId }));
    case 'depth-reading':
      return atRow(context, await findDepthReading(tx, params));
    case 'dig':
      return atRow(context, await findDig(tx, params));
    case 'crust-reading':
      return atRow(context, await findCrustReading(tx, params));
    case 'marker-tally':
      return atRow(context, await findMarkerTally(tx, params));
    case 'field-transect':
      return inPlanting(context, await findFieldTransect(tx, params));
    case 'condition':
      return inPlanting(context, await findCondition(tx, params));
    case 'note':
      return inPlanting(context, await findNote(tx, params));
    case 'photo':
      return inPlanting(context, await findPhoto(tx, params));
    case 'entry-restriction':
      return inField(context, await findEntryRestriction(tx, params));
    case 'entry-exception': {
      const found = await findEntryException(tx, params);
      return inField(context, found && (await findEntryRestriction(tx, { ...params, id: found.restrictionId })));
    }
  }
}

async function atRow(context: WriteContext, found: { rowSampleId: string } | undefined): Promise<Withdrawable> {
  if (!found) throw new AppError('not-found');
  const { planting } = await findSeenRowSample(context, found.rowSampleId);
  return { plantingId: planting.id, fieldId: null, rowSampleIds: [found.rowSampleId] };
}

async function inPlanting(context: WriteContext, found: { plantingId: string } | undefined): Promise<Withdrawable> {
  if (!found) throw new AppError('not-found');
  const { planting } = await findSeenPlanting(context, found.plantingId);
  return { plantingId: planting.id, fieldId: null, rowSampleIds: [] };
}

async function inField(context: WriteContext, found: { fieldId: string } | undefined): Promise<Withdrawable> {
  if (!found) throw new AppError('not-found');
  const { field } = await findSeenField(context, found.fieldId);
  return { plantingId: null, fieldId: field.id, rowSampleIds: [] };
}

async function allOfPlanting(context: WriteContext, found: { plantingId: string } | undefined): Promise<Withdrawable> {
  const { plantingId, ...rest } = await inPlanting(context, found);
  const samples = plantingId === null ? [] : await listRowSamples(context.tx, { organisationId: context.actor.organisationId, plantingId });
  return { ...rest, plantingId, rowSampleIds: samples.map((sample) => sample.id) };
}
