import type { SaidPenalty } from '@/lib/schemas/figures';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { decimalText } from '@/lib/format/decimal-text';
import { yieldText } from '@/lib/format/yield-text';

/** A loss as it is said, with its own unit: the studies do not share one. "0.9 to 3.0 %", "8.3 bu/ac". */
export function penaltyText({ lossLow, lossHigh, unit }: SaidPenalty, units: UnitSystem, withYieldUnit = true): string {
  const inYield = unit === 'bushels-per-acre';
  const decimals = inYield && units === 'metric' ? 2 : 1;
  const plain = (loss: number) =>
    inYield ? yieldText(loss, units, { decimals, withUnit: false }) : decimalText(loss, decimals);
  const high = inYield ? yieldText(lossHigh, units, { decimals, withUnit: withYieldUnit }) : `${plain(lossHigh)} %`;
  return plain(lossLow) === plain(lossHigh) ? high : `${plain(lossLow)} to ${high}`;
}

/** What the loss is a part of, where that is not said by its unit. */
export function penaltyOf({ unit }: SaidPenalty): string {
  switch (unit) {
    case 'percent-of-even-stand':
      return 'of the even stand';
    case 'percent-of-three-plants':
      return 'of three neighboring plants';
    case 'percent-of-yield':
      return 'of the yield';
    case 'bushels-per-acre':
      return 'of yield';
  }
}
