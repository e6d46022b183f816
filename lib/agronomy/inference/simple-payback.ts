import { insufficient, value, type Outcome } from '../outcome';
import { requiredNumber } from '../required-number';
import { chanceAbove, type EstimatedDifference } from './chance-above';
import { studentQuantile } from './student-t';

export type PaybackAsked = {
  costDollars: number;
  acresPerYear: number;
  priceDollarsPerBushel: number;
  /** What it costs to run, such as wearing parts. */
  upkeepDollarsPerAcre: number;
  /** What it saves whatever the yield, such as labor. */
  savingDollarsPerYear: number;
  /** The yield gain in bushels per acre; null without an error of its own, as from one block. */
  gainBushelsPerAcre: EstimatedDifference | null;
  /** Within how many years it should be paid, for the chance of that. */
  withinYears: number;
};

type Chances = {
  chanceNever: number;
  chanceWithinYears: number;
  returnDollarsPerYear: { mean: number; lower: number; upper: number };
};

/** `may-never-pay` carries no number of years: the yearly return's interval reaches zero, so that none is its upper end. */
export type Payback =
  | (Chances & { kind: 'years'; years: number; yearsLower: number; yearsUpper: number })
  | (Chances & { kind: 'may-never-pay' });

/**
 * In how many years does a piece of equipment pay for itself?
 *
 * Takes the cost in dollars (above 0), acres a year (above 0), the price of corn (above 0), upkeep and yearly savings (0 or
 * more), the yield gain with its standard error and degrees of freedom, and the years asked about (above 0). Returns years
 * with a 95 % interval, or that it may never pay; both with the chance that it never does and that it is paid within the
 * years asked. Insufficient without an error of the gain, since then nobody can say whether the gain is there. Throws
 * ImpossibleInput outside those limits.
 * Equation: years = cost / (acres × (gain × price − upkeep) + savings), the interval from both ends of the gain's; the chance
 * of never is that of a yearly return of zero or less, by Student's t (`chanceAbove`).
 * Simple payback: without interest, and without the end of its life, which `netPresentValueDollars` reads. Acres, price and
 * gain are taken as the same every year. Example: $6,900, 620 acres, $4.10 and a gain of 3.0 ± 0.5 bu on 9 degrees of
 * freedom: 0.90 years, 0.66 to 1.45.
 */
export function simplePayback(asked: PaybackAsked): Outcome<Payback> {
  const cost = requiredNumber(asked.costDollars, 'costDollars', { above: 0 });
  const acres = requiredNumber(asked.acresPerYear, 'acresPerYear', { above: 0 });
  const price = requiredNumber(asked.priceDollarsPerBushel, 'priceDollarsPerBushel', { above: 0 });
  const upkeep = requiredNumber(asked.upkeepDollarsPerAcre, 'upkeepDollarsPerAcre', { atLeast: 0 });
  const saving = requiredNumber(asked.savingDollarsPerYear, 'savingDollarsPerYear', { atLeast: 0 });
  const within = requiredNumber(asked.withinYears, 'withinYears', { above: 0 });
  const gain = asked.gainBushelsPerAcre;
  if (gain === null)
    return insufficient('gain-without-error', 'a yield gain with its interval', 'no interval');

  const returnAt = (bushels: number) => acres * (bushels * price - upkeep) + saving;
  const gainFor = (dollarsPerYear: number) => ((dollarsPerYear - saving) / acres + upkeep) / price;
  const chanceNever = 1 - chanceAbove(gain, gainFor(0));
  const reach = studentQuantile(0.975, gain.degreesOfFreedom) * gain.standardError;
  const yearly = {
    mean: returnAt(gain.mean),
    lower: returnAt(gain.mean - reach),
    upper: returnAt(gain.mean + reach),
  };
  const chances = {
    chanceNever,
    chanceWithinYears: chanceAbove(gain, gainFor(cost / within)),
    returnDollarsPerYear: yearly,
  };
  if (yearly.lower <= 0) return value({ kind: 'may-never-pay', ...chances });
  return value({
    kind: 'years',
    years: cost / yearly.mean,
    yearsLower: cost / yearly.upper,
    yearsUpper: cost / yearly.lower,
    ...chances,
  });
}
