import type { CountRow } from '../../data/count';

export type ObservedCount = Omit<CountRow, 'replacesId' | 'importId'> & {
  /** All plants up so far at this visit, whichever way it was typed. */
  plantsUp: number;
  /** False for a second count of the same row, day and time; the first that came in is used until one is taken back. */
  used: boolean;
  alsoCountedBy: string | null;
};
