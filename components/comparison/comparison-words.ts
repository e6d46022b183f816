import { comparisonHeadline } from '@/lib/agronomy/comparison-headline';
import { countText } from '@/lib/format/count-text';
import { dateText } from '@/lib/format/date-text';
import { decimalText } from '@/lib/format/decimal-text';
import { pValueText } from '@/lib/format/p-value-text';
import type { TrialComparison } from '@/lib/schemas/comparison';
import type { MainFigure, UnitSystem } from '@/lib/schemas/vocabulary';
import { comparisonTexts as texts } from '@/lib/texts/comparison-texts';
import { figureWords } from './figure-words';

export type ComparisonWords = {
  headline: string;
  /** How sure and by what right: stands right under the headline. */
  sub: string[];
  /** What else the comparison of the main figure says. */
  more: string[];
};

/** Figures that move as long as plants come; the score holds the spread as a part. */
const movesWhileCounting: readonly MainFigure[] = ['spread-days', 'half-up-days', 'late-share', 'score'];

/** What the trial says about its main figure: no more than its interval supports, and nothing where it was not locked. */
export function comparisonWords(comparison: TrialComparison, units: UnitSystem): ComparisonWords {
  const { trial, finding, notes, settings } = comparison;
  const words = figureWords(trial.mainFigure, units);
  if (notes.stripsCompared === 0 && settings.every((setting) => setting.rowSamples === 0)) {
    return {
      headline: texts.nothingCounted,
      sub: [texts.nothingCountedHint(countText(settings.length, 'setting'), countText(trial.blocks, 'block'))],
      more: [],
    };
  }
  if (!trial.isLocked) return { headline: texts.notLocked, sub: [texts.notLockedWhy], more: [] };
  const { headline, details } = comparisonHeadline(finding, {
    setting: (id) => settings.find((setting) => setting.settingId === id)?.phrase ?? id,
    amount: words.amount,
    range: words.range,
  });
  const isMoving = finding.kind === 'difference' && notes.stillCounting.length > 0 && movesWhileCounting.includes(trial.mainFigure);
  const [interval, ...more] = details;
  return {
    headline: isMoving ? texts.soFar(lowered(headline)) : headline,
    sub: [...(interval ? [interval] : []), mainFigureSentence(comparison, words.name), ...randomizationSentence(comparison)],
    more,
  };
}

const lowered = (sentence: string) => sentence.charAt(0).toLowerCase() + sentence.slice(1);

function mainFigureSentence({ trial, planting }: TrialComparison, name: string): string {
  if (trial.lockedAt === null) return texts.mainFigure(name, texts.notLockedYet);
  const lockedOn = trial.lockedAt.slice(0, 10);
  const date = dateText(lockedOn);
  return texts.mainFigure(name, lockedOn <= planting.plantedOn ? texts.lockedBefore(date) : texts.lockedAfter(date));
}

/** The check that assumes nothing but the chance that laid the strips. */
export function randomizationSentence({ randomization, finding }: TrialComparison): string[] {
  if (finding.kind === 'nothing-to-compare') return [];
  if (randomization.kind === 'insufficient') return [texts.randomizationNone(randomization.needed, randomization.had)];
  const test = randomization.value;
  const whole = (count: number) => decimalText(count, 0);
  return [
    test.method === 'exact'
      ? texts.randomizationExact(pValueText(test.p), whole(test.asExtreme), whole(test.arrangements))
      : texts.randomizationSampled(pValueText(test.p), whole(test.sampled)),
  ];
}
