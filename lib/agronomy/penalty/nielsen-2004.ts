import { requiredNumber } from '../required-number';
import type { Penalty } from './penalty';

/**
 * By Nielsen's 2004 update: what does uneven spacing cost?
 *
 * Takes the SD of the spacings in inches (0 or more). Returns bushels per acre. Never insufficient; throws
 * ImpossibleInput for a negative SD. Method: 2.2 bu/ac per inch, one site-year; counted above 2 in, as the
 * earlier rule does (the update prints the slope). Missing plants raise the SD: never add it to a loss
 * figured from the stand. Example: SD 4.5 in costs 5.5 bu/ac.
 */
export function nielsen2004(spacingSdInches: number): Penalty {
  requiredNumber(spacingSdInches, 'spacingSdInches', { atLeast: 0 });
  const loss = Math.max(0, spacingSdInches - 2) * 2.2;
  return {
    study: 'nielsen-2004',
    source: 'Nielsen 2004 update, Purdue, one site-year',
    reading: 'read',
    lossLow: loss,
    lossHigh: loss,
    unit: 'bushels-per-acre',
    basis: 'formula',
    column: '',
    domain: 'one site-year; counted above an SD of 2 in as the earlier rule',
  };
}
