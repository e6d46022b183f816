import { insufficient, value } from '../outcome';
import type { Outcome } from '../outcome';
import { randomStream, shuffled } from '../random';
import { requiredNumber } from '../required-number';
import type { StripFigure } from './block-analysis';
import { blockConnection } from './block-connection';
import { arrangementStatistic } from './randomisation-statistic';

/** More arrangements than this are sampled, not counted out. */
export const EXACT_ARRANGEMENTS_MAX = 2_000_000;
export const SAMPLED_ARRANGEMENTS = 100_000;

export type RandomisationTest =
  | {
      method: 'exact';
      arrangements: number;
      asExtreme: number;
      p: number;
      /** No difference, however large, can bring p of these blocks below this. */
      smallestAttainableP: number;
    }
  | {
      method: 'sampled';
      arrangements: number;
      sampled: number;
      seed: number;
      p: number;
      /** Standard error of the sampled p. */
      pStandardError: number;
      /** Of all arrangements; a sample cannot show less than `smallestSampledP`. */
      smallestAttainableP: number;
      /** 1 / (sampled + 1), because the arrangement that was laid counts as one of them. */
      smallestSampledP: number;
    };

/**
 * In how many of the arrangements that chance could have laid would the settings differ as much?
 *
 * Takes one figure per strip with its block and setting, only of blocks laid out by chance, and a seed for the case
 * that there are too many arrangements to count. Returns the share as p, with the number of arrangements.
 * Insufficient below two blocks with more than one strip, below two settings, or when no shared block connects them. Throws ImpossibleInput for a figure that
 * is no number or a seed out of range.
 * Method: Fisher 1935, The Design of Experiments. The figures stay where they grew and the settings are dealt anew
 * within every block; the statistic is the settings' sum of squares with blocks taken out, which orders arrangements as F
 * does. Up to two million arrangements are all counted, by the symmetry of complete blocks where there is one (renaming the
 * settings changes nothing, so that the first block may stand still); above that a seeded sample of 100,000, with
 * p = (as extreme + 1) / (sampled + 1). A lost strip stays lost in every arrangement.
 * What it assumes: nothing but the chance that laid the strips. What it does not tell: how large the difference is.
 * Example: three barleys in four blocks: 66 of 1,296 arrangements, p 0.0509.
 */
export function randomisationTest(strips: readonly StripFigure[], seed: number): Outcome<RandomisationTest> {
  for (const strip of strips) requiredNumber(strip.figure, 'figure');
  const blocks = groupedByBlock(strips);
  const settings = [...new Set(blocks.flat().map((strip) => strip.setting))];
  if (blocks.length < 2)
    return insufficient('one-block', '2 blocks with 2 strips', `${blocks.length} such blocks`);
  if (settings.length < 2) return insufficient('one-setting', '2 settings', `${settings.length}`);
  if (!blockConnection(blocks.flat())) {
    return insufficient(
      'not-connected',
      'settings that share blocks',
      'groups of settings with no block in common',
    );
  }

  const statistic = arrangementStatistic(blocks, settings);
  const dealt = blocks.map((block) => block.map((strip) => settings.indexOf(strip.setting)));
  const observed = statistic.of(dealt);
  const atLeast = (candidate: number, bar: number) => candidate >= bar - 1e-9 * statistic.scale;
  const isComplete = blocks.every(
    (block) =>
      block.length === settings.length &&
      new Set(block.map((strip) => strip.setting)).size === settings.length,
  );
  const arrangements = dealt.reduce((product, hand) => product * distinctArrangements(hand), 1);

  if (arrangements > EXACT_ARRANGEMENTS_MAX) {
    const stream = randomStream(seed);
    let asExtreme = 0;
    for (let sample = 0; sample < SAMPLED_ARRANGEMENTS; sample += 1) {
      if (atLeast(statistic.of(dealt.map((hand) => shuffled(hand, stream))), observed)) asExtreme += 1;
    }
    const p = (asExtreme + 1) / (SAMPLED_ARRANGEMENTS + 1);
    return value({
      method: 'sampled',
      arrangements,
      sampled: SAMPLED_ARRANGEMENTS,
      seed,
      p,
      pStandardError: Math.sqrt((p * (1 - p)) / SAMPLED_ARRANGEMENTS),
      // Only ties are certain without counting: complete blocks tie in every renaming of the settings.
      smallestAttainableP: (isComplete ? distinctArrangements(dealt[0] as number[]) : 1) / arrangements,
      smallestSampledP: 1 / (SAMPLED_ARRANGEMENTS + 1),
    });
  }

  const choices = dealt.map((hand, index) => (isComplete && index === 0 ? [hand] : arrangementsOf(hand)));
  const counted = choices.reduce((product, hands) => product * hands.length, 1);
  const repeats = arrangements / counted;
  let asExtreme = 0;
  let largest = -Infinity;
  let largestCount = 0;
  statistic.forEach(choices, (candidate) => {
    if (atLeast(candidate, observed)) asExtreme += 1;
    if (!atLeast(candidate, largest)) return;
    largestCount = candidate > largest + 1e-9 * statistic.scale ? 1 : largestCount + 1;
    largest = Math.max(largest, candidate);
  });
  return value({
    method: 'exact',
    arrangements,
    asExtreme: asExtreme * repeats,
    p: asExtreme / counted,
    smallestAttainableP: largestCount / counted,
  });
}

/** Blocks of one strip can be dealt in one way only and are left out. */
function groupedByBlock(strips: readonly StripFigure[]): StripFigure[][] {
  const names = [...new Set(strips.map((strip) => strip.block))];
  return names
    .map((name) => strips.filter((strip) => strip.block === name))
    .filter((block) => block.length > 1);
}

function distinctArrangements(hand: readonly number[]): number {
  const counts = new Map<number, number>();
  let product = 1;
  hand.forEach((setting, index) => {
    const count = (counts.get(setting) ?? 0) + 1;
    counts.set(setting, count);
    product = (product * (index + 1)) / count;
  });
  return product;
}

/** Every different order of a hand, a setting that stands twice in it not counted twice. */
function arrangementsOf(hand: readonly number[]): number[][] {
  if (hand.length <= 1) return [[...hand]];
  return [...new Set(hand)].flatMap((first) => {
    const place = hand.indexOf(first);
    const rest = [...hand.slice(0, place), ...hand.slice(place + 1)];
    return arrangementsOf(rest).map((order) => [first, ...order]);
  });
}
