import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { quantityText } from './quantity-text';
import { shownInUnits } from './shown-in-units';
import type { TextOptions } from './text-options';

type PlantsPerAreaOptions = TextOptions & {
  /** 100 for means over many rows, where single plants claim too much. */
  nearest?: 1 | 100;
};

/** `plantsPerAreaText(30748.2, 'us')` is "30,748 plants per acre". */
export function plantsPerAreaText(
  plantsPerAcre: number,
  units: UnitSystem,
  { nearest = 1, ...options }: PlantsPerAreaOptions = {},
): string {
  if (nearest === 1) return quantityText(plantsPerAcre, 'plants-per-area', units, 0, options);
  // Rounded in the unit that is shown, or a hectare would show odd hundreds.
  const shownPerUs = shownInUnits(1, 'plants-per-area', units);
  const rounded = Math.round((plantsPerAcre * shownPerUs) / nearest) * nearest;
  return quantityText(rounded / shownPerUs, 'plants-per-area', units, 0, options);
}
