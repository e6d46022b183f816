import type { ReplantFigure, ReplantGap } from '@/lib/schemas/replant';

/** The words of keep or replant: its sentences, its pictures, its sum and what it rests on. */
export const replantTexts = {
  title: 'Keep or replant',
  anArea: { us: 'an acre', metric: 'a hectare' },
  wholeField: 'Whole field',
  scopes: 'Which part of the field',
  scope: (name: string, area: string | null) => (area === null ? name : `${name}, ${area}`),
  forArea: (dollars: string, area: string) => `${dollars} for the ${area}`,
  zoneSays: {
    keep: (zone: string, change: string) =>
      `In ${zone} the answer is another: keep, since replanting there would lose ${change}.`,
    replant: (zone: string, change: string) =>
      `In ${zone} the answer is another: replanting there would gain ${change}.`,
    'too-close': (zone: string) => `In ${zone} the answer is another: there it is too close to call.`,
    'cannot-tell': (zone: string) =>
      `In ${zone} the answer is another: the yield table cannot settle it there.`,
  },
  about: (amount: string) => `about ${amount}`,
  atLeast: (amount: string) => `at least ${amount}`,
  atMost: (amount: string) => `at most ${amount}`,
  between: (lower: string, upper: string) => `${lower} to ${upper}`,
  notInIt:
    'The price, the yield table and the second stand are not in that: they are taken as typed and as printed, and each can be off by more than the count.',
  notInItWithoutCount:
    'The price, the yield table and the second stand are taken as typed and as printed; each can be off by more than the count.',
  countingCanStop: 'No stand inside that interval turns the answer, so counting can stop.',
  countingCouldTurn:
    'Another stand inside that interval would turn the answer, so more row samples are worth their time.',
  closeToRounding: (amount: string) =>
    `One printed percent of the table is worth ${amount} here; a smaller difference could be its rounding.`,

  noAnswer: 'No answer yet',
  noAnswerForCrop: 'There is no answer for this crop',
  gaps: {
    'crop-without-table': () =>
      'The yield table behind keep or replant is of corn. For other crops Rowrise scores the stand and leaves this decision without a number.',
    'no-row-samples': ([zone]) =>
      zone === undefined
        ? 'Nothing has been counted here. Set out row samples, at least two, and count them first.'
        : `Nothing has been counted in ${zone}. Set out row samples there, at least two, and count them first.`,
    'zone-not-counted': (zones) =>
      `Nothing has been counted in ${zones.join(' and ')}. The whole field is answered when every zone has a counted row sample.`,
    'rest-not-counted': () =>
      'Nothing has been counted outside the zones. The whole field is answered when that part has a counted row sample as well; a zone can be answered alone.',
    'rest-without-area': () =>
      'Some row samples lie outside the zones, and the field has no area to weigh them by. Type the area of the field in the plan.',
    'rest-without-room': () =>
      'Some row samples lie in no zone, though the zones cover the whole field. Put each of them into its zone.',
    'figures-missing': () => '',
    'replant-not-after-planting': () =>
      'The replant day typed before is no longer after the planting date. Type the day you could replant.',
  } satisfies Record<ReplantGap['reason'], (names: readonly string[]) => string>,
  type: 'Type',
  and: ' and ',
  andPageAnswers: ', and this page answers.',
  toCounts: 'To the row samples',
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

  stand: 'The stand now',
  standInterval: (interval: string) => `95 % interval ${interval}.`,
  standWithoutInterval: 'One place cannot say how far off it may be; two row samples can.',
  weightedNote: 'The zones are counted each by itself and weighted by their area.',

  bars: {
    title: 'What keeping and replanting make',
    keep: (stand: string) => `Keep, ${stand} plants`,
    replant: (day: string, stand: string) => `Replant ${day}, ${stand} plants`,
    sample: (rows: string) => `Keeping rests on ${rows}`,
    uncertainty:
      'The line on a bar runs from the low to the high end: of the count for keeping, of a poor and a good second stand for replanting',
    bounded: 'A dashed bar is at most that long: the table ends before it',
    noRange: 'no range known',
    orLess: (lower: string, upper: string) => `${lower} or less to ${upper}`,
  },

  sum: {
    title: 'The sum, line by line',
    lead: 'Every number opens to what it was made from.',
    keepHead: (day: string) => `Keep, planted ${day}`,
    replantHead: (day: string) => `Replant ${day}`,
    moneyHead: { us: 'Replanting, dollars an acre', metric: 'Replanting, dollars a hectare' },
    stand: 'Stand',
    secondStand: 'Stand after replanting',
    tableShare: (day: string) => `Share of full yield, planted ${day}`,
    gapLoss: 'Less for gaps',
    unevenLoss: 'Less for unevenness',
    poorChance: 'Chance of a poor second stand',
    poorYield: 'which then yields, of full',
    ofFullYield: 'of the yield at full stand',
    keepYield: 'Keeping makes',
    replantYield: 'Replanting makes',
    yieldChange: (more: boolean, bushels: string, price: string) =>
      `${bushels} ${more ? 'more' : 'less'}, at ${price}`,
    yieldChangeBounded: (price: string) => `The difference in yield, at ${price}`,
    extraDrying: 'Extra drying',
    insurancePayment: 'Insurance payment',
    noCosts: 'No cost of replanting is in this sum.',
    gain: { us: 'Replanting, an acre', metric: 'Replanting, a hectare' },
    gainField: (area: string) => `For the ${area}`,
    noField: 'Type the area of the field in the plan to see the dollars for all of it.',
  },

  inputs: {
    planted: 'Planted',
    stand: 'The stand',
    interval: 'Its 95 % interval',
    readFor: 'Stand it is read for',
    reading: 'How it is read',
    printed: 'printed in the table',
    interpolated: 'on a straight line between printed cells',
    'no-plants': 'no plants, no yield',
    atMost: 'beyond the end of the table: at most the edge',
    extrapolated: 'the author of the table extrapolated after 25 May',
    fullYield: 'Yield at full stand and best date',
    fromSheet: 'typed for this sum',
    fromPlan: 'from the plan of the planting',
    typed: 'Typed',
    typedBy: 'Typed by',
    price: 'Price',
    row: (label: string) => `Row sample ${label}`,
    seen: (day: string) => `seen ${day}`,
    rounding: 'One printed percent of the table is worth',
    draws: 'Draws over the count',
  },

  breakEven: {
    label: 'Break-even stand',
    about: (stand: string) => `about ${stand}`,
    thisStand: (stand: string) => `this stand, ${stand}`,
    turnsAt: (stand: string) => `break-even, ${stand}`,
    scaleNote: (unit: string, hasInterval: boolean) =>
      `In ${unit}.${hasInterval ? ' The line above the tape is the count’s 95 % interval.' : ''} Hatched: replanting earns more; solid: keeping.`,
    exact: 'There keeping and replanting earn the same; above it keeping earns more.',
    bound: 'There keeping and replanting earn the same. It is a bound because a date lies beyond the table.',
    belowTable: (stand: string) => `Keeping earns more at every stand of the table, down to ${stand}.`,
    noneInTable: 'Replanting earns more at every stand of the table.',
    cannotTell: 'The table ends before it could say at which stand the two earn the same.',
  },

  rests: {
    title: 'What it rests on',
    table: 'The yield table',
    tableOrigin: (age: string) =>
      `Nafziger 1994, Journal of Production Agriculture 7:59, as printed by Purdue: ${age} old, averages over hybrids of the 1980s and 1990s in the central Corn Belt. Published tables of this kind differ by 5 to 10 points at one and the same stand and date.`,
    tableExtrapolated: 'Its rows after 25 May were extrapolated by its author.',
    lowYield: (yields: string, stand: string) =>
      `Fields under about ${yields} do not respond to stands above about ${stand}; the table does not know that.`,
    counts: 'The counts',
    uncounted: (labels: string) => `Not counted yet, so not in it: ${labels}.`,
    noRows: 'No row sample is counted yet.',
    label: 'Row sample',
    zone: 'Zone',
    seen: 'Last seen',
    noZone: 'outside the zones',
    draws: (draws: string, seed: string) => `${draws} draws from seed ${seed}.`,
    formulas: (versions: string) => `Formulas, with their versions: ${versions}.`,
  },
} as const;
