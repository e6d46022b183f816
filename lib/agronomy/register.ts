import type { FigureId } from './figures';
import { penaltyEntries } from './register/penalty-entries';
import type { RegisterEntry } from './register/register-entry';
import { scoreEntries } from './register/score-entries';
import { spacingEntries } from './register/spacing-entries';
import { standEntries } from './register/stand-entries';
import { timingEntries } from './register/timing-entries';

/**
 * Where every figure of a row sample or a group comes from; a screen opens a number with `register[id]`. The
 * type refuses a figure without an entry, and a test figures every worked example again.
 */
export const register: Record<FigureId, RegisterEntry> = {
  ...standEntries,
  ...timingEntries,
  ...spacingEntries,
  ...scoreEntries,
  ...penaltyEntries,
};
