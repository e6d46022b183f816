import { mapOutcome, type Outcome } from '../outcome';
import { requiredNumber } from '../required-number';
import type { Penalty } from './penalty';
import { shareAndAmount } from './share-and-amount';

/**
 * By Ford and Hicks (1992), as quoted: what do late plants cost?
 *
 * Takes the share of late plants (0 to 1) and how many leaves they are behind (0 or more). Returns the loss in
 * percent of the even stand. Insufficient beyond half the plants or two leaves. Throws ImpossibleInput for a
 * share above 1 or a negative number of leaves.
 * Method: Minnesota, every other plant one leaf behind 94 %, two leaves 83 %; interpolated from the even
 * stand. Read in a page that quotes the study, not in the study. Days are not turned into leaves.
 * Example: every other plant two leaves behind costs 17 %.
 */
export function fordHicks1992(lateShare: number, leavesBehind: number): Outcome<Penalty> {
  requiredNumber(lateShare, 'lateShare', { atLeast: 0, atMost: 1 });
  requiredNumber(leavesBehind, 'leavesBehind', { atLeast: 0 });
  const loss = shareAndAmount(lateShare, leavesBehind, {
    studiedShare: 0.5,
    losses: [
      { at: 0, result: 0 },
      { at: 1, result: 6 },
      { at: 2, result: 17 },
    ],
    amountUnit: 'leaves',
  });
  return mapOutcome(loss, ({ lossPercent, basis }) => ({
    study: 'ford-hicks-1992',
    source: 'Ford and Hicks 1992, Minnesota, as quoted by extension',
    reading: 'quoted',
    lossLow: lossPercent,
    lossHigh: lossPercent,
    unit: 'percent-of-even-stand',
    basis,
    column: '',
    domain: 'every other plant late, by one or two leaves',
  }));
}
