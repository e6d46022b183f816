import { comparisonDescription } from '@/lib/agronomy/comparison-description';
import { blockAnalysis, type BlockAnalysis, type StripFigure } from '@/lib/agronomy/inference/block-analysis';
import { holmAgainstReference, tukeyPairs, type ComparedPair } from '@/lib/agronomy/inference/pairwise';
import { pairwiseLetters } from '@/lib/agronomy/inference/pairwise-letters';
import { mapOutcome, type Outcome } from '@/lib/agronomy/outcome';
import type { ComparedFigure, FigureComparison } from '@/lib/schemas/comparison';
import type { ComparisonRule } from '@/lib/schemas/vocabulary';
import { stripAnswer, type ComparedStrip } from './compared-strips';

export type ComparisonPlan = { mainFigure: ComparedFigure; rule: ComparisonRule; referenceSettingId: string };

/** What was worked out for one figure: what leaves the server, and what the finding of the main figure is made from. */
export type ComparedFigureResult = {
  wire: FigureComparison;
  figures: StripFigure[];
  analysis: Outcome<BlockAnalysis>;
  pairs: ComparedPair[];
};

/** Compares the settings by one figure, one value a strip, the differences between blocks taken out. */
export function compareFigure(
  strips: readonly ComparedStrip[],
  figure: ComparedFigure,
  plan: ComparisonPlan,
): ComparedFigureResult {
  const answers = strips.map((strip) => ({ ...strip, answer: stripAnswer(strip, figure) }));
  const figures = answers.flatMap(({ strip, settingId, answer }) =>
    answer.kind === 'value' ? [{ block: strip.blockId, setting: settingId, figure: answer.value.figure }] : [],
  );
  const analysis = blockAnalysis(figures);
  const pairs = analysis.kind === 'value' ? plannedPairs(analysis.value, plan) : [];
  const wire: FigureComparison = {
    figure,
    strips: answers.map(({ strip, settingId, answer }) => ({
      stripId: strip.id,
      number: strip.number,
      blockNumber: strip.blockNumber,
      settingId,
      value: answer,
    })),
    means: meansOf(figures, analysis, figure === plan.mainFigure && plan.rule === 'tukey' ? pairs : null),
    analysis: mapOutcome(analysis, (fitted) => ({
      blocks: fitted.blocks,
      strips: fitted.strips,
      missingStrips: fitted.missingStrips,
      errorSd: fitted.errorSd,
      errorDegreesOfFreedom: fitted.errorDegreesOfFreedom,
      settingDegreesOfFreedom: fitted.settingDegreesOfFreedom,
      fRatio: fitted.fRatio,
      p: fitted.p,
    })),
    differences: pairs.map(({ first, second, difference, lower, upper, p, toldApart }) => ({
      first,
      second,
      difference,
      lower,
      upper,
      p,
      toldApart,
    })),
  };
  return { wire, figures, analysis, pairs };
}

/** One rule for all that is shown: as it was planned before planting. */
function plannedPairs(analysis: BlockAnalysis, { rule, referenceSettingId }: ComparisonPlan): ComparedPair[] {
  if (rule === 'tukey') return tukeyPairs(analysis);
  const isCompared = analysis.means.some((mean) => mean.setting === referenceSettingId);
  return isCompared ? holmAgainstReference(analysis, referenceSettingId) : [];
}

/** Least-squares means where there are any, else the plain mean of a setting's strips. */
function meansOf(
  figures: readonly StripFigure[],
  analysis: Outcome<BlockAnalysis>,
  letteredPairs: readonly ComparedPair[] | null,
): FigureComparison['means'] {
  const fitted = analysis.kind === 'value' ? analysis.value : null;
  const letters = fitted && letteredPairs ? pairwiseLetters(fitted.means, letteredPairs) : [];
  return comparisonDescription(figures).map(({ setting, strips, mean, least, most }) => {
    const leastSquares = fitted?.means.find((each) => each.setting === setting);
    return {
      settingId: setting,
      strips,
      mean: leastSquares?.leastSquaresMean ?? mean,
      standardError: leastSquares?.standardError ?? null,
      least,
      most,
      letters: letters.find((each) => each.setting === setting)?.letters ?? null,
    };
  });
}
