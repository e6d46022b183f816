import { nafzigerYieldPercent } from './replant-table-nafziger';
import type { StandDateReading } from './replant-table-nafziger';
import type { MonthDay } from './replant-date';

/** From the least to the most a figure can be. The two are equal unless the table only gives a bound. */
export type Span = { lower: number; upper: number };

/** A cost of replanting as its payer calls it. */
export type ReplantCost = { label: string; dollarsPerAcre: number };

/** Everything the sum rests on, complete and checked. */
export type ReplantTerms = {
  maximumYieldBushelsPerAcre: number;
  priceDollarsPerBushel: number;
  plantedOn: MonthDay;
  gapLossShare: number;
  unevenLossShare: number;
  replantOn: MonthDay;
  replantPlantsPerAcre: number;
  poorSecondStandChance: number;
  poorSecondStandYieldShare: number;
  costs: readonly ReplantCost[];
  extraDryingDollarsPerAcre: number;
  insurancePaymentDollarsPerAcre: number;
};

/** One line of the sum. Dollar lines before `gain` add up to it: what is paid out is negative. */
export type ReplantLine = {
  id:
    | 'maximum-yield'
    | 'keep-table-share'
    | 'keep-gap-loss-share'
    | 'keep-uneven-loss-share'
    | 'keep-yield'
    | 'replant-table-share'
    | 'poor-second-stand-chance'
    | 'poor-second-stand-yield-share'
    | 'replant-yield'
    | 'yield-change'
    | 'yield-change-value'
    | 'replant-cost'
    | 'extra-drying'
    | 'insurance-payment'
    | 'gain';
  /** The payer's own words, on `replant-cost` lines only. */
  label: string | null;
  unit: 'bushels-per-acre' | 'share' | 'dollars-per-acre';
  amount: Span;
};

export type ReplantSum = {
  keepReading: StandDateReading;
  replantReading: StandDateReading;
  keepYieldBushelsPerAcre: Span;
  replantYieldBushelsPerAcre: Span;
  gainDollarsPerAcre: Span;
  lines: ReplantLine[];
};

/**
 * What does replanting gain over keeping, per acre, for one stand?
 *
 * Takes the terms (yields in bu/ac, shares 0 to 1, dollars per acre) and the stand in plants per acre. Returns
 * every line of the sum and the gain, each as a span whose ends differ only where the table gives a bound.
 * Never insufficient, since the terms are complete. Throws what the table throws.
 * Equation: keep = Ymax × pct × (1 − gap) × (1 − uneven); replant = Ymax × [(1 − p) × pct(new) + p × poor share];
 * gain = (replant − keep) × price − costs − extra drying + insurance payment.
 * What it does not tell: anything of uneven spacing, which is not charged, since the stand and the gaps already
 * charge the missing plants; nor what the insurer will consent to.
 * Example: 200 bu/ac, planted 30 April, 20,000 plants: keep 184 bu; replanted 25 May at 30,000: 174 bu.
 */
export function replantSum(terms: ReplantTerms, plantsPerAcre: number): ReplantSum {
  const keepReading = nafzigerYieldPercent(terms.plantedOn, plantsPerAcre, 'plantedOn');
  const replantReading = nafzigerYieldPercent(terms.replantOn, terms.replantPlantsPerAcre, 'replantOn');
  const keepShare = shareSpan(keepReading);
  const replantShare = shareSpan(replantReading);
  const keepFactor =
    terms.maximumYieldBushelsPerAcre * (1 - terms.gapLossShare) * (1 - terms.unevenLossShare);
  const poorShare = terms.poorSecondStandChance * terms.poorSecondStandYieldShare;
  const keep = mapSpan(keepShare, (share) => keepFactor * share);
  const replant = mapSpan(
    replantShare,
    (share) => terms.maximumYieldBushelsPerAcre * ((1 - terms.poorSecondStandChance) * share + poorShare),
  );
  const change = { lower: replant.lower - keep.upper, upper: replant.upper - keep.lower };
  const changeValue = mapSpan(change, (bushels) => bushels * terms.priceDollarsPerBushel);
  const paid =
    terms.costs.reduce((sum, cost) => sum + cost.dollarsPerAcre, 0) +
    terms.extraDryingDollarsPerAcre -
    terms.insurancePaymentDollarsPerAcre;
  const gain = mapSpan(changeValue, (dollars) => dollars - paid);

  return {
    keepReading,
    replantReading,
    keepYieldBushelsPerAcre: keep,
    replantYieldBushelsPerAcre: replant,
    gainDollarsPerAcre: gain,
    lines: [
      line('maximum-yield', 'bushels-per-acre', terms.maximumYieldBushelsPerAcre),
      line('keep-table-share', 'share', keepShare),
      line('keep-gap-loss-share', 'share', terms.gapLossShare),
      line('keep-uneven-loss-share', 'share', terms.unevenLossShare),
      line('keep-yield', 'bushels-per-acre', keep),
      line('replant-table-share', 'share', replantShare),
      line('poor-second-stand-chance', 'share', terms.poorSecondStandChance),
      line('poor-second-stand-yield-share', 'share', terms.poorSecondStandYieldShare),
      line('replant-yield', 'bushels-per-acre', replant),
      line('yield-change', 'bushels-per-acre', change),
      line('yield-change-value', 'dollars-per-acre', changeValue),
      ...terms.costs.map((cost) =>
        line('replant-cost', 'dollars-per-acre', negated(cost.dollarsPerAcre), cost.label),
      ),
      line('extra-drying', 'dollars-per-acre', negated(terms.extraDryingDollarsPerAcre)),
      line('insurance-payment', 'dollars-per-acre', terms.insurancePaymentDollarsPerAcre),
      line('gain', 'dollars-per-acre', gain),
    ],
  };
}

/** A bound leaves everything from no yield to the edge's value open. */
function shareSpan(reading: StandDateReading): Span {
  const upper = reading.percent / 100;
  return { lower: reading.kind === 'value' ? upper : 0, upper };
}

function mapSpan(span: Span, transform: (end: number) => number): Span {
  return { lower: transform(span.lower), upper: transform(span.upper) };
}

function negated(dollars: number): number {
  return dollars === 0 ? 0 : -dollars;
}

function line(
  id: ReplantLine['id'],
  unit: ReplantLine['unit'],
  amount: number | Span,
  label: string | null = null,
): ReplantLine {
  return { id, label, unit, amount: typeof amount === 'number' ? { lower: amount, upper: amount } : amount };
}
