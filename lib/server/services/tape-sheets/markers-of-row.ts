import type { ObservedCount } from '../counts/observed-count';

/** The markers that the standing visits of a row sample set, each once. */
export function markersOfRow(counts: readonly ObservedCount[], rowSampleId: string): string[] {
  return [...new Set(counts.flatMap((count) => (count.rowSampleId === rowSampleId && count.marker !== null ? [count.marker] : [])))];
}
