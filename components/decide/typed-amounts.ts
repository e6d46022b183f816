import type { ReplantInputs } from '@/lib/schemas/replant-sheet';

export type TypedAmounts = {
  price: string | null;
  costs: { label: string; amount: string }[];
  extraDrying: string | null;
  insurancePayment: string | null;
};

/** The amounts of a sheet as they were typed, in whichever units that was. */
export function typedAmounts(inputs: ReplantInputs): TypedAmounts {
  return inputs.typedIn === 'us'
    ? {
        price: inputs.pricePerBushel,
        costs: inputs.costs.map(({ label, dollarsPerAcre }) => ({ label, amount: dollarsPerAcre })),
        extraDrying: inputs.extraDryingPerAcre,
        insurancePayment: inputs.insurancePaymentPerAcre,
      }
    : {
        price: inputs.pricePerTonne,
        costs: inputs.costs.map(({ label, dollarsPerHectare }) => ({ label, amount: dollarsPerHectare })),
        extraDrying: inputs.extraDryingPerHectare,
        insurancePayment: inputs.insurancePaymentPerHectare,
      };
}
