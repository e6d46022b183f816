/**
 * Both ends in one text, the unit said once: `intervalText(28100, 31900, (n) => decimalText(n, 0))` is
 * "28,100 to 31,900". Throws when the ends are the wrong way round.
 */
export function intervalText(
  lower: number,
  upper: number,
  endText: (value: number) => string,
  unit?: string,
): string {
  if (lower > upper)
    throw new RangeError(`An interval must go up: its lower end is ${lower}, its upper end ${upper}.`);
  const ends = `${endText(lower)} to ${endText(upper)}`;
  return unit ? `${ends} ${unit}` : ends;
}
