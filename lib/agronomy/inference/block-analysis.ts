import { ImpossibleInput, insufficient, value } from '../outcome';
import type { Insufficient, Outcome } from '../outcome';
import { requiredNumber } from '../required-number';
import { blockConnection } from './block-connection';
import { upperTailF } from './f-distribution';
import { blockLeastSquares } from './block-least-squares';
import { symmetricForm } from './linear-algebra';

export const COMPARED_SETTINGS_MAX = 24;

/** One strip's figure. Row samples are averaged or pooled into it before: the strip is the unit. */
export type StripFigure = { block: string; setting: string; figure: number };

export type SettingMean = {
  setting: string;
  strips: number;
  leastSquaresMean: number;
  standardError: number;
};

/** `difference` is the mean of `first` less that of `second`. */
export type SettingDifference = { first: string; second: string; difference: number; standardError: number };

export type BlockAnalysis = {
  /** The analyzed settings, in the order in which they first came. */
  means: SettingMean[];
  /** Settings with a single strip: described elsewhere, not tested, since one strip shows no variance. */
  leftOut: { setting: string; figure: number }[];
  blocks: number;
  strips: number;
  /** Strips that complete blocks would have had and these do not. */
  missingStrips: number;
  meanSquareError: number;
  /** Its root: how far strips of one setting and block lie apart, in the figure's own unit. */
  errorSd: number;
  errorDegreesOfFreedom: number;
  settingDegreesOfFreedom: number;
  fRatio: number;
  p: number;
  /** Every pair of analyzed settings once, the earlier one first. */
  differences: SettingDifference[];
};

/**
 * How do the settings compare once the differences between blocks are taken out?
 *
 * Takes one figure per strip with its block and setting; a lost strip is simply not there. Returns least-squares
 * means with standard errors, the error mean square with its degrees of freedom, F and p of the settings, and the
 * difference of every pair. Units are those of the figure.
 * Insufficient: fewer than two blocks; fewer than two settings with two strips; settings that no chain of shared
 * blocks connects; no degrees of freedom left for error; strips that do not vary. Throws ImpossibleInput for a
 * figure that is no number or more than 24 settings.
 * Equation: figure = block + setting + error, by least squares; a setting's mean is taken over all blocks alike.
 * Method: Cochran & Cox 1957, Experimental Designs, ch. 4; least-squares means as in Searle, Speed & Milliken 1980,
 * The American Statistician 34:216. A setting with a single strip is fitted exactly and would change nothing, so it is left out.
 * What it does not tell: whether the strips were placed by chance, and anything of single plants or rows.
 * Example: five barleys in six blocks (Immer 1934): MSE 162.89 on 20 df, F 4.231, p 0.0121.
 */
export function blockAnalysis(strips: readonly StripFigure[]): Outcome<BlockAnalysis> {
  for (const strip of strips) requiredNumber(strip.figure, 'figure');
  const allSettings = distinct(strips.map((strip) => strip.setting));
  if (allSettings.length > COMPARED_SETTINGS_MAX) {
    throw new ImpossibleInput(
      `A comparison takes at most ${COMPARED_SETTINGS_MAX} settings; there are ${allSettings.length}.`,
      'settings',
    );
  }
  const stripsOf = new Map(allSettings.map((setting) => [setting, 0]));
  for (const { setting } of strips) stripsOf.set(setting, (stripsOf.get(setting) as number) + 1);
  const isCompared = (setting: string) => (stripsOf.get(setting) as number) > 1;
  const settings = allSettings.filter(isCompared);
  const used = strips.filter((strip) => isCompared(strip.setting));
  const blocks = distinct(used.map((strip) => strip.block));
  const refusal = tooLittle(strips, settings, blocks, used);
  if (refusal) return refusal;

  const fit = blockLeastSquares(used, blocks, settings);
  const { errorDegreesOfFreedom } = fit;
  const meanSquareError = fit.residualSquares / errorDegreesOfFreedom;
  if (fit.isExact) {
    return insufficient(
      'no-variation',
      'strips that vary within a setting',
      'the same difference in every block',
    );
  }
  const settingDegreesOfFreedom = settings.length - 1;
  const fRatio = fit.settingSquares / settingDegreesOfFreedom / meanSquareError;
  const standardError = (contrast: readonly number[]) =>
    Math.sqrt(meanSquareError * symmetricForm(fit.inverse, contrast));

  return value({
    means: settings.map((setting) => ({
      setting,
      strips: stripsOf.get(setting) as number,
      leastSquaresMean: fit.mean(setting),
      standardError: standardError(fit.meanContrast(setting)),
    })),
    leftOut: strips
      .filter((strip) => !isCompared(strip.setting))
      .map(({ setting, figure }) => ({ setting, figure })),
    blocks: blocks.length,
    strips: used.length,
    missingStrips: missingCells(used, blocks, settings),
    meanSquareError,
    errorSd: Math.sqrt(meanSquareError),
    errorDegreesOfFreedom,
    settingDegreesOfFreedom,
    fRatio,
    p: upperTailF(fRatio, settingDegreesOfFreedom, errorDegreesOfFreedom),
    differences: settings.flatMap((first, index) =>
      settings.slice(index + 1).map((second) => {
        const minus = fit.meanContrast(second);
        const contrast = fit.meanContrast(first).map((weight, column) => weight - (minus[column] as number));
        return {
          first,
          second,
          difference: fit.mean(first) - fit.mean(second),
          standardError: standardError(contrast),
        };
      }),
    ),
  });
}

function tooLittle(
  strips: readonly StripFigure[],
  settings: readonly string[],
  blocks: readonly string[],
  used: readonly StripFigure[],
): Insufficient | null {
  const allBlocks = distinct(strips.map((strip) => strip.block)).length;
  if (allBlocks < 2) return insufficient('one-block', '2 blocks', allBlocks === 1 ? '1 block' : 'no block');
  if (settings.length < 2) {
    return insufficient('single-strips', '2 settings with 2 strips each', `${settings.length} such settings`);
  }
  if (!blockConnection(used)) {
    return insufficient(
      'not-connected',
      'settings that share blocks',
      'groups of settings with no block in common',
    );
  }
  const degrees = used.length - blocks.length - settings.length + 1;
  if (degrees < 1)
    return insufficient('no-error-degrees-of-freedom', '1 degree of freedom for error', `${degrees}`);
  return null;
}

function missingCells(
  used: readonly StripFigure[],
  blocks: readonly string[],
  settings: readonly string[],
): number {
  const present = new Set(used.map((strip) => JSON.stringify([strip.block, strip.setting])));
  return blocks.length * settings.length - present.size;
}

function distinct(names: readonly string[]): string[] {
  return [...new Set(names)];
}
