import { CENTIMETERS_PER_INCH } from '../constants';
import { requiredNumber } from '../required-number';
import type { Penalty } from './penalty';

const NO_EFFECT_TO_CENTIMETERS = 12;
const LOSS_PERCENT_PER_CENTIMETER = 1.06;

/**
 * By Lauer and Rankin (2004): what does uneven spacing cost?
 *
 * Takes the SD of the spacings in inches (0 or more). Returns the loss in percent of yield, at most 100. Never
 * insufficient; throws ImpossibleInput for a negative SD.
 * Method: Agron. J. 96:1464, no effect up to an SD of 12 cm, then −1.06 % per cm.
 * Missing plants raise the SD: never add it to a loss figured from the stand.
 * Example: SD 5.116 in is 13.0 cm and costs 1.05 %.
 */
export function lauerRankin2004(spacingSdInches: number): Penalty {
  requiredNumber(spacingSdInches, 'spacingSdInches', { atLeast: 0 });
  const beyondCentimeters = Math.max(0, spacingSdInches * CENTIMETERS_PER_INCH - NO_EFFECT_TO_CENTIMETERS);
  const loss = Math.min(100, beyondCentimeters * LOSS_PERCENT_PER_CENTIMETER);
  return {
    study: 'lauer-rankin-2004',
    source: 'Lauer and Rankin 2004, Agron. J. 96:1464',
    reading: 'read',
    lossLow: loss,
    lossHigh: loss,
    unit: 'percent-of-yield',
    basis: 'formula',
    column: '',
    domain: 'no effect up to an SD of 12 cm (4.7 in)',
  };
}
