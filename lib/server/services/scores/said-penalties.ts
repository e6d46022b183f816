import type { Penalties } from '@/lib/agronomy/figures';
import { mapOutcome } from '@/lib/agronomy/outcome';
import { penaltyStudies } from '@/lib/agronomy/penalty/penalty';
import type { SaidPenalties } from '@/lib/schemas/figures';

/** What the studies say, without what their entries in the register say anyway: there are thirteen of them at every row sample. */
export function saidPenalties(penalties: Penalties): SaidPenalties {
  return Object.fromEntries(
    penaltyStudies.map((study) => [
      study,
      mapOutcome(penalties[study], ({ lossLow, lossHigh, unit, basis, column }) => ({ lossLow, lossHigh, unit, basis, column })),
    ]),
  ) as SaidPenalties;
}
