import type { CountRow } from '../../data/count';

export type ObservedCount = Omit<CountRow, 'replacesId' | 'importId'> & {
  /** All plants up so far at this visit, whichever way it was typed. */
  plantsUp: number;
  /** False for a second count of the same row, day and time; the first that came in is used until one is taken back. */
  used: boolean;
  alsoCountedBy: string | null;
};

type Countable = Pick<CountRow, 'visitedOn' | 'visitedAt' | 'countedAs' | 'plants' | 'personName'>;

/** A visit without a time counts as noon, so that it stands between a morning's and an evening's. */
export const momentOf = (each: { visitedOn: string; visitedAt: string | null }) => `${each.visitedOn}T${each.visitedAt ?? '12:00'}`;

/**
 * Puts the standing counts of one row sample in the order of their visits, sums up "new since" into "so far", and sets a
 * second count of the same visit beside the first. Counts come in as recorded, earliest first.
 */
export function resolveCounts<Row extends Countable>(rows: readonly Row[]): (Row & { plantsUp: number; used: boolean; alsoCountedBy: string | null })[] {
  const inOrder = [...rows].sort((a, b) => (momentOf(a) < momentOf(b) ? -1 : momentOf(a) > momentOf(b) ? 1 : 0));
  let before = 0;
  let usedMoment = '';
  let atMoment = 0;
  return inOrder.map((row) => {
    const moment = momentOf(row);
    const used = moment !== usedMoment;
    if (used) before = atMoment;
    const plantsUp = row.countedAs === 'new' ? before + row.plants : row.plants;
    if (used) {
      usedMoment = moment;
      atMoment = plantsUp;
    }
    const other = inOrder.find((each) => each !== row && momentOf(each) === moment);
    return { ...row, plantsUp, used, alsoCountedBy: other ? other.personName : null };
  });
}
