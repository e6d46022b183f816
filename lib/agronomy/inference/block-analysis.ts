import { ImpossibleInput, insufficient, value } from '../outcome';
import type { Insufficient, Outcome } from '../outcome';
import { requiredNumber } from '../required-number';
import { blockConnection } from './block-connection';
import { upperTailF } from './f-distribution';
import { invertedPositive, symmetricForm } from './linear-algebra';

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
  const stripsOf = (setting: string) => strips.filter((strip) => strip.setting === setting);
  const settings = allSettings.filter((setting) => stripsOf(setting).length > 1);
  const used = strips.filter((strip) => settings.includes(strip.setting));
  const blocks = distinct(used.map((strip) => strip.block));
  const refusal = tooLittle(strips, settings, blocks, used);
  if (refusal) return refusal;

  const fit = leastSquares(used, blocks, settings);
  const errorDegreesOfFreedom = used.length - blocks.length - settings.length + 1;
  const meanSquareError = fit.residualSquares / errorDegreesOfFreedom;
  const largest = Math.max(...used.map((strip) => Math.abs(strip.figure)));
  if (meanSquareError <= (1e-10 * largest) ** 2) {
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
      strips: stripsOf(setting).length,
      leastSquaresMean: fit.mean(setting),
      standardError: standardError(fit.meanContrast(setting)),
    })),
    leftOut: strips
      .filter((strip) => !settings.includes(strip.setting))
      .map(({ setting, figure }) => ({ setting, figure })),
    blocks: blocks.length,
    strips: used.length,
    missingStrips: missingCells(used, blocks, settings),
    meanSquareError,
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

/** Least squares on block columns and all setting columns but the last, around the grand mean. */
function leastSquares(used: readonly StripFigure[], blocks: readonly string[], settings: readonly string[]) {
  const grandMean = used.reduce((sum, strip) => sum + strip.figure, 0) / used.length;
  const columns = blocks.length + settings.length - 1;
  const normal = Array.from({ length: columns }, () => new Array<number>(columns).fill(0));
  const right = new Array<number>(columns).fill(0);
  const columnsOf = (strip: StripFigure) => {
    const settingColumn = settings.indexOf(strip.setting);
    const own = [blocks.indexOf(strip.block)];
    return settingColumn < settings.length - 1 ? [...own, blocks.length + settingColumn] : own;
  };
  for (const strip of used) {
    for (const row of columnsOf(strip)) {
      right[row] = (right[row] as number) + strip.figure - grandMean;
      for (const column of columnsOf(strip)) {
        (normal[row] as number[])[column] = ((normal[row] as number[])[column] as number) + 1;
      }
    }
  }
  const inverse = invertedPositive(normal);
  const effects = inverse.map((row) => product(row, right));
  const meanContrast = (setting: string): number[] => {
    const column = blocks.length + settings.indexOf(setting);
    return effects.map((_, index) => (index < blocks.length ? 1 / blocks.length : index === column ? 1 : 0));
  };
  const fitted = (strip: StripFigure) =>
    columnsOf(strip).reduce((sum, column) => sum + (effects[column] as number), grandMean);
  const residualSquares = squares(used.map((strip) => strip.figure - fitted(strip)));
  const blockMeans = new Map(
    blocks.map((block) => {
      const own = used.filter((strip) => strip.block === block);
      return [block, own.reduce((sum, strip) => sum + strip.figure, 0) / own.length] as const;
    }),
  );
  // The settings' share, as fitted values less block means, stays exact where a difference of two large sums would not.
  const settingSquares = squares(
    used.map((strip) => fitted(strip) - (blockMeans.get(strip.block) as number)),
  );
  return {
    inverse,
    residualSquares,
    settingSquares,
    meanContrast,
    mean: (setting: string) => grandMean + product(meanContrast(setting), effects),
  };
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

function product(first: readonly number[], second: readonly number[]): number {
  return first.reduce((sum, entry, index) => sum + entry * (second[index] as number), 0);
}

function squares(numbers: readonly number[]): number {
  return numbers.reduce((sum, entry) => sum + entry * entry, 0);
}
