'use client';

import { IntervalPlot } from '@/components/charts/interval-plot';
import { Section } from '@/components/ui/section';
import { useWho } from '@/lib/client/who';
import { countText } from '@/lib/format/count-text';
import type { TrialComparison } from '@/lib/schemas/comparison';
import { comparisonTexts } from '@/lib/texts/comparison-texts';
import { figureWords } from './figure-words';
import { comparedBy, differencesFromReference, drawnSettings, referenceOf } from './main-figure';

const texts = comparisonTexts.differences;

/** The main figure of each setting against the reference, with the intervals of the planned comparison. */
export function DifferencesSection({ comparison }: { comparison: TrialComparison }) {
  const { units } = useWho();
  const { trial } = comparison;
  const words = figureWords(trial.mainFigure, units);
  const main = comparedBy(comparison, trial.mainFigure);
  const differences = differencesFromReference(main, trial.referenceSettingId);
  const title = texts.title(words.head, referenceOf(comparison)?.name ?? '');
  if (main.analysis.kind === 'insufficient' || differences.length === 0) {
    const why = main.analysis.kind === 'insufficient' ? main.analysis : null;
    return (
      <Section title={title}>
        <p>{why ? texts.needs(why.needed, why.had) : texts.referenceAlone}</p>
      </Section>
    );
  }
  const { blocks, strips } = main.analysis.value;
  return (
    <Section title={title}>
      <IntervalPlot
        title={title}
        unit={texts.unit(words.head, words.unit)}
        sample={texts.sample(countText(blocks, 'block'), countText(strips, 'strip'))}
        uncertainty={`${words.better}. ${texts.rules[trial.rule]}`}
        fileName="differences"
        rows={drawnSettings(comparison)
          .filter((setting) => !setting.isReference)
          .map((setting) => {
            const found = differences.find((each) => each.settingId === setting.settingId);
            return {
              id: setting.settingId,
              label: setting.name,
              seriesIndex: setting.seriesIndex,
              interval: found ? { estimate: found.difference, lower: found.lower, upper: found.upper } : null,
              text: found ? words.signed(found.difference) : texts.notCompared,
              intervalText: found ? words.signedRange(found.lower, found.upper) : '',
            };
          })}
      />
    </Section>
  );
}
