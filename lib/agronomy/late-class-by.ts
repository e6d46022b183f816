import { SAME_NUMBER } from './constants';
import { ImpossibleInput } from './outcome';
import type { LateClass } from './plant-delays';

/** One leaf collar to V10, in °F degree days (an extension write-up, quoted). */
export const DEGREE_DAYS_F_PER_COLLAR = 82;

export type Behind = { by: 'collars'; collars: number } | { by: 'degree-days'; degreeDaysF: number };

/**
 * Which class is a plant that is so many leaf collars, or so much heat, behind?
 *
 * Takes how far it is behind its neighbors or the first flush, in leaf collars at V3 to V4 or in °F degree days; negative
 * is ahead. Returns its class. Never insufficient; throws ImpossibleInput for a number that is not finite.
 * Method: late from one collar or 82 °F degree days behind, very late from two or 164 (Purdue and an extension write-up,
 * both quoted). *Slow* is a label of days only. One collar is the least that can be seen, so the limit itself is late.
 * Days are lateClassOf's. What lateness costs is each study's own to say.
 * Example: 1 collar behind is late; 81 degree days are on time; 164 are very late.
 */
export function lateClassBy(behind: Behind): LateClass {
  const collars = behind.by === 'collars' ? behind.collars : behind.degreeDaysF / DEGREE_DAYS_F_PER_COLLAR;
  if (!Number.isFinite(collars)) throw new ImpossibleInput('How far a plant is behind is not a number.', behind.by);
  if (collars >= 2 - SAME_NUMBER) return 'very-late';
  return collars >= 1 - SAME_NUMBER ? 'late' : 'on-time';
}
