import type { SettingMean } from './block-analysis';
import type { ComparedPair } from './pairwise';

export type SettingLetters = { setting: string; letters: string };

/**
 * Which settings share a letter, and so are not told apart?
 *
 * Takes the means and the compared pairs (Tukey's: one rule for letters, no second one beside it). Returns per
 * setting its letters, from the largest mean down. Never insufficient; throws nothing.
 * Method: insert and absorb, Piepho 2004, Journal of Computational and Graphical Statistics 13:456. Every pair
 * told apart shares no letter, every other pair shares one, and no letter is spent twice on the same settings.
 * What it does not tell: that settings with a common letter are equal.
 * Example: A above B above C, only A and C told apart: A a, B ab, C b.
 */
export function pairwiseLetters(
  means: readonly SettingMean[],
  pairs: readonly ComparedPair[],
): SettingLetters[] {
  const order = [...means]
    .sort((first, second) => second.leastSquaresMean - first.leastSquaresMean)
    .map((mean) => mean.setting);
  let columns = [new Set(order)];
  for (const { first, second } of pairs.filter((pair) => pair.toldApart)) {
    columns = absorbed(
      columns.flatMap((column) =>
        column.has(first) && column.has(second)
          ? [without(column, second), without(column, first)]
          : [column],
      ),
    );
  }
  const place = (column: Set<string>) => order.findIndex((setting) => column.has(setting));
  columns.sort((first, second) => place(first) - place(second));
  return order.map((setting) => ({
    setting,
    letters: columns.map((column, index) => (column.has(setting) ? letter(index) : '')).join(''),
  }));
}

function without(column: ReadonlySet<string>, setting: string): Set<string> {
  return new Set([...column].filter((other) => other !== setting));
}

/** Drops columns whose settings all stand in another one. */
function absorbed(columns: readonly Set<string>[]): Set<string>[] {
  return columns.filter(
    (column, index) =>
      !columns.some(
        (other, otherIndex) =>
          otherIndex !== index &&
          [...column].every((setting) => other.has(setting)) &&
          (other.size > column.size || otherIndex < index),
      ),
  );
}

/** a to z, then a2, b2 and on. */
function letter(index: number): string {
  const round = Math.floor(index / 26);
  return String.fromCharCode(97 + (index % 26)) + (round > 0 ? String(round + 1) : '');
}
