import type { RegisterEntry } from './register-entry';

type StandId =
  'plantsPerAcre' | 'plantsPerAcreInterval' | 'shareOfSeed' | 'shareOfSeedInterval' | 'tapeLessCounted';

export const standEntries: Record<StandId, RegisterEntry> = {
  plantsPerAcre: {
    id: 'plantsPerAcre',
    version: '1',
    name: 'Plants per acre',
    sentence: 'The plants the measured length holds, brought up to an acre.',
    equation:
      'plants held × 43,560 / (row length in ft × row spacing in ft); plants held = plants − ½ of the doubtful ones − ½ for each end that is a plant. A group: all plants held over all area.',
    source:
      'The formula of the extension services; doubtful plants at one half, Wisconsin W120; plant ends, own derivation.',
    domain: 'Any measured length; the last count, or the tape sheet where nothing was counted.',
    limits:
      'One row sample says nothing about the rest of the field. Places chosen as best or worst mislead.',
    workedExample: {
      given: '11 plants read on the tape from a plant at 0 to a plant at 68 in, 30-inch rows',
      result: '30,748 plants per acre (11 over the length would say 33,824)',
      inputs: { plantsUp: 11, lengthInches: 68, rowSpacingInches: 30 },
      expected: { plantsPerAcre: 30748 },
      tolerance: 0.5,
      source: 'Readings printed with the SSMG-37 guide; the stand is own arithmetic from them.',
    },
  },
  plantsPerAcreInterval: {
    id: 'plantsPerAcreInterval',
    version: '1',
    name: 'Interval of plants per acre',
    sentence: 'The stands that agree with what was counted, at 95 %.',
    equation:
      'Places (strips, or row samples where there are no strips): R ± t(n − 1) × √(Σ(yᵢ − R aᵢ)² / (n − 1) / n) / mean area, R = Σy / Σa. One row sample: Wilson interval of its seeds, or exact Poisson without a seeding rate; both of the counting only.',
    source: 'Cochran 1977, Sampling Techniques (ratio estimator); Wilson 1927; Garwood 1936.',
    domain: 'Two places or more; one row sample as counting only, with no more plants than seeds.',
    limits:
      'It holds for places chosen at random. Counting only leaves out how the rest of the field differs.',
    workedExample: {
      given: '31, 28, 33, 26, 30 and 29 plants in six lengths of 17.424 ft, 30-inch rows',
      result: '26,951 to 32,049 plants per acre around 29,500',
      inputs: { plants: [31, 28, 33, 26, 30, 29], lengthInches: 209.088, rowSpacingInches: 30 },
      expected: { plantsPerAcreLower: 26950.9296876165, plantsPerAcreUpper: 32049.0703123835 },
      tolerance: 0.001,
      source: 'R 4.2.2, t.test',
    },
  },
  shareOfSeed: {
    id: 'shareOfSeed',
    version: '1',
    name: 'Share of seed',
    sentence: 'How many of the seeds sown stand as plants.',
    equation: 'plants held / (seeds per acre × area)',
    source: 'Arithmetic; the seeding rate is the one the planting was set to.',
    domain: 'A known seeding rate. It may pass 100 % where doubles put more plants than seeds into a length.',
    limits: 'The planter may have dropped another rate than it was set to.',
    workedExample: {
      given: '29,500 plants per acre of 34,000 seeds',
      result: '86.76 %',
      inputs: { plants: 29.5, seeds: 34 },
      expected: { share: 0.867647058823529 },
      tolerance: 1e-9,
      source: 'own arithmetic',
    },
  },
  shareOfSeedInterval: {
    id: 'shareOfSeedInterval',
    version: '1',
    name: 'Interval of the share of seed',
    sentence: 'The shares that agree with what was counted, at 95 %.',
    equation:
      'One row sample: Wilson, (p + z²/2n ± z √(p(1 − p)/n + z²/4n²)) / (1 + z²/n), z = 1.96. A group: the interval of plants per acre over seeds per acre.',
    source: 'Wilson 1927; Cochran 1977 for a group.',
    domain: 'No more plants than seeds in one row sample.',
    limits: 'Of one row sample it is the counting only; neighbors share crust, depth and residue.',
    workedExample: {
      given: '28 plants of 34 seeds',
      result: '66.5 to 91.7 %',
      inputs: { plants: 28, seeds: 34 },
      expected: { shareLower: 0.664862626001573, shareUpper: 0.916510309546277 },
      tolerance: 1e-9,
      source: 'R 4.2.2, prop.test',
    },
  },
  tapeLessCounted: {
    id: 'tapeLessCounted',
    version: '1',
    name: 'Tape sheet less count',
    sentence: 'How many plants the tape sheet shows beyond the last count of the same length.',
    equation: 'plants on the tape sheet − plants at the last count, summed over row samples that have both',
    source: 'Definition.',
    domain: 'Row samples with a count and a tape sheet.',
    limits:
      'Counts decide the stand and the timing, the tape sheet the spacing; the difference says only that they differ.',
    workedExample: {
      given: '33 plants on the tape sheet, 34 at the last count',
      result: '−1 plant',
      inputs: { onTape: 33, counted: 34 },
      expected: { plants: -1 },
      tolerance: 0,
      source: 'own arithmetic',
    },
  },
};
