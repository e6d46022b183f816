import { restrictionHoursMost } from '@/lib/schemas/field-limits';

/** Hours of a restricted-entry interval as typed, such as 12 or 4.5; undefined for anything else. */
export function hoursTyped(text: string): number | undefined {
  const plain = text.trim().replace(',', '.');
  if (!/^\d{1,4}(\.\d{1,2})?$/.test(plain)) return undefined;
  const hours = Number(plain);
  return hours > 0 && hours <= restrictionHoursMost ? hours : undefined;
}
