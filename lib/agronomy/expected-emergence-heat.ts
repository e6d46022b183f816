import { requiredNumber } from './required-number';

export type SeedZone = {
  seedingDepthInches: number;
  /** The soil around the seed is dry. */
  seedZoneDry: boolean;
  residueCoverShare: number;
  /** Crusting or fine soil, or sandy soil: 30 to 60 degree days later or earlier. */
  soil: 'fine' | 'medium' | 'coarse';
};

export type ExpectedHeat = { earliestDegreeDaysF: number; usualDegreeDaysF: number; latestDegreeDaysF: number; added: { reason: 'depth' | 'dry' | 'residue' | 'soil'; from: number; to: number }[] };

/**
 * After how much heat from planting should corn come up here?
 *
 * Takes seeding depth in inches (above 0), whether the seed zone is dry, residue cover over the row (0 to 1) and the soil.
 * Returns earliest, usual and latest °F degree days and what was added for what. Never insufficient; throws
 * ImpossibleInput for a depth or share that cannot be.
 * Method: usually 115 (Purdue), 90 (Iowa, Nebraska) to 125 (Wisconsin W121); adjustments of W121: 15 an inch deeper than
 * 2 in, 30 in a dry seed zone, 30 to 60 under more than 75 % cover, 30 to 60 more in fine and less in coarse soil. The
 * usual value takes half of a range. W121 does not say whether adjustments add up; here they do.
 * Guidance on when to look, no verdict: corn may take four weeks in poor conditions.
 * Example: 2 in deep, moist, 20 % cover, medium soil: 90 to 125, usually 115; 3 in deep and dry: 135 to 170, usually 160.
 */
export function expectedEmergenceHeat(zone: SeedZone): ExpectedHeat {
  requiredNumber(zone.seedingDepthInches, 'seedingDepthInches', { above: 0 });
  requiredNumber(zone.residueCoverShare, 'residueCoverShare', { atLeast: 0, atMost: 1 });
  const added: ExpectedHeat['added'] = [];
  const deeper = Math.max(0, zone.seedingDepthInches - 2) * 15;
  if (deeper > 0) added.push({ reason: 'depth', from: deeper, to: deeper });
  if (zone.seedZoneDry) added.push({ reason: 'dry', from: 30, to: 30 });
  if (zone.residueCoverShare > 0.75) added.push({ reason: 'residue', from: 30, to: 60 });
  if (zone.soil === 'fine') added.push({ reason: 'soil', from: 30, to: 60 });
  if (zone.soil === 'coarse') added.push({ reason: 'soil', from: -60, to: -30 });
  const sum = (part: (each: ExpectedHeat['added'][number]) => number) => added.reduce((total, each) => total + part(each), 0);
  return {
    earliestDegreeDaysF: 90 + sum(({ from }) => from),
    usualDegreeDaysF: 115 + sum(({ from, to }) => (from + to) / 2),
    latestDegreeDaysF: 125 + sum(({ to }) => to),
    added,
  };
}
