import { emergenceCurve } from '@/lib/agronomy/emergence-curve';
import { emergencePercentile } from '@/lib/agronomy/emergence-percentile';
import { defaultLateLimits } from '@/lib/agronomy/late-limits';
import { chainOutcome } from '@/lib/agronomy/outcome';
import { plantDelays } from '@/lib/agronomy/plant-delays';
import type { RowSample, TapePlace } from '@/lib/agronomy/row-sample';
import { sortedCounts } from '@/lib/agronomy/sorted-counts';
import type { DrawnPlant } from '@/lib/schemas/drawn-plant';

/** The places of a row sample's tape sheet as they are drawn, late ones judged against the row's own first flush. */
export function drawnPlants(sample: RowSample): DrawnPlant[] {
  const places = sample.tape ?? [];
  const flush = chainOutcome(emergenceCurve(sortedCounts(sample)), (curve) => emergencePercentile(curve, 0.1));
  const delays = plantDelays(
    places.map((place) => ({ firstSeen: place.firstSeen, markedLate: place.kind === 'late' })),
    flush,
    sample.lateLimits ?? defaultLateLimits,
  );
  return places.map((place, index) => ({
    positionInches: place.positionInches,
    segment: place.segment ?? 0,
    days: cameUpDays(place),
    late: delays[index]?.lateClass === 'late' || delays[index]?.lateClass === 'very-late',
    double: place.kind === 'double',
    kind: place.kind === 'missing' ? 'missing' : 'plant',
  }));
}

function cameUpDays({ firstSeen }: TapePlace): number | null {
  if (!firstSeen) return null;
  return firstSeen.afterDays === null ? firstSeen.byDays : (firstSeen.afterDays + firstSeen.byDays) / 2;
}
