import { invertedPositive } from './linear-algebra';
import type { StripFigure } from './block-analysis';

export type ArrangementStatistic = {
  /** The statistic of one arrangement: per block, which setting (by its number) stands on each strip. */
  of: (dealt: readonly (readonly number[])[]) => number;
  /** Calls back with the statistic of every combination of the blocks' choices. */
  forEach: (
    choices: readonly (readonly (readonly number[])[])[],
    callback: (statistic: number) => void,
  ) => void;
  /** The size of the numbers compared, for telling a tie from a difference. */
  scale: number;
};

/**
 * How far apart are the settings in one arrangement, with blocks taken out?
 *
 * Takes the blocks' strips and the settings' names. Returns functions that give the settings' sum of squares
 * (adjusted for blocks) for arrangements of those settings on those strips. Never insufficient; throws nothing of its own.
 * Equation: Q′ C⁻ Q, Q the settings' totals of deviations from block means, C the information on settings, which
 * dealing anew within blocks leaves as it is because the same settings stay in each block.
 * Example: complete blocks: the sum of the squared totals, divided by the number of blocks.
 */
export function arrangementStatistic(
  blocks: readonly (readonly StripFigure[])[],
  settings: readonly string[],
): ArrangementStatistic {
  const deviations = blocks.map((block) => {
    const mean = block.reduce((sum, strip) => sum + strip.figure, 0) / block.length;
    return block.map((strip) => strip.figure - mean);
  });
  const inverse = generalizedInverse(blocks, settings);
  const fromTotals = (totals: readonly number[]): number => {
    let sum = 0;
    for (let row = 0; row < totals.length; row += 1) {
      const weights = inverse[row] as number[];
      let inner = 0;
      for (let column = 0; column < totals.length; column += 1) {
        inner += (weights[column] as number) * (totals[column] as number);
      }
      sum += inner * (totals[row] as number);
    }
    return sum;
  };
  const added = (totals: number[], hand: readonly number[], blockIndex: number, sign: 1 | -1): void => {
    const own = deviations[blockIndex] as number[];
    for (let strip = 0; strip < hand.length; strip += 1) {
      const setting = hand[strip] as number;
      totals[setting] = (totals[setting] as number) + sign * (own[strip] as number);
    }
  };
  return {
    of: (dealt) => {
      const totals = settings.map(() => 0);
      dealt.forEach((hand, blockIndex) => added(totals, hand, blockIndex, 1));
      return fromTotals(totals);
    },
    forEach: (choices, callback) => {
      const walk = (blockIndex: number, totals: readonly number[]): void => {
        const hands = choices[blockIndex];
        if (!hands) {
          callback(fromTotals(totals));
          return;
        }
        for (const hand of hands) {
          // A fresh copy, because adding and taking away again would let rounding pile up over a million steps.
          const next = totals.slice();
          added(next, hand, blockIndex, 1);
          walk(blockIndex + 1, next);
        }
      };
      walk(
        0,
        settings.map(() => 0),
      );
    },
    scale: deviations.flat().reduce((sum, deviation) => sum + deviation * deviation, 0),
  };
}

/** C plus a constant in every cell is positive definite when the settings are connected, and its inverse serves as C⁻. */
function generalizedInverse(
  blocks: readonly (readonly StripFigure[])[],
  settings: readonly string[],
): number[][] {
  const information = settings.map(() => settings.map(() => 1));
  for (const block of blocks) {
    const counts = settings.map((setting) => block.filter((strip) => strip.setting === setting).length);
    counts.forEach((count, row) => {
      const cells = information[row] as number[];
      cells[row] = (cells[row] as number) + count;
      counts.forEach((other, column) => {
        cells[column] = (cells[column] as number) - (count * other) / block.length;
      });
    });
  }
  return invertedPositive(information);
}
