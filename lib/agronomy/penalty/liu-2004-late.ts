import { mapOutcome, type Outcome } from '../outcome';
import { requiredNumber } from '../required-number';
import type { Penalty } from './penalty';
import { shareAndAmount } from './share-and-amount';

/**
 * By Liu, Tollenaar, Stewart and Deen (2004): what do late plants cost?
 *
 * Takes the share of late plants (0 to 1) and how many leaf stages they are behind (0 or more). Returns the
 * loss in percent of the even stand. Insufficient beyond one plant in six or four leaf stages. Throws
 * ImpossibleInput for a share above 1 or a negative number of leaf stages.
 * Method: Crop Sci. 44:847, one plant in six late by two leaf stages −4 %, by four −8 %; interpolated from the
 * even stand. Days are not turned into leaf stages: that needs the heat of those days.
 * Example: one plant in six, two leaf stages behind, costs 4 %.
 */
export function liu2004Late(lateShare: number, leafStagesBehind: number): Outcome<Penalty> {
  requiredNumber(lateShare, 'lateShare', { atLeast: 0, atMost: 1 });
  requiredNumber(leafStagesBehind, 'leafStagesBehind', { atLeast: 0 });
  const loss = shareAndAmount(lateShare, leafStagesBehind, {
    studiedShare: 1 / 6,
    losses: [
      { at: 0, result: 0 },
      { at: 2, result: 4 },
      { at: 4, result: 8 },
    ],
    amountUnit: 'leaf stages',
  });
  return mapOutcome(loss, ({ lossPercent, basis }) => ({
    study: 'liu-2004-late',
    source: 'Liu, Tollenaar, Stewart and Deen 2004, Crop Sci. 44:847',
    reading: 'read',
    lossLow: lossPercent,
    lossHigh: lossPercent,
    unit: 'percent-of-even-stand',
    basis,
    column: '',
    domain: 'one plant in six late, by two or four leaf stages',
  }));
}
