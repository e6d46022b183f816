import { ImpossibleInput, insufficient, value } from './outcome';
import type { Outcome } from './outcome';
import { breakEvenStand } from './replant-break-even';
import type { BreakEvenStand } from './replant-break-even';
import { dayOfYear } from './replant-date';
import type { MonthDay } from './replant-date';
import { replantDraws } from './replant-draws';
import type { ReplantDraws, StandCount } from './replant-draws';
import { replantSum } from './replant-sum';
import type { ReplantCost, ReplantSum, ReplantTerms, Span } from './replant-sum';
import { requiredNumber } from './required-number';

/** What the grower and the records give. Null is not given; an empty list of costs is given, and none. */
export type ReplantQuestion = {
  stand: StandCount | null;
  maximumYieldBushelsPerAcre: number | null;
  priceDollarsPerBushel: number | null;
  acres: number | null;
  plantedOn: MonthDay | null;
  gapLossShare: number;
  unevenLossShare: number;
  replantOn: MonthDay | null;
  replantPlantsPerAcre: number | null;
  poorSecondStandChance: number | null;
  /** Share of the field's maximum yield that a poor second stand would make; needed when its chance is above 0. */
  poorSecondStandYieldShare: number | null;
  costs: readonly ReplantCost[] | null;
  extraDryingDollarsPerAcre: number | null;
  insurancePaymentDollarsPerAcre: number | null;
  seed: number;
};

export type ReplantRecommendation = 'keep' | 'replant' | 'too-close' | 'cannot-tell';

export type ReplantOverInterval = {
  standLower: number;
  standUpper: number;
  gainAtLowerDollarsPerAcre: Span;
  gainAtUpperDollarsPerAcre: Span;
  draws: ReplantDraws;
  /** False when every stand the interval holds, read at its ends, gives the same answer: counting can stop. */
  anotherCountCouldTurnIt: boolean;
};

export type Replant = {
  recommendation: ReplantRecommendation;
  /** Why a call is too close or open; null when the recommendation is to keep or to replant. */
  because: 'within-table-rounding' | 'count-reaches-both' | 'table-ends' | null;
  /** True when a figure is only bounded by the table and the recommendation holds all the same. */
  standsDespiteBound: boolean;
  isBounded: boolean;
  sum: ReplantSum;
  gainDollarsPerAcre: Span;
  gainDollarsField: Outcome<Span>;
  /** What one printed percent of the table is worth; a smaller gain could be its rounding alone. */
  tableRoundingDollarsPerAcre: number;
  overInterval: Outcome<ReplantOverInterval>;
  breakEven: BreakEvenStand;
};

/**
 * Keep this stand, or replant it?
 *
 * Takes the stand with its error (plants per acre), the field's maximum yield (bu/ac), price, dates, the second
 * stand and every cost, all as the caller's own figures. Returns the sum line by line, a recommendation, how it
 * holds over the count's interval, the break-even stand, and the gain for the field.
 * Insufficient, naming each, when something needed is not given. Throws ImpossibleInput, naming the field, for
 * figures that cannot be, and for a replant day that is not after planting.
 * Method: `replantSum` on the table of Nafziger 1994. *Keep* or *replant* only when the gain is further from zero
 * than one printed percent of the table is worth and has the same sign at both ends of the count's interval; else
 * *too close*. Where the table gives only a bound, the same rule on the whole span; when the span itself holds
 * both answers, *cannot tell*.
 * What it does not tell: how far the tables differ among themselves (5 to 10 points at one cell), the cause of
 * the poor stand, or what insurer, seed supplier and herbicide labels allow.
 * Example: planted 30 April, 20,000 plants, 200 bu/ac; replanting on 25 May at 30,000 makes 10 bu less: keep.
 */
export function replant(question: ReplantQuestion): Outcome<Replant> {
  const missing = missingFrom(question);
  if (missing.length > 0) return insufficient('replant-figures-missing', missing.join(', '), 'not given');
  const stand = question.stand as StandCount;
  const terms = checkedTerms(question);
  checkStand(stand);

  const sum = replantSum(terms, stand.plantsPerAcre);
  const gain = sum.gainDollarsPerAcre;
  const isBounded = sum.keepReading.kind === 'at-most' || sum.replantReading.kind === 'at-most';
  const rounding = 0.01 * terms.maximumYieldBushelsPerAcre * terms.priceDollarsPerBushel;
  const interval = overInterval(terms, stand, question.seed);
  const call = recommended(gain, rounding, interval);

  return value({
    ...call,
    isBounded,
    standsDespiteBound: isBounded && call.because === null,
    sum,
    gainDollarsPerAcre: gain,
    gainDollarsField:
      question.acres === null
        ? insufficient('acres-missing', 'acres', 'not given')
        : value({ lower: gain.lower * question.acres, upper: gain.upper * question.acres }),
    tableRoundingDollarsPerAcre: rounding,
    overInterval: interval,
    breakEven: breakEvenStand(terms),
  });
}

