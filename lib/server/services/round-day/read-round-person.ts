import 'server-only';
import { asPerson } from '@/db/connection';
import { roundDayVersion, roundPersonMark, type RoundPerson } from '@/lib/schemas/round-day';
import { listOrganisationsOfPerson } from '../../data/membership';
import { database } from '../../database';
import type { SignedIn } from '../../session/current-person';

/** Whose phone this is at this moment, and the organisations that person belongs to. */
export async function readRoundPerson({ personId, name, units }: SignedIn): Promise<RoundPerson> {
  const organisations = await asPerson(database(), personId, (tx) => listOrganisationsOfPerson(tx, { personId }));
  return {
    what: roundPersonMark,
    version: roundDayVersion,
    person: { id: personId, name, units },
    organisations: organisations.map(({ organisationId, name: called, role }) => ({ id: organisationId, name: called, role })),
  };
}
