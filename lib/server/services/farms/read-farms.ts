import 'server-only';
import { seesFarm } from '@/lib/access/can';
import { listFarms } from '../../data/farm';
import type { ReadContext } from '../../operations/context';

/** The farms a person sees, by name. */
export async function readFarms({ tx, actor }: ReadContext) {
  const farms = await listFarms(tx, { organisationId: actor.organisationId });
  return farms
    .filter((each) => seesFarm(actor, each.id))
    .map(({ id, name, timeZone, version }) => ({ id, name, timeZone, version }));
}
