/** The words of farms and fields. */
export const farmTexts = {
  title: 'Farms and fields',
  addTitle: 'Add a farm',
  changeTitle: 'Change the farm',
  name: 'Farm name',
  timeZone: 'Time zone',
  timeZoneHint: 'Dates of field work are local days in this zone.',
  add: 'Add farm',
  save: 'Save farm',
  none: 'No farm yet',
  noneHint: 'Add the first farm. Its fields and plantings come next.',
} as const;
