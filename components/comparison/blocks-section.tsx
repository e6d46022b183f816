'use client';

import { BlockDots } from '@/components/charts/block-dots';
import { SeriesSample } from '@/components/charts/series-name';
import { Section } from '@/components/ui/section';
import { useWho } from '@/lib/client/who';
import { countText } from '@/lib/format/count-text';
import type { TrialComparison } from '@/lib/schemas/comparison';
import { comparisonTexts } from '@/lib/texts/comparison-texts';
import { figureWords } from './figure-words';
import { comparedBy, drawnSettings } from './main-figure';

const texts = comparisonTexts.blocks;

/** What each block did: one mark a strip, the strips of a setting joined. */
export function BlocksSection({ comparison }: { comparison: TrialComparison }) {
  const { units } = useWho();
  const words = figureWords(comparison.trial.mainFigure, units);
  const { strips } = comparedBy(comparison, comparison.trial.mainFigure);
  const drawn = drawnSettings(comparison);
  const blockNumbers = [...new Set(strips.map((strip) => strip.blockNumber))].sort((a, b) => a - b);
  const blocks = blockNumbers.map((number) => ({
    id: String(number),
    label: texts.block(number),
    dots: strips.flatMap((strip) => {
      const setting = drawn.find((each) => each.settingId === strip.settingId);
      if (strip.blockNumber !== number || !setting || strip.value.kind === 'insufficient') return [];
      const { figure } = strip.value.value;
      return [{ seriesIndex: setting.seriesIndex, value: figure, text: words.mean(figure) }];
    }),
  }));
  const dots = blocks.reduce((sum, block) => sum + block.dots.length, 0);
  return (
    <Section title={texts.title(words.head)} lead={texts.lead}>
      {dots === 0 ? (
        <p>{texts.none}</p>
      ) : (
        <>
          <ul className="flex flex-wrap gap-x-5 gap-y-1 text-13">
            {drawn.map((setting) => (
              <li key={setting.settingId} className="flex items-center font-bold">
                <SeriesSample index={setting.seriesIndex} />
                {setting.name}
              </li>
            ))}
          </ul>
          <BlockDots
            title={texts.title(words.head)}
            unit={[words.head, words.columnUnit].filter(Boolean).join(', ')}
            sample={countText(dots, 'strip')}
            uncertainty={texts.uncertainty}
            fileName="blocks"
            series={drawn.map((setting) => ({ seriesIndex: setting.seriesIndex, label: setting.name }))}
            tickText={words.mean}
            blocks={blocks}
          />
        </>
      )}
    </Section>
  );
}
