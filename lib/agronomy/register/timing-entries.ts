import type { RegisterEntry, WorkedExample } from './register-entry';

type TimingId =
  | 'emergenceCurve'
  | 'daysTo10'
  | 'daysTo50'
  | 'daysTo90'
  | 'spreadDays'
  | 'lateShare'
  | 'lateShareFromCounts'
  | 'latePattern';

const tenVisits = {
  days: [1, 2, 3, 4, 5, 6, 7, 8, 9, 10],
  plantsUp: [0, 2, 4, 15, 25, 38, 45, 50, 50, 50],
};

const percentileEquation =
  'tᵢ + (pN − cᵢ)(tⱼ − tᵢ) / (cⱼ − cᵢ), c the plants up by visit, N the plants emerged; a count equal to pN is its own day';

const percentileSource = 'Farooq et al. 2005, J. Integr. Plant Biol. 47:187';

const percentileLimits =
  'Of the plants that came up, not of the seeds sown; it moves later while plants still come. Where the first visit found that many up, it is "by that day at the latest". A setting or planting with strips: the mean of its strips.';

function percentileExample(result: string, days: number): WorkedExample {
  return {
    given: '0, 2, 4, 15, 25, 38, 45, 50, 50 and 50 plants on days 1 to 10',
    result,
    inputs: tenVisits,
    expected: { days },
    tolerance: 1e-6,
    source:
      days === 5
        ? 'Farooq et al. 2005 by definition; germination packages that answer differently here divide 0 by 0'
        : 'A germination index package, 3.090909; other percentiles by the same formula in R 4.2.2',
  };
}

function percentileEntry(id: TimingId, percent: number, example: WorkedExample): RegisterEntry {
  return {
    id,
    version: '1',
    name: `Days to ${percent} % up`,
    sentence: `Days after planting until ${percent} % of the emerged stand were up.`,
    equation: percentileEquation,
    source: percentileSource,
    domain: 'At least one plant up; exact where a visit came before that many were up.',
    limits: percentileLimits,
    workedExample: example,
  };
}

export const timingEntries: Record<TimingId, RegisterEntry> = {
  emergenceCurve: {
    id: 'emergenceCurve',
    version: '1',
    name: 'Emergence curve',
    sentence: 'Plants that had come up by each visit.',
    equation:
      'The never-falling line closest to the counts (pooled adjacent violators). Row samples visited in the same rounds: their counts added, then fitted once; otherwise each row read by a straight line at all days, then added.',
    source: 'Barlow et al. 1972, isotonic regression; the pooling of unlike rounds is our own.',
    domain: 'At least one count with a plant up.',
    limits:
      'A count says only that a plant came up since the visit before. Losses are a number of their own.',
    workedExample: {
      given: '2, 9, 17, 16, 24, 23, 27 and 26 plants on days 5 to 12',
      result: '2, 9, 16.5, 16.5, 23.5, 23.5, 26.5 and 26.5 came up, 3 were lost',
      inputs: { days: [5, 6, 7, 8, 9, 10, 11, 12], plantsUp: [2, 9, 17, 16, 24, 23, 27, 26] },
      expected: { thirdVisit: 16.5, plantsEmerged: 26.5, plantsLost: 3 },
      tolerance: 1e-9,
      source: 'R 4.2.2, isoreg',
    },
  },
  daysTo10: percentileEntry('daysTo10', 10, percentileExample('3.09 days', 3.09090909090909)),
  daysTo50: percentileEntry('daysTo50', 50, percentileExample('5 days, the day of that count', 5)),
  daysTo90: percentileEntry('daysTo90', 90, percentileExample('7 days', 7)),
  spreadDays: {
    id: 'spreadDays',
    version: '1',
    name: 'Emergence spread',
    sentence: 'Days from 10 to 90 % of the emerged stand.',
    equation: 'days to 90 % − days to 10 %',
    source: percentileSource,
    domain: 'A visit before nine tenths were up. "At least" until two visits found nothing new.',
    limits:
      'Dead seeds make a stand look even: read it beside the final stand. Rows pooled into one curve have a wider spread than the mean of their own.',
    workedExample: percentileExample('3.91 days', 3.90909090909091),
  },
  lateShare: {
    id: 'lateShare',
    version: '1',
    name: 'Late share',
    sentence: 'The share of plants that came up well after the first flush of their row.',
    equation:
      'plants whose delay is above the limit / plants with a known delay; delay = middle of the two visits around the plant − day 10 % of its row sample were up',
    source:
      'Own classes: slow above 2 days, late above 7, very late above 14; the limits can be changed for a planting.',
    domain: 'Tape sheets with markers or late plants marked; otherwise the counts.',
    limits:
      'A plant’s day is known to half the time between two visits. Plants that died before the sheet are not on it.',
    workedExample: {
      given:
        'first flush on day 9.4; a plant missed on day 17 and seen on day 18, three plants seen by day 10',
      result: '8.1 days behind, late: 1 of 4, 25 %',
      inputs: { firstFlushDays: 9.4, afterDays: 17, byDays: 18 },
      expected: { delayDays: 8.1, share: 0.25 },
      tolerance: 1e-9,
      source: 'own arithmetic',
    },
  },
  lateShareFromCounts: {
    id: 'lateShareFromCounts',
    version: '1',
    name: 'Late share by the counts',
    sentence: 'The share of the emerged stand that came up more than the limit after the first flush.',
    equation: '1 − plants up at (day 10 % were up + limit) / plants emerged, straight between visits',
    source: 'Own definition.',
    domain: 'Two visits or more. "At least" while plants still come.',
    limits: 'It does not tell which plants are late, so their pattern stays unknown.',
    workedExample: {
      given: '0, 20, 20, 25, 25 and 25 plants on days 8, 10, 17, 19, 20 and 21',
      result: 'first flush on day 8.25, 20 up on day 15.25: 20 % late',
      inputs: { days: [8, 10, 17, 19, 20, 21], plantsUp: [0, 20, 20, 25, 25, 25] },
      expected: { share: 0.2, delayDays: 9.75 },
      tolerance: 1e-9,
      source: 'own arithmetic',
    },
  },
  latePattern: {
    id: 'latePattern',
    version: '1',
    name: 'Pattern of late plants',
    sentence: 'Whether late plants stand alone or in groups along the row.',
    equation: 'late plants / unbroken runs of late plants; below 2 alternating, 2 and more in groups',
    source: 'The patterns of Nafziger, Carter and Graham 1991 (runs of 1 and of 3); the limit is our own.',
    domain: 'Tape sheets with at least one late plant.',
    limits: 'Runs lengthen with the late share even where their order is chance.',
    workedExample: {
      given: 'late, in time, late, late',
      result: '2 runs of 1.5 plants on average: alternating',
      inputs: { late: [1, 0, 1, 1] },
      expected: { meanRunLength: 1.5 },
      tolerance: 0,
      source: 'own arithmetic',
    },
  },
};
