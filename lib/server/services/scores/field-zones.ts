import { standZones } from '@/lib/agronomy/inference/stand-zones';
import type { RowSample } from '@/lib/agronomy/row-sample';
import { rowStand } from '@/lib/agronomy/row-stand';
import { readingIn } from '@/lib/schemas/reading';
import type { CoreSamples } from './core-samples';
import { plantingFacts } from './planting-facts';

export type FieldZone = { zoneId: string | null; name: string | null; acres: number; samples: RowSample[] };

/** A hundredth of an acre is the rounding of areas in other units, no ground of its own. */
const roundingAcres = 0.01;

/**
 * The parts of a field that are counted apart: each zone with its acres and row samples, and the rest of the field as a
 * part of its own where row samples lie in it and the field's area is known.
 */
export function fieldZones(core: CoreSamples, samples: readonly RowSample[]) {
  const { fieldAcres } = plantingFacts(core);
  const zoneOf = new Map(core.rowSamples.map((rowSample) => [rowSample.id, rowSample.zoneId]));
  const zones = core.zones.map((zone): FieldZone => ({
    zoneId: zone.id,
    name: zone.name,
    acres: readingIn({ unit: zone.areaUnit, thousandths: zone.areaThousandths }, 'acres'),
    samples: samples.filter((sample) => zoneOf.get(sample.rowSampleId) === zone.id),
  }));
  const known = new Set(core.zones.map((zone) => zone.id));
  const outside = samples.filter((sample) => !known.has(zoneOf.get(sample.rowSampleId) ?? ''));
  const acresLeft = Math.max(0, (fieldAcres ?? 0) - zones.reduce((sum, zone) => sum + zone.acres, 0));
  const hasRest = zones.length > 0 && outside.length > 0 && acresLeft > roundingAcres;
  const parts = hasRest ? [...zones, { zoneId: null, name: null, acres: acresLeft, samples: outside }] : zones;
  return {
    parts,
    acresNotSampled: hasRest || acresLeft <= roundingAcres ? 0 : acresLeft,
    rowSamplesOutside: hasRest ? 0 : outside.length,
  };
}

/** The stand of the whole planting weighted by the acres of its parts. */
export function standOfParts(parts: readonly FieldZone[]) {
  return standZones(
    parts.map(({ acres, samples }) => ({
      acres,
      rowSamples: samples.flatMap((sample) => {
        const stand = rowStand(sample);
        return stand.kind === 'value' ? [{ plantsHeld: stand.value.plantsHeld, areaAcres: stand.value.areaAcres }] : [];
      }),
    })),
  );
}
