import type { DaysFigure } from './figures';
import { lateShareFromCounts, type LateShare } from './late-share';
import { defaultLateLimits } from './late-limits';
import { chainOutcome, type Outcome } from './outcome';
import { poolEmergence } from './emergence-pool';
import { requiredCount } from './required-count';
import type { RowSample } from './row-sample';
import { sortedCounts } from './sorted-counts';
import { timingFigures, type TimingFigures } from './timing-figures';

/** A row sample of a strip with the planter row it stands in, 1 being the first. */
export type RowUnitSample = { rowUnit: number; strip: string; sample: RowSample };

export type RowUnitTiming = {
  rowUnit: number;
  strips: number;
  /** One curve of the unit's row samples in all strips, and what it says. */
  timing: TimingFigures;
  lateShare: Outcome<LateShare>;
  /** The same strip by strip, for telling a row unit from a setting. */
  byStrip: { strip: string; daysTo50: Outcome<DaysFigure>; lateShare: Outcome<LateShare> }[];
};

/**
 * How did each planter unit's row come up, over all strips?
 *
 * Takes row samples with their strip and planter row (whole, 1 or more); several of one unit in a strip are pooled.
 * Returns per row unit, in ascending order, its timing from all strips together and strip by strip. A figure is
 * insufficient where its counts are. Throws ImpossibleInput for a planter row that is none and as poolEmergence does.
 * Method: counts of the unit's row samples added and fitted once (poolEmergence), so a unit's figure needs no strip of its own to be complete. Late
 * by the counts, with the limits of its first row sample.
 * What it does not tell: whether the unit or its place is at fault (wheel track, guess row); rowUnitEffects says
 * whether it is more than chance. Example: unit 6 half up on day 9.1 over four strips, units 3 and 10 on day 8.2.
 */
export function timingOfRowUnits(samples: readonly RowUnitSample[]): RowUnitTiming[] {
  const rowUnits = [
    ...new Set(samples.map(({ rowUnit }) => requiredCount(rowUnit, 'rowUnit', { atLeast: 1 }))),
  ];
  return rowUnits
    .sort((left, right) => left - right)
    .map((rowUnit) => {
      const own = samples.filter((each) => each.rowUnit === rowUnit);
      const strips = [...new Set(own.map((each) => each.strip))];
      return {
        rowUnit,
        strips: strips.length,
        ...pooled(own),
        byStrip: strips.map((strip) => {
          const { timing, lateShare } = pooled(own.filter((each) => each.strip === strip));
          return { strip, daysTo50: timing.daysTo50, lateShare };
        }),
      };
    });
}

function pooled(samples: readonly RowUnitSample[]): Pick<RowUnitTiming, 'timing' | 'lateShare'> {
  const curve = poolEmergence(samples.map(({ sample }) => sortedCounts(sample)));
  const limits = samples[0]?.sample.lateLimits ?? defaultLateLimits;
  return {
    timing: timingFigures(curve),
    lateShare: chainOutcome(curve, (fitted) => lateShareFromCounts(fitted, limits)),
  };
}
