import { insufficient, mapOutcome, value } from '../outcome';
import type { Outcome } from '../outcome';
import { blockAnalysis } from './block-analysis';
import { environmentsOf, type EnvironmentStrip } from './environment-strip';
import { studentQuantile } from './student-t';

export type OwnError = {
  standardError: number;
  lower: number;
  upper: number;
  meanSquareError: number;
  errorDegreesOfFreedom: number;
  blocks: number;
};

export type EnvironmentDifference = {
  environment: string;
  /** `first` less `second`, least squares; from the blocks that hold both where there is too little for that. */
  difference: Outcome<number>;
  /** The environment's own error and 95 % interval; insufficient where it has one block. */
  ownError: Outcome<OwnError>;
};

/**
 * How far apart are two settings in each field or year, by its own strips?
 *
 * Takes strips with environment, block, setting and figure, and the two settings. Returns per environment the difference with
 * its own error, in the figure's unit. Insufficient, each for itself: where the two share no block; error and interval
 * also where there is one block or strips do not vary. Throws ImpossibleInput as blockAnalysis does.
 * Method: blockAnalysis of that environment alone; a single block shows a difference but no error.
 * Example: Trebi less Manchuria: 24.8 in 1931 (error mean square 162.9), 22.8 in 1932 (198.0).
 */
export function environmentDifferences(
  strips: readonly EnvironmentStrip[],
  first: string,
  second: string,
): EnvironmentDifference[] {
  return environmentsOf(strips).map(({ environment, strips: own }) => {
    const analysis = blockAnalysis(own);
    const pair =
      analysis.kind === 'value'
        ? analysis.value.differences.find(
            (each) =>
              (each.first === first && each.second === second) ||
              (each.first === second && each.second === first),
          )
        : undefined;
    if (analysis.kind === 'insufficient' || !pair) {
      const difference = withinBlocks(own, first, second);
      const notAnalyzed = insufficient('single-strips', '2 strips of each setting', 'fewer');
      return { environment, difference, ownError: analysis.kind === 'insufficient' ? analysis : notAnalyzed };
    }
    const difference = pair.first === first ? pair.difference : -pair.difference;
    return {
      environment,
      difference: value(difference),
      ownError: mapOutcome(analysis, ({ meanSquareError, errorDegreesOfFreedom, blocks }) => {
        const reach = studentQuantile(0.975, errorDegreesOfFreedom) * pair.standardError;
        return {
          standardError: pair.standardError,
          lower: difference - reach,
          upper: difference + reach,
          meanSquareError,
          errorDegreesOfFreedom,
          blocks,
        };
      }),
    };
  });
}

/** The mean of the differences in blocks that hold both settings. */
function withinBlocks(strips: readonly EnvironmentStrip[], first: string, second: string): Outcome<number> {
  const differences = [...new Set(strips.map((strip) => strip.block))].flatMap((block) => {
    const mean = (setting: string) => {
      const own = strips.filter((strip) => strip.block === block && strip.setting === setting);
      return own.length > 0 ? own.reduce((sum, strip) => sum + strip.figure, 0) / own.length : null;
    };
    const one = mean(first);
    const other = mean(second);
    return one === null || other === null ? [] : [one - other];
  });
  if (differences.length === 0) return insufficient('no-shared-block', '1 block with both settings', 'none');
  return value(differences.reduce((sum, difference) => sum + difference, 0) / differences.length);
}
