import type { StripFigure } from './block-analysis';
import { invertedPositive } from './linear-algebra';

export type BlockLeastSquares = {
  /** Least-squares mean of a setting: over all blocks alike. */
  mean: (setting: string) => number;
  /** The weights that make that mean from the fitted effects, for the variance of any contrast of means. */
  meanContrast: (setting: string) => number[];
  /** Variances of the fitted effects in units of the error variance. */
  inverse: number[][];
  residualSquares: number;
  /** Sum of squares of the settings once blocks are taken out. */
  settingSquares: number;
  errorDegreesOfFreedom: number;
  /** Nothing is left of the figures but rounding: strips that do not vary show no error. */
  isExact: boolean;
};

/**
 * What do block + setting say of every strip, by least squares?
 *
 * Takes strips and the names of their blocks and settings, connected through shared blocks. Returns means, their weights and
 * the sums of squares, in the figure's unit (squared). Never insufficient: who calls has looked whether there is enough.
 * Throws ImpossibleInput when no chain of shared blocks connects the settings.
 * Equation: figure = block + setting + error, on block columns and all setting columns but the last, around the grand
 * mean so that large figures lose no digits.
 * Example: complete blocks: the plain mean of each setting.
 */
export function blockLeastSquares(
  used: readonly StripFigure[],
  blocks: readonly string[],
  settings: readonly string[],
): BlockLeastSquares {
  const blockOf = new Map(blocks.map((block, index) => [block, index]));
  const settingOf = new Map(settings.map((setting, index) => [setting, index]));
  const places = used.map((strip) => ({
    block: blockOf.get(strip.block) as number,
    setting: settingOf.get(strip.setting) as number,
    figure: strip.figure,
  }));
  const grandMean = used.reduce((sum, strip) => sum + strip.figure, 0) / used.length;
  const { normal, right, blockSums } = normalEquations(places, blocks.length, settings.length, grandMean);
  const inverse = invertedPositive(normal);
  const effects = inverse.map((row) => product(row, right));
  const fitted = places.map(
    ({ block, setting }) => grandMean + (effects[block] as number) + (effects[blocks.length + setting] ?? 0),
  );
  const residualSquares = squares(places.map(({ figure }, index) => figure - (fitted[index] as number)));
  // The settings' share, as fitted values less block means, stays exact where a difference of two large sums would not.
  const settingSquares = squares(
    places.map(({ block }, index) => {
      const { sum, strips } = blockSums[block] as BlockSum;
      return (fitted[index] as number) - grandMean - sum / strips;
    }),
  );
  const meanContrast = (setting: string): number[] => {
    const column = blocks.length + (settingOf.get(setting) as number);
    return effects.map((_, index) => (index < blocks.length ? 1 / blocks.length : index === column ? 1 : 0));
  };
  const errorDegreesOfFreedom = used.length - blocks.length - settings.length + 1;
  const largest = Math.max(...used.map((strip) => Math.abs(strip.figure)));
  return {
    inverse,
    residualSquares,
    settingSquares,
    errorDegreesOfFreedom,
    isExact: residualSquares <= errorDegreesOfFreedom * (1e-10 * largest) ** 2,
    meanContrast,
    mean: (setting) => grandMean + product(meanContrast(setting), effects),
  };
}

type Place = { block: number; setting: number; figure: number };
type BlockSum = { sum: number; strips: number };

function normalEquations(
  places: readonly Place[],
  blockCount: number,
  settingCount: number,
  grandMean: number,
) {
  const columns = blockCount + settingCount - 1;
  const normal = Array.from({ length: columns }, () => new Array<number>(columns).fill(0));
  const right = new Array<number>(columns).fill(0);
  const blockSums: BlockSum[] = Array.from({ length: blockCount }, () => ({ sum: 0, strips: 0 }));
  for (const { block, setting, figure } of places) {
    const own = setting < settingCount - 1 ? [block, blockCount + setting] : [block];
    for (const row of own) {
      right[row] = (right[row] as number) + figure - grandMean;
      const cells = normal[row] as number[];
      for (const column of own) cells[column] = (cells[column] as number) + 1;
    }
    const total = blockSums[block] as BlockSum;
    total.sum += figure - grandMean;
    total.strips += 1;
  }
  return { normal, right, blockSums };
}

function product(first: readonly number[], second: readonly number[]): number {
  return first.reduce((sum, entry, index) => sum + entry * (second[index] as number), 0);
}

function squares(numbers: readonly number[]): number {
  return numbers.reduce((sum, entry) => sum + entry * entry, 0);
}
