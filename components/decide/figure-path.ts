import type { ReplantFigure } from '@/lib/schemas/replant';
import type { UnitSystem } from '@/lib/schemas/vocabulary';

const paths: Record<ReplantFigure, Record<UnitSystem, string>> = {
  fullYield: { us: 'fullYield', metric: 'fullYield' },
  price: { us: 'pricePerBushel', metric: 'pricePerTonne' },
  replantOn: { us: 'replantOn', metric: 'replantOn' },
  replantStand: { us: 'replantStand', metric: 'replantStand' },
  costs: { us: 'costs.0.dollarsPerAcre', metric: 'costs.0.dollarsPerHectare' },
  extraDrying: { us: 'extraDryingPerAcre', metric: 'extraDryingPerHectare' },
  insurancePayment: { us: 'insurancePaymentPerAcre', metric: 'insurancePaymentPerHectare' },
  poorSecondStandChance: { us: 'poorSecondStandChancePercent', metric: 'poorSecondStandChancePercent' },
  poorSecondStandYield: { us: 'poorSecondStandYieldPercent', metric: 'poorSecondStandYieldPercent' },
};

/** Where in the body of a sheet a figure stands, typed in these units: what names the field on the page and in a refusal. */
export function figurePath(figure: ReplantFigure, typedIn: UnitSystem): string {
  return `inputs.${paths[figure][typedIn]}`;
}

/** The path of one amount in the list of costs. */
export function costAmountPath(index: number, typedIn: UnitSystem): string {
  return `inputs.costs.${index}.${typedIn === 'us' ? 'dollarsPerAcre' : 'dollarsPerHectare'}`;
}
