'use client';

import { NumberSource } from '@/components/ui/number-source';
import { register } from '@/lib/agronomy/register';
import { useWho } from '@/lib/client/who';
import type { ComparedFigure, ComparedSetting, TrialComparison } from '@/lib/schemas/comparison';
import { comparisonTexts } from '@/lib/texts/comparison-texts';
import { scoreTexts } from '@/lib/texts/score-texts';
import { figureWords, registerIds, type FigureWords } from './figure-words';
import { comparedBy } from './main-figure';

type MeanOpenerProps = { comparison: TrialComparison; figure: ComparedFigure; setting: ComparedSetting };

const texts = comparisonTexts.table;

/** A setting's mean as it is written; without one, in a word what is missing. */
export function meanText({ comparison, figure, setting }: MeanOpenerProps, words: FigureWords): { text: string; sort: number | null } {
  const compared = comparedBy(comparison, figure);
  const mean = compared.means.find((each) => each.settingId === setting.settingId);
  if (mean) return { text: words.mean(mean.mean), sort: mean.mean };
  const why = compared.strips.find((strip) => strip.settingId === setting.settingId)?.value;
  const reason = why?.kind === 'insufficient' ? scoreTexts.short[why.reason] : undefined;
  return { text: reason ?? texts.missing, sort: null };
}

/** The word to stand under a mean while counting goes on in one of its strips: its value is then only a bound. */
export function meanBound({ comparison, figure, setting }: MeanOpenerProps): string | null {
  const isBound = comparedBy(comparison, figure).strips.some(
    (strip) => strip.settingId === setting.settingId && strip.value.kind === 'value' && strip.value.value.isBound,
  );
  if (!isBound) return null;
  if (figure === 'score') return texts.bounds.atMost;
  return figure === 'half-up-days' ? texts.bounds.atLatest : texts.bounds.atLeast;
}

/** A setting's mean that opens to the strips it was taken from, the figure's formula and its source. */
export function MeanOpener({ comparison, figure, setting }: MeanOpenerProps) {
  const { units } = useWho();
  const words = figureWords(figure, units);
  const compared = comparedBy(comparison, figure);
  const mean = compared.means.find((each) => each.settingId === setting.settingId);
  const id = registerIds[figure];
  const strips = compared.strips
    .filter((strip) => strip.settingId === setting.settingId)
    .map((strip) => ({ name: texts.stripOf(strip.blockNumber, strip.number), text: stripText(strip.value, words) }));
  const spread = mean
    ? [
        ...(mean.standardError === null ? [] : [{ name: texts.standardError, text: words.amount(mean.standardError) }]),
        { name: texts.range, text: words.range(mean.least, mean.most) },
      ]
    : [];
  return (
    <NumberSource
      label={[`${setting.name}: ${words.name}`, words.columnUnit].filter(Boolean).join(', ')}
      text={meanText({ comparison, figure, setting }, words).text}
      inputs={[...strips, ...spread]}
      {...(id ? { entry: register[id] } : {})}
      {...(mean ? { note: mean.standardError === null ? texts.plain : texts.leastSquares } : {})}
    />
  );
}

function stripText(value: TrialComparison['figures'][number]['strips'][number]['value'], words: FigureWords): string {
  if (value.kind === 'insufficient') return scoreTexts.short[value.reason] ?? texts.missing;
  const text = words.mean(value.value.figure);
  return value.value.isBound ? texts.stripBound(text) : text;
}
