import { SAME_NUMBER } from '../constants';
import { interpolate, isAnchor, type Anchor } from '../interpolate';
import { insufficient, value, type Outcome } from '../outcome';
import { spokenNumber } from '../spoken-number';

export type StudiedResponse = {
  /** The one share of late plants the study worked with. */
  studiedShare: number;
  /** Loss in percent by how far behind, ascending, beginning with no delay and no loss. */
  losses: readonly Anchor[];
  /** What `at` counts, for the sentence that refuses, for example `days`. */
  amountUnit: string;
};

/**
 * What does a study of one share of late plants and several delays say of another share and delay?
 *
 * Takes the share late (0 to 1), how far behind they are and the study's figures. Returns the loss in percent
 * and whether it was measured. Insufficient beyond the study's share or its longest delay. Throws nothing of
 * its own. Method: straight between the delays studied; in proportion to the share between none (the even
 * check, no loss) and the share studied.
 * Example: half the stand 7 days late costs 5 %; a quarter 7 days late is interpolated to 2.5 %.
 */
export function shareAndAmount(
  lateShare: number,
  amount: number,
  study: StudiedResponse,
): Outcome<{ lossPercent: number; basis: 'measured' | 'interpolated' }> {
  if (lateShare === 0 || amount === 0) return value({ lossPercent: 0, basis: 'measured' });
  const amountMax = study.losses[study.losses.length - 1]?.at ?? 0;
  if (lateShare > study.studiedShare + SAME_NUMBER) {
    return insufficient(
      'beyond-study',
      `at most ${spokenNumber(study.studiedShare * 100)} % of plants late`,
      `${spokenNumber(lateShare * 100)} %`,
    );
  }
  if (amount > amountMax + SAME_NUMBER) {
    return insufficient(
      'beyond-study',
      `a delay up to ${amountMax} ${study.amountUnit}`,
      `${spokenNumber(amount)} ${study.amountUnit}`,
    );
  }
  const atStudiedShare = Math.abs(lateShare - study.studiedShare) <= SAME_NUMBER;
  const lossAtShare = interpolate(study.losses, amount);
  return value({
    lossPercent: (lossAtShare * Math.min(lateShare, study.studiedShare)) / study.studiedShare,
    basis: atStudiedShare && isAnchor(study.losses, amount) ? 'measured' : 'interpolated',
  });
}
