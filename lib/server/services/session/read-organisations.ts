import 'server-only';
import { asPerson } from '@/db/connection';
import { listOrganisationsOfPerson } from '../../data/membership';
import { database } from '../../database';
import { currentPerson } from '../../session/current-person';

/** The organisations of whoever is signed in; undefined where nobody is. */
export async function readOrganisations() {
  const person = await currentPerson();
  if (!person) return undefined;
  return asPerson(database(), person.personId, (tx) => listOrganisationsOfPerson(tx, { personId: person.personId }));
}
