import { insufficient, mapOutcome, value, type Outcome } from './outcome';
import { plantsHeld } from './plants-held';
import type { RowSample } from './row-sample';
import { plantsPerAcre, rowAreaAcres } from './stand';

export type RowStand = {
  plantsPerAcre: number;
  plantsUp: number;
  plantsDoubtful: number;
  /** After doubtful plants and plant ends are settled. */
  plantsHeld: number;
  areaAcres: number;
  source: 'counts' | 'tape-sheet';
};

/**
 * What stands in one row sample now?
 *
 * Takes a row sample. Returns plants per acre with the plants behind it. Insufficient without a count and
 * without a tape sheet. Throws ImpossibleInput as plantsHeld and plantsPerAcre do.
 * Method: the last count decides the stand (the mean, if two people counted at that moment); without a count,
 * the plants on the tape sheet. Plants that died before are not in it.
 * Example: places 0 2 17 33 38 39 44 52 55 60 68 in, both ends plants, 30-inch rows: 30,748 per acre.
 */
export function rowStand(sample: RowSample): Outcome<RowStand> {
  return mapOutcome(plantsStanding(sample), (standing) => {
    const held = plantsHeld({ ...standing, startEnd: sample.startEnd, farEnd: sample.farEnd });
    const row = { ...sample, plantsHeld: held };
    return {
      ...standing,
      plantsPerAcre: plantsPerAcre(row),
      plantsHeld: held,
      areaAcres: rowAreaAcres(sample.lengthInches, sample.rowSpacingInches),
    };
  });
}

type Standing = Pick<RowStand, 'plantsUp' | 'plantsDoubtful' | 'source'>;

function plantsStanding(sample: RowSample): Outcome<Standing> {
  const lastDay = Math.max(...sample.counts.map((count) => count.days));
  const last = sample.counts.filter((count) => count.days === lastDay);
  if (last.length > 0) {
    const mean = (pick: (count: (typeof last)[number]) => number) =>
      last.reduce((sum, count) => sum + pick(count), 0) / last.length;
    return value({
      plantsUp: mean((count) => count.plantsUp),
      plantsDoubtful: mean((count) => count.plantsDoubtful),
      source: 'counts',
    });
  }
  if (sample.tape) return value({ plantsUp: plantsOnTape(sample), plantsDoubtful: 0, source: 'tape-sheet' });
  return insufficient('not-counted', 'a count or a tape sheet', 'neither');
}

/** The plants on the tape sheet; a missing place is none. */
export function plantsOnTape(sample: RowSample): number {
  return (sample.tape ?? []).filter((place) => place.kind !== 'missing').length;
}

/**
 * Do the tape sheet and the last count agree?
 *
 * Takes a row sample. Returns plants on the tape sheet less plants at the last count, whole plants up with the
 * doubtful ones. Insufficient without both. Throws nothing of its own. Counts decide the stand and the
 * timing, the tape sheet the spacing; where they differ both are shown. Example: 33 on the tape, 34 counted: −1.
 */
export function tapeLessCounted(sample: RowSample): Outcome<number> {
  const standing = plantsStanding(sample);
  if (standing.kind === 'insufficient' || standing.value.source !== 'counts' || !sample.tape) {
    return insufficient('one-source', 'a count and a tape sheet', 'one of them at most');
  }
  return value(plantsOnTape(sample) - standing.value.plantsUp);
}
