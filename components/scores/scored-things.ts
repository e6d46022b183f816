import type { ScoreLevel, Scores } from '@/lib/schemas/scores';
import { scoreTexts } from '@/lib/texts/score-texts';
import type { FigureSubject } from './figure-subject';

/** One line of a level: a setting, a strip or a row sample, with its figures where it has any. */
export type ScoredThing = {
  id: string;
  name: string;
  /** Where it lies, or what is to be said of it. */
  detail: string;
  subject: FigureSubject | null;
  /** Why there are no figures. */
  without: string | null;
  seriesIndex: number | null;
};

/** The things of a level as a screen lists them. */
export function scoredThings(scores: Scores, level: ScoreLevel): ScoredThing[] {
  const { planting } = scores;
  switch (level) {
    case 'planting':
      return [];
    case 'setting':
      return scores.settings.map((setting) => ({
        id: setting.settingId,
        name: setting.name,
        detail: setting.isReference ? scoreTexts.reference : '',
        subject: { planting, ...setting, row: null },
        without: null,
        seriesIndex: setting.seriesIndex,
      }));
    case 'strip':
      return scores.strips.map((strip) => ({
        id: strip.stripId,
        name: scoreTexts.strip(strip.number),
        detail: [scoreTexts.block(strip.blockNumber), basisWords(strip.settingName, strip.settingBasis)].filter(Boolean).join(', '),
        subject: { planting, ...strip, row: null },
        without: null,
        seriesIndex: null,
      }));
    case 'row-sample':
      return scores.rowSamples.map((row) => ({
        id: row.rowSampleId,
        name: row.label,
        detail: [
          row.stripNumber === null ? '' : scoreTexts.strip(row.stripNumber).toLowerCase(),
          row.settingBasis ? basisWords(row.settingName, row.settingBasis) : '',
          row.zoneName ?? '',
        ]
          .filter(Boolean)
          .join(', '),
        subject: row.scored && { planting, ...row.scored, pooled: null, row },
        without: row.scored ? null : withoutWords(row.impossible),
        seriesIndex: null,
      }));
  }
}

function basisWords(settingName: string | null, basis: 'as-planted' | 'as-planned' | 'lost'): string {
  if (basis === 'lost') return scoreTexts.lostStrip;
  return settingName ?? '';
}

function withoutWords(impossible: string | null): string {
  return impossible === null ? scoreTexts.notCountedYet : impossibleWords(impossible);
}

/** Which of its readings cannot be, in words. */
export function impossibleWords(field: string): string {
  const words = scoreTexts.impossible;
  return field in words ? words[field as keyof typeof words] : words.other;
}
