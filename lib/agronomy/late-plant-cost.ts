import { CORN_BUSHEL_POUNDS } from './corn-bushel';
import { ImpossibleInput } from './outcome';
import type { Span } from './replant-sum';
import { requiredNumber } from './required-number';

export type LatePlantCostAsked = {
  /** Late less neighbor, pounds of grain a plant at standard moisture; as `latePlantsWeighed` gives it. */
  differencePounds: { mean: number; lower: number; upper: number };
  latePlantsPerAcre: number;
  priceDollarsPerBushel: number;
};

type Cost = Span & { mean: number };
export type LatePlantCost = { centsPerLatePlant: Cost; bushelsPerAcre: Cost; dollarsPerAcre: Cost };

/**
 * What does each late plant cost, and all of them on an acre?
 *
 * Takes the weighed difference in pounds a plant with its interval, late plants per acre (0 or more) and the price of corn
 * (above 0). Returns cents a late plant, and bushels and dollars per acre, each with the interval of the difference; below
 * zero where late plants made more. Never insufficient; throws ImpossibleInput outside those limits or for an interval that
 * does not hold its mean.
 * Equation: pounds lost / 56 × price, × late plants per acre. The interval carries the weighing alone, not the count of late
 * plants. It overstates the cost by what neighbors took over. Example: 0.15 lb less, 2,000 late plants and $4.10: 1.1 cents
 * a plant, 5.36 bu and $21.96 an acre.
 */
export function latePlantCost(asked: LatePlantCostAsked): LatePlantCost {
  const { mean, lower, upper } = asked.differencePounds;
  [mean, lower, upper].forEach((pounds) => requiredNumber(pounds, 'differencePounds'));
  if (lower > mean || upper < mean)
    throw new ImpossibleInput('The interval does not hold its mean.', 'differencePounds');
  const plants = requiredNumber(asked.latePlantsPerAcre, 'latePlantsPerAcre', { atLeast: 0 });
  const price = requiredNumber(asked.priceDollarsPerBushel, 'priceDollarsPerBushel', { above: 0 });
  // What is lost is the difference turned round, so its lower end is the difference's upper one.
  const scaled = (factor: number): Cost => ({
    mean: 0 - mean * factor,
    lower: 0 - upper * factor,
    upper: 0 - lower * factor,
  });
  return {
    centsPerLatePlant: scaled((100 * price) / CORN_BUSHEL_POUNDS),
    bushelsPerAcre: scaled(plants / CORN_BUSHEL_POUNDS),
    dollarsPerAcre: scaled((plants * price) / CORN_BUSHEL_POUNDS),
  };
}
