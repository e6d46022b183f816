import { ImpossibleInput } from '@/lib/agronomy/outcome';
import { rowScores, type RowScores } from '@/lib/agronomy/row-scores';
import type { RowSample } from '@/lib/agronomy/row-sample';

export type SoundSamples = {
  /** Row samples whose readings can be; only these go into groups. */
  samples: RowSample[];
  scores: ReadonlyMap<string, RowScores>;
  /** By row sample, the input that cannot be. */
  impossible: ReadonlyMap<string, string>;
};

/**
 * Scores each row sample and sets apart those whose readings contradict each other, such as a visit before a planting date
 * that was moved later. One of them must not take the rest of the field down with it.
 */
export function soundSamples(all: readonly RowSample[]): SoundSamples {
  const scores = new Map<string, RowScores>();
  const impossible = new Map<string, string>();
  for (const sample of all) {
    try {
      scores.set(sample.rowSampleId, rowScores(sample));
    } catch (error) {
      if (!(error instanceof ImpossibleInput)) throw error;
      impossible.set(sample.rowSampleId, error.field ?? 'not-named');
    }
  }
  return { samples: all.filter((sample) => scores.has(sample.rowSampleId)), scores, impossible };
}
