import type { Figures } from '@/lib/agronomy/figures';
import type { SaidPenalties } from '@/lib/schemas/figures';
import type { PlantingFacts } from '@/lib/schemas/planting-facts';
import type { PooledFacts } from '@/lib/schemas/scored-group';
import type { ScoredRow } from '@/lib/schemas/scores';

/** What a figure belongs to: one row sample with its readings, or a group of them. */
export type FigureSubject = {
  planting: PlantingFacts;
  figures: Figures;
  penalties: SaidPenalties;
  /** Null for one row sample. */
  pooled: PooledFacts | null;
  /** Null for a group. */
  row: ScoredRow | null;
};
