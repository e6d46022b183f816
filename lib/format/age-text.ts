/** How long ago, in the largest unit that says it: "under a minute", "12 min", "3 h", "2 days". */
export function ageText(minutes: number): string {
  if (minutes < 1) return 'under a minute';
  if (minutes < 60) return `${minutes} min`;
  if (minutes < 48 * 60) return `${Math.floor(minutes / 60)} h`;
  return `${Math.floor(minutes / 1_440)} days`;
}
