import { ImpossibleInput } from './outcome';
import { randomStream, shuffled } from './random';

export const LAYOUT_SETTINGS_MAX = 24;
export const LAYOUT_BLOCKS_MAX = 40;

export type LaidStrip = {
  /** 1 for the first strip of the trial, counted on across the blocks in field order. */
  stripNumber: number;
  /** 1 for the first strip of its block. */
  positionInBlock: number;
  setting: string;
};

export type LaidBlock = { blockNumber: number; strips: LaidStrip[] };

export type Layout = {
  /** Two settings make pairs, three or more make randomised complete blocks: the same shuffle, two names. */
  design: 'pairs' | 'complete-blocks';
  seed: number;
  blocks: LaidBlock[];
  smallestAttainableP: number;
};

/**
 * In which order do the settings stand in each block?
 *
 * Inputs: `settings`, two to 24 different names or ids; `blocks`, 1 to 40; `seed`, a whole number from 0 to
 * 4,294,967,295 that is shown and stored, so that anyone can lay the same trial out again.
 * Result: per block its strips in field order, every setting once, and the smallest p the exact randomisation
 * test of this layout can reach.
 * Throws ImpossibleInput, naming the field, for fewer than two settings, a repeated one, or counts out of range.
 * Method: every block is shuffled on its own, every order equally likely (randomised complete blocks;
 * Washington and Idaho on-farm testing guide 1994; Nebraska and Oregon EM 9381, 2023: paired comparison for two).
 * What it does not tell: whether the blocks are even within, and whether wheel tracks or end units fall on a strip.
 * Example: settings A and B in four blocks of seed 1: four pairs, smallest attainable p 0.125.
 */
export function layout(plan: { settings: readonly string[]; blocks: number; seed: number }): Layout {
  const { settings, blocks, seed } = plan;
  refuseUnlayable(settings, blocks);
  const stream = randomStream(seed);
  return {
    design: settings.length === 2 ? 'pairs' : 'complete-blocks',
    seed,
    blocks: Array.from({ length: blocks }, (_, blockIndex) => ({
      blockNumber: blockIndex + 1,
      strips: shuffled(settings, stream).map((setting, index) => ({
        stripNumber: blockIndex * settings.length + index + 1,
        positionInBlock: index + 1,
        setting,
      })),
    })),
    smallestAttainableP: smallestAttainableP(settings.length, blocks),
  };
}

/**
 * How small can p of the exact randomisation test become in complete blocks, however large the difference?
 *
 * Inputs: number of settings and of blocks. Result: a share from 0 to 1.
 * Equation: (s!)^(1 − b) for s settings in b blocks. Renaming the settings leaves the test's statistic as it is, so
 * at least s! of the (s!)^b arrangements tie with the most extreme one.
 * What it does not tell: how likely the trial is to get there.
 * Example: two settings in 4, 5, 6 blocks: 0.125, 0.0625, 0.03125. One block: 1, so nothing can be shown.
 */
export function smallestAttainableP(settingCount: number, blockCount: number): number {
  return factorial(settingCount) ** (1 - blockCount);
}

function factorial(count: number): number {
  let product = 1;
  for (let factor = 2; factor <= count; factor += 1) product *= factor;
  return product;
}

function refuseUnlayable(settings: readonly string[], blocks: number): void {
  if (settings.length < 2) throw new ImpossibleInput('A comparison needs at least two settings.', 'settings');
  if (settings.length > LAYOUT_SETTINGS_MAX) {
    throw new ImpossibleInput(
      `A trial compares at most ${LAYOUT_SETTINGS_MAX} settings; there are ${settings.length}.`,
      'settings',
    );
  }
  if (new Set(settings).size !== settings.length) {
    throw new ImpossibleInput('Each setting stands once in a block.', 'settings');
  }
  if (!Number.isInteger(blocks) || blocks < 1 || blocks > LAYOUT_BLOCKS_MAX) {
    throw new ImpossibleInput(`A trial has 1 to ${LAYOUT_BLOCKS_MAX} blocks.`, 'blocks');
  }
}
