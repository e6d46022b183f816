import type { ComparisonFinding, HeadlineFigure, ToldApart } from './comparison-finding';
import type { Insufficient } from './outcome';

/** How the reader's units, rounding and names are written. Amounts handed over are never negative. */
export type HeadlineWording = {
  /** A setting inside a sentence after "with", for example "the cleaners floating and light down". */
  setting: (id: string) => string;
  /** An amount of the figure with its unit, for example "1.5 days" or "4.1 points". */
  amount: (amount: number) => string;
  /** An interval with its unit once, for example "0.4 to 2.6 days". */
  range: (lower: number, upper: number) => string;
};

export type ComparisonHeadline = {
  /** The finding, one sentence. */
  headline: string;
  /** Interval and blocks, what cannot be told, what else was seen, how little it rests on: a sentence each. */
  details: string[];
};

type FigureWords = { name: string; less: (amount: string) => string; more: (amount: string) => string };

const FIGURES: Record<HeadlineFigure, FigureWords> = {
  'spread-days': {
    name: 'emergence spread',
    less: (amount) => `the stand came up ${amount} tighter`,
    more: (amount) => `the stand came up ${amount} more spread out`,
  },
  'half-up-days': {
    name: 'days to half up',
    less: (amount) => `half the stand was up ${amount} earlier`,
    more: (amount) => `half the stand was up ${amount} later`,
  },
  'plants-per-acre': {
    name: 'stand',
    less: (amount) => `the stand was ${amount} thinner`,
    more: (amount) => `the stand was ${amount} thicker`,
  },
  'late-share': {
    name: 'late share',
    less: (amount) => `the late share was ${amount} lower`,
    more: (amount) => `the late share was ${amount} higher`,
  },
  'spacing-sd': {
    name: 'spacing SD',
    less: (amount) => `the spacing SD was ${amount} smaller`,
    more: (amount) => `the spacing SD was ${amount} larger`,
  },
  score: {
    name: 'score',
    less: (amount) => `the score was ${amount} lower`,
    more: (amount) => `the score was ${amount} higher`,
  },
};

/**
 * How is the finding said?
 *
 * Takes a finding and how to write its numbers and names. Returns the headline and the sentences under it. Never
 * insufficient; throws nothing of its own. Direction is the figure's own: a spread that is smaller came up tighter.
 * Example: "With the cleaners floating and light down, the stand came up 1.5 days tighter than with the cleaners
 * raised." and "The 95 % interval is 0.4 to 2.6 days, from 4 blocks."
 */
export function comparisonHeadline(finding: ComparisonFinding, wording: HeadlineWording): ComparisonHeadline {
  switch (finding.kind) {
    case 'nothing-to-compare':
      return { headline: nothingToCompare(finding.because), details: [] };
    case 'difference':
      return {
        headline: differenceSentence(finding, finding.figure, wording),
        details: [
          `The 95 % interval is ${intervalInWords(finding, wording)}, from ${finding.blocks} blocks.`,
          ...notToldApart(finding, wording),
          ...alsoSeen(finding, wording),
          ...limits(finding, wording),
        ],
      };
    case 'no-difference-shown':
      return {
        headline: `No difference in ${FIGURES[finding.figure].name} from ${wording.setting(finding.reference)} was shown.`,
        details: [
          `Differences of up to ${wording.amount(finding.notRuledOutUpTo)} cannot be ruled out (95 % intervals, ${finding.blocks} blocks).`,
          ...finding.intervalAloneExcludesZero.map(
            (setting) =>
              `The interval of ${wording.setting(setting)} alone leaves zero out; looked at together with the other comparisons it does not hold.`,
          ),
          ...alsoSeen(finding, wording),
          ...limits(finding, wording),
        ],
      };
  }
}

function differenceSentence(told: ToldApart, figure: HeadlineFigure, wording: HeadlineWording): string {
  const words = FIGURES[figure];
  const amount = wording.amount(Math.abs(told.difference));
  const clause = told.difference < 0 ? words.less(amount) : words.more(amount);
  return `With ${wording.setting(told.setting)}, ${clause} than with ${wording.setting(told.comparedWith)}.`;
}

/** The interval in the direction of the claim, so that both its ends are above zero. */
function intervalInWords(told: ToldApart, wording: HeadlineWording): string {
  return told.difference < 0
    ? wording.range(-told.upper, -told.lower)
    : wording.range(told.lower, told.upper);
}

function notToldApart(
  finding: Extract<ComparisonFinding, { kind: 'difference' }>,
  wording: HeadlineWording,
): string[] {
  const partners = (setting: string) =>
    finding.cannotTell.flatMap(({ first, second }) =>
      first === setting ? [second] : second === setting ? [first] : [],
    );
  const sentences = [finding.setting, finding.reference].flatMap((setting) => {
    const others = partners(setting).map(wording.setting);
    return others.length > 0
      ? [`Not told apart from ${wording.setting(setting)}: ${others.join('; ')}.`]
      : [];
  });
  const others = new Set(finding.cannotTell.flatMap(({ first, second }) => [first, second]));
  const isAlone = others.size === 0 && finding.alsoSeen.length === 0;
  if (finding.rule === 'holm' && !isAlone) {
    sentences.push('The settings were compared with the reference only, not with one another.');
  }
  return sentences;
}

function alsoSeen(
  finding: Exclude<ComparisonFinding, { kind: 'nothing-to-compare' }>,
  wording: HeadlineWording,
): string[] {
  return finding.alsoSeen.map(
    (told) =>
      `Also seen: ${differenceSentence(told, finding.figure, wording).replace(/^With/, 'with').slice(0, -1)} (${intervalInWords(told, wording)}).`,
  );
}

function limits(
  finding: Exclude<ComparisonFinding, { kind: 'nothing-to-compare' }>,
  wording: HeadlineWording,
): string[] {
  const degrees = finding.errorDegreesOfFreedom;
  return [
    ...(finding.isLittle
      ? [
          `Only ${degrees} ${degrees === 1 ? 'degree' : 'degrees'} of freedom ${degrees === 1 ? 'stands' : 'stand'} behind the error: how far strips vary is itself hardly known.`,
        ]
      : []),
    ...finding.leftOut.map(
      (setting) => `A single strip ran with ${wording.setting(setting)}: it is described, not compared.`,
    ),
  ];
}

function nothingToCompare(because: Insufficient): string {
  switch (because.reason) {
    case 'one-block':
      return because.had === '1 block'
        ? 'One block: nothing to compare yet.'
        : 'No block yet: nothing to compare.';
    case 'single-strips':
      return 'Fewer than two settings have two strips: nothing to compare yet.';
    case 'reference-not-compared':
      return 'The reference has fewer than two strips: nothing to compare with yet.';
    case 'not-connected':
      return 'The settings share no blocks: nothing to compare.';
    case 'no-error-degrees-of-freedom':
      return 'Too few strips to know how far strips vary: nothing to compare yet.';
    case 'no-variation':
      return 'The strips do not vary as measured strips do: nothing to compare.';
    default:
      return `Too little to compare yet: needed ${because.needed}, had ${because.had}.`;
  }
}
