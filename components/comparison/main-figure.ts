import { seriesMost } from '@/components/charts/series-style';
import type { ComparedFigure, ComparedSetting, FigureComparison, TrialComparison } from '@/lib/schemas/comparison';

/** The comparison of one figure; every figure there is travels with every comparison. */
export function comparedBy(comparison: TrialComparison, figure: ComparedFigure): FigureComparison {
  const found = comparison.figures.find((each) => each.figure === figure);
  if (!found) throw new Error(`The comparison does not hold ${figure}.`);
  return found;
}

export function settingOf(comparison: TrialComparison, settingId: string): ComparedSetting | undefined {
  return comparison.settings.find((setting) => setting.settingId === settingId);
}

export function referenceOf(comparison: TrialComparison): ComparedSetting | undefined {
  return settingOf(comparison, comparison.trial.referenceSettingId);
}

/** The settings that have a line of their own in a picture. */
export function drawnSettings(comparison: TrialComparison): ComparedSetting[] {
  return comparison.settings.filter((setting) => setting.seriesIndex < seriesMost);
}

/** Each other setting less the reference, the sign turned where the pair was worked out the other way round. */
export function differencesFromReference({ differences }: FigureComparison, reference: string) {
  return differences
    .filter(({ first, second }) => first === reference || second === reference)
    .map((pair) =>
      pair.second === reference
        ? { settingId: pair.first, difference: pair.difference, lower: pair.lower, upper: pair.upper }
        : { settingId: pair.second, difference: -pair.difference, lower: -pair.upper, upper: -pair.lower },
    );
}
