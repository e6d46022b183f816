import { insufficient, value, type Outcome } from './outcome';
import { requiredNumber } from './required-number';

export type RowSpacings = { spacingsInches: readonly number[]; theoreticalSpacingInches: number };

export type PlacementShares = { multiplesShare: number; singlesShare: number; missesShare: number };

export type Placement = {
  spacings: number;
  /** Multiples, singles, one skip, two skips, three or more. */
  regions: [number, number, number, number, number];
  /** Kachman and Smith 1995: shares of all spacings. */
  ofSpacings: PlacementShares;
  /** ISO 7256-1:1984: shares of the theoretical places the spacings cover. */
  ofPlaces: PlacementShares;
  theoreticalPlaces: number;
  /** SD of the singles over the theoretical spacing; 0.29 is its practical upper limit. */
  precision: Outcome<number>;
};

/**
 * How well did the planter singulate: how many spacings are multiples, singles and misses?
 *
 * Takes the spacings of one or more rows in inches (0 or more), each with the theoretical spacing of its
 * seeding rate (above 0). Returns shares by both published ways of counting. Insufficient without a spacing;
 * precision also with fewer than two singles. Throws ImpossibleInput for negative spacings.
 *
 * Method: x = spacing / theoretical. Multiple x ≤ 0.5, single x ≤ 1.5, one skip x ≤ 2.5, two x ≤ 3.5, three or
 * more above; limits closed on the right, x rounded to 1e-9 first because decimals give 1.5000000000000002.
 * Kachman and Smith 1995, Trans. ASAE 38:379, count over spacings; ISO 7256-1:1984 over places: a single
 * covers one, a skip of k covers k + 1, a multiple none of its own (both from memory, checked against
 * reference values). More than three skips in a row count as three.
 * From plants that came up, a miss may be a seed that failed and not a place the planter skipped.
 * Example: 14 spacings with 1 multiple, 11 singles, 1 single and 1 double skip: 7.14, 78.57, 14.29 % of
 * spacings, 6.25, 75 and 18.75 % of places.
 */
export function kachmanSmith(rows: readonly RowSpacings[]): Outcome<Placement> {
  const ratios = rows.flatMap(spacingRatios);
  const count = ratios.length;
  if (count === 0) return insufficient('too-few-spacings', '1 spacing, that is 2 plants', '0 spacings');
  const regions: Placement['regions'] = [0, 0, 0, 0, 0];
  for (const ratio of ratios) regions[regionOf(ratio)] += 1;
  const [multiples, singles, oneSkip, twoSkips, threeSkips] = regions;
  const misses = oneSkip + twoSkips + threeSkips;
  const missedPlaces = oneSkip + 2 * twoSkips + 3 * threeSkips;
  const theoreticalPlaces = singles + misses + missedPlaces;
  return value({
    spacings: count,
    regions,
    ofSpacings: {
      multiplesShare: multiples / count,
      singlesShare: singles / count,
      missesShare: misses / count,
    },
    ofPlaces: placeShares(multiples, missedPlaces, theoreticalPlaces),
    theoreticalPlaces,
    precision: precisionOf(ratios.filter((ratio) => regionOf(ratio) === 1)),
  });
}

function spacingRatios(row: RowSpacings): number[] {
  requiredNumber(row.theoreticalSpacingInches, 'theoreticalSpacingInches', { above: 0 });
  return row.spacingsInches.map((spacing) => {
    requiredNumber(spacing, 'spacingsInches', { atLeast: 0 });
    return spacing / row.theoreticalSpacingInches;
  });
}

function regionOf(exactRatio: number): 0 | 1 | 2 | 3 | 4 {
  const ratio = Math.round(exactRatio * 1e9) / 1e9;
  if (ratio <= 0.5) return 0;
  if (ratio <= 1.5) return 1;
  if (ratio <= 2.5) return 2;
  return ratio <= 3.5 ? 3 : 4;
}

function placeShares(multiples: number, missedPlaces: number, places: number): PlacementShares {
  // Rows of nothing but multiples cover no place of their own; then the multiples are all there is.
  if (places === 0) return { multiplesShare: 1, singlesShare: 0, missesShare: 0 };
  return {
    multiplesShare: multiples / places,
    singlesShare: (places - multiples - missedPlaces) / places,
    missesShare: missedPlaces / places,
  };
}

function precisionOf(singles: readonly number[]): Outcome<number> {
  if (singles.length < 2) return insufficient('too-few-singles', '2 single spacings', `${singles.length}`);
  const mean = singles.reduce((sum, ratio) => sum + ratio, 0) / singles.length;
  const squares = singles.reduce((sum, ratio) => sum + (ratio - mean) ** 2, 0);
  return value(Math.sqrt(squares / (singles.length - 1)));
}
