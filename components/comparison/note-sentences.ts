import { countText } from '@/lib/format/count-text';
import { dateText } from '@/lib/format/date-text';
import { decimalText } from '@/lib/format/decimal-text';
import type { TrialComparison } from '@/lib/schemas/comparison';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { comparisonTexts } from '@/lib/texts/comparison-texts';
import { figureWords } from './figure-words';

const texts = comparisonTexts.notes;

/** What a reader must know beside the finding, each as a sentence; nothing that was left out is passed over in silence. */
export function noteSentences({ notes, settings, trial, figures }: TrialComparison, units: UnitSystem): string[] {
  const nameOf = (id: string) => settings.find((setting) => setting.settingId === id)?.name ?? id;
  const words = figureWords(trial.mainFigure, units);
  const main = figures.find((each) => each.figure === trial.mainFigure);
  const hasBound = main?.strips.some((strip) => strip.value.kind === 'value' && strip.value.value.isBound) ?? false;
  const reason = (given: string | null) => (given === null ? '' : texts.reason(given));
  const counted = notes.stripsTotal - notes.lost.length - notes.notCounted.length;
  const withoutFigure = counted - notes.stripsCompared;
  return [
    ...(notes.stillCounting.length > 0
      ? [texts.stillCounting(`${countText(notes.stillCounting.length, 'strip')} of ${notes.stripsTotal}`, listed(notes.stillCounting), hasBound ? texts.bound(words.name) : '')]
      : []),
    ...(notes.notCounted.length > 0 ? [texts.notCounted(countText(notes.notCounted.length, 'strip'), listed(notes.notCounted))] : []),
    ...(withoutFigure > 0 && counted > 0 ? [texts.withoutFigure(countText(withoutFigure, 'counted strip'), words.name)] : []),
    ...(notes.visitsLeast < notes.visitsMost ? [texts.visits(decimalText(notes.visitsLeast, 0), decimalText(notes.visitsMost, 0))] : []),
    ...(notes.lastVisitLeast && notes.lastVisitMost && notes.lastVisitLeast < notes.lastVisitMost
      ? [texts.lastVisit(dateText(notes.lastVisitLeast, 'day-and-month'), dateText(notes.lastVisitMost, 'day-and-month'))]
      : []),
    ...notes.plantedOtherwise.map((strip) => texts.otherwise(strip.number, nameOf(strip.settingId), nameOf(strip.plannedId), reason(strip.reason))),
    ...notes.lost.map((strip) => texts.lost(strip.number, reason(strip.reason), countText(strip.rowSamples, 'row sample'))),
    ...(notes.asPlannedOnly > 0 ? [texts.asPlannedOnly(countText(notes.asPlannedOnly, 'strip'))] : []),
    ...(notes.rowSamplesNotCounted.length > 0
      ? [texts.rowsNotCounted(countText(notes.rowSamplesNotCounted.length, 'row sample'), listed(notes.rowSamplesNotCounted))]
      : []),
    ...(notes.rowSamplesImpossible.length > 0
      ? [texts.impossible(countText(notes.rowSamplesImpossible.length, 'row sample'), listed(notes.rowSamplesImpossible))]
      : []),
    ...(notes.rowSamplesOutsideStrips > 0 ? [texts.outside(countText(notes.rowSamplesOutsideStrips, 'row sample'))] : []),
    ...(notes.blocksNotAsDealt.length > 0 ? [texts.notAsDealt(listed(notes.blocksNotAsDealt))] : []),
  ];
}

const named = 10;

function listed(things: readonly (number | string)[]): string {
  const rest = things.length - named;
  return `${things.slice(0, named).join(', ')}${rest > 0 ? ` and ${rest} more` : ''}`;
}
