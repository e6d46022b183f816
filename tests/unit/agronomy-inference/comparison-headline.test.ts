import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { comparisonFinding } from '../../../lib/agronomy/comparison-finding';
import type {
  HeadlineComparison,
  HeadlineFigure,
  HeadlinePair,
} from '../../../lib/agronomy/comparison-finding';
import { comparisonHeadline } from '../../../lib/agronomy/comparison-headline';
import { insufficient, value } from '../../../lib/agronomy/outcome';

const names: Record<string, string> = {
  raised: 'the cleaners raised',
  pinned: 'the cleaners pinned above the soil',
  own: 'the cleaners floating under their own weight',
  light: 'the cleaners floating and light down',
};
const wording = {
  setting: (id: string) => names[id] ?? id,
  amount: (amount: number) => `${amount.toFixed(1)} days`,
  range: (lower: number, upper: number) => `${lower.toFixed(1)} to ${upper.toFixed(1)} days`,
};

function pair(
  first: string,
  second: string,
  difference: number,
  reach: number,
  toldApart?: boolean,
): HeadlinePair {
  const [lower, upper] = [difference - reach, difference + reach];
  return { first, second, difference, lower, upper, toldApart: toldApart ?? (lower > 0 || upper < 0) };
}

function compared(pairs: HeadlinePair[], change: Partial<HeadlineComparison> = {}) {
  return value<HeadlineComparison>({
    rule: 'tukey',
    pairs,
    blocks: 4,
    errorDegreesOfFreedom: 9,
    leftOut: [],
    ...change,
  });
}

/** Spreads 4.4, 3.9, 3.2, 2.9 days. */
const four = [
  pair('raised', 'pinned', 0.5, 1.1),
  pair('raised', 'own', 1.2, 1.1),
  pair('raised', 'light', 1.5, 1.1),
  pair('pinned', 'own', 0.7, 1.1),
  pair('pinned', 'light', 1.0, 1.1),
  pair('own', 'light', 0.3, 1.1),
];

function said(
  pairs: HeadlinePair[],
  figure: HeadlineFigure = 'spread-days',
  change: Partial<HeadlineComparison> = {},
) {
  return comparisonHeadline(comparisonFinding(compared(pairs, change), figure, 'raised'), wording);
}

