import { requiredNumber } from '../required-number';
import type { Penalty } from './penalty';

/**
 * By Carlson, Doerge and Clay: what does uneven spacing cost?
 *
 * Takes the SD of the spacings in inches (0 or more). Returns bushels per acre. Never insufficient; throws
 * ImpossibleInput for a negative SD. Method: SSMG-37, (SD − 2.0) × 4 bu/ac per inch, never below 0.
 * Missing plants raise the SD, so this partly charges the stand: never add it to a loss figured from the stand.
 * Example: SD 5.116 in costs 12.5 bu/ac.
 */
export function carlsonDoergeClay(spacingSdInches: number): Penalty {
  requiredNumber(spacingSdInches, 'spacingSdInches', { atLeast: 0 });
  const loss = Math.max(0, spacingSdInches - 2) * 4;
  return {
    study: 'carlson-doerge-clay',
    source: 'Carlson, Doerge and Clay, SSMG-37',
    reading: 'read',
    lossLow: loss,
    lossHigh: loss,
    unit: 'bushels-per-acre',
    basis: 'formula',
    column: '',
    domain: 'any SD; the guide prints no upper end',
  };
}
