import { requiredNumber } from './required-number';

export type ChangingHours = { changes: number; hours: number };

/**
 * How long does it take to change the planter from strip to strip of this layout?
 *
 * Takes the settings of the strips in the order in which they are planted, and the minutes one change takes (0 or more).
 * Returns the number of changes, the first set-up not counted, and hours. Never insufficient: a layout without strips takes no
 * change. Throws ImpossibleInput for minutes that cannot be.
 * Equation: changes × minutes / 60, a change wherever two strips in turn have different settings. Own arithmetic.
 * What it does not tell: turning, filling, and whether soil and weather stay the same over so many hours.
 * Example: A B B A planted in turn, 45 minutes a change: 2 changes, 1.5 hours.
 */
export function changingHours(settingsInTurn: readonly string[], minutesPerChange: number): ChangingHours {
  requiredNumber(minutesPerChange, 'minutesPerChange', { atLeast: 0 });
  const changes = settingsInTurn.filter(
    (setting, index) => index > 0 && setting !== settingsInTurn[index - 1],
  ).length;
  return { changes, hours: (changes * minutesPerChange) / 60 };
}
