import type { MarkerTallyRow } from '../../data/marker-tally';

/** The newest word on the markers of one row sample; null where nobody has said. Each number is of all of them, not one more. */
export function markerBalance(tallies: readonly MarkerTallyRow[]): { set: number | null; takenUp: number | null; left: number } {
  const newest = (event: MarkerTallyRow['event']) => tallies.findLast((tally) => tally.event === event)?.markers ?? null;
  const [set, takenUp] = [newest('set'), newest('taken-up')];
  return { set, takenUp, left: Math.max(0, (set ?? 0) - (takenUp ?? 0)) };
}
