import type { RegisterEntry } from './register-entry';

/** Immer 1934: five barleys in each of six blocks, block by block, in 1931 and 1932. */
const twoYears = [
  [
    119.8, 124.8, 121.4, 140.8, 124, 86.9, 96, 77.1, 101.8, 78.9, 98.9, 104.1, 89, 89.3, 69.1, 82.3, 89.6,
    77.3, 131.3, 78.4, 81, 98.3, 105.4, 109.7, 119.7, 146.6, 145.7, 142, 191.5, 150.7,
  ],
  [
    98.9, 75.7, 61.9, 125.5, 96.2, 67.7, 94.1, 66.7, 91.8, 67.4, 66.4, 80.3, 49.9, 61.9, 96.7, 103.1, 129.6,
    105.1, 139.9, 116.5, 80.7, 84.2, 82.3, 87.2, 80.4, 100.4, 108.1, 115.5, 147.7, 112.2,
  ],
] as const;

/** Means, pooled fields and years, row units, residue and what a layout can show. */
export const comparisonEntries: readonly RegisterEntry[] = [
  {
    id: 'least-squares-mean',
    version: '1',
    name: 'Mean of a setting, blocks alike',
    sentence: 'What a setting would average had it run in every block, with its standard error.',
    equation:
      'strip figure = block + setting + error, by least squares; the setting’s mean over all blocks alike',
    source: 'Searle, Speed and Milliken 1980, The American Statistician 34:216',
    domain: 'At least two blocks and two settings with two strips each; up to 24 settings.',
    limits:
      'With no strip lost it is the plain mean. With strips lost it leans on the blocks being alike for all settings.',
    workedExample: {
      given:
        'three settings in four blocks: 82.3 77.3 131.3, 119.8 121.4 140.8, 98.9 89.0 89.3, 86.9 77.1 101.8',
      result: 'means 96.975, 91.2 and 115.8 with standard error 6.78; error mean square 183.8',
      inputs: {
        settings: 3,
        figures: [82.3, 77.3, 131.3, 119.8, 121.4, 140.8, 98.9, 89, 89.3, 86.9, 77.1, 101.8],
      },
      expected: {
        first: 96.975,
        second: 91.2,
        third: 115.8,
        standardError: 6.779,
        meanSquareError: 183.8197,
      },
      tolerance: 0.0005,
      source: 'R 4.2.2 and emmeans 1.8.4 on barleys of Immer 1934',
    },
  },
  {
    id: 'pooled-difference',
    version: '1',
    name: 'Difference over several fields or years',
    sentence:
      'How far two settings lie apart on average over fields or years, and how sure that is of others like them.',
    equation:
      'mean of the fields’ differences ± t(0.975; fields − 1) × SD of the differences / √fields; for these fields only: ± t(0.975; ν) × √(Σ SE²) / fields',
    source: 'Student’s t on fields; ν by Satterthwaite 1946, Biometrics Bulletin 2:110',
    domain: 'At least two fields or years that hold both settings in a block. Every field counts alike.',
    limits:
      'It speaks of fields like those that were run; two of them leave 1 degree of freedom. Each field is shown with its own difference and error beside it.',
    workedExample: {
      given:
        'five barleys in six blocks in two years; the fourth less the first: 24.8 in one year, 22.8 in the other',
      result: '23.8; interval 11.0 to 36.6 for years like these, 12.7 to 34.9 for these two',
      inputs: { settings: 5, figures: twoYears[0], figuresNext: twoYears[1] },
      expected: {
        difference: 23.8083,
        lower: 10.9962,
        upper: 36.6204,
        theseLower: 12.7219,
        theseUpper: 34.8947,
      },
      tolerance: 0.0001,
      source: 'R 4.2.2, t.test and lm on the barleys of Immer 1934',
    },
  },
  {
    id: 'setting-by-environment',
    version: '1',
    name: 'Settings by field or year',
    sentence:
      'Whether the settings do the same in every field or year, and whether they differ over all of them.',
    equation:
      'figure = field + block in field + setting + setting × field + error; F of setting × field against the error, F of the settings against setting × field',
    source: 'Cochran and Cox 1957, Experimental Designs, ch. 14',
    domain: 'At least two fields or years that share settings, one of them with two blocks or more.',
    limits:
      'Settings are held against setting × field when fields stand for others; with two or three fields that shows little. With lost strips it is approximate.',
    workedExample: {
      given: 'five barleys in six blocks in two years',
      result: 'settings × years F 0.40, p 0.80; settings against it F 18.2, p 0.008',
      inputs: { settings: 5, figures: twoYears[0], figuresNext: twoYears[1] },
      expected: { interactionF: 0.4043, interactionP: 0.8044, settingF: 18.1965, settingP: 0.0079 },
      tolerance: 0.00005,
      source: 'R 4.2.2, aov on the barleys of Immer 1934',
    },
  },
  {
    id: 'row-unit',
    version: '1',
    name: 'Row unit or setting',
    sentence:
      'Whether one row unit of the planter is later than the others in all strips, whatever the setting.',
    equation:
      'figure = strip + row unit + error, by least squares; each unit less the mean of the others, p by Holm over the units',
    source: 'Least squares as for blocks; Holm 1979, Scand. J. Statist. 6:65',
    domain: 'At least two strips and two row units that were sampled in two strips each.',
    limits:
      'It does not tell the unit from its place: wheel track, guess row, pinch row. On a split planter setting and row unit are mixed and nothing is told.',
    workedExample: {
      given:
        'five row units in six strips (barleys standing for units), the fourth above the others in all but one strip',
      result: 'the fourth 22.9 more than the others, standard error 5.8, p 0.004',
      inputs: { rowUnits: 5, rowUnit: 4, figures: twoYears[0] },
      expected: { lessOthers: 22.9417, standardError: 5.8254, p: 0.0041 },
      tolerance: 0.00005,
      source: 'R 4.2.2, lm and p.adjust on the barleys of Immer 1934',
    },
  },
  {
    id: 'residue-and-timing',
    version: '1',
    name: 'Residue in the row against timing',
    sentence: 'How many days later strips come up for every ten points more of residue in the seed row.',
    equation:
      'slope = Σ (cover − mean of its block)(days − mean of its block) / Σ (cover − mean of its block)²; interval by t on strips − blocks − 1',
    source: 'Least squares with blocks taken out',
    domain:
      'Two or more strips in a block, cover that differs between them, one degree of freedom for error.',
    limits:
      'It does not tell that residue is the cause: settings change more than cover. Cover read with error makes the slope too small.',
    workedExample: {
      given: 'three trees as blocks, measured on seven days: size on age / 20',
      result: '19.2 more for every ten, interval 16.5 to 21.8',
      inputs: {
        covers: [5.9, 24.2, 33.2, 50.2, 61.55, 68.6, 79.1],
        first: [30, 58, 87, 115, 120, 142, 145],
        second: [33, 69, 111, 156, 172, 203, 203],
        third: [30, 51, 75, 108, 115, 139, 140],
      },
      expected: { slope: 19.1767, lower: 16.5108, upper: 21.8426 },
      tolerance: 0.00005,
      source: 'R 4.2.2, lm on the data set Orange',
    },
  },
  {
    id: 'smallest-difference',
    version: '1',
    name: 'Smallest difference a layout can show',
    sentence: 'How large a true difference must be for four trials in five of this layout to show it.',
    equation:
      'P(F′ > critical F) = 0.8 with F′ non-central, λ = blocks × difference² / (2 SD²); for a pair on 1 degree of freedom (non-central t), for any difference on settings − 1',
    source: 'Cochran and Cox 1957, Experimental Designs, ch. 2; by calculation, not by simulation',
    domain: 'Two to 24 settings in 2 to 40 complete blocks, and the SD of strips from earlier trials.',
    limits:
      'As good as the SD put in: another field may vary more. Against a reference it asks Holm’s dearest step, so the trial does at least as well.',
    workedExample: {
      given: 'two settings in 4 blocks, strips with an SD of 0.35 days',
      result: '1.05 days; a difference of 1 day is shown in 76 % of trials',
      inputs: { settings: 2, blocks: 4, stripSd: 0.35, difference: 1 },
      expected: { difference: 1.0533, power: 0.7625 },
      tolerance: 0.00005,
      source: 'R 4.2.2, power.t.test(type = "paired", strict = TRUE)',
    },
  },
  {
    id: 'blocks-needed',
    version: '1',
    name: 'Blocks needed',
    sentence: 'The fewest blocks in which four trials in five show a difference of this size.',
    equation: 'the smallest number of blocks whose chance to show the difference is 0.8 or more',
    source: 'As for the smallest difference a layout can show',
    domain: 'Two to 24 settings; up to 40 blocks.',
    limits: 'As good as the SD put in. The randomization test has its own floor, shown beside it.',
    workedExample: {
      given: 'two settings, strips with an SD of 0.35 days, a difference of 0.8 days',
      result: '6 blocks (5.2, rounded up)',
      inputs: { settings: 2, stripSd: 0.35, difference: 0.8 },
      expected: { blocks: 6 },
      tolerance: 0,
      source: 'R 4.2.2, power.t.test(type = "paired", strict = TRUE): 5.22',
    },
  },
  {
    id: 'strip-sd',
    version: '1',
    name: 'SD of strips in earlier trials',
    sentence: 'How far strips of one setting vary within a block, by trials that were run before.',
    equation: 'SD = √(Σ df × error mean square / Σ df); interval by χ² on Σ df',
    source: 'Pooled variance; χ² interval',
    domain: 'One or more analyzed trials of the same figure.',
    limits: 'Few degrees of freedom leave a wide interval; its upper end is the careful one to plan with.',
    workedExample: {
      given: 'error mean squares of 162.89 and 197.98 on 20 degrees of freedom each',
      result: 'SD 13.4, interval 11.0 to 17.2',
      inputs: { meanSquares: [162.887166667, 197.9754], degreesOfFreedom: [20, 20] },
      expected: { stripSd: 13.4325, lower: 11.0282, upper: 17.1869 },
      tolerance: 0.00005,
      source: 'R 4.2.2, qchisq',
    },
  },
  {
    id: 'split-planter',
    version: '1',
    name: 'Split planter',
    sentence:
      'One setting on each half of the planter, dealt by chance from a seed; direction of travel alternates.',
    equation: 'out: left half, right half; back: right half, left half',
    source:
      'Own definition; Washington and Idaho on-farm testing guide 1994 for equal chances within a block',
    domain: 'Two settings in 2 to 40 passes; an even number has each setting as often on either side.',
    limits:
      'Setting and row unit are mixed: a difference may be that of the row units. The randomization test shows nothing here (smallest p 1).',
    workedExample: {
      given: 'four passes of A on one half and B on the other',
      result: 'A lies left in 2 of 4 passes; smallest p 1',
      inputs: { passes: 4, seed: 1 },
      expected: { passesLeft: 2, smallestP: 1 },
      tolerance: 0,
      source: 'own arithmetic',
    },
  },
  {
    id: 'changing-hours',
    version: '1',
    name: 'Hours of changing the planter',
    sentence: 'How long it takes to change settings from strip to strip of a layout.',
    equation: 'changes between strips planted in turn × minutes a change / 60',
    source: 'Own arithmetic on the grower’s own minutes.',
    domain: 'Any layout, in the order in which it is planted.',
    limits: 'The first set-up, turning and filling are not in it.',
    workedExample: {
      given: 'A B B A planted in turn, 45 minutes a change',
      result: '2 changes, 1.5 hours',
      inputs: { settings: 'A B B A', minutesPerChange: 45 },
      expected: { changes: 2, hours: 1.5 },
      tolerance: 0,
      source: 'own arithmetic',
    },
  },
];
