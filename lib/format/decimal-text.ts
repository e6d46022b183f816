type DecimalOptions = {
  /** A plus before what is above zero, for differences. */
  signed?: boolean;
};

/** The true minus, as wide as a plus; both faces have it. */
export const minusSign = '\u2212';

/**
 * Writes a number with a fixed count of decimals, halves away from zero, thousands apart by commas, a true minus and
 * never a minus before zero. Throws for what is no finite number: a missing value has words of its own.
 * For example `decimalText(-30747.5, 0)` is "−30,748".
 */
export function decimalText(
  value: number,
  decimals: number,
  { signed = false }: DecimalOptions = {},
): string {
  if (!Number.isFinite(value)) throw new RangeError(`A number to be shown must be finite, not ${value}.`);
  return new Intl.NumberFormat('en-US', {
    minimumFractionDigits: decimals,
    maximumFractionDigits: decimals,
    signDisplay: signed ? 'exceptZero' : 'negative',
  })
    .format(value)
    .replace('-', minusSign);
}
