import { replantGainByTable } from './replant-gain-by-table';
import type { ReplantTerms, Span } from './replant-sum';
import { requiredNumber } from './required-number';
import type { StandDateTable } from './stand-date-table';

export type HoeAsked = {
  soundSproutsPerAcre: number;
  /** Of the sprouts, the share expected to come through after the pass, 0 to 1; the caller's judgment. */
  comeThroughShare: number;
  /** Of the plants that stand, the share the pass takes, 0 to 1. */
  plantsTakenShare: number;
  costDollarsPerAcre: number;
  /** What the late ones cost the stand, 0 to 1, from a penalty study. */
  unevenLossShare: number;
};

export type HoeGain = { standAfterPlantsPerAcre: number; gainOverKeepingDollarsPerAcre: Span; bounded: boolean };

/**
 * What does a pass with the rotary hoe gain over keeping the stand as it is?
 *
 * Takes a table, the terms of replantSum, the stand in plants per acre and what the pass is expected to do. Returns the
 * stand after it and the gain per acre. Never insufficient; throws ImpossibleInput for shares outside 0 to 1 or negative
 * amounts. Equation: stand × (1 − taken) + sprouts × come through; gain = (yield after − keep yield) × price − cost.
 * How many come through is a judgment on site, not a published number.
 * Example: 16,000 plants and 8,000 sprouts of which three quarters come through, none taken: 22,000.
 */
export function hoeGain(table: StandDateTable, terms: ReplantTerms, plantsPerAcre: number, asked: HoeAsked): HoeGain {
  const share = (key: 'comeThroughShare' | 'plantsTakenShare' | 'unevenLossShare') => requiredNumber(asked[key], key, { atLeast: 0, atMost: 1 });
  const sprouts = requiredNumber(asked.soundSproutsPerAcre, 'soundSproutsPerAcre', { atLeast: 0 });
  const cost = requiredNumber(asked.costDollarsPerAcre, 'costDollarsPerAcre', { atLeast: 0 });
  const after = plantsPerAcre * (1 - share('plantsTakenShare')) + sprouts * share('comeThroughShare');
  const kept = replantGainByTable(table, terms, plantsPerAcre);
  const hoed = replantGainByTable(table, { ...terms, unevenLossShare: share('unevenLossShare') }, after);
  const gain = (bushels: number) => bushels * terms.priceDollarsPerBushel - cost;
  return {
    standAfterPlantsPerAcre: after,
    gainOverKeepingDollarsPerAcre: {
      lower: gain(hoed.keepYieldBushelsPerAcre.lower - kept.keepYieldBushelsPerAcre.upper),
      upper: gain(hoed.keepYieldBushelsPerAcre.upper - kept.keepYieldBushelsPerAcre.lower),
    },
    bounded: kept.keepYieldBushelsPerAcre.lower !== kept.keepYieldBushelsPerAcre.upper || hoed.keepYieldBushelsPerAcre.lower !== hoed.keepYieldBushelsPerAcre.upper,
  };
}
