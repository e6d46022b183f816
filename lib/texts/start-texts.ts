import type { DecisionChoice } from '@/lib/schemas/vocabulary';

/** The words of the page one comes to first. */
export const startTexts = {
  noFarmTitle: 'Begin with a farm',
  noFarmHint: 'Add the first farm, then its fields and what was planted in them.',
  noFarmAction: 'To farms and fields',
  noPlantingTitle: 'Nothing is planted yet',
  noPlantingHint: 'Open a field and add its planting: date, crop, row spacing, seeds.',
  noFarmSeen: 'You are attached to no farm yet. Ask the owner of the account.',
  waiting: (count: string) => `${count} ${count === '1' ? 'planting awaits' : 'plantings await'} a decision`,
  counting: (count: string) => `${count} ${count === '1' ? 'planting' : 'plantings'} this season`,
  rowsToCount: (count: string) => `${count} row ${count === '1' ? 'sample' : 'samples'} on your farms`,
  nothingToCount: 'There are no row samples on your farms yet',
  growerNone: 'No decision waits for you',
  scoutLead: 'Choose the row whose paper sheet is in your hand.',
  thisSeason: 'This season',
  earlier: 'Earlier seasons',
  counted: (visited: string, all: string) => `${visited} of ${all} row samples counted`,
  noRowSamples: 'no row samples laid out yet',
  lastVisit: (date: string) => `last visit ${date}`,
  neverVisited: 'nobody has been there',
  layOut: 'Trial drawn, not locked',
  awaits: 'Awaits a decision',
  signed: { keep: 'Keep, signed', replant: 'Replant, signed' } satisfies Record<DecisionChoice, string>,
  open: { plan: 'Plan', count: 'Count', scores: 'Scores', compare: 'Compare', decide: 'Decide' },
  allCounts: 'All counts of this planting',
  notCounted: 'not counted yet',
} as const;
