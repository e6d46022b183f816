import { SAME_NUMBER } from './constants';
import { mergedVisits, type VisitCount } from './merged-visits';

/**
 * May counting stop: did the last two visits find nothing new?
 *
 * Takes the counts of one row sample in order of time. Returns yes or no; never insufficient, since fewer
 * than three visits are simply "no". Throws ImpossibleInput as mergedVisits does.
 * Method: nothing new at a visit means its count is not above the highest count before it. Two people at one
 * moment are one visit.
 * A plant that came up while another died leaves the count as it was, so a yes can be one plant wrong.
 * Example: 30 33 33 33 has ended, 30 33 33 has not.
 */
export function countingEnded(counts: readonly VisitCount[]): boolean {
  const visits = mergedVisits(counts);
  if (visits.length < 3) return false;
  const highestBeforeLastTwo = Math.max(...visits.slice(0, -2).map((visit) => visit.plantsUp));
  if (highestBeforeLastTwo <= 0) return false;
  return visits.slice(-2).every((visit) => visit.plantsUp <= highestBeforeLastTwo + SAME_NUMBER);
}
