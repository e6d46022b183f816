import type { Insufficient, Outcome } from './outcome';
import { insufficient } from './outcome';

/** The figures a trial's headline may speak of, and whether less of it is better. */
export const LESS_IS_BETTER = {
  'spread-days': true,
  'half-up-days': true,
  'plants-per-acre': false,
  'late-share': true,
  'spacing-sd': true,
  score: false,
} as const;

export type HeadlineFigure = keyof typeof LESS_IS_BETTER;

/** `difference` and its 95 % interval are `first` less `second`, in the figure's unit. */
export type HeadlinePair = {
  first: string;
  second: string;
  difference: number;
  lower: number;
  upper: number;
  toldApart: boolean;
};

export type HeadlineComparison = {
  /** Planned: Tukey looks at all pairs, Holm at each setting against the reference. */
  rule: 'tukey' | 'holm';
  pairs: readonly HeadlinePair[];
  blocks: number;
  errorDegreesOfFreedom: number;
  /** Settings with a single strip, described and not compared. */
  leftOut: readonly string[];
};

/** A setting less what it is compared with; `better` looks at the figure's own direction. */
export type ToldApart = {
  setting: string;
  comparedWith: string;
  difference: number;
  lower: number;
  upper: number;
  better: boolean;
};

type Common = {
  figure: HeadlineFigure;
  reference: string;
  rule: HeadlineComparison['rule'];
  blocks: number;
  errorDegreesOfFreedom: number;
  /** Fewer than 6 degrees of freedom stand behind the error. */
  isLittle: boolean;
  leftOut: readonly string[];
  /** Pairs that were looked at and are not told apart. */
  cannotTell: { first: string; second: string }[];
  /** Told apart as well, in the order of their size: from the reference first, then from one another. */
  alsoSeen: ToldApart[];
};

export type ComparisonFinding =
  | (Common & { kind: 'difference' } & ToldApart)
  | (Common & {
      kind: 'no-difference-shown';
      /** The largest difference from the reference, either way, that some 95 % interval still holds. */
      notRuledOutUpTo: number;
      /** Settings whose own interval leaves zero out although the planned rule does not tell them apart. */
      intervalAloneExcludesZero: string[];
    })
  | { kind: 'nothing-to-compare'; figure: HeadlineFigure; reference: string; because: Insufficient };

export const FEW_ERROR_DEGREES_OF_FREEDOM = 6;

/**
 * What does the comparison support saying about the main figure?
 *
 * Takes the comparison as planned (or why there is none), the main figure and the reference. Returns a finding: the setting
 * that the planned rule and its interval both tell apart from the reference (the best of them, or the worst when
 * none is better), or that none is and how large a difference stays open, or that there is nothing to compare.
 * Never insufficient itself; throws nothing.
 * Method: a difference is claimed only when the adjusted p tells the pair apart *and* the 95 % interval leaves zero
 * out. One main figure and one reference, chosen before planting: picking the best of eleven figures finds
 * something false in up to 43 % of trials.
 * What it does not tell: that settings which are not told apart are equal.
 * Example: light down less raised −1.5 days of spread, interval −2.6 to −0.4, told apart: a difference, better.
 */
export function comparisonFinding(
  comparison: Outcome<HeadlineComparison>,
  figure: HeadlineFigure,
  reference: string,
): ComparisonFinding {
  if (comparison.kind === 'insufficient') {
    return { kind: 'nothing-to-compare', figure, reference, because: comparison };
  }
  const { pairs, rule, blocks, errorDegreesOfFreedom, leftOut } = comparison.value;
  const withReference = pairs
    .filter((pair) => pair.first === reference || pair.second === reference)
    .map((pair) => (pair.second === reference ? pair : turned(pair)));
  if (withReference.length === 0) {
    const because = insufficient('reference-not-compared', '2 strips of the reference', 'fewer');
    return { kind: 'nothing-to-compare', figure, reference, because };
  }

  const fromReference = bySize(withReference.filter(isShown).map((pair) => toldApart(pair, figure)));
  const amongOthers = bySize(
    pairs
      .filter((pair) => pair.first !== reference && pair.second !== reference && isShown(pair))
      .map((pair) => toldApart(pair, figure))
      .map((told) => (told.better ? told : exchanged(told))),
  );
  const common: Common = {
    figure,
    reference,
    rule,
    blocks,
    errorDegreesOfFreedom,
    isLittle: errorDegreesOfFreedom < FEW_ERROR_DEGREES_OF_FREEDOM,
    leftOut,
    cannotTell: pairs.filter((pair) => !isShown(pair)).map(({ first, second }) => ({ first, second })),
    alsoSeen: [],
  };
  const chosen = fromReference.find((told) => told.better) ?? fromReference[0];
  if (chosen) {
    const others = fromReference.filter((told) => told !== chosen);
    return { ...common, kind: 'difference', ...chosen, alsoSeen: [...others, ...amongOthers] };
  }
  return {
    ...common,
    kind: 'no-difference-shown',
    alsoSeen: amongOthers,
    notRuledOutUpTo: Math.max(
      ...withReference.flatMap(({ lower, upper }) => [Math.abs(lower), Math.abs(upper)]),
    ),
    intervalAloneExcludesZero: withReference.filter(leavesZeroOut).map((pair) => pair.first),
  };
}

function leavesZeroOut(pair: HeadlinePair): boolean {
  return pair.lower > 0 || pair.upper < 0;
}

function isShown(pair: HeadlinePair): boolean {
  return pair.toldApart && leavesZeroOut(pair);
}

function turned(pair: HeadlinePair): HeadlinePair {
  return {
    ...pair,
    first: pair.second,
    second: pair.first,
    difference: -pair.difference,
    lower: -pair.upper,
    upper: -pair.lower,
  };
}

function toldApart(pair: HeadlinePair, figure: HeadlineFigure): ToldApart {
  const { first, second, difference, lower, upper } = pair;
  return {
    setting: first,
    comparedWith: second,
    difference,
    lower,
    upper,
    better: difference < 0 === LESS_IS_BETTER[figure],
  };
}

/** The same two settings told from the better one's side. */
function exchanged(told: ToldApart): ToldApart {
  return {
    setting: told.comparedWith,
    comparedWith: told.setting,
    difference: -told.difference,
    lower: -told.upper,
    upper: -told.lower,
    better: !told.better,
  };
}

function bySize(told: readonly ToldApart[]): ToldApart[] {
  return [...told].sort((first, second) => Math.abs(second.difference) - Math.abs(first.difference));
}
