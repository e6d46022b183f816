import type { RegisterEntry } from './register-entry';

/** Smooth curves of emergence, and where the seeds went. */
export const emergenceFitEntries: readonly RegisterEntry[] = [
  {
    id: 'emergence-fit',
    version: '1',
    name: 'Smooth emergence curve',
    sentence: 'The days to 10, 50 and 90 % up and the spread, from a smooth curve fitted to what the visits saw.',
    equation: 'maximum of Σ nᵢ log{F(tᵢ) − F(tᵢ₋₁)}, seeds not seen n log{1 − d F(tₖ)}, or where counting has not ended less N log F(tₖ); F log-normal, log-logistic or Weibull, the lowest AIC',
    source: 'Onofri, Mesgaran and Ritz 2022, Weed Science',
    domain: 'Three intervals with new plants or more; below that the days are interpolated. No curve where none is best, or one so flat that its days are not told.',
    limits: 'Plants of one row are not independent: its standard errors are too small for a row, and settings are compared by strips.',
    workedExample: {
      given: '4, 17, 10, 7, 1 and 1 plants between days 4 to 5, 5 to 6, 6 to 7, 7 to 8, 8 to 9 and 10 to 11',
      result: 'log-logistic, half up on day 6.05, spread 2.61 days',
      inputs: { lower: [4, 5, 6, 7, 8, 10], upper: [5, 6, 7, 8, 9, 11], count: [4, 17, 10, 7, 1, 1] },
      expected: { half: 6.05094, spread: 2.61414, aic: 125.09539 },
      tolerance: 5e-6,
      source: 'R 4.2.2, survival 3.5-3, survreg of type interval2',
    },
  },
  {
    id: 'where-the-seeds-went',
    version: '2',
    name: 'Where the seeds went',
    sentence: 'Of the planned seeds so many are on time, late and missing; of the missing places that were dug so many held no seed or one that died, and what nobody dug is not accounted for.',
    equation: 'planned seeds = rate × area, less plants are missing, doubles apart; missing less digs are not accounted for; Wilson intervals',
    source: 'counts by definition; Wilson 1927; causes from extension keys (Iowa State, Ohio State, Wisconsin W127)',
    domain: 'Row samples with a tape sheet and a seeding rate; digs where there are any.',
    limits:
        'No seed found is a seed not dropped, or one that birds or rodents took. Digs speak for themselves only and are not spread over places that nobody dug. A key suggests, it does not decide. More seeds found than planned are shown beside it.',
    workedExample: {
      given: '34 seeds, 29 plants on time, 2 late, 1 double; digs at 2 of 3 places: no seed, a rotten seed',
      result: '85 % on time, 6 % late, 9 % missing; of 2 digs 1 without a seed; 1 seed, 3 %, not accounted for',
      inputs: { seeds: 34, onTime: 29, late: 2, doubles: 1 },
      expected: { onTime: 0.8529, late: 0.0588, missing: 0.0882, noSeed: 0.5, notAccountedFor: 0.0294 },
      tolerance: 5e-5,
      source: 'own arithmetic',
    },
  },
];
