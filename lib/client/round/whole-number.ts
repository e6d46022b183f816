/** A whole number as typed, zero or more and at most so many; undefined for anything else, an empty field too. */
export function wholeNumber(typed: string, most: number): number | undefined {
  const text = typed.trim();
  if (!/^\d{1,6}$/.test(text)) return undefined;
  const number = Number(text);
  return number <= most ? number : undefined;
}
