import 'server-only';
import { seesFarm } from '@/lib/access/can';
import { AppError } from '@/lib/errors/app-error';
import { findFarm } from '../../data/farm';
import type { ReadContext } from '../../operations/context';

/** The farm, or not found: for one that is gone, another organisation's, or not among the person's farms, alike. */
export async function findSeenFarm({ tx, actor }: ReadContext, farmId: string) {
  const found = await findFarm(tx, { organisationId: actor.organisationId, farmId });
  if (!found || !seesFarm(actor, found.id)) throw new AppError('not-found');
  return found;
}
