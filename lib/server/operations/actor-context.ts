import 'server-only';
import { inOrganisation, type Database } from '@/db/connection';
import type { Actor } from '@/lib/access/can';
import { AppError } from '@/lib/errors/app-error';
import { clockAt } from '../clock';
import { findMembership, listFarmIdsOfPerson } from '../data/membership';
import type { ReadContext } from './context';

/**
 * Runs `work` in a transaction of the organisation, as the person's standing membership allows at this moment. Somebody
 * who is no member is told what a stranger to a nonexistent organisation is told.
 */
export function withActor<T>(
  db: Database,
  who: { organisationId: string; personId: string; now: () => Date },
  work: (context: ReadContext) => Promise<T>,
): Promise<T> {
  return inOrganisation(db, who, async (tx) => {
    const found = await findMembership(tx, who);
    if (!found) throw new AppError('not-found');
    const seesAll = found.role === 'owner' || found.role === 'agronomist';
    const actor: Actor = {
      personId: who.personId,
      name: found.personName,
      organisationId: who.organisationId,
      role: found.role,
      farmIds: seesAll ? 'all' : await listFarmIdsOfPerson(tx, who),
    };
    return work({
      tx,
      actor,
      clock: clockAt(who.now, found.demoToday),
      organisation: { name: found.organisationName, timeZone: found.timeZone, demoToday: found.demoToday },
    });
  });
}
