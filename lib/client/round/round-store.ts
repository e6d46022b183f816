import { Dexie, type Table } from 'dexie';
import type { RoundDay } from '@/lib/schemas/round-day';
import type { KeptEntry } from './entry';

/** The day a phone took along for one person and organisation. */
export type KeptDay = { key: string; personId: string; organisationId: string; day: RoundDay; readAt: number };

/** A photo that has not been answered for yet, with its bytes as they will be sent. */
export type KeptPhoto = {
  photoId: string;
  personId: string;
  organisationId: string;
  plantingId: string;
  rowSampleId: string | null;
  digId: string | null;
  bytes: ArrayBuffer;
  sha256: string;
  byteLength: number;
  takenOn: string;
  takenAt: string | null;
  place: { latitude: number; longitude: number; accuracyMeters: number } | null;
  state: 'kept' | 'needs-look';
  /** Why the server would not have it, where it would not. */
  sentence?: string;
  keptAt: number;
};

/** What is being typed and has not been kept yet, so that a phone that goes off comes back to it. */
export type KeptDraft = { key: string; personId: string; organisationId: string; name: string; draft: unknown; changedAt: number };

/** One fact of this phone: its id, its sequence, whose it is, which tape is in hand. */
export type PhoneFact = { name: string; value: unknown };

export const roundStoreName = 'rowrise-round';

/**
 * The phone's own store. What the scout has entered stands here from the press until its receipt has come; nothing but a
 * receipt takes an entry away. A version that has been out stays upgradable: a store is never made anew.
 */
export class RoundStore extends Dexie {
  declare entries: Table<KeptEntry, string>;
  declare days: Table<KeptDay, string>;
  declare photos: Table<KeptPhoto, string>;
  declare drafts: Table<KeptDraft, string>;
  declare facts: Table<PhoneFact, string>;

  constructor(name = roundStoreName) {
    // Strict: a press counts as kept only once it is on the disk, not while it lies in the system's memory.
    super(name, { chromeTransactionDurability: 'strict' });
    this.version(1).stores({
      entries: 'operationId, deviceSequence, [personId+organisationId+state]',
      days: 'key, personId',
      photos: 'photoId, [personId+organisationId]',
      drafts: 'key, [personId+organisationId]',
      facts: 'name',
    });
  }
}

export const dayKey = (personId: string, organisationId: string) => `${personId} ${organisationId}`;
export const draftKey = (personId: string, organisationId: string, name: string) => `${personId} ${organisationId} ${name}`;
