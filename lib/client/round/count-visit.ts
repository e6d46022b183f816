import { checkCounts, type CheckedCount } from '@/lib/schemas/check-counts';
import type { Confirmation } from '@/lib/schemas/operation';
import type { RoundRow } from '@/lib/schemas/round-day';
import type { CountDraft } from './count-draft';
import type { NewEntry } from './entry';
import { usedCounts } from './due-row';
import type { EntryVisit } from './visit-of-row';

type Me = { id: string; name: string };
export type CountToKeep = { countedAs: 'so-far' | 'new'; plants: number; doubtful: number };

/** What a draft says once it is kept; undefined while no number has been typed. */
export function countOfDraft(draft: CountDraft): CountToKeep | undefined {
  return draft.plants === null ? undefined : { countedAs: draft.countedAs, plants: draft.plants, doubtful: draft.doubtful ?? 0 };
}

/** "Looked, none new" is a count of its own: none since the last visit, the doubtful as they were unless typed anew. */
export function noneNew(draft: CountDraft, row: RoundRow): CountToKeep {
  return { countedAs: 'new', plants: 0, doubtful: draft.doubtful ?? usedCounts(row).at(-1)?.doubtful ?? 0 };
}

/** The same questions that the server asks, before the entry is kept: asked in the field, not days later at a desk. */
export function checkCountOfRow(row: RoundRow, count: CountToKeep, thingId: string, visit: EntryVisit, me: Me): CheckedCount | undefined {
  const entered = { id: thingId, personId: me.id, personName: me.name, visitedOn: visit.visitedOn, visitedAt: visit.visitedAt, ...count };
  return checkCounts({ label: row.label, seeds: row.seeds }, [...row.counts, entered], new Set([thingId]))[0];
}

export function countEntry(row: RoundRow, plantingId: string, count: CountToKeep, thingId: string, visit: EntryVisit, confirmations: Confirmation[]): NewEntry {
  return {
    kind: 'count.record',
    thingId,
    body: { rowSampleId: row.id, visit, ...count, replacesId: null },
    about: { plantingId, rowSampleId: row.id },
    confirmations,
  };
}
