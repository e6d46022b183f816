import type { DaysFigure, FigureId, Figures } from '@/lib/agronomy/figures';
import type { LateShare } from '@/lib/agronomy/late-share';
import type { Outcome } from '@/lib/agronomy/outcome';
import { penaltyStudies, type PenaltyStudy } from '@/lib/agronomy/penalty/penalty';
import type { ScorePart } from '@/lib/agronomy/score';
import type { StandInterval } from '@/lib/agronomy/stand-interval-shape';
import { countText } from '@/lib/format/count-text';
import { daysText } from '@/lib/format/days-text';
import { decimalText } from '@/lib/format/decimal-text';
import { intervalText } from '@/lib/format/interval-text';
import { percentText } from '@/lib/format/percent-text';
import { plantsPerAreaText } from '@/lib/format/plants-per-area-text';
import { rowLengthText } from '@/lib/format/row-length-text';
import { spacingText } from '@/lib/format/spacing-text';
import type { SaidPenalty } from '@/lib/schemas/figures';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { figureNames, scoreTexts } from '@/lib/texts/score-texts';
import type { FigureSubject } from './figure-subject';
import { penaltyOf, penaltyText } from './penalty-text';

/** A figure as it is read: its number with unit, how sure or of what, and what to sort it by. */
export type ShownFigure = {
  label: string;
  text: string;
  /** "at least", "at most" or "by", where the number is only a bound; the text holds it too. */
  bound: string | null;
  detail: string | null;
  sort: number | null;
};

type Said = { text: string; bound?: string | null; detail?: string | null; sort: number };

const atLeast = (isBound: boolean, text: string) => {
  const bound = isBound ? scoreTexts.bounds.atLeast : null;
  return { bound, text: bound ? `${bound} ${text}` : text };
};

/** Says one figure of a row sample or a group; where there is too little, in a word what is missing and below it what it needs. */
export function shownFigure(id: FigureId, subject: FigureSubject, units: UnitSystem): ShownFigure {
  const label = figureNames[id];
  const answer = isStudy(id) ? said(subject.penalties[id], penaltySaid(units)) : figureSaid(id, subject, units);
  if (answer.kind === 'insufficient') {
    const { reason, needed, had } = answer;
    return { label, text: scoreTexts.short[reason] ?? scoreTexts.tooLittle, bound: null, detail: scoreTexts.needs(needed, had), sort: null };
  }
  const { text, bound = null, detail = null, sort } = answer.value;
  return { label, text, bound, detail, sort };
}

/** The number alone, where the word of its bound stands beside it in small. */
export function withoutBound(text: string, bound: string | null): string {
  return bound && text.startsWith(`${bound} `) ? text.slice(bound.length + 1) : text;
}

export function isStudy(id: FigureId): id is PenaltyStudy {
  return (penaltyStudies as readonly string[]).includes(id);
}

function said<T>(outcome: Outcome<T>, words: (value: T) => Said): Outcome<Said> {
  return outcome.kind === 'value' ? { kind: 'value', value: words(outcome.value) } : outcome;
}

/** Single plants are said of one row sample; over many rows they would claim too much. */
export function standText(plantsPerAcre: number, isOneRow: boolean, units: UnitSystem, withUnit = false): string {
  return plantsPerAreaText(plantsPerAcre, units, { nearest: isOneRow ? 1 : 100, withUnit });
}

export function isOneRow(subject: Pick<FigureSubject, 'pooled'>): boolean {
  return subject.pooled === null || subject.pooled.definition.stand === 'one-row-sample';
}

