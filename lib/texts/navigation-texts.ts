/** The names of places; each appears only where it has a screen. */
export const navigationTexts = {
  start: 'Start',
  farms: 'Farms',
  settings: 'Settings',
  people: 'People',
  changes: 'Changes',
  methods: 'Methods',
  preferences: 'Preferences',
  plan: 'Plan',
  count: 'Count',
  scores: 'Scores',
  compare: 'Compare',
  decide: 'Decide',
} as const;
