/**
 * How is a number said inside the words of an insufficient answer?
 *
 * Takes a finite number, returns it with at most one decimal as text. Never insufficient, throws nothing.
 * Figures are never rounded here: those words are not a figure, and what a screen shows passes lib/format.
 * Example: 27.3333 is said as 27.3, 34 as 34.
 */
export function spokenNumber(amount: number): string {
  return String(Math.round(amount * 10) / 10);
}
