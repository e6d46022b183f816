import { requiredNumber } from '../required-number';
import type { Penalty } from './penalty';

/**
 * By Liu et al. (2004): what does uneven spacing cost?
 *
 * Takes the SD of the spacings in inches (0 or more). Returns a loss of 0 %, which is the finding: no
 * significant effect. Never insufficient; throws ImpossibleInput for a negative SD.
 * Method: Liu, Tollenaar, Stewart and Deen 2004. No significant effect is not proof of none.
 * Example: SD 4.5 in costs nothing that the study could show.
 */
export function liu2004Spacing(spacingSdInches: number): Penalty {
  requiredNumber(spacingSdInches, 'spacingSdInches', { atLeast: 0 });
  return {
    study: 'liu-2004-spacing',
    source: 'Liu, Tollenaar, Stewart and Deen 2004',
    reading: 'read',
    lossLow: 0,
    lossHigh: 0,
    unit: 'percent-of-yield',
    basis: 'formula',
    column: 'no significant effect found',
    domain: 'the spacing variation the study made',
  };
}
