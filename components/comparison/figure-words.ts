import { daysText } from '@/lib/format/days-text';
import { decimalText } from '@/lib/format/decimal-text';
import { intervalText } from '@/lib/format/interval-text';
import { percentText } from '@/lib/format/percent-text';
import { plantsPerAreaText } from '@/lib/format/plants-per-area-text';
import { spacingText } from '@/lib/format/spacing-text';
import { unitName } from '@/lib/format/unit-name';
import type { FigureId } from '@/lib/agronomy/figures';
import type { ComparedFigure } from '@/lib/schemas/comparison';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { comparedFigureNames, comparisonTexts } from '@/lib/texts/comparison-texts';

/** How the means and differences of one figure are written in a reader's units. */
export type FigureWords = {
  head: string;
  name: string;
  better: string;
  /** Unit of a difference; empty where the number carries it. */
  unit: string;
  /** Unit of a mean, for a column head; empty where the number carries it. */
  columnUnit: string;
  mean: (value: number) => string;
  /** A difference without its sign, with its unit: "1.5 days", "4.1 percentage points". */
  amount: (difference: number) => string;
  /** A difference with its sign and unit. */
  signed: (difference: number) => string;
  /** The same without its unit, where a head holds it. */
  signedAlone: (difference: number) => string;
  /** Both ends of an interval, the unit once. */
  range: (lower: number, upper: number) => string;
  /** Both ends with their signs and no unit, beside a difference that has it. */
  signedRange: (lower: number, upper: number) => string;
};

type Plain = {
  unit: string;
  columnUnit?: string;
  mean: (value: number) => string;
  difference: (value: number, style: { signed: boolean; finer: boolean }) => string;
};

/** Writes one compared figure; the same words serve the headline, the table and the pictures. */
export function figureWords(figure: ComparedFigure, units: UnitSystem): FigureWords {
  const { unit, columnUnit = '', mean, difference } = plain(figure, units);
  const withUnit = (text: string) => `${text} ${unit === 'days' && /^[+−]?1(\.0)?$/.test(text) ? 'day' : unit}`.trim();
  const ends = (lower: number, upper: number, signed: boolean, endUnit?: string) => {
    // An interval that leaves zero out must not be rounded onto it.
    const finer = [lower, upper].some((end) => end !== 0 && /^0([.]0*)?$/.test(difference(Math.abs(end), { signed: false, finer: false })));
    return intervalText(lower, upper, (value) => difference(value, { signed, finer }), endUnit);
  };
  return {
    ...comparedFigureNames[figure],
    unit,
    columnUnit,
    mean,
    amount: (value) => withUnit(difference(Math.abs(value), { signed: false, finer: false })),
    signed: (value) => withUnit(difference(value, { signed: true, finer: false })),
    signedAlone: (value) => difference(value, { signed: true, finer: false }),
    range: (lower, upper) => ends(lower, upper, false, unit),
    signedRange: (lower, upper) => ends(lower, upper, true),
  };
}

function plain(figure: ComparedFigure, units: UnitSystem): Plain {
  switch (figure) {
    case 'spread-days':
    case 'half-up-days':
      return {
        unit: 'days',
        columnUnit: figure === 'spread-days' ? 'days' : '',
        mean: (value) => daysText(value, { withUnit: false }),
        difference: (value, { signed, finer }) => daysText(value, { withUnit: false, signed, decimals: finer ? 2 : 1 }),
      };
    case 'plants-per-acre':
      return {
        unit: unitName('plants-per-area', units),
        columnUnit: unitName('plants-per-area', units),
        mean: (value) => plantsPerAreaText(value, units, { nearest: 100, withUnit: false }),
        difference: (value, { signed, finer }) => plantsPerAreaText(value, units, { nearest: finer ? 1 : 100, withUnit: false, signed }),
      };
    case 'spacing-sd':
      return {
        unit: unitName('spacing', units),
        columnUnit: unitName('spacing', units),
        mean: (value) => spacingText(value, units, { withUnit: false }),
        difference: (value, { signed, finer }) => spacingText(value, units, { withUnit: false, signed, decimals: finer ? 2 : 1 }),
      };
    case 'score':
      return {
        unit: comparisonTexts.pointsUnit,
        mean: (value) => decimalText(value, 0),
        difference: (value, { signed, finer }) => decimalText(value, finer ? 1 : 0, { signed }),
      };
    case 'late-share':
    case 'share-of-seed':
    case 'spacing-cv':
    case 'in-row-cover': {
      const decimals = figure === 'late-share' ? 1 : 0;
      return {
        unit: comparisonTexts.percentagePointsUnit,
        mean: (value) => percentText(value, { decimals }),
        difference: (value, { signed, finer }) => percentText(value, { decimals: finer ? decimals + 1 : decimals, withUnit: false, signed }),
      };
    }
  }
}

/** The register's entry of each compared figure; in-row cover is a plain share and has none. */
export const registerIds: Record<ComparedFigure, FigureId | null> = {
  'spread-days': 'spreadDays',
  'half-up-days': 'daysTo50',
  'plants-per-acre': 'plantsPerAcre',
  'late-share': 'lateShare',
  'spacing-sd': 'spacingInchesSd',
  score: 'score',
  'share-of-seed': 'shareOfSeed',
  'spacing-cv': 'spacingCv',
  'in-row-cover': null,
};
