import { SAME_NUMBER } from './constants';
import { insufficient, value, type Outcome } from './outcome';
import { requiredNumber } from './required-number';

/** Closer than this to the plant before (Novak and Ransom: 5.1 cm). */
export const DOUBLE_BELOW_INCHES = 2;

/** A stretch without a plant as long as this or longer (Novak and Ransom: 30.5 cm). */
export const GAP_FROM_INCHES = 12;

export type DoublesAndGaps = {
  spacings: number;
  doubles: number;
  doublesShare: number;
  gaps: number;
  gapsShare: number;
  gapLengthsInches: number[];
  gapInchesTotal: number;
};

/**
 * Which plants crowd each other, and where is the row empty?
 *
 * Takes spacings in inches (0 or more) of one or more rows joined. Returns doubles and gaps as numbers and as
 * shares of the spacings, and each gap's length in inches, in order. Insufficient without a spacing. Throws
 * ImpossibleInput for negative spacings.
 * Method: double below 2 in, gap from 12 in, whatever the seeding rate (Novak and Ransom 2018). Not to be
 * mixed with multiples and misses, which are relative to the theoretical spacing. An empty stretch between an
 * end mark and the first or last plant is not seen.
 * Example: spacings 2 15 16 5 1 5 8 3 5 8 in hold 1 double and gaps of 15 and 16 in.
 */
export function doublesAndGaps(spacings: readonly number[]): Outcome<DoublesAndGaps> {
  spacings.forEach((spacing) => requiredNumber(spacing, 'spacings', { atLeast: 0 }));
  const count = spacings.length;
  if (count === 0) return insufficient('too-few-spacings', '1 spacing, that is 2 plants', '0 spacings');
  const doubles = spacings.filter((spacing) => spacing < DOUBLE_BELOW_INCHES - SAME_NUMBER).length;
  const gapLengthsInches = spacings.filter((spacing) => spacing >= GAP_FROM_INCHES - SAME_NUMBER);
  return value({
    spacings: count,
    doubles,
    doublesShare: doubles / count,
    gaps: gapLengthsInches.length,
    gapsShare: gapLengthsInches.length / count,
    gapLengthsInches,
    gapInchesTotal: gapLengthsInches.reduce((sum, gap) => sum + gap, 0),
  });
}
