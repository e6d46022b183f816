/** The words of the plan of a planting. */
export const planTexts = {
  pageTitle: 'Plan',
  titleTrial: (settings: string, blocks: string) => `${settings} in ${blocks}`,
  titleSamples: (samples: string) => `${samples} to count`,
  titleNothing: 'Nothing is laid out yet',
  factsTitle: 'What was planted',
  change: 'Change the planting',
  remove: 'Remove this planting',
  removeExplanation: 'It goes from the lists. A planting with row samples stays.',
  notGiven: 'not given',
  plantedOn: 'Planted',
  intendedStand: 'Intended final stand',
  fullYield: 'Yield at a full stand planted on the best date',
  tagGermination: 'Germination on the tag',
  limits: 'Slow, late, very late after',
  limitsText: (slow: string, late: string, veryLate: string) => `${slow}, ${late}, ${veryLate} days`,
  zones: 'Zones',
} as const;
