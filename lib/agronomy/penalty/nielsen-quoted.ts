import { requiredNumber } from '../required-number';
import type { Penalty } from './penalty';

/**
 * By Nielsen, Purdue, as quoted: what does uneven spacing cost?
 *
 * Takes the SD of the spacings in inches (0 or more). Returns bushels per acre. Never insufficient; throws
 * ImpossibleInput for a negative SD. Method: 2.5 bu/ac per inch above 2 in, as quoted by Wisconsin (2000) and
 * Ontario, not read in the source. Missing plants raise the SD: never add it to a loss figured from the stand.
 * Example: SD 4.5 in costs 6.25 bu/ac.
 */
export function nielsenQuoted(spacingSdInches: number): Penalty {
  requiredNumber(spacingSdInches, 'spacingSdInches', { atLeast: 0 });
  const loss = Math.max(0, spacingSdInches - 2) * 2.5;
  return {
    study: 'nielsen-quoted',
    source: 'Nielsen, Purdue, as quoted by Wisconsin 2000 and Ontario',
    reading: 'quoted',
    lossLow: loss,
    lossHigh: loss,
    unit: 'bushels-per-acre',
    basis: 'formula',
    column: '',
    domain: 'any SD; the quotation prints no upper end',
  };
}