function recommended(
  gain: Span,
  rounding: number,
  interval: Outcome<ReplantOverInterval>,
): Pick<Replant, 'recommendation' | 'because'> {
  const keepWins = gain.upper < -rounding;
  const replantWins = gain.lower > rounding;
  if (!keepWins && !replantWins) {
    return gain.lower < -rounding || gain.upper > rounding
      ? { recommendation: 'cannot-tell', because: 'table-ends' }
      : { recommendation: 'too-close', because: 'within-table-rounding' };
  }
  if (interval.kind === 'value' && interval.value.anotherCountCouldTurnIt) {
    return { recommendation: 'too-close', because: 'count-reaches-both' };
  }
  return { recommendation: keepWins ? 'keep' : 'replant', because: null };
}

function overInterval(terms: ReplantTerms, stand: StandCount, seed: number): Outcome<ReplantOverInterval> {
  const { error } = stand;
  if (error === null)
    return insufficient('count-without-error', 'at least 2 row samples', 'no standard error');
  const gainAtStand = (plantsPerAcre: number) => replantSum(terms, plantsPerAcre).gainDollarsPerAcre;
  const standLower = Math.max(0, error.lower);
  const gainAtLower = gainAtStand(standLower);
  const gainAtUpper = gainAtStand(error.upper);
  const everKeep = Math.max(gainAtLower.upper, gainAtUpper.upper) < 0;
  const everReplant = Math.min(gainAtLower.lower, gainAtUpper.lower) > 0;
  return value({
    standLower,
    standUpper: error.upper,
    gainAtLowerDollarsPerAcre: gainAtLower,
    gainAtUpperDollarsPerAcre: gainAtUpper,
    draws: replantDraws({ plantsPerAcre: stand.plantsPerAcre, ...error }, gainAtStand, seed),
    anotherCountCouldTurnIt: !everKeep && !everReplant,
  });
}

const NEEDED = [
  ['stand', 'the stand'],
  ['maximumYieldBushelsPerAcre', 'the yield at full stand'],
  ['priceDollarsPerBushel', 'the price'],
  ['plantedOn', 'the planting date'],
  ['replantOn', 'the replant date'],
  ['replantPlantsPerAcre', 'the second stand'],
  ['poorSecondStandChance', 'the chance of a poor second stand'],
  ['costs', 'the replant costs'],
  ['extraDryingDollarsPerAcre', 'the extra drying'],
  ['insurancePaymentDollarsPerAcre', 'the insurance payment'],
] as const;

function missingFrom(question: ReplantQuestion): string[] {
  const missing: string[] = NEEDED.filter(([key]) => question[key] === null).map(([, name]) => name);
  if ((question.poorSecondStandChance ?? 0) > 0 && question.poorSecondStandYieldShare === null) {
    missing.push('the yield of a poor second stand');
  }
  return missing;
}

function checkedTerms(question: ReplantQuestion): ReplantTerms {
  const given = question as { [key in keyof ReplantQuestion]: NonNullable<ReplantQuestion[key]> };
  const share = (key: 'gapLossShare' | 'unevenLossShare' | 'poorSecondStandChance') =>
    requiredNumber(given[key], key, { atLeast: 0, atMost: 1 });
  if (dayOfYear(given.replantOn, 'replantOn') <= dayOfYear(given.plantedOn, 'plantedOn')) {
    throw new ImpossibleInput('The replant date is not after the planting date.', 'replantOn');
  }
  if (question.acres !== null) requiredNumber(question.acres, 'acres', { above: 0 });
  return {
    maximumYieldBushelsPerAcre: requiredNumber(
      given.maximumYieldBushelsPerAcre,
      'maximumYieldBushelsPerAcre',
      { above: 0 },
    ),
    priceDollarsPerBushel: requiredNumber(given.priceDollarsPerBushel, 'priceDollarsPerBushel', { above: 0 }),
    plantedOn: given.plantedOn,
    gapLossShare: share('gapLossShare'),
    unevenLossShare: share('unevenLossShare'),
    replantOn: given.replantOn,
    replantPlantsPerAcre: requiredNumber(given.replantPlantsPerAcre, 'replantPlantsPerAcre', { above: 0 }),
    poorSecondStandChance: share('poorSecondStandChance'),
    poorSecondStandYieldShare: requiredNumber(
      question.poorSecondStandYieldShare ?? 0,
      'poorSecondStandYieldShare',
      {
        atLeast: 0,
        atMost: 1,
      },
    ),
    costs: given.costs.map((cost) => ({
      label: cost.label,
      dollarsPerAcre: requiredNumber(cost.dollarsPerAcre, 'costs', { atLeast: 0 }),
    })),
    extraDryingDollarsPerAcre: requiredNumber(given.extraDryingDollarsPerAcre, 'extraDryingDollarsPerAcre', {
      atLeast: 0,
    }),
    insurancePaymentDollarsPerAcre: requiredNumber(
      given.insurancePaymentDollarsPerAcre,
      'insurancePaymentDollarsPerAcre',
      { atLeast: 0 },
    ),
  };
}

function checkStand(stand: StandCount): void {
  requiredNumber(stand.plantsPerAcre, 'stand', { atLeast: 0 });
  if (stand.error === null) return;
  requiredNumber(stand.error.standardErrorPlantsPerAcre, 'stand', { atLeast: 0 });
  requiredNumber(stand.error.degreesOfFreedom, 'stand', { atLeast: 1 });
  requiredNumber(stand.error.lower, 'stand', { atMost: stand.plantsPerAcre });
  requiredNumber(stand.error.upper, 'stand', { atLeast: stand.plantsPerAcre });
}
