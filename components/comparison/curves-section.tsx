'use client';

import { EmergenceCurves } from '@/components/charts/emergence-curves';
import { seriesMost } from '@/components/charts/series-style';
import { Section } from '@/components/ui/section';
import { useWho } from '@/lib/client/who';
import { countText } from '@/lib/format/count-text';
import type { TrialComparison } from '@/lib/schemas/comparison';
import { comparisonTexts } from '@/lib/texts/comparison-texts';
import { drawnSettings } from './main-figure';

const texts = comparisonTexts.curves;

/** How the settings came up, in plants per area over days, each line named at its end. */
export function CurvesSection({ comparison }: { comparison: TrialComparison }) {
  const { units } = useWho();
  const { settings } = comparison;
  const series = drawnSettings(comparison).flatMap((setting) => {
    if (setting.curve.kind === 'insufficient') return [];
    const interval = setting.scored.figures.plantsPerAcreInterval;
    return [
      {
        id: setting.settingId,
        label: setting.name,
        seriesIndex: setting.seriesIndex,
        points: setting.curve.value.points.map((point) => ({ daysAfterPlanting: point.days, value: point.plantsPerAcre })),
        ...(interval.kind === 'value'
          ? { lastInterval: { lower: interval.value.plantsPerAcreLower, upper: interval.value.plantsPerAcreUpper } }
          : {}),
      },
    ];
  });
  const rows = settings.reduce((sum, setting) => sum + setting.rowSamples, 0);
  return (
    <Section title={texts.title} lead={texts.lead}>
      {series.length === 0 ? (
        <p>{texts.none}</p>
      ) : (
        <EmergenceCurves
          title={texts.title}
          sample={texts.sample(countText(settings.length, 'setting'), countText(rows, 'row sample'))}
          uncertainty={texts.uncertainty}
          measure="plants-per-area"
          units={units}
          fileName="emergence-by-setting"
          series={series}
        />
      )}
      {settings.length > seriesMost ? <p className="text-13 text-ink-soft">{texts.moreThanLines(seriesMost)}</p> : null}
    </Section>
  );
}