function figureSaid(id: keyof Figures, subject: FigureSubject, units: UnitSystem): Outcome<Said> {
  const { figures } = subject;
  switch (id) {
    case 'plantsPerAcre':
      return said(figures[id], ({ plantsPerAcre }) => ({
        text: standText(plantsPerAcre, isOneRow(subject), units, true),
        detail: intervalDetail(figures.plantsPerAcreInterval, (plants) => standText(plants, isOneRow(subject), units)),
        sort: plantsPerAcre,
      }));
    case 'plantsPerAcreInterval':
      return said(figures[id], (interval) => ({
        text: standIntervalText(interval, (plants) => standText(plants, isOneRow(subject), units)),
        sort: interval.plantsPerAcreLower,
      }));
    case 'shareOfSeed':
      return said(figures[id], ({ share }) => ({
        text: percentText(share),
        detail:
          figures.shareOfSeedInterval.kind === 'value'
            ? ninetyFive(intervalText(figures.shareOfSeedInterval.value.shareLower, figures.shareOfSeedInterval.value.shareUpper, percentText))
            : null,
        sort: share,
      }));
    case 'shareOfSeedInterval':
      return said(figures[id], ({ shareLower, shareUpper }) => ({
        text: intervalText(shareLower, shareUpper, percentText),
        sort: shareLower,
      }));
    case 'emergenceCurve':
      return said(figures[id], (curve) => ({ text: countText(curve.points.length, 'visit'), sort: curve.points.length }));
    case 'daysTo10':
    case 'daysTo50':
    case 'daysTo90':
      return said(figures[id], daysSaid);
    case 'spreadDays':
      return said(figures[id], ({ days, bound, boundReasons }) => ({
        ...atLeast(bound === 'at-least', daysText(days)),
        detail: boundReasons.length > 0 ? boundReasons.map((reason) => scoreTexts.spreadBounds[reason]).join(' ') : null,
        sort: days,
      }));
    case 'lateShare':
    case 'lateShareFromCounts':
      return said(figures[id], lateSaid);
    case 'latePattern':
      return said(figures[id], ({ pattern, meanRunLength, runs }) => ({
        text: scoreTexts.patterns[pattern],
        detail: scoreTexts.runs(countText(runs, 'run'), decimalText(meanRunLength, 1)),
        sort: meanRunLength,
      }));
    case 'spacingInchesMean':
    case 'spacingInchesSd':
    case 'spacingInchesSdSingles':
    case 'spacingInchesSdFromMissing':
    case 'theoreticalSpacingInches':
      return said(figures[id], (inches) => ({ text: spacingText(inches, units), sort: inches }));
    case 'spacingCv':
      return said(figures[id], (cv) => ({ text: percentText(cv), sort: cv }));
    case 'placement':
      return said(figures[id], ({ ofSpacings, ofPlaces }) => ({
        text: scoreTexts.multiplesAndMisses(share(ofSpacings.multiplesShare), share(ofSpacings.missesShare)),
        detail: scoreTexts.ofPlaces(share(ofPlaces.multiplesShare), share(ofPlaces.missesShare)),
        sort: ofSpacings.missesShare,
      }));
    case 'doublesAndGaps':
      return said(figures[id], ({ doubles, gaps, gapInchesTotal, gapLengthsInches }) => ({
        text: `${countText(doubles, 'double')}, ${countText(gaps, 'gap')}`,
        detail:
          gaps === 0
            ? null
            : scoreTexts.gaps(rowLengthText(Math.max(...gapLengthsInches), units), rowLengthText(gapInchesTotal, units)),
        sort: doubles + gaps,
      }));
    case 'tapeLessCounted':
      return said(figures[id], (plants) => ({ text: `${decimalText(plants, 0, { signed: true })} ${Math.abs(plants) === 1 ? 'plant' : 'plants'}`, sort: plants }));
    case 'score':
      return said(figures[id], ({ points, bound }) => pointsSaid({ points, bound }));
    case 'scoreStand':
    case 'scoreTiming':
    case 'scoreSpacing':
      return said(figures[id], pointsSaid);
  }
}

const share = (of: number) => percentText(of, { decimals: 1 });

const ninetyFive = (interval: string) => scoreTexts.interval(interval);

function standIntervalText(interval: StandInterval, endText: (plants: number) => string): string {
  return intervalText(interval.plantsPerAcreLower, interval.plantsPerAcreUpper, endText);
}

function intervalDetail(interval: Figures['plantsPerAcreInterval'], endText: (plants: number) => string): string {
  if (interval.kind === 'insufficient') return scoreTexts.noInterval(interval.needed, interval.had);
  return `${ninetyFive(standIntervalText(interval.value, endText))}${scoreTexts.intervalBasis[interval.value.basis]}`;
}

function daysSaid({ days, bound }: DaysFigure): Said {
  const day = daysText(days, { withUnit: false });
  return bound === 'at-latest'
    ? { text: `by day ${day}`, detail: scoreTexts.atLatest, sort: days }
    : { text: `day ${day}`, sort: days };
}

function lateSaid({ share: late, bound, latePlants, plants, source, limits }: LateShare): Said {
  const count = (of: number) => decimalText(of, Number.isInteger(of) ? 0 : 1);
  return {
    ...atLeast(bound === 'at-least', share(late)),
    detail: scoreTexts.late(count(latePlants), count(plants), scoreTexts.lateSources[source], decimalText(limits.lateDays, 0)),
    sort: late,
  };
}

function pointsSaid({ points, bound }: ScorePart): Said {
  const word = bound === 'at-most' ? scoreTexts.bounds.atMost : null;
  const number = decimalText(points, 0);
  return { text: word ? `${word} ${number}` : number, bound: word, sort: points };
}

const penaltySaid =
  (units: UnitSystem) =>
  (penalty: SaidPenalty): Said => ({
    text: penaltyText(penalty, units),
    detail: [penaltyOf(penalty), penalty.column, penalty.basis === 'interpolated' ? scoreTexts.interpolated : ''].filter(Boolean).join('; '),
    sort: penalty.lossHigh,
  });
