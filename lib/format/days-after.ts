const millisecondsPerDay = 86_400_000;

/** Whole calendar days from one local day to another, for "day 8": negative where the second lies before the first. */
export function daysAfter(from: string, to: string): number {
  return (Date.parse(`${to}T00:00:00Z`) - Date.parse(`${from}T00:00:00Z`)) / millisecondsPerDay;
}
