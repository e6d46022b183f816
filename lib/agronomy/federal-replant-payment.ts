import { requiredNumber } from './required-number';

export type ReplantInsurance = {
  guaranteeDollarsPerAcre: number;
  projectedPriceDollarsPerBushel: number;
  insuredShare: number;
  replantedAcres: number;
  unitAcres: number;
  plantedBeforeEarliestDate: boolean;
  paidAlreadyThisYear: boolean;
};

export type ReplantPayment =
  | { kind: 'payable'; dollarsPerAcre: number; limitedBy: 'guarantee' | 'bushels' }
  | { kind: 'not-payable'; because: 'area-too-small' | 'planted-too-early' | 'paid-already' };

/**
 * What would the federal crop insurance pay toward replanting corn, per acre?
 *
 * Takes the guarantee and the projected price in dollars, the insured share (0 to 1), acres replanted and acres of the
 * unit, and what would bar it. Returns dollars per acre and which limit held, or why nothing is payable. Never
 * insufficient; throws ImpossibleInput for amounts that cannot be.
 * Method: the lesser of 20 % of the guarantee and 8 bu/ac × projected price, times the share (8 bu: Iowa State 2012; the
 * rest from memory); at least 20 acres or 20 % of the unit; once a crop year; not for acres planted before the earliest
 * planting date (from memory). The insurer's consent comes before a stand is destroyed. Terms vary by county and year: the
 * agent's word counts. Example: guarantee $600, price $4.50, share 1: the lesser of $120 and $36 is $36.
 */
export function federalReplantPayment(insurance: ReplantInsurance): ReplantPayment {
  const guarantee = requiredNumber(insurance.guaranteeDollarsPerAcre, 'guaranteeDollarsPerAcre', { above: 0 });
  const price = requiredNumber(insurance.projectedPriceDollarsPerBushel, 'projectedPriceDollarsPerBushel', { above: 0 });
  const share = requiredNumber(insurance.insuredShare, 'insuredShare', { above: 0, atMost: 1 });
  const unit = requiredNumber(insurance.unitAcres, 'unitAcres', { above: 0 });
  const acres = requiredNumber(insurance.replantedAcres, 'replantedAcres', { above: 0, atMost: unit });
  if (insurance.plantedBeforeEarliestDate) return { kind: 'not-payable', because: 'planted-too-early' };
  if (insurance.paidAlreadyThisYear) return { kind: 'not-payable', because: 'paid-already' };
  if (acres < 20 && acres < 0.2 * unit) return { kind: 'not-payable', because: 'area-too-small' };
  const [byGuarantee, byBushels] = [0.2 * guarantee, 8 * price];
  return { kind: 'payable', dollarsPerAcre: Math.min(byGuarantee, byBushels) * share, limitedBy: byGuarantee < byBushels ? 'guarantee' : 'bushels' };
}
