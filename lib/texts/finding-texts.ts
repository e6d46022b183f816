/** The sentence a stand is summed up in, part by part. */
export const findingTexts = {
  stand: (plants: string, unit: string) => `${plants} ${unit} stand`,
  ofSeed: (share: string) => `, ${share} of the seed`,
  spread: (days: string, isAtLeast: boolean) => ` They took ${isAtLeast ? 'at least ' : ''}${days} to come up, from 10 to 90 %.`,
  interval: (interval: string, from: string, weighted: string) => `The 95\u00a0% interval is ${interval}, from ${from}${weighted}.`,
  byArea: (zones: number) => `, weighted by the area of ${zones} zones`,
  countingOnly: (interval: string) =>
    `One row sample: counting alone leaves ${interval}, and it says nothing about the rest of the field.`,
  noInterval: (from: string, needed: string) => `From ${from}; an interval needs ${needed}.`,
  inStrips: (rows: string, strips: string) => `${rows} in ${strips}`,
  countingEnded: 'Counting has ended: two visits found nothing new.',
  stillComing: 'Counting has not ended: until two visits find nothing new, more may come.',
  halfUp: (day: string, isAtLatest: boolean) => `Half were up ${isAtLatest ? 'by' : 'on'} day ${day}${isAtLatest ? ' at the latest' : ''}`,
  late: (share: string, isAtLeast: boolean) => `${isAtLeast ? 'at least ' : ''}${share} of the plants came up late`,
  score: (points: string, isAtMost: boolean, parts: string, leftOut: string) =>
    `Score ${isAtMost ? 'at most ' : ''}${points} of 100: ${parts}${leftOut ? `; ${leftOut} left out` : ''}.`,
  parts: { stand: 'stand', timing: 'timing', spacing: 'spacing' },
} as const;
