import { ImpossibleInput } from './outcome';
import { LAYOUT_BLOCKS_MAX } from './layout';
import { randomStream, shuffled } from './random';
import { requiredCount } from './required-count';

export type SplitPass = {
  /** 1 for the first pass; two settings side by side, so that a pass is a block. */
  passNumber: number;
  /** `back` runs against the first pass: the planter is turned round, and its halves change sides. */
  direction: 'out' | 'back';
  /** In field order, from the left looking along the first pass. */
  strips: { stripNumber: number; positionInBlock: number; half: 'left' | 'right'; setting: string }[];
};

export type SplitPlanterLayout = {
  design: 'split-planter';
  seed: number;
  /** Which setting the planter's left and right half carry through the whole trial. */
  leftHalf: string;
  rightHalf: string;
  passes: SplitPass[];
  /** As many passes out as back, so that each setting lies as often on either side. */
  isBalanced: boolean;
  /** A setting always runs on the same row units: a difference may be theirs. */
  settingAndRowUnitMixed: true;
  /** Chance dealt the halves once, and both ways differ by as much: the randomization test shows nothing. */
  smallestAttainableP: 1;
};

/**
 * How is a trial laid with one setting on each half of the planter?
 *
 * Takes two different settings, the number of passes (2 to 40; an even number is balanced) and a seed, a whole number from 0 to
 * 4,294,967,295 that is shown and stored. Returns the halves, and per pass its direction and strips in field order.
 * Never insufficient; throws ImpossibleInput, naming the field, for other than two settings, one twice, or passes out of range.
 * Method: for hardware that takes a wrench and cannot be dealt strip by strip. Chance gives the settings to the halves; direction of travel alternates,
 * so that each setting lies by turns left and right and slope and drift do not follow it.
 * What it does not tell: whether a difference is the setting's or that of the row units it ran on; only changing the
 * halves over in another trial or year parts them. Example: four passes of A left and B right: A B, B A, A B, B A.
 */
export function splitPlanterLayout(plan: {
  settings: readonly string[];
  passes: number;
  seed: number;
}): SplitPlanterLayout {
  const { settings, seed } = plan;
  if (settings.length !== 2) {
    throw new ImpossibleInput(
      `A split planter carries two settings, one on each half; there are ${settings.length}.`,
      'settings',
    );
  }
  if (settings[0] === settings[1])
    throw new ImpossibleInput('The halves of the planter must differ.', 'settings');
  const passes = requiredCount(plan.passes, 'passes', { atLeast: 2, atMost: LAYOUT_BLOCKS_MAX });
  const [leftHalf, rightHalf] = shuffled(settings, randomStream(seed)) as [string, string];
  const halves = [
    { half: 'left' as const, setting: leftHalf },
    { half: 'right' as const, setting: rightHalf },
  ];
  return {
    design: 'split-planter',
    seed,
    leftHalf,
    rightHalf,
    passes: Array.from({ length: passes }, (_, index) => ({
      passNumber: index + 1,
      direction: index % 2 === 0 ? 'out' : 'back',
      strips: (index % 2 === 0 ? halves : [...halves].reverse()).map((half, position) => ({
        stripNumber: 2 * index + position + 1,
        positionInBlock: position + 1,
        ...half,
      })),
    })),
    isBalanced: passes % 2 === 0,
    settingAndRowUnitMixed: true,
    smallestAttainableP: 1,
  };
}
