import type { RegisterEntry, WorkedExample } from './register-entry';

type SpacingId =
  | 'spacingInchesMean'
  | 'spacingInchesSd'
  | 'spacingCv'
  | 'theoreticalSpacingInches'
  | 'placement'
  | 'spacingInchesSdSingles'
  | 'spacingInchesSdFromMissing'
  | 'doublesAndGaps';

const printedPlaces = [0, 2, 17, 33, 38, 39, 44, 52, 55, 60, 68];
const referencePlaces = [0, 6.1, 12.4, 18.2, 24.9, 26, 31.2, 43.8, 49.7, 56.4, 62.5, 81.9, 88.1, 94.6, 100.2];

const missingRaise = 'Missing plants raise it by themselves, however well the planter placed the rest.';

function printedExample(
  result: string,
  expected: WorkedExample['expected'],
  tolerance: number,
  source = 'Printed with the SSMG-37 guide',
): WorkedExample {
  return {
    given: 'plants at 0 2 17 33 38 39 44 52 55 60 68 in',
    result,
    inputs: { positions: printedPlaces },
    expected,
    tolerance,
    source,
  };
}

export const spacingEntries: Record<SpacingId, RegisterEntry> = {
  spacingInchesMean: {
    id: 'spacingInchesMean',
    version: '1',
    name: 'Mean spacing',
    sentence: 'How far a plant stands from the one before it, on average.',
    equation: 'Σ spacing / number of spacings; rows joined, never bridged',
    source: 'Arithmetic mean.',
    domain: 'A tape sheet with two plants.',
    limits: 'The distance from a mark to the first plant is no spacing.',
    workedExample: printedExample('6.8 in', { inches: 6.8 }, 0.05),
  },
  spacingInchesSd: {
    id: 'spacingInchesSd',
    version: '1',
    name: 'SD of the spacings',
    sentence: 'How much the spacings differ among themselves.',
    equation: '√(Σ(spacing − mean)² / (n − 1))',
    source: 'Sample standard deviation, as in the example printed with the SSMG-37 guide.',
    domain: 'Two spacings, that is three plants in a row.',
    limits: missingRaise,
    workedExample: printedExample('5.1 in', { inches: 5.1 }, 0.05),
  },
  spacingCv: {
    id: 'spacingCv',
    version: '1',
    name: 'CV of the spacings',
    sentence: 'The SD of the spacings as a share of their mean.',
    equation: 'SD / mean',
    source: 'Coefficient of variation.',
    domain: 'Two spacings and plants at more than one place.',
    limits: missingRaise,
    workedExample: {
      given: '15 plants on 100.2 in, as in the reference case for a target of 6.22 in',
      result: '58.8 %',
      inputs: { positions: referencePlaces },
      expected: { cv: 0.588480045815519 },
      tolerance: 1e-8,
      source: 'R 4.2.2',
    },
  },
  theoreticalSpacingInches: {
    id: 'theoreticalSpacingInches',
    version: '1',
    name: 'Theoretical spacing',
    sentence: 'How far apart the seeds would lie if every one were dropped evenly.',
    equation: '6,272,640 / (seeds per acre × row spacing in)',
    source: 'Arithmetic.',
    domain: 'A known seeding rate.',
    limits: 'From the rate the planter was set to, not from the plants that came up.',
    workedExample: {
      given: '32,000 seeds per acre in 30-inch rows',
      result: '6.534 in (printed as 6.5)',
      inputs: { seedsPerAcre: 32000, rowSpacingInches: 30 },
      expected: { inches: 6.5 },
      tolerance: 0.05,
      source: 'Ontario guide',
    },
  },
  placement: {
    id: 'placement',
    version: '1',
    name: 'Multiples, singles and misses',
    sentence: 'How many spacings are far too short, as planned, or far too long for the seeding rate.',
    equation:
      'x = spacing / theoretical; multiple x ≤ 0.5, single x ≤ 1.5, miss above (one skip to 2.5, two to 3.5, three beyond). Over all spacings; and over the theoretical places they cover.',
    source:
      'Kachman and Smith 1995, Trans. ASAE 38:379 (spacings); ISO 7256-1:1984 (places); both from memory.',
    domain: 'A tape sheet with two plants and a known seeding rate.',
    limits: 'From plants that came up, a miss may be a seed that failed and not a place the planter skipped.',
    workedExample: {
      given: '15 plants on 100.2 in, theoretical spacing 6.22 in',
      result: '7.14 % multiples, 78.57 singles, 14.29 misses of spacings; 6.25, 75, 18.75 of places',
      inputs: { positions: referencePlaces, theoreticalSpacingInches: 6.22 },
      expected: {
        multiplesOfSpacings: 0.0714285714285714,
        missesOfSpacings: 0.142857142857143,
        multiplesOfPlaces: 0.0625,
        missesOfPlaces: 0.1875,
      },
      tolerance: 1e-8,
      source: 'Evaluated in R from both definitions',
    },
  },
  spacingInchesSdSingles: {
    id: 'spacingInchesSdSingles',
    version: '1',
    name: 'SD of the single spacings',
    sentence: 'How much the spacings differ when multiples and misses are left out.',
    equation: 'SD of the singles; over the theoretical spacing it is the precision, 0.29 its practical limit',
    source: 'Kachman and Smith 1995 (from memory).',
    domain: 'Two single spacings and a known seeding rate.',
    limits: 'It shows the planter’s placement more than the whole SD does, but emergence shifts plants too.',
    workedExample: {
      given: '15 plants on 100.2 in, theoretical spacing 6.22 in',
      result: '0.460 in, a precision of 7.40 %',
      inputs: { positions: referencePlaces, theoreticalSpacingInches: 6.22 },
      expected: { precision: 0.0740248516605871 },
      tolerance: 1e-8,
      source: 'R 4.2.2',
    },
  },
  spacingInchesSdFromMissing: {
    id: 'spacingInchesSdFromMissing',
    version: '1',
    name: 'SD from missing plants alone',
    sentence: 'How uneven the spacing would be from missing plants alone, every seed placed perfectly.',
    equation: 'theoretical spacing × √(1 − s) / s, s the share of seed standing',
    source: 'Own derivation: places to the next plant are geometric when plants are missing by chance.',
    domain: 'A known seeding rate and something standing.',
    limits: 'Plants missing in clumps raise the SD further.',
    workedExample: {
      given: 'seeds 6 in apart, 75 % standing',
      result: '4 in',
      inputs: { theoreticalSpacingInches: 6, share: 0.75 },
      expected: { inches: 4 },
      tolerance: 1e-12,
      source: 'own arithmetic',
    },
  },
  doublesAndGaps: {
    id: 'doublesAndGaps',
    version: '1',
    name: 'Doubles and gaps',
    sentence: 'Plants that crowd each other, and stretches of a foot or more without a plant.',
    equation: 'double: spacing below 2 in; gap: spacing of 12 in or more, with its length',
    source: 'Novak and Ransom 2018 (5.1 and 30.5 cm).',
    domain: 'A tape sheet with two plants.',
    limits:
      'Not multiples and misses, which are relative to the seeding rate. Empty stretches at an end mark are not seen.',
    workedExample: printedExample(
      '1 double and 2 gaps, 15 and 16 in',
      { doubles: 1, gaps: 2, gapInchesTotal: 31 },
      0,
      'own arithmetic on the places printed with the SSMG-37 guide',
    ),
  },
};
