import 'server-only';
import { badField } from '@/lib/errors/app-error';
import type { Role } from '@/lib/schemas/vocabulary';
import { listFarms } from '../../data/farm';
import type { ReadContext } from '../../operations/context';

/** The farms a person is attached to: known ones, and at least one for somebody who sees nothing without. */
export async function assertFarmsKnown({ tx, actor }: ReadContext, role: Role, farmIds: readonly string[]): Promise<void> {
  const known = new Set((await listFarms(tx, { organisationId: actor.organisationId })).map((farm) => farm.id));
  if (!farmIds.every((farmId) => known.has(farmId))) throw badField('farmIds', 'A chosen farm is not there any more. Choose again.');
  if ((role === 'scout' || role === 'grower') && farmIds.length === 0) {
    throw badField('farmIds', 'Choose at least one farm; a scout or grower sees nothing without.');
  }
}
