import type { TapePlant } from './tape-plant';

/** How far a plant is drawn from the tape: the earlier it came up, the farther; least of all when nobody saw its day. */
export function plantHeight(plant: TapePlant, least: number, most: number): number {
  if (plant.earliness === null) return least;
  return least + Math.min(1, Math.max(0, plant.earliness)) * (most - least);
}

/** Which of the three heads it wears. */
export function plantLook(plant: TapePlant): 'on-time' | 'late' | 'unknown' {
  if (plant.late) return 'late';
  return plant.earliness === null ? 'unknown' : 'on-time';
}
