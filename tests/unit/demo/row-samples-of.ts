import type { RowSample } from '@/lib/agronomy/row-sample';
import { theoreticalSpacingInches } from '@/lib/agronomy/theoretical-spacing';
import { parseTapePlace, placeInches } from '@/lib/schemas/tape-place';
import { observeCounts, observeTape } from '@/db/demo/observe-row';
import type { SimulatedStrip } from '@/db/demo/simulate-trial';
import { trialPlan } from '@/db/demo/trial-truth';

const { firstVisitDay, lastVisitDay, rowLengthInches, rowSpacingInches, seedsPerAcre, lateLimits } = trialPlan;

/** What the scouts write down of simulated strips, as the calculations take it. */
export function rowSamplesOf(strips: readonly SimulatedStrip[]): RowSample[] {
  return strips.flatMap((strip) =>
    strip.rows.map(({ seeds }, index): RowSample => {
      const stripId = `${strip.blockNumber} ${strip.setting}`;
      const visits = observeCounts(seeds, { first: firstVisitDay, last: lastVisitDay });
      const places = observeTape(seeds, visits, { lengthInches: rowLengthInches, theoreticalSpacingInches: theoreticalSpacingInches(seedsPerAcre, rowSpacingInches) });
      return {
        rowSampleId: `${stripId} ${index + 1}`,
        stripId,
        crop: 'corn',
        rowSpacingInches,
        seedsPerAcre,
        intendedPlantsPerAcre: 31_500,
        lengthInches: rowLengthInches,
        startEnd: 'mark',
        farEnd: 'mark',
        counts: visits.map(({ day, plantsUp }) => ({ days: day, plantsUp, plantsDoubtful: 0 })),
        tape: places.map(({ typed, kind, marker }) => {
          const parsed = parseTapePlace(typed, 'in');
          if (!parsed.ok) throw new Error(parsed.message);
          const visit = visits.find((each) => each.marker === marker);
          const afterDays = visit && visit.day > firstVisitDay ? visit.day - 1 : null;
          return { positionInches: placeInches(parsed.thousandths, 'in'), kind, firstSeen: visit ? { afterDays, byDays: visit.day } : null };
        }),
        lateLimits,
      };
    }),
  );
}
