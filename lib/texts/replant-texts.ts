import type { ReplantFigure } from '@/lib/schemas/replant';

/** The words of keep or replant: its sentences, its sum, its form and its signature. */
export const replantTexts = {
  title: 'Keep or replant',
  anArea: { us: 'an acre', metric: 'a hectare' },
  wholeField: 'Whole field',
  scopes: 'Which part of the field',
  scope: (name: string, area: string | null) => (area === null ? name : `${name}, ${area}`),
  forArea: (dollars: string, area: string) => `${dollars} for the ${area}`,
  zoneSays: {
    keep: (zone: string, change: string) => `In ${zone} the answer is another: keep, since replanting there would lose ${change}.`,
    replant: (zone: string, change: string) => `In ${zone} the answer is another: replanting there would gain ${change}.`,
    'too-close': (zone: string) => `In ${zone} the answer is another: there it is too close to call.`,
    'cannot-tell': (zone: string) => `In ${zone} the answer is another: the yield table cannot settle it there.`,
  },
  about: (amount: string) => `about ${amount}`,
  atLeast: (amount: string) => `at least ${amount}`,
  notInIt: 'Only the count is drawn at random in that. The price, the yield table and the second stand are not in it: they are taken as typed and as printed, and each can be off by more than the count.',
  notInItWithoutCount: 'The price, the yield table and the second stand are taken as typed and as printed; each can be off by more than the count.',
  countingCanStop: 'No stand inside that interval turns the answer, so counting can stop.',
  countingCouldTurn: 'Another stand inside that interval would turn the answer, so more row samples are worth their time.',
  closeToRounding: (amount: string) => `One printed percent of the table is worth ${amount} here; a smaller difference could be its rounding.`,

  figureNames: {
    fullYield: 'the yield at full stand',
    price: 'the price',
    replantOn: 'the day you could replant',
    replantStand: 'the stand after replanting',
    costs: 'the costs of replanting',
    extraDrying: 'the extra drying',
    insurancePayment: 'the insurance payment',
    poorSecondStandChance: 'the chance of a poor second stand',
    poorSecondStandYield: 'what a poor second stand yields',
  } satisfies Record<ReplantFigure, string>,
} as const;
