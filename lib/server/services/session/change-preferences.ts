import 'server-only';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { updateUnits } from '../../data/person';
import { database } from '../../database';
import type { SignedIn } from '../../session/current-person';

/** Keeps a person's own choices; they hold in every organisation the person belongs to. */
export async function changePreferences(person: SignedIn, input: { units: UnitSystem }): Promise<void> {
  await updateUnits(database(), { personId: person.personId, units: input.units });
}
