import { dateText } from '@/lib/format/date-text';
import { countTexts } from '@/lib/texts/count-texts';

export type Findings = {
  countingEnded: boolean;
  countedTwiceOn: readonly string[];
  fallingOn: readonly string[];
  datedAheadOn: readonly string[];
  tapePlants: number | null;
  lastPlantsUp: number | null;
  tapeLessCounted: number | null;
};

const days = (dates: readonly string[]) => dates.map((date) => dateText(date, 'day-and-month')).join(', ');

/** What is to be looked at in a row sample, each in a few words; none where there is nothing. */
export function findingTexts(findings: Findings): string[] {
  const { countedTwiceOn, fallingOn, datedAheadOn, tapeLessCounted } = findings;
  return [
    ...(countedTwiceOn.length > 0 ? [countTexts.countedTwice(days(countedTwiceOn))] : []),
    ...(fallingOn.length > 0 ? [countTexts.falls(days(fallingOn))] : []),
    ...(datedAheadOn.length > 0 ? [countTexts.datedAheadOn(days(datedAheadOn))] : []),
    ...(tapeLessCounted !== null && tapeLessCounted < 0 ? [countTexts.tapeFewer(String(-tapeLessCounted))] : []),
    ...(tapeLessCounted !== null && tapeLessCounted > 0 ? [countTexts.tapeMore(String(tapeLessCounted))] : []),
  ];
}

/** Whether counting has ended, may go on, or has not begun. */
export function countingText(findings: Findings): string {
  if (findings.lastPlantsUp === null) return countTexts.notCounted;
  return findings.countingEnded ? countTexts.ended : countTexts.stillComing;
}
