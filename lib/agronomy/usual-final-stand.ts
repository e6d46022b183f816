import { requiredNumber } from './required-number';

/** Of the seeds that could germinate, as many as usually make a plant. Common practice, no source. */
export const USUAL_SURVIVAL = 0.95;

/**
 * Which final stand may be intended with this seed?
 *
 * Takes seeds per acre (above 0) and the germination on the tag as a share (above 0, at most 1). Returns plants per
 * acre. Never insufficient; throws ImpossibleInput for numbers outside these ranges.
 * Method: seeds × tag germination × 0.95, the usual survival in the field (common practice, no source; 5 to 10 % of
 * seeds failing is ordinary, Ohio State).
 * It is a default for what somebody intends, not a forecast: cold, crusted or cloddy ground lets fewer through.
 * Example: 34,000 seeds at 95 % germination: 30,685 plants per acre.
 */
export function usualFinalStandPerAcre(seedsPerAcre: number, tagGerminationShare: number): number {
  requiredNumber(seedsPerAcre, 'seedsPerAcre', { above: 0 });
  requiredNumber(tagGerminationShare, 'tagGerminationShare', { above: 0, atMost: 1 });
  return seedsPerAcre * tagGerminationShare * USUAL_SURVIVAL;
}
