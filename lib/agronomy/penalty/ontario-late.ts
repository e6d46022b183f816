import { mapOutcome, type Outcome } from '../outcome';
import { requiredLatePlants, type LatePlants } from './late-plants';
import type { Penalty } from './penalty';
import { shareAndAmount } from './share-and-amount';

/**
 * By the Ontario guide: what do late plants cost?
 *
 * Takes the share of late plants (0 to 1) and their mean delay in days. Returns the loss in percent of the even
 * stand. Insufficient beyond half the plants or 14 days. Throws ImpossibleInput for a share above 1 or a
 * negative delay. Method: half the stand 7 days late −5 %, 14 days late −12 %; interpolated from the even
 * stand. The guide does not print its environments.
 * Example: half the stand 14 days late loses 12 %.
 */
export function ontarioLate(late: LatePlants): Outcome<Penalty> {
  requiredLatePlants(late);
  const loss = shareAndAmount(late.lateShare, late.delayDays, {
    studiedShare: 0.5,
    losses: [
      { at: 0, result: 0 },
      { at: 7, result: 5 },
      { at: 14, result: 12 },
    ],
    amountUnit: 'days',
  });
  return mapOutcome(loss, ({ lossPercent, basis }) => ({
    study: 'ontario-late',
    source: 'Ontario guide',
    reading: 'read',
    lossLow: lossPercent,
    lossHigh: lossPercent,
    unit: 'percent-of-even-stand',
    basis,
    column: '',
    domain: 'half the plants late, by 7 or 14 days',
  }));
}
