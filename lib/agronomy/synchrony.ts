import { mergedVisits, type VisitCount } from './merged-visits';
import { insufficient, value, type Outcome } from './outcome';

/**
 * How likely is it that two plants taken at random were found new at one and the same visit?
 *
 * Takes the counts of one row sample in order of time: days since planting, plants up so far. Returns Z from 0 to 1;
 * 1 when all were found at one visit. Insufficient below two plants. Throws ImpossibleInput as mergedVisits does.
 * Method: Z = Σ C(nᵢ, 2) / C(N, 2) (Primack 1985; Ranal and Santana 2006), nᵢ by the highest count so far, since a plant
 * that dies was not un-emerged.
 * It depends on how often one counts: never compare it between plots with other rounds.
 * Example: 0 2 4 15 25 38 45 50 50 50 on ten days gives 0.1722.
 */
export function synchrony(counts: readonly VisitCount[]): Outcome<number> {
  let highest = 0;
  let pairsTogether = 0;
  for (const { plantsUp } of mergedVisits(counts)) {
    const fresh = Math.max(0, plantsUp - highest);
    pairsTogether += pairs(fresh);
    highest += fresh;
  }
  if (highest < 2) return insufficient('too-few-plants', '2 plants up', `${highest} ${highest === 1 ? 'plant' : 'plants'} up`);
  return value(pairsTogether / pairs(highest));
}

// Two people's counts of one moment are averaged, so that half a plant can be new; half a plant makes no pair.
const pairs = (plants: number) => Math.max(0, (plants * (plants - 1)) / 2);
