import { insufficient, value, type Outcome } from './outcome';

export type LatePattern = {
  /** Which published pattern the row is read as. */
  pattern: 'alternating' | 'in-groups';
  meanRunLength: number;
  runs: number;
  latePlants: number;
};

/**
 * Do late plants stand alone or in groups along the row?
 *
 * Takes, for each row, whether each plant in tape order is late. Returns the mean number of late plants in
 * an unbroken run and the published pattern nearest to it. Insufficient without a late plant. Throws nothing.
 * Method: mean run length; runs never bridge two rows or a cut. Nafziger, Carter and Graham (1991) studied late plants
 * alternating (runs of 1) and in threes (runs of 3); below 2, the middle, is read as alternating, 2 and
 * more as in groups. The limit is our own.
 * Runs lengthen with the share of late plants even where their order is chance: at half, chance gives 2.
 * Example: late, in time, late, late is 2 runs with a mean of 1.5, alternating.
 */
export function latePattern(rows: readonly (readonly boolean[])[]): Outcome<LatePattern> {
  let runs = 0;
  let latePlants = 0;
  for (const row of rows) {
    row.forEach((late, index) => {
      if (!late) return;
      latePlants += 1;
      if (index === 0 || !row[index - 1]) runs += 1;
    });
  }
  if (runs === 0) return insufficient('no-late-plants', '1 late plant on a tape sheet', '0 late plants');
  const meanRunLength = latePlants / runs;
  return value({ pattern: meanRunLength < 2 ? 'alternating' : 'in-groups', meanRunLength, runs, latePlants });
}
