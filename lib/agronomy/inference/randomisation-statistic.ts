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
  const count = settings.length;
  const inverse = Float64Array.from(generalizedInverse(blocks, settings).flat());
  const fromTotals = (totals: Float64Array): number => {
    let sum = 0;
    for (let row = 0; row < count; row += 1) {
      let inner = 0;
      for (let column = 0; column < count; column += 1) {
        inner += (inverse[row * count + column] as number) * (totals[column] as number);
      }
      sum += inner * (totals[row] as number);
    }
    return sum;
  };
  const add = (totals: Float64Array, hand: readonly number[], blockIndex: number): void => {
    const own = deviations[blockIndex] as number[];
    for (let strip = 0; strip < hand.length; strip += 1) {
      const setting = hand[strip] as number;
      totals[setting] = (totals[setting] as number) + (own[strip] as number);
    }
  };
  return {
    of: (dealt) => {
      const totals = new Float64Array(count);
      dealt.forEach((hand, blockIndex) => add(totals, hand, blockIndex));
      return fromTotals(totals);
    },
    forEach: (choices, callback) => {
      const shares = choices.map((hands, blockIndex) =>
        hands.map((hand) => {
          const share = new Float64Array(count);
          add(share, hand, blockIndex);
          return share;
        }),
      );
      // One array a block, written anew for every hand: adding and taking away again would let rounding pile up over a
      // million steps, and a new array each time would cost more than the sums.
      const totalsAfter = choices.map(() => new Float64Array(count));
      const walk = (blockIndex: number, before: Float64Array): void => {
        const hands = shares[blockIndex];
        const after = totalsAfter[blockIndex];
        if (!hands || !after) {
          callback(fromTotals(before));
          return;
        }
        for (const share of hands) {
          for (let setting = 0; setting < count; setting += 1) {
            after[setting] = (before[setting] as number) + (share[setting] as number);
          }
          walk(blockIndex + 1, after);
        }
      };
      walk(0, new Float64Array(count));
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