describe('comparisonHeadline', () => {
  it('names the best setting that is told apart from the reference, then interval, blocks and what cannot be told', () => {
    expect(said(four)).toEqual({
      headline:
        'With the cleaners floating and light down, the stand came up 1.5 days tighter than with the cleaners raised.',
      details: [
        'The 95 % interval is 0.4 to 2.6 days, from 4 blocks.',
        'Not told apart from the cleaners floating and light down: the cleaners pinned above the soil; the cleaners floating under their own weight.',
        'Not told apart from the cleaners raised: the cleaners pinned above the soil.',
        'Also seen: with the cleaners floating under their own weight, the stand came up 1.2 days tighter than with the cleaners raised (0.1 to 2.3 days).',
      ],
    });
  });

  it.each([
    ['spread-days', -1.5, 'the stand came up 1.5 days tighter', true],
    ['spread-days', 1.5, 'the stand came up 1.5 days more spread out', false],
    ['half-up-days', -1.5, 'half the stand was up 1.5 days earlier', true],
    ['half-up-days', 1.5, 'half the stand was up 1.5 days later', false],
    ['plants-per-acre', 1.5, 'the stand was 1.5 days thicker', true],
    ['plants-per-acre', -1.5, 'the stand was 1.5 days thinner', false],
    ['late-share', -1.5, 'the late share was 1.5 days lower', true],
    ['late-share', 1.5, 'the late share was 1.5 days higher', false],
    ['spacing-sd', -1.5, 'the spacing SD was 1.5 days smaller', true],
    ['score', 1.5, 'the score was 1.5 days higher', true],
    ['score', -1.5, 'the score was 1.5 days lower', false],
  ] as const)('says of %s %d: %s', (figure, difference, clause, better) => {
    const finding = comparisonFinding(compared([pair('light', 'raised', difference, 1)]), figure, 'raised');
    expect(finding).toMatchObject({ kind: 'difference', better });
    expect(comparisonHeadline(finding, wording).headline).toBe(
      `With the cleaners floating and light down, ${clause} than with the cleaners raised.`,
    );
  });

  it('prefers a smaller gain to a larger loss, and still tells the loss', () => {
    const { headline, details } = said([pair('light', 'raised', -1.2, 1), pair('own', 'raised', 2, 1)]);
    expect(headline).toContain('1.2 days tighter');
    expect(details).toContain(
      'Also seen: with the cleaners floating under their own weight, the stand came up 2.0 days more spread out than with the cleaners raised (1.0 to 3.0 days).',
    );
  });

  it('shows no difference and says how large a one stays open', () => {
    expect(said([pair('raised', 'light', 0.8, 1.1), pair('raised', 'own', 0.3, 1.1)])).toEqual({
      headline: 'No difference in emergence spread from the cleaners raised was shown.',
      details: ['Differences of up to 1.9 days cannot be ruled out (95 % intervals, 4 blocks).'],
    });
  });

  it('tells a difference between others when none from the reference was shown, from the better side', () => {
    const { headline, details } = said([
      pair('light', 'raised', -0.7, 1),
      pair('own', 'raised', 0.8, 1),
      pair('own', 'light', 1.5, 1),
    ]);
    expect(headline).toBe('No difference in emergence spread from the cleaners raised was shown.');
    expect(details[1]).toBe(
      'Also seen: with the cleaners floating and light down, the stand came up 1.5 days tighter than with the cleaners floating under their own weight (0.5 to 2.5 days).',
    );
  });

  it('claims nothing from an interval that leaves zero out when the planned rule does not hold', () => {
    const { headline, details } = said(
      [pair('light', 'raised', -1.2, 1, false), pair('own', 'raised', -0.1, 1)],
      'spread-days',
      {
        rule: 'holm',
      },
    );
    expect(headline).toMatch(/^No difference/);
    expect(details).toContain(
      'The interval of the cleaners floating and light down alone leaves zero out; looked at together with the other comparisons it does not hold.',
    );
  });

  it('says under Holm that the others were not compared with one another', () => {
    const { details } = said(
      [pair('light', 'raised', -2, 1), pair('own', 'raised', -0.1, 1)],
      'spread-days',
      { rule: 'holm' },
    );
    expect(details).toContain('The settings were compared with the reference only, not with one another.');
    const alone = said([pair('light', 'raised', -2, 1)], 'spread-days', { rule: 'holm' });
    expect(alone.details).toEqual(['The 95 % interval is 1.0 to 3.0 days, from 4 blocks.']);
  });

  it('says how little fewer than 6 degrees of freedom are, and which setting ran in one strip', () => {
    const few = said([pair('light', 'raised', -2, 1)], 'spread-days', {
      errorDegreesOfFreedom: 5,
      leftOut: ['own'],
    });
    expect(few.details.slice(1)).toEqual([
      'Only 5 degrees of freedom stand behind the error: how far strips vary is itself hardly known.',
      'A single strip ran with the cleaners floating under their own weight: it is described, not compared.',
    ]);
    const six = said([pair('light', 'raised', -2, 1)], 'spread-days', { errorDegreesOfFreedom: 6 });
    expect(six.details).toHaveLength(1);
  });

  it.each([
    ['one-block', '1 block', 'One block: nothing to compare yet.'],
    ['one-block', 'no block', 'No block yet: nothing to compare.'],
    ['single-strips', '1 such settings', 'Fewer than two settings have two strips: nothing to compare yet.'],
    [
      'no-error-degrees-of-freedom',
      '0',
      'Too few strips to know how far strips vary: nothing to compare yet.',
    ],
    ['something-else', 'none', 'Too little to compare yet: needed more, had none.'],
  ])('says of %s (%s): %s', (reason, had, sentence) => {
    const finding = comparisonFinding(insufficient(reason, 'more', had), 'score', 'raised');
    expect(finding.kind).toBe('nothing-to-compare');
    expect(comparisonHeadline(finding, wording)).toEqual({ headline: sentence, details: [] });
  });

  it('has nothing to compare with when the reference is not among the compared', () => {
    expect(said([pair('light', 'own', -2, 1)]).headline).toBe(
      'The reference has fewer than two strips: nothing to compare with yet.',
    );
  });

  it('never claims a difference whose interval holds zero, whichever way round the pairs come', () => {
    const pairs = fc.array(
      fc.tuple(
        fc.double({ min: -3, max: 3, noNaN: true }),
        fc.double({ min: 0.1, max: 3, noNaN: true }),
        fc.boolean(),
        fc.boolean(),
      ),
      { minLength: 1, maxLength: 6 },
    );
    fc.assert(
      fc.property(pairs, (drawn) => {
        const list = drawn.map(([difference, reach, told, turnedRound], index) =>
          turnedRound
            ? pair('raised', `s${index}`, difference, reach, told)
            : pair(`s${index}`, 'raised', difference, reach, told),
        );
        const finding = comparisonFinding(compared(list), 'spread-days', 'raised');
        if (finding.kind !== 'difference') return;
        expect(finding.lower > 0 || finding.upper < 0).toBe(true);
        expect(finding.lower <= finding.difference && finding.difference <= finding.upper).toBe(true);
        const source = list.find((each) => each.first === finding.setting || each.second === finding.setting);
        expect(source?.toldApart).toBe(true);
        expect(finding.difference).toBe(source?.first === 'raised' ? -source.difference : source?.difference);
      }),
    );
  });

  it.each([
    ['not-connected', 'The settings share no blocks: nothing to compare.'],
    ['no-error-degrees-of-freedom', 'Too few strips to know how far strips vary: nothing to compare yet.'],
    ['no-variation', 'The strips do not vary as measured strips do: nothing to compare.'],
    ['one-environment', 'Too little to compare yet: needed 2 fields, had 1.'],
  ])('says why nothing is compared: %s', (reason, sentence) => {
    const finding = comparisonFinding(insufficient(reason, '2 fields', '1'), 'score', 'raised');
    expect(comparisonHeadline(finding, wording)).toEqual({ headline: sentence, details: [] });
  });
});
