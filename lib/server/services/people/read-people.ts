import 'server-only';
import { listFarms } from '../../data/farm';
import { listFarmsOfPeople, listMembers } from '../../data/membership';
import { listOpenLinks } from '../../data/one-time-link';
import type { ReadContext } from '../../operations/context';

/** The people of the organisation with their roles and farms, and the links that are still open. */
export async function readPeople({ tx, actor, clock }: ReadContext) {
  const { organisationId } = actor;
  const attached = await listFarmsOfPeople(tx, { organisationId });
  const members = await listMembers(tx, { organisationId });
  const links = await listOpenLinks(tx, { organisationId, now: clock.now().toISOString() });
  const farms = await listFarms(tx, { organisationId });
  return {
    members: members.map(({ personId, name, email, role, version }) => ({
      personId,
      name,
      email,
      role,
      version,
      farmIds: attached.filter((each) => each.personId === personId).map((each) => each.farmId),
    })),
    links: links.map(({ id, purpose, name, email, role, expiresAt }) => ({ id, purpose, name, email, role, expiresOn: expiresAt.slice(0, 10) })),
    farms: farms.map(({ id, name }) => ({ id, name })),
  };
}
export type People = Awaited<ReturnType<typeof readPeople>>;
