import 'server-only';
import { standStrips, type StandUnit } from '@/lib/agronomy/inference/stand-interval';
import { standZones } from '@/lib/agronomy/inference/stand-zones';
import { poolStand } from '@/lib/agronomy/pool-stand';
import type { RowSample } from '@/lib/agronomy/row-sample';
import { rowStand } from '@/lib/agronomy/row-stand';
import type { ReplantBasis, ReplantGap } from '@/lib/schemas/replant';

export type ZoneOfField = { id: string; name: string; acres: number };

export type ScopeInput = {
  zone: ZoneOfField | null;
  zones: readonly ZoneOfField[];
  fieldAcres: number | null;
  /** Counted row samples with the zone each lies in. */
  samples: readonly { sample: RowSample; zoneId: string | null }[];
};

type Stand = ReplantBasis['stand'];
export type StandOfScope = { stand: Stand; gaps: ReplantGap[]; acres: number | null };

/** An area of the field outside its zones below this share is the rounding of the areas, not a part nobody counted. */
const restShareIgnored = 0.02;

/**
 * What stands where the decision is about: in one zone, or in the whole field with its zones weighted by their area. A part
 * of the field that nobody counted leaves the field without an answer, and is named.
 */
export function standOfScope({ zone, zones, fieldAcres, samples }: ScopeInput): StandOfScope {
  if (zone) {
    const inside = samples.filter(({ zoneId }) => zoneId === zone.id);
    return {
      acres: zone.acres,
      ...pooled(
        inside.map(({ sample }) => sample),
        [zone.name],
      ),
    };
  }
  if (zones.length === 0)
    return {
      acres: fieldAcres,
      ...pooled(
        samples.map(({ sample }) => sample),
        [],
      ),
    };
  if (samples.length === 0)
    return { acres: fieldAcres, stand: null, gaps: [{ reason: 'no-row-samples', names: [] }] };
  return weighted(zones, fieldAcres, samples);
}

function pooled(samples: readonly RowSample[], names: string[]): Pick<StandOfScope, 'stand' | 'gaps'> {
  const { plantsPerAcre, plantsPerAcreInterval, basis } = poolStand(samples);
  if (plantsPerAcre.kind === 'insufficient')
    return { stand: null, gaps: [{ reason: 'no-row-samples', names }] };
  // An interval of the counting alone says nothing of the rest of the field, so it is no error of the field's stand.
  const interval =
    plantsPerAcreInterval.kind === 'value' && plantsPerAcreInterval.value.student
      ? plantsPerAcreInterval.value
      : null;
  return {
    stand: {
      plantsPerAcre: plantsPerAcre.value.plantsPerAcre,
      interval: interval?.student
        ? { lower: interval.plantsPerAcreLower, upper: interval.plantsPerAcreUpper, ...interval.student }
        : null,
      places: basis === 'strips-as-places' ? 'strips' : 'row-samples',
    },
    gaps: [],
  };
}

function weighted(
  zones: readonly ZoneOfField[],
  fieldAcres: number | null,
  samples: ScopeInput['samples'],
): StandOfScope {
  const zonesAcres = zones.reduce((sum, each) => sum + each.acres, 0);
  const restAcres = fieldAcres === null ? null : fieldAcres - zonesAcres;
  const hasRest = restAcres !== null && fieldAcres !== null && restAcres > restShareIgnored * fieldAcres;
  const strata = zones.map((each) => ({
    ...each,
    samples: samples.filter(({ zoneId }) => zoneId === each.id),
  }));
  const outside = samples.filter(({ zoneId }) => zoneId === null);
  const acres = fieldAcres ?? (outside.length === 0 ? zonesAcres : null);
  const gaps: ReplantGap[] = [];
  const uncounted = strata.filter((each) => each.samples.length === 0).map(({ name }) => name);
  if (uncounted.length > 0) gaps.push({ reason: 'zone-not-counted', names: uncounted });
  if (outside.length === 0 && hasRest) gaps.push({ reason: 'rest-not-counted', names: [] });
  if (outside.length > 0 && restAcres === null) gaps.push({ reason: 'rest-without-area', names: [] });
  if (outside.length > 0 && restAcres !== null && !hasRest)
    gaps.push({ reason: 'rest-without-room', names: [] });
  if (gaps.length > 0) return { stand: null, gaps, acres };
  const all =
    outside.length > 0 && restAcres !== null ? [...strata, { acres: restAcres, samples: outside }] : strata;
  const estimate = standZones(
    all.map((each) => ({
      acres: each.acres,
      rowSamples: placesOf(each.samples.map(({ sample }) => sample)),
    })),
  );
  if (estimate.kind === 'insufficient')
    return { stand: null, gaps: [{ reason: 'no-row-samples', names: [] }], acres };
  const { plantsPerAcre, interval } = estimate.value;
  const student = interval.kind === 'value' ? interval.value.student : null;
  return {
    stand: {
      plantsPerAcre,
      interval:
        interval.kind === 'value' && student
          ? { lower: interval.value.plantsPerAcreLower, upper: interval.value.plantsPerAcreUpper, ...student }
          : null,
      places: 'zones',
    },
    gaps,
    acres,
  };
}

/** Row samples of one strip are alike, so a strip is one place here as it is elsewhere. */
function placesOf(samples: readonly RowSample[]): StandUnit[] {
  const units = samples.flatMap((sample) => {
    const stand = rowStand(sample);
    if (stand.kind === 'insufficient') return [];
    const { plantsHeld, areaAcres } = stand.value;
    return [{ plantsHeld, areaAcres, stripId: sample.stripId ?? `row sample ${sample.rowSampleId}` }];
  });
  const strips = standStrips(units);
  return strips.length > 1 ? strips : units;
}
