import { register } from './register';
import { inferenceRegister } from './register-inference';
import { comparisonEntries } from './register/comparison-entries';
import { decideEntries } from './register/decide-entries';
import { emergenceFitEntries } from './register/emergence-fit-entries';
import { moneyEntries } from './register/money-entries';
import type { RegisterEntry } from './register/register-entry';
import { restatedPenaltyEntries } from './register/restated-penalty-entries';
import { standEstimatorEntries } from './register/stand-estimator-entries';
import { timingDetailEntries } from './register/timing-detail-entries';
import { yieldEntries } from './register/yield-entries';

/**
 * Every formula of the core with its source, limits and worked example: what the Methods page shows, and what "where this
 * number comes from" opens. A test holds that each public calculation has its entry, and figures every example again.
 */
export const wholeRegister: readonly RegisterEntry[] = [
  ...Object.values(register),
  ...inferenceRegister,
  ...standEstimatorEntries,
  ...timingDetailEntries,
  ...emergenceFitEntries,
  ...comparisonEntries,
  ...restatedPenaltyEntries,
  ...decideEntries,
  ...yieldEntries,
  ...moneyEntries,
];
