import type { KeptEntry } from './entry';
import type { RoundStore } from './round-store';

/**
 * Takes an entry back that has never left the phone, and says whether it did. One that has been tried may have arrived
 * although no answer came: it is taken back by an entry of its own, which the caller keeps then.
 */
export function removeUntried(store: RoundStore, operationId: string): Promise<boolean> {
  return store.transaction('rw', store.entries, async () => {
    const entry = await store.entries.get(operationId);
    if (!entry || entry.tried || entry.state !== 'kept') return false;
    await store.entries.delete(operationId);
    return true;
  });
}

/** The kinds that can be taken back, with the name the server knows their things by. */
export const withdrawnAs: Record<string, string> = {
  'count.record': 'count',
  'tape-sheet.record': 'tape-sheet',
  'residue.record': 'residue-reading',
  'depth.record': 'depth-reading',
  'dig.record': 'dig',
  'crust.record': 'crust-reading',
  'transect.record': 'field-transect',
  'condition.record': 'condition',
  'note.record': 'note',
  'markers.record': 'marker-tally',
};

/** The entry that takes another one back, once that one may have left the phone. */
export function withdrawalOf(entry: KeptEntry, thingId: string, reason: string) {
  const targetKind = withdrawnAs[entry.kind];
  if (targetKind === undefined) return undefined;
  return {
    kind: 'observation.withdraw',
    thingId,
    body: { targetKind, targetId: entry.thingId, reason },
    about: { plantingId: entry.plantingId, rowSampleId: entry.rowSampleId },
  };
}
