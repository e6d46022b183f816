import 'server-only';
import { replant } from '@/lib/agronomy/replant';
import { replantSum, type ReplantTerms, type Span } from '@/lib/agronomy/replant-sum';
import type { ReplantBasis, ReplantValue } from '@/lib/schemas/replant';

/** Any seed would do; one that stays makes the same basis give the same shares, and the same hash. */
const drawSeed = 1994;

/** The core's answer as it travels and is frozen: numbers only, nothing rounded. */
export function replantValue(
  terms: ReplantTerms,
  stand: NonNullable<ReplantBasis['stand']>,
  acres: number | null,
): ReplantValue {
  const outcome = replant({
    ...terms,
    acres,
    seed: drawSeed,
    stand: { plantsPerAcre: stand.plantsPerAcre, error: stand.interval },
  });
  // Every figure is there, so the core has no reason left to find them too few.
  if (outcome.kind === 'insufficient')
    throw new Error(`complete terms were found insufficient: ${outcome.needed}`);
  const { sum, gainDollarsField, overInterval, ...answer } = outcome.value;
  const { keepReading, replantReading, keepYieldBushelsPerAcre, replantYieldBushelsPerAcre, lines } = sum;
  const { maximumYieldBushelsPerAcre, priceDollarsPerBushel, replantPlantsPerAcre } = terms;
  return {
    kind: 'value',
    ...answer,
    keepReading,
    replantReading,
    keepYieldBushelsPerAcre,
    replantYieldBushelsPerAcre,
    keepYieldOverCount: stand.interval ? yieldOverCount(terms, stand.plantsPerAcre, stand.interval) : null,
    replantYieldOverSecondStand: yieldOverSecondStand(terms, replantReading.kind === 'value'),
    lines,
    gainDollarsField: gainDollarsField.kind === 'value' ? gainDollarsField.value : null,
    overInterval: overInterval.kind === 'value' ? overInterval.value : null,
    terms: { maximumYieldBushelsPerAcre, priceDollarsPerBushel, replantPlantsPerAcre },
  };
}

/** The line of the table falls again at thick stands, so the ends of the count need not be the ends of the yield. */
function yieldOverCount(
  terms: ReplantTerms,
  plantsPerAcre: number,
  interval: { lower: number; upper: number },
): ReplantValue['keepYieldOverCount'] {
  const sums = [interval.lower, plantsPerAcre, interval.upper].map((stand) =>
    replantSum(terms, Math.max(0, stand)),
  );
  const ascending = sums.sort((a, b) => a.keepYieldBushelsPerAcre.upper - b.keepYieldBushelsPerAcre.upper);
  const [least, most] = [ascending[0], ascending.at(-1)];
  if (!least || !most) return null;
  return {
    lower: least.keepYieldBushelsPerAcre.upper,
    upper: most.keepYieldBushelsPerAcre.upper,
    lowerIsBound: least.keepReading.kind === 'at-most',
  };
}

function yieldOverSecondStand(terms: ReplantTerms, isInTable: boolean): Span | null {
  if (terms.poorSecondStandChance === 0 || !isInTable) return null;
  const [poor, good] = [1, 0].map(
    (poorSecondStandChance) =>
      replantSum({ ...terms, poorSecondStandChance }, 0).replantYieldBushelsPerAcre.upper,
  );
  return poor === undefined || good === undefined
    ? null
    : { lower: Math.min(poor, good), upper: Math.max(poor, good) };
}
