import { bySegment } from './by-segment';
import type { EmergenceCurve } from './emergence-curve';
import { emergenceCurve } from './emergence-curve';
import { emergencePercentile } from './emergence-percentile';
import type { Figures } from './figures';
import { defaultLateLimits, type LateLimits } from './late-limits';
import { latePattern } from './late-pattern';
import { lateShareFromCounts, lateShareFromTape, settledClasses, type LateShare } from './late-share';
import { chainOutcome, insufficient, type Outcome } from './outcome';
import { plantDelays, type PlantDelay } from './plant-delays';
import type { RowSample } from './row-sample';
import { sortedCounts } from './sorted-counts';

export type LateFigures = Pick<Figures, 'lateShare' | 'lateShareFromCounts' | 'latePattern'>;

/**
 * Which plants of one or more row samples came up late, and in what pattern?
 *
 * Takes row samples and the curve their counts were pooled to (or insufficient). Returns the late share from
 * the tape sheets where these carry it, otherwise from the counts, the counts' own share beside it, and the
 * pattern. Each is insufficient where its own needs are not met. Throws ImpossibleInput as its parts do.
 * Method: each plant is late against the first flush of its own row sample, for its neighbors stand there;
 * the plants of all sheets are then added. The counts' share is against the pooled curve's first flush.
 * The limits of the first row sample hold for all: they belong to the planting.
 * Example: 2 late of 30 and 4 late of 34 plants on two sheets are 6 of 64, 9.4 %.
 */
export function lateFigures(samples: readonly RowSample[], curve: Outcome<EmergenceCurve>): LateFigures {
  const limits = samples[0]?.lateLimits ?? defaultLateLimits;
  const sheets = samples
    .filter((sample) => sample.tape !== null)
    .map((sample) => sheetDelays(sample, limits));
  const bound = sheets.some((sheet) => sheet.bound === 'at-least') ? 'at-least' : 'exact';
  const fromTape: Outcome<LateShare> =
    sheets.length > 0
      ? lateShareFromTape(
          sheets.map((sheet) => sheet.plants),
          bound,
          limits,
        )
      : insufficient('no-tape-sheet', '1 tape sheet', 'no tape sheet');
  const fromCounts = chainOutcome(curve, (fitted) => lateShareFromCounts(fitted, limits));
  return {
    lateShare: fromTape.kind === 'value' || fromCounts.kind === 'insufficient' ? fromTape : fromCounts,
    lateShareFromCounts: fromCounts,
    latePattern:
      fromTape.kind === 'value'
        ? latePattern(sheets.flatMap(lateRows))
        : fromTape,
  };
}

/** Whether each plant is late, one list for each piece of the row that the tape did not cut. */
function lateRows(sheet: ReturnType<typeof sheetDelays>): boolean[][] {
  const plants = settledClasses(sheet.plants).map((lateClass, index) => ({ late: isLate(lateClass), segment: sheet.segments[index] }));
  return bySegment(plants, (plant) => plant.segment).map((piece) => piece.map((plant) => plant.late));
}

function isLate(lateClass: PlantDelay['lateClass']): boolean {
  return lateClass === 'late' || lateClass === 'very-late';
}

/**
 * How late is each plant of one tape sheet, against the first flush of its own row sample?
 *
 * Takes a row sample and the limits. Returns the delays of its plants in tape order, missing places left out, the piece of
 * the tape that each stands on, and whether shares read off them are exact or at least. Never insufficient: a plant whose
 * day is not known is *unknown*, and without a sheet there are none. Throws ImpossibleInput as plantDelays does. Method:
 * plantDelays from the tenth percentile.
 * Example: a sheet without visits and marks gives *unknown* throughout.
 */
export function sheetDelays(
  sample: RowSample,
  limits: LateLimits,
): { plants: PlantDelay[]; segments: number[]; bound: LateShare['bound'] } {
  const curve = emergenceCurve(sortedCounts(sample));
  const firstFlush = chainOutcome(curve, (fitted) => emergencePercentile(fitted, 0.1));
  const standing = (sample.tape ?? []).filter((place) => place.kind !== 'missing');
  const plants = standing.map((place) => ({ firstSeen: place.firstSeen, markedLate: place.kind === 'late' }));
  const delays = plantDelays(plants, firstFlush, limits);
  const restsOnVisits = delays.some((plant) => plant.basis === 'visits');
  const complete =
    curve.kind === 'value' &&
    curve.value.countingEnded &&
    firstFlush.kind === 'value' &&
    firstFlush.value.bound === 'exact';
  return { plants: delays, segments: standing.map((place) => place.segment ?? 0), bound: restsOnVisits && !complete ? 'at-least' : 'exact' };
}
