import { chainOutcome, insufficient, value } from '../outcome';
import type { Outcome } from '../outcome';
import { blockAnalysis, type BlockAnalysis } from './block-analysis';
import { environmentsOf, inOneTrial, type EnvironmentStrip } from './environment-strip';
import { upperTailF } from './f-distribution';

export type VarianceTest = { fRatio: number; numeratorDf: number; denominatorDf: number; p: number };

export type SettingByEnvironment = {
  /** Each field or year on its own, with its own error mean square; insufficient where it has one block. */
  environments: { environment: string; analysis: Outcome<BlockAnalysis> }[];
  /** Largest error mean square of an environment over the smallest; pooling assumes they are alike. */
  errorRatio: number;
  /** All strips with environments as more blocks: settings are taken to do the same everywhere. */
  withoutInteraction: BlockAnalysis;
  interaction: VarianceTest & { squares: number; meanSquare: number };
  /** Error once settings may do otherwise in each environment, pooled over them. */
  error: { meanSquare: number; degreesOfFreedom: number };
  /** For these environments and no others. */
  settingsAgainstError: VarianceTest;
  /** Settings × environment as the error: for environments that stand for others. */
  settingsAgainstInteraction: VarianceTest;
};

/**
 * Do the settings do the same in every field or year, and do they differ over all of them?
 *
 * Takes one figure per strip with its environment, block and setting; block names need to be distinct only within an environment. Returns each
 * environment's own analysis, the analysis of all strips without settings × environment, the test of that interaction, and
 * the settings tested with it, against the strips' error and against the interaction. Figures in their own unit.
 * Insufficient: fewer than two environments; what blockAnalysis finds too little over all; an environment whose
 * settings share no blocks or whose strips do not vary; no degrees of freedom left for interaction or error.
 * Throws ImpossibleInput as blockAnalysis does.
 * Equation: figure = environment + block in environment + setting + setting × environment + error; sums of squares in this order.
 * Method: Cochran & Cox 1957, Experimental Designs, ch. 14; as aov(y ~ environment / block + setting * environment) in R.
 * What it does not tell: with two or three environments hardly anything of others. With lost strips the test against the
 * interaction is approximate. Example: Immer's barleys in two years: interaction F 0.40 on 4 and 40, p 0.80; settings
 * against it F 18.2 on 4 and 4, p 0.008.
 */
export function settingByEnvironment(strips: readonly EnvironmentStrip[]): Outcome<SettingByEnvironment> {
  const environments = environmentsOf(strips).map(({ environment, strips: own }) => ({
    environment,
    analysis: blockAnalysis(own),
  }));
  if (environments.length < 2) {
    return insufficient('one-environment', '2 fields or years', `${environments.length}`);
  }
  return chainOutcome(blockAnalysis(inOneTrial(strips)), (pooled) => tested(environments, pooled));
}

function tested(
  environments: SettingByEnvironment['environments'],
  withoutInteraction: BlockAnalysis,
): Outcome<SettingByEnvironment> {
  const unclear = environments.flatMap(({ analysis }) =>
    analysis.kind === 'insufficient' && !FITTED_EXACTLY.has(analysis.reason) ? [analysis] : [],
  )[0];
  if (unclear) return unclear;
  const own = environments.flatMap(({ analysis }) => (analysis.kind === 'value' ? [analysis.value] : []));
  const sum = (part: (analysis: BlockAnalysis) => number) =>
    own.reduce((total, each) => total + part(each), 0);
  const errorDf = sum((each) => each.errorDegreesOfFreedom);
  const interactionDf = withoutInteraction.errorDegreesOfFreedom - errorDf;
  if (errorDf < 1 || interactionDf < 1) {
    return insufficient(
      'no-error-degrees-of-freedom',
      'settings that meet in 2 environments, in 2 blocks of one of them',
      `${errorDf} degrees of freedom for error, ${interactionDf} for settings × environment`,
    );
  }
  const errorSquares = sum(squaresOf);
  const errorMeanSquare = errorSquares / errorDf;
  // Rounding may leave a difference of two equal sums a hair below zero.
  const interactionSquares = Math.max(0, squaresOf(withoutInteraction) - errorSquares);
  const interactionMeanSquare = interactionSquares / interactionDf;
  if (interactionMeanSquare <= 1e-12 * errorMeanSquare) {
    return insufficient(
      'no-variation',
      'differences that vary between environments',
      'the same in all of them',
    );
  }
  const { settingDegreesOfFreedom } = withoutInteraction;
  const settingMeanSquare = withoutInteraction.fRatio * withoutInteraction.meanSquareError;
  const meanSquares = own.map((each) => each.meanSquareError);
  return value({
    environments,
    errorRatio: Math.max(...meanSquares) / Math.min(...meanSquares),
    withoutInteraction,
    interaction: {
      squares: interactionSquares,
      meanSquare: interactionMeanSquare,
      ...varianceTest(interactionMeanSquare / errorMeanSquare, interactionDf, errorDf),
    },
    error: { meanSquare: errorMeanSquare, degreesOfFreedom: errorDf },
    settingsAgainstError: varianceTest(settingMeanSquare / errorMeanSquare, settingDegreesOfFreedom, errorDf),
    settingsAgainstInteraction: varianceTest(
      settingMeanSquare / interactionMeanSquare,
      settingDegreesOfFreedom,
      interactionDf,
    ),
  });
}

/** Environments that are too small to be tested are fitted to the last strip: they add nothing to the error. */
const FITTED_EXACTLY: ReadonlySet<string> = new Set([
  'one-block',
  'single-strips',
  'no-error-degrees-of-freedom',
]);

function squaresOf(analysis: BlockAnalysis): number {
  return analysis.meanSquareError * analysis.errorDegreesOfFreedom;
}

function varianceTest(fRatio: number, numeratorDf: number, denominatorDf: number): VarianceTest {
  return { fRatio, numeratorDf, denominatorDf, p: upperTailF(fRatio, numeratorDf, denominatorDf) };
}
