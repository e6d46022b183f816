import type { Question } from '@/lib/errors/app-error';
import { readingIn, type Reading } from '@/lib/schemas/reading';

/** Zones that are larger together than their field are asked about: one of the areas is likely a slip. */
export function zoneQuestions(zones: readonly { area: Reading }[], fieldArea: Reading | null): Question[] {
  if (!fieldArea) return [];
  const acres = zones.reduce((sum, zone) => sum + readingIn(zone.area, 'acres'), 0);
  const fieldAcres = readingIn(fieldArea, 'acres');
  if (acres <= fieldAcres * 1.001) return [];
  return [{ rule: 'zones-exceed-field', about: 'zones', sentence: `The zones add up to more than the field's ${fieldArea.typed} ${fieldArea.unit}. Is that right?` }];
}
