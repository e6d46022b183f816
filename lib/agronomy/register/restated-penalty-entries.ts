import type { RegisterEntry } from './register-entry';

/** What guides say of uneven stands beyond the studies that are shown as penalties. */
export const restatedPenaltyEntries: readonly RegisterEntry[] = [
  {
    id: 'illinois-2014',
    version: '1',
    name: 'Late plants as Illinois restates them',
    sentence: 'What late plants take from yield, by the 1991 study in round numbers.',
    equation:
      'a week and a half late 6 to 9 %; three weeks late, a quarter 10 %, half to three quarters 20 to 22 %; straight between, from none',
    source: 'Illinois Extension 2014, restating Nafziger, Carter and Graham 1991',
    domain: 'Up to three quarters of the plants and three weeks.',
    limits: 'No study of its own, so no second witness beside the 1991 one. Corn only.',
    workedExample: {
      given: 'half the plants three weeks late',
      result: '20 to 22 %',
      inputs: { lateShare: 0.5, delayDays: 21 },
      expected: { low: 20, high: 22 },
      tolerance: 0.5,
      source: 'Illinois Extension 2014',
    },
  },
  {
    id: 'ohio-replant-gain',
    version: '1',
    name: 'What replanting an uneven stand gains, by Ohio',
    sentence: 'How much replanting can gain at most by making an uneven stand even.',
    equation:
      'a delay under two weeks: under 5 %; half or more of the plants three weeks or more late: up to 10 %',
    source: 'Ohio State University, AGF-122',
    domain: 'Delays under two weeks, or of three weeks and more for half of the plants or more.',
    limits:
      'A bound, not a loss; what the later date costs is not in it. Between what is printed nothing is said. Corn only.',
    workedExample: {
      given: 'half the plants three weeks late',
      result: 'at most 10 %',
      inputs: { lateShare: 0.5, delayDays: 21 },
      expected: { most: 10 },
      tolerance: 0,
      source: 'AGF-122',
    },
  },
  {
    id: 'nafziger-1996',
    version: '1',
    name: 'What neighbors of a skip make up',
    sentence: 'How much of a missing plant its neighbors make up.',
    equation: '47 % at 18,000 plants per acre, 19 % at 30,000; straight between',
    source: 'Nafziger 1996, J. Prod. Agric. 9:238',
    domain: '18,000 to 30,000 plants per acre.',
    limits:
      'Skips and doubles act in opposite directions. The stand table charges missing plants already: never add a skip’s loss to it. Corn only.',
    workedExample: {
      given: '30,000 plants per acre',
      result: '19 %',
      inputs: { stand: 30_000 },
      expected: { share: 0.19 },
      tolerance: 0.005,
      source: 'Nafziger 1996',
    },
  },
];
