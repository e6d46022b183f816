import type { RegisterEntry } from './register/register-entry';

const tablesAge =
  'The table comes from hybrids of the 1980s and 1990s in the central Corn Belt; published tables differ by 5 to 10 points at the same cell.';

/** Where the comparisons, the layout and the keep-or-replant answer come from. A test figures every worked example again. */
export const inferenceRegister: RegisterEntry[] = [
  {
    id: 'block-interval',
    version: '1',
    name: 'Difference between two settings with its block interval',
    sentence:
      'How far two settings lie apart once differences between blocks are taken out, and how sure that is.',
    equation:
      'strip figure = block + setting + error, by least squares; difference ± t(0.975; error degrees of freedom) × its standard error',
    source: 'Cochran and Cox 1957, Experimental Designs, ch. 4; means of incomplete blocks by least squares',
    domain:
      'At least two blocks and two settings with two strips each; up to 24 settings. Lost strips are allowed.',
    limits:
      'The strip is the unit: row samples in a strip add no degrees of freedom. Fewer than 6 are little.',
    workedExample: {
      given: 'strips in six pairs: 29.1 30.4 28.7 31.2 30.0 29.5 against 27.8 29.9 27.1 29.6 29.2 27.7',
      result: 'a difference of 1.27, 95 % interval 0.73 to 1.80, on 5 degrees of freedom',
      inputs: {
        first: [29.1, 30.4, 28.7, 31.2, 30, 29.5],
        second: [27.8, 29.9, 27.1, 29.6, 29.2, 27.7],
      },
      expected: { difference: 1.267, lower: 0.729, upper: 1.805, degreesOfFreedom: 5 },
      tolerance: 0.0005,
      source: 'R 4.2.2, t.test(paired = TRUE)',
    },
  },
  {
    id: 'tukey',
    version: '1',
    name: 'All settings compared with one another',
    sentence:
      'Which settings differ when every pair is looked at, and a 95 % interval that holds for all pairs at once.',
    equation:
      'q = √2 × |difference| / its standard error, held against the studentized range; letters by the same rule',
    source: 'Tukey’s studentized range; with lost strips in the form of Kramer 1956, Biometrics 12:307',
    domain: 'Two to 24 settings; planned before planting.',
    limits: 'Settings that share a letter are not shown to be equal.',
    workedExample: {
      given: 'a difference of −25.37 with standard error 7.369 among five settings, 20 degrees of freedom',
      result: 'p 0.019',
      inputs: {
        difference: -25.3666666666667,
        standardError: 7.3685631043116,
        settings: 5,
        degreesOfFreedom: 20,
      },
      expected: { p: 0.01933 },
      tolerance: 0.000005,
      source: 'R 4.2.2 and emmeans 1.8.4 on the barleys of Immer 1934',
    },
  },
  {
    id: 'holm',
    version: '1',
    name: 'Settings compared with the reference',
    sentence:
      'Which settings differ from the reference, with each p made dearer for the number of comparisons.',
    equation:
      'p sorted ascending; the i-th of m becomes the largest of (m − j + 1) × p(j) up to i, at most 1',
    source: 'Holm 1979, Scand. J. Statist. 6:65',
    domain: 'Comparisons with one reference chosen before planting.',
    limits: 'The interval shown with it is each comparison’s own and is not widened for the others.',
    workedExample: {
      given: 'p of 0.001, 0.008, 0.012, 0.03, 0.04 and 0.2',
      result: '0.006, 0.04, 0.048, 0.09, 0.09 and 0.2',
      inputs: { p: [0.001, 0.008, 0.012, 0.03, 0.04, 0.2] },
      expected: { first: 0.006, second: 0.04, third: 0.048, fourth: 0.09, fifth: 0.09, sixth: 0.2 },
      tolerance: 1e-12,
      source: 'R 4.2.2, p.adjust',
    },
  },
  {
    id: 'randomization-test',
    version: '1',
    name: 'Exact randomization test',
    sentence:
      'In how many of the layouts that chance could have dealt the settings would differ at least as much.',
    equation:
      'p = arrangements at least as extreme / all arrangements within blocks; the settings’ sum of squares ranks them',
    source: 'Fisher 1935, The Design of Experiments',
    domain:
      'Blocks run as they were randomized. Up to two million arrangements are counted, more are sampled from a shown seed.',
    limits:
      'Says nothing of the size of a difference. Two settings in four blocks cannot go below p = 0.125.',
    workedExample: {
      given:
        'three settings in four blocks: 82.3 77.3 131.3, 119.8 121.4 140.8, 98.9 89.0 89.3, 86.9 77.1 101.8',
      result: '66 of 1,296 arrangements, p 0.051',
      inputs: {
        settings: 3,
        figures: [82.3, 77.3, 131.3, 119.8, 121.4, 140.8, 98.9, 89, 89.3, 86.9, 77.1, 101.8],
      },
      expected: { arrangements: 1296, asExtreme: 66, p: 0.0509259 },
      tolerance: 5e-8,
      source: 'counted in R 4.2.2 on barleys of Immer 1934',
    },
  },
  {
    id: 'layout',
    version: '1',
    name: 'Randomized layout',
    sentence: 'The order of the settings in each block, dealt by chance from a seed that is shown.',
    equation:
      'each block shuffled on its own, every order equally likely; smallest p = (settings!)^(1 − blocks)',
    source:
      'Washington and Idaho on-farm testing guide 1994; Nebraska and Oregon EM 9381, 2023; generator xoshiro128**, Blackman and Vigna 2021',
    domain: 'Two to 24 settings in 1 to 40 blocks; two settings are laid in pairs.',
    limits: 'It does not know wheel tracks, guess rows or uneven ground. One block shows no difference.',
    workedExample: {
      given: 'two settings in four blocks',
      result: 'smallest p 0.125',
      inputs: { settings: 2, blocks: 4 },
      expected: { smallestP: 0.125 },
      tolerance: 1e-12,
      source: 'own arithmetic: 2 of 16 arrangements',
    },
  },
  {
    id: 'nafziger-1994',
    version: '1',
    name: 'Yield by stand and planting date',
    sentence: 'What share of the field’s best yield a stand of this size, planted on this day, makes.',
    equation: 'the printed grid of 13 days and 14 stands; straight lines between neighboring cells',
    source: 'Nafziger 1994, J. Prod. Agric. 7:59, as printed by Purdue',
    domain:
      '10 April to 9 June, 10,000 to 36,000 plants per acre. Beyond it only a bound: at most what the edge says. Rows after 25 May were extrapolated by the source.',
    limits: `${tablesAge} Fields under about 100 bu/ac do not respond above about 24,000.`,
    workedExample: {
      given: 'planted 30 April, 20,000 plants per acre',
      result: '92 %',
      inputs: { month: 4, day: 30, plantsPerAcre: 20_000 },
      expected: { percent: 92 },
      tolerance: 1e-9,
      source: 'Purdue',
    },
  },
  {
    id: 'keep-or-replant',
    version: '1',
    name: 'Keep or replant',
    sentence: 'What replanting would gain or lose over keeping this stand.',
    equation:
      'keep = best yield × % × (1 − gap loss) × (1 − uneven loss); replant = best yield × [(1 − p) × % + p × poor second stand]; gain = (replant − keep) × price − costs − extra drying + insurance payment',
    source: 'Nafziger 1994 as printed by Purdue; the sum is ordinary arithmetic on the grower’s own figures',
    domain:
      'Keep or replant is said only when the gain exceeds one printed percent of the table and has one sign over the count’s 95 % interval.',
    limits: `${tablesAge} Uneven spacing is not charged: stand and gaps already charge the missing plants. Only the count’s error is drawn.`,
    workedExample: {
      given: 'a field of 200 bu/ac planted 30 April with 20,000 plants; replanted 25 May at 30,000',
      result: 'keeping makes 184 bu, replanting 174 bu: keep',
      inputs: { maximumYield: 200, plantsPerAcre: 20_000, replantPlantsPerAcre: 30_000 },
      expected: { keepYield: 184, replantYield: 174 },
      tolerance: 1e-9,
      source: 'Purdue',
    },
  },
  {
    id: 'break-even-stand',
    version: '1',
    name: 'Break-even stand',
    sentence: 'The stand at which keeping and replanting earn the same.',
    equation:
      'the stand whose % on the planting day is [replant yield + (insurance payment − costs − extra drying) / price] / [best yield × (1 − gap loss) × (1 − uneven loss)]',
    source: 'Nafziger 1994 as printed by Purdue, solved for the stand',
    domain: 'Inside the table; a bound when a date lies beyond it.',
    limits: tablesAge,
    workedExample: {
      given:
        '170 bu/ac, replant cost $10 an acre, planted late April, replanted 1 June; price taken as $2.00 (from memory)',
      result: 'under about 12,000 plants per acre; the Nafziger grid says about 12,700',
      inputs: { maximumYield: 170, costs: 10, price: 2, replantPlantsPerAcre: 30_000 },
      expected: { plantsPerAcre: 12_000 },
      tolerance: 1000,
      source: 'Illinois 2002',
    },
  },
];
