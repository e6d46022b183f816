import { v7 } from 'uuid';
import type { KeptEntry, NewEntry } from './entry';
import { draftKey, type KeptPhoto, type RoundStore } from './round-store';

/** Whose entry it is and when it happened, as the phone knows it at the press. */
export type KeepFrame = {
  personId: string;
  organisationId: string;
  occurred: { date: string; time: string | null; zone: string };
  /** The phone's clock in milliseconds; data only, it decides no order. */
  keptAt: number;
};

const sequenceFact = 'device-sequence';
const deviceFact = 'device-id';

/**
 * Puts entries into the store, each with the next number of this phone's own order, and takes the draft they came from
 * away, all in one transaction: after a cut either all of them stand or the draft does. Resolves once they are on the
 * disk. Rejects where the phone refuses, and then nothing has changed.
 */
export async function keepEntries(
  store: RoundStore,
  frame: KeepFrame,
  entries: readonly NewEntry[],
  options: { clearDrafts?: readonly string[]; photo?: KeptPhoto } = {},
): Promise<KeptEntry[]> {
  const { personId, organisationId } = frame;
  return store.transaction('rw', store.entries, store.facts, store.drafts, store.photos, async () => {
    const device = (await store.facts.get(deviceFact))?.value;
    const deviceId = typeof device === 'string' ? device : v7();
    if (device === undefined) await store.facts.put({ name: deviceFact, value: deviceId });
    const last = Number((await store.facts.get(sequenceFact))?.value ?? 0);
    const kept = entries.map((entry, index): KeptEntry => ({
      operationId: v7(),
      personId,
      organisationId,
      deviceId,
      deviceSequence: last + index + 1,
      kind: entry.kind,
      version: entry.version ?? 1,
      thingId: entry.thingId,
      baseVersion: entry.baseVersion ?? null,
      follows: entry.follows ?? null,
      body: entry.body,
      occurred: frame.occurred,
      confirmations: entry.confirmations ?? [],
      plantingId: entry.about.plantingId,
      rowSampleId: entry.about.rowSampleId,
      state: 'kept',
      tried: false,
      keptAt: frame.keptAt,
      sentAt: null,
      answer: null,
    }));
    await store.entries.bulkAdd(kept);
    if (options.photo) await store.photos.add(options.photo);
    await store.facts.put({ name: sequenceFact, value: last + kept.length });
    for (const name of options.clearDrafts ?? []) await store.drafts.delete(draftKey(personId, organisationId, name));
    return kept;
  });
}
