import type { RegisterEntry } from './register-entry';

type ScoreId = 'score' | 'scoreStand' | 'scoreTiming' | 'scoreSpacing';

const notMoney = 'It grades the work and says nothing of money.';

export const scoreEntries: Record<ScoreId, RegisterEntry> = {
  score: {
    id: 'score',
    version: '1',
    name: 'Score',
    sentence: 'How full and even the stand is, from 0 to 100, with its three parts.',
    equation:
      '0.4 × stand + 0.4 × timing + 0.2 × spacing; a part left out leaves its weight to the others in proportion',
    source: 'Own weights; the parts lie between published anchors.',
    domain: 'At least one part.',
    limits: `${notMoney} Missing plants weigh in the stand and in the spacing. Scores with different parts left out are not comparable.`,
    workedExample: {
      given: 'stand 90, timing 50, spacing 44.4 points',
      result: '64.9',
      inputs: { stand: 90, timing: 50, spacing: 44.4 },
      expected: { points: 64.88 },
      tolerance: 1e-9,
      source: 'own arithmetic',
    },
  },
  scoreStand: {
    id: 'scoreStand',
    version: '1',
    name: 'Stand points',
    sentence: 'How close the stand comes to the intended final stand.',
    equation: '100 at the intended stand or above, 0 at half of it or below, straight between',
    source: 'Own anchors.',
    domain: 'A stand and an intended final stand.',
    limits: notMoney,
    workedExample: {
      given: '28,500 plants per acre of 30,000 intended',
      result: '90',
      inputs: { plantsPerAcre: 28500, intendedPlantsPerAcre: 30000 },
      expected: { points: 90 },
      tolerance: 1e-9,
      source: 'own arithmetic',
    },
  },
  scoreTiming: {
    id: 'scoreTiming',
    version: '1',
    name: 'Timing points',
    sentence: 'How close together the plants came up.',
    equation:
      'Without weather: 100 at a spread of 2 days or less, 0 at 7 days or more, straight between. With weather: 100 at 25 degree days, 0 at 82.',
    source:
      '25 degree days count as uniform (Illinois, Nafziger 2013; whether first to last plant was meant is not known); 82 are one leaf collar; the day anchors are our own.',
    domain: 'A spread. "At most" where the spread is "at least".',
    limits: `${notMoney} Dead seeds make a stand look even.`,
    workedExample: {
      given: 'a spread of 4.5 days',
      result: '50',
      inputs: { days: 4.5 },
      expected: { points: 50 },
      tolerance: 1e-9,
      source: 'own arithmetic',
    },
  },
  scoreSpacing: {
    id: 'scoreSpacing',
    version: '1',
    name: 'Spacing points',
    sentence: 'How even the spacing is.',
    equation: '100 at an SD of 2 in or less, 50 at 4.5 in, 0 at 10 in or more, straight between',
    source:
      'Survey of 354 Indiana and Ohio fields (Nielsen): mean 4.5 in, from under 2.5 to over 10; 2 in is about the best to be had.',
    domain: 'An SD of the spacings.',
    limits: `${notMoney} Missing plants raise the SD.`,
    workedExample: {
      given: 'an SD of 4.5 in, the survey’s mean',
      result: '50',
      inputs: { inches: 4.5 },
      expected: { points: 50 },
      tolerance: 1e-9,
      source: 'own anchor at the survey’s mean',
    },
  },
};
