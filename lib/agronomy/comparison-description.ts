import { requiredNumber } from './required-number';

export type SettingDescription = {
  setting: string;
  strips: number;
  mean: number;
  least: number;
  most: number;
};

/**
 * What was seen under each setting, without any claim?
 *
 * Takes one figure per strip with its setting. Returns, in the order in which the settings first came, the number of strips,
 * their plain mean and their range, in the figure's unit. Never insufficient: a setting without a strip is not
 * there. Throws ImpossibleInput for a figure that is no number.
 * What it does not tell: whether settings differ; with strips missing, plain means mix settings with blocks.
 * Example: strips of 3.9 and 4.1 days under one setting: 2 strips, mean 4.0, 3.9 to 4.1.
 */
export function comparisonDescription(
  strips: readonly { setting: string; figure: number }[],
): SettingDescription[] {
  const bySetting = new Map<string, number[]>();
  for (const strip of strips) {
    const figure = requiredNumber(strip.figure, 'figure');
    bySetting.set(strip.setting, [...(bySetting.get(strip.setting) ?? []), figure]);
  }
  return [...bySetting].map(([setting, figures]) => ({
    setting,
    strips: figures.length,
    mean: figures.reduce((sum, figure) => sum + figure, 0) / figures.length,
    least: Math.min(...figures),
    most: Math.max(...figures),
  }));
}
