import type { StandDateReading } from './replant-table-nafziger';
import type { ReplantTerms, Span } from './replant-sum';
import { tableYieldPercent, type StandDateTable } from './stand-date-table';

export type GainByTable = {
  keepYieldBushelsPerAcre: Span;
  replantYieldBushelsPerAcre: Span;
  gainDollarsPerAcre: Span;
  /** The table gives only a bound for one of the two, so that the ends of the spans differ. */
  bounded: boolean;
};

/**
 * What does replanting gain over keeping, per acre, by this table?
 *
 * Takes a table, the terms of replantSum and the stand in plants per acre (0 or more). Returns both yields and the gain as
 * spans whose ends differ only where the table gives a bound. Never insufficient; throws as tableYieldPercent.
 * Equation: keep = Ymax × pct × (1 − gap) × (1 − uneven); replant = Ymax × [(1 − p) × pct(new) + p × poor share];
 * gain = (replant − keep) × price − costs − extra drying + insurance payment. A test holds it to replantSum on its table.
 * A bound leaves everything from no yield to the edge's value open. Example: Iowa 2001, 24,000 planted 1 May against a full
 * stand on 28 May: 94 % against 90 %.
 */
export function replantGainByTable(table: StandDateTable, terms: ReplantTerms, plantsPerAcre: number): GainByTable {
  const kept = tableYieldPercent(table, terms.plantedOn, plantsPerAcre, 'plantedOn');
  return gainOfReadings(terms, kept, tableYieldPercent(table, terms.replantOn, terms.replantPlantsPerAcre, 'replantOn'));
}

/** The same from what the table says of the stand that is kept and of the second one. */
export function gainOfReadings(terms: ReplantTerms, keptReading: StandDateReading, secondReading: StandDateReading): GainByTable {
  const [kept, second] = [shareSpan(keptReading), shareSpan(secondReading)];
  const keepFactor = terms.maximumYieldBushelsPerAcre * (1 - terms.gapLossShare) * (1 - terms.unevenLossShare);
  const poor = terms.poorSecondStandChance;
  const replantYield = (share: number) => terms.maximumYieldBushelsPerAcre * ((1 - poor) * share + poor * terms.poorSecondStandYieldShare);
  const keep = { lower: kept.lower * keepFactor, upper: kept.upper * keepFactor };
  const replant = { lower: replantYield(second.lower), upper: replantYield(second.upper) };
  const paid = terms.costs.reduce((sum, { dollarsPerAcre }) => sum + dollarsPerAcre, 0) + terms.extraDryingDollarsPerAcre - terms.insurancePaymentDollarsPerAcre;
  const gain = (bushels: number) => bushels * terms.priceDollarsPerBushel - paid;
  return {
    keepYieldBushelsPerAcre: keep,
    replantYieldBushelsPerAcre: replant,
    gainDollarsPerAcre: { lower: gain(replant.lower - keep.upper), upper: gain(replant.upper - keep.lower) },
    bounded: kept.lower !== kept.upper || second.lower !== second.upper,
  };
}

function shareSpan(reading: StandDateReading): Span {
  const upper = reading.percent / 100;
  return { lower: reading.kind === 'value' ? upper : 0, upper };
}
