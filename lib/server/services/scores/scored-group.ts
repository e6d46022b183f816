import { poolScores } from '@/lib/agronomy/pool-scores';
import type { RowSample } from '@/lib/agronomy/row-sample';
import type { ScoredGroup } from '@/lib/schemas/scored-group';
import { saidPenalties } from './said-penalties';

/** What the row samples of a group say together, in the form in which it leaves the server. */
export function scoredGroup(samples: readonly RowSample[]): ScoredGroup {
  const { figures, penalties, ...pooled } = poolScores(samples);
  return { figures, penalties: saidPenalties(penalties), pooled };
}
