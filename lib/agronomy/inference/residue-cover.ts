import { chainOutcome, insufficient, mapOutcome, value, type Outcome } from '../outcome';
import { residueMarksPercent, type ResidueMarks } from '../residue-marks';
import { wilsonInterval } from '../share-of-seed';
import type { CoverPlace } from '../tillage-class';
import { ratioOfSums } from './ratio-of-sums';

export type CoverInterval = {
  coverPercentLower: number;
  coverPercentUpper: number;
  level: 0.95;
  method: 'binomial-wilson' | 't-over-places';
};

export type ResidueCover = {
  place: CoverPlace;
  coverPercent: number;
  marksRead: number;
  marksCovered: number;
  places: number;
  /** Of the marks alone, as if every mark were its own place; it says nothing about the rest of the field. */
  counting: CoverInterval;
  /** From how places differ; insufficient below three. Where both are there, this one is about the field. */
  overPlaces: Outcome<CoverInterval>;
};

/** The extension services ask for at least three places in a field. */
const PLACES_LEAST = 3;

/**
 * How much of the ground, or of the seed row, lies under residue, and how sure is that?
 *
 * Takes the tapes read, one a place, and whether they lay over the rows or along the seed row. Returns percent cover over
 * all marks with two 95 % intervals. Insufficient without a place; the interval over places below three. Throws
 * ImpossibleInput for more marks over residue than were read, or counts that are not whole.
 * Method: line transect, marks over residue of marks read (Missouri G1570, Nebraska, Illinois, Kansas, Wisconsin A3533).
 * Counting only: Wilson 1927. Over places: t interval of the ratio Σ covered / Σ read (Cochran 1977), cut at 0 and 100.
 * Residue lies in windrows, so places differ more than marks say. A line over the rows hardly sees a cleared row;
 * one study of 2021 found tapes reading 10 points above a grid. Example: 44 of 100 marks: 44 %, counting 34.7 to 53.8.
 */
export function residueCover(places: readonly ResidueMarks[], place: CoverPlace): Outcome<ResidueCover> {
  for (const marks of places) residueMarksPercent(marks);
  if (places.length === 0) return insufficient('no-places', '1 place', 'none');
  const marksRead = places.reduce((sum, marks) => sum + marks.marksRead, 0);
  const marksCovered = places.reduce((sum, marks) => sum + marks.marksCovered, 0);
  const coverPercent = residueMarksPercent({ marksRead, marksCovered });
  return mapOutcome(wilsonInterval(marksCovered, marksRead), ({ shareLower, shareUpper }) => ({
    place,
    coverPercent,
    marksRead,
    marksCovered,
    places: places.length,
    counting: {
      coverPercentLower: 100 * shareLower,
      coverPercentUpper: 100 * shareUpper,
      level: 0.95,
      method: 'binomial-wilson',
    },
    overPlaces: chainOutcome(enough(places), () => {
      const { reach } = ratioOfSums(
        places.map((marks) => ({ amount: 100 * marks.marksCovered, size: marks.marksRead })),
      );
      return value({
        coverPercentLower: Math.max(0, coverPercent - reach),
        coverPercentUpper: Math.min(100, coverPercent + reach),
        level: 0.95,
        method: 't-over-places',
      });
    }),
  }));
}

function enough(places: readonly unknown[]): Outcome<number> {
  if (places.length >= PLACES_LEAST) return value(places.length);
  return insufficient('too-few-places', `${PLACES_LEAST} places`, `${places.length}`);
}
