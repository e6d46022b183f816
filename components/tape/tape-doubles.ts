import type { TapePlant } from './tape-plant';

export type TapeDouble = { fromInches: number; toInches: number };

const partnerWithinInches = 3;

/**
 * The pairs that a bracket joins: each plant noted as a double with its nearest neighbor, if that one stands within
 * three inches; otherwise the place alone, since two plants may stand at one mark.
 */
export function tapeDoubles(plants: readonly TapePlant[]): TapeDouble[] {
  const standing = plants.filter((plant) => plant.kind === 'plant');
  const pairs = new Map<string, TapeDouble>();
  for (const plant of standing) {
    if (!plant.double) continue;
    const at = plant.positionInches;
    const partner = standing
      .filter((other) => other !== plant && (other.segment ?? 0) === (plant.segment ?? 0) && Math.abs(other.positionInches - at) <= partnerWithinInches)
      .sort((a, b) => Math.abs(a.positionInches - at) - Math.abs(b.positionInches - at))[0];
    const fromInches = Math.min(at, partner?.positionInches ?? at);
    const toInches = Math.max(at, partner?.positionInches ?? at);
    pairs.set(`${fromInches} ${toInches}`, { fromInches, toInches });
  }
  return [...pairs.values()].sort((a, b) => a.fromInches - b.fromInches);
}
