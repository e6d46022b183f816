import 'server-only';
import { inOrganisation, type Database, type Transaction } from '@/db/connection';
import { findLastSeal, insertSeals, listOrganisationsToSeal, listSealedEvents, listUnsealedEvents, lockSeals } from '../../data/audit-seal';
import { chainHash, chainStart } from './chain-hash';

const eventsAtOnce = 5_000;

/**
 * Seals the events that no seal covers yet into each organisation's hash chain. It runs apart from the writes: done
 * inside them, every sync of an organisation would wait for the one before.
 */
export async function sealAudit(db: Database): Promise<number> {
  let sealed = 0;
  for (const organisationId of await listOrganisationsToSeal(db)) {
    sealed += await inOrganisation(db, { organisationId }, async (tx) => {
      await lockSeals(tx, { organisationId });
      const last = await findLastSeal(tx, { organisationId });
      let before = last?.chainHash ?? chainStart;
      const events = await listUnsealedEvents(tx, { organisationId, most: eventsAtOnce });
      const seals = events.map((event, index) => {
        before = chainHash(before, event);
        return { place: (last?.place ?? 0) + index + 1, eventId: event.id, chainHash: before };
      });
      await insertSeals(tx, { organisationId, seals });
      return seals.length;
    });
  }
  return sealed;
}

/** The place of the first link that does not follow from the one before, or undefined where the chain is whole. */
export async function findBrokenSeal(tx: Transaction, organisationId: string): Promise<number | undefined> {
  let before = chainStart;
  let expectedPlace = 1;
  for (const { place, chainHash: sealed, ...event } of await listSealedEvents(tx, { organisationId })) {
    before = chainHash(before, event);
    if (place !== expectedPlace || sealed !== before) return expectedPlace;
    expectedPlace += 1;
  }
  return undefined;
}
