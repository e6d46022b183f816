import 'server-only';
import type { ReplantTerms } from '@/lib/agronomy/replant-sum';
import { hectaresPerAcre } from '@/lib/format/shown-in-units';
import { bushelsPerTonne } from '@/lib/format/price-text';
import { readingIn } from '@/lib/schemas/reading';
import type { ReplantBasis, ReplantFigure } from '@/lib/schemas/replant';
import type { ReplantInputs } from '@/lib/schemas/replant-sheet';

type Planting = { plantedOn: string; fullYield: { bushelsPerAcre: number } | null };
export type TermsOrMissing =
  { kind: 'terms'; terms: ReplantTerms } | { kind: 'missing'; figures: ReplantFigure[] };

/** What each amount is a bushel and an acre, wherever it was typed; money becomes a number here, on its way into the core. */
export function amountsOf(inputs: ReplantInputs) {
  const amount = (text: string | null, perUs: number) => (text === null ? null : Number(text) * perUs);
  if (inputs.typedIn === 'us') {
    return {
      dollarsPerBushel: amount(inputs.pricePerBushel, 1),
      costs: inputs.costs.map(({ label, dollarsPerAcre }) => ({
        label,
        dollarsPerAcre: Number(dollarsPerAcre),
      })),
      extraDrying: amount(inputs.extraDryingPerAcre, 1),
      insurancePayment: amount(inputs.insurancePaymentPerAcre, 1),
    };
  }
  return {
    dollarsPerBushel: amount(inputs.pricePerTonne, 1 / bushelsPerTonne),
    costs: inputs.costs.map(({ label, dollarsPerHectare }) => ({
      label,
      dollarsPerAcre: Number(dollarsPerHectare) * hectaresPerAcre,
    })),
    extraDrying: amount(inputs.extraDryingPerHectare, hectaresPerAcre),
    insurancePayment: amount(inputs.insurancePaymentPerHectare, hectaresPerAcre),
  };
}

/** The yield at full stand that the sum uses: the sheet's own, else what the plan of the planting has. */
export function fullYieldOf(inputs: ReplantInputs | null, planned: number | null): ReplantBasis['fullYield'] {
  if (inputs?.fullYield) return { bushelsPerAcre: readingIn(inputs.fullYield, 'bu/ac'), from: 'sheet' };
  return planned === null ? null : { bushelsPerAcre: planned, from: 'planting' };
}

/** The terms of the sum in the units of the core, or which figures somebody still has to type. None is guessed. */
export function replantTerms(inputs: ReplantInputs | null, planting: Planting): TermsOrMissing {
  const missing: ReplantFigure[] = planting.fullYield ? [] : ['fullYield'];
  if (!inputs) {
    return {
      kind: 'missing',
      figures: [
        ...missing,
        'price',
        'replantOn',
        'replantStand',
        'costs',
        'extraDrying',
        'insurancePayment',
        'poorSecondStandChance',
      ],
    };
  }
  const { dollarsPerBushel, costs, extraDrying, insurancePayment } = amountsOf(inputs);
  const { replantOn, replantStand, poorSecondStandYieldPercent } = inputs;
  if (dollarsPerBushel === null) missing.push('price');
  if (replantOn === null) missing.push('replantOn');
  if (replantStand === null) missing.push('replantStand');
  if (extraDrying === null) missing.push('extraDrying');
  if (insurancePayment === null) missing.push('insurancePayment');
  if (inputs.poorSecondStandChancePercent > 0 && poorSecondStandYieldPercent === null)
    missing.push('poorSecondStandYield');
  if (
    missing.length > 0 ||
    !planting.fullYield ||
    dollarsPerBushel === null ||
    replantOn === null ||
    replantStand === null ||
    extraDrying === null ||
    insurancePayment === null
  ) {
    return { kind: 'missing', figures: missing };
  }
  return {
    kind: 'terms',
    terms: {
      maximumYieldBushelsPerAcre: planting.fullYield.bushelsPerAcre,
      priceDollarsPerBushel: dollarsPerBushel,
      plantedOn: monthDay(planting.plantedOn),
      gapLossShare: inputs.gapLossPercent / 100,
      unevenLossShare: inputs.unevenLossPercent / 100,
      replantOn: monthDay(replantOn),
      replantPlantsPerAcre: readingIn(replantStand, 'per-acre'),
      poorSecondStandChance: inputs.poorSecondStandChancePercent / 100,
      poorSecondStandYieldShare: (poorSecondStandYieldPercent ?? 0) / 100,
      costs,
      extraDryingDollarsPerAcre: extraDrying,
      insurancePaymentDollarsPerAcre: insurancePayment,
    },
  };
}

function monthDay(isoDate: string) {
  return { month: Number(isoDate.slice(5, 7)), day: Number(isoDate.slice(8, 10)) };
}

/** A second stand is planted after the first, in the same season; the table knows days of the year and no years. */
export function isAfterPlanting(replantOn: string, plantedOn: string): boolean {
  return replantOn > plantedOn && replantOn.slice(0, 4) === plantedOn.slice(0, 4);
}
