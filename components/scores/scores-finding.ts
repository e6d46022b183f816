import { countText } from '@/lib/format/count-text';
import { daysText } from '@/lib/format/days-text';
import { decimalText } from '@/lib/format/decimal-text';
import { intervalText } from '@/lib/format/interval-text';
import { percentText } from '@/lib/format/percent-text';
import { unitName } from '@/lib/format/unit-name';
import type { Scores } from '@/lib/schemas/scores';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { findingTexts as texts } from '@/lib/texts/finding-texts';
import { scoreTexts } from '@/lib/texts/score-texts';
import { standText } from './shown-figure';

export type ScoresFinding = { headline: string; details: string[] };

/** What the stand of a planting says, as one sentence, with how sure it is and how far counting has got below it. */
export function scoresFinding(scores: Scores, units: UnitSystem): ScoresFinding {
  const { figures, pooled } = scores.whole;
  if (figures.plantsPerAcre.kind === 'insufficient') return { headline: scoreTexts.nothing, details: [] };
  const oneRow = pooled.definition.stand === 'one-row-sample';
  const plants = (plantsPerAcre: number) => standText(plantsPerAcre, oneRow, units);
  const stand = texts.stand(plants(figures.plantsPerAcre.value.plantsPerAcre), unitName('plants-per-area', units));
  const ofSeed = figures.shareOfSeed.kind === 'value' ? texts.ofSeed(percentText(figures.shareOfSeed.value.share)) : '';
  return {
    headline: `${stand}${ofSeed}.${spreadSentence(scores)}`,
    details: [intervalSentence(scores, plants), timingSentence(scores), scoreSentence(scores)].filter(Boolean),
  };
}

function spreadSentence({ whole: { figures } }: Scores): string {
  const spread = figures.spreadDays;
  if (spread.kind === 'insufficient') return '';
  return texts.spread(daysText(spread.value.days), spread.value.bound === 'at-least');
}

function intervalSentence({ whole: { figures, pooled }, zones, zoneStand }: Scores, plants: (plantsPerAcre: number) => string): string {
  const from = rowsAndStrips(pooled.rowSamples, pooled.strips);
  const interval = figures.plantsPerAcreInterval;
  if (interval.kind === 'insufficient') return texts.noInterval(from, interval.needed);
  const { plantsPerAcreLower, plantsPerAcreUpper, basis } = interval.value;
  const text = intervalText(plantsPerAcreLower, plantsPerAcreUpper, plants);
  if (basis === 'counting-only') return texts.countingOnly(text);
  const weighted = zoneStand?.stand.kind === 'value' ? texts.byArea(zones.length) : '';
  return texts.interval(text, from, weighted);
}

function rowsAndStrips(rowSamples: number, strips: number): string {
  const rows = countText(rowSamples, 'row sample');
  return strips > 0 ? texts.inStrips(rows, countText(strips, 'strip')) : rows;
}

function timingSentence({ whole: { figures } }: Scores): string {
  const curve = figures.emergenceCurve;
  if (curve.kind === 'insufficient') return '';
  const { daysTo50, lateShare } = figures;
  const clauses = [
    ...(daysTo50.kind === 'value'
      ? [texts.halfUp(daysText(daysTo50.value.days, { withUnit: false }), daysTo50.value.bound === 'at-latest')]
      : []),
    ...(lateShare.kind === 'value'
      ? [texts.late(percentText(lateShare.value.share, { decimals: 1 }), lateShare.value.bound === 'at-least')]
      : []),
  ];
  const said = clauses.length > 0 ? ` ${clauses.join('; ')}.` : '';
  return `${curve.value.countingEnded ? texts.countingEnded : texts.stillComing}${said}`;
}

function scoreSentence({ whole: { figures } }: Scores): string {
  const { score } = figures;
  if (score.kind === 'insufficient') return '';
  const named = { stand: figures.scoreStand, timing: figures.scoreTiming, spacing: figures.scoreSpacing };
  const parts = (['stand', 'timing', 'spacing'] as const).flatMap((name) => {
    const part = named[name];
    return part.kind === 'value' ? [`${texts.parts[name]} ${decimalText(part.value.points, 0)}`] : [];
  });
  const leftOut = score.value.leftOut.map((name) => texts.parts[name]);
  return texts.score(decimalText(score.value.points, 0), score.value.bound === 'at-most', parts.join(', '), leftOut.join(' and '));
}
