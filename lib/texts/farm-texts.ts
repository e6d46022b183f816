/** The words of farms. */
export const farmTexts = {
  title: 'Farms and fields',
  addTitle: 'Add a farm',
  changeTitle: 'Change the farm',
  change: 'Change the farm',
  name: 'Farm name',
  timeZone: 'Time zone',
  timeZoneHint: 'Dates of field work are local days in this zone.',
  add: 'Add farm',
  save: 'Save farm',
  none: 'No farm yet',
  noneHint: 'Add the first farm. Its fields and plantings come next.',
  remove: (name: string) => `Remove the farm ${name}`,
  removeExplanation: 'The farm goes from the lists. A farm with fields stays.',
} as const;
