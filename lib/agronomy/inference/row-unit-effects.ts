import { insufficient, value } from '../outcome';
import type { Outcome } from '../outcome';
import { blockLeastSquares, type BlockLeastSquares } from './block-least-squares';
import { upperTailF } from './f-distribution';
import { holm } from './holm';
import { symmetricForm } from './linear-algebra';
import { TOLD_APART_P } from './pairwise';
import {
  isLaterInAllStrips,
  requiredRowUnitFigures,
  settingsMet,
  tooFewRowUnits,
  type RowUnitFigure,
} from './row-unit-figures';
import { studentQuantile, studentTwoSidedP } from './student-t';

export type RowUnitEffect = {
  rowUnit: number;
  strips: number;
  settings: number;
  /** Less the mean of the other row units in the same strips, in the figure's unit, with its own 95 % interval. */
  lessOthers: number;
  standardError: number;
  lower: number;
  upper: number;
  /** Adjusted by Holm for looking at every row unit. */
  p: number;
  /** Later than the mean of the others in every strip where it was sampled. */
  laterInAllStrips: boolean;
  /** Told apart and later in all strips: a row unit, not a setting. Never more than half of them: then the others are early. */
  isLateUnit: boolean;
};

export type RowUnitEffects = {
  /** In ascending order. */
  rowUnits: RowUnitEffect[];
  /** Row units sampled in one strip only: nothing to compare. */
  leftOut: number[];
  strips: number;
  fRatio: number;
  p: number;
  errorDegreesOfFreedom: number;
  /** Where not, strips and so settings also differ by the row units that were sampled in them. */
  sameUnitsInEveryStrip: boolean;
};

/**
 * Is it the setting or a row unit that is late?
 *
 * Takes one figure per strip and planter row with the strip's setting. Returns each row unit less the others with strips
 * (and so settings and blocks) taken out, and whether it is late in all strips, in the figure's unit.
 * Insufficient: fewer than two strips or row units; row units that each ran under one setting only while there are
 * several (a split planter: setting and row unit are mixed); none that shared strips connect; no degrees of freedom for
 * error; figures that do not vary. Throws ImpossibleInput for a figure that is no number, a planter row that is no whole
 * number above 0, or two figures of one row unit in a strip.
 * Equation: figure = strip + row unit + error, by least squares; t of each unit less the mean of the others; Holm 1979.
 * What it does not tell: a row unit that is late under one setting only, and whether the unit or its place is at fault:
 * wheel track, guess row, pinch row. Example: five units in six strips, one 22.9 later than the others, p 0.004.
 */
export function rowUnitEffects(figures: readonly RowUnitFigure[]): Outcome<RowUnitEffects> {
  requiredRowUnitFigures(figures);
  const all = [...new Set(figures.map(({ rowUnit }) => rowUnit))].sort((left, right) => left - right);
  const stripsOf = (rowUnit: number) => figures.filter((each) => each.rowUnit === rowUnit).length;
  const rowUnits = all.filter((rowUnit) => stripsOf(rowUnit) > 1);
  const used = figures.filter(({ rowUnit }) => stripsOf(rowUnit) > 1);
  const refusal = tooFewRowUnits(figures, used);
  if (refusal) return refusal;

  const strips = [...new Set(used.map(({ strip }) => strip))];
  const fit = blockLeastSquares(
    used.map(({ strip, rowUnit, figure }) => ({ block: strip, setting: `${rowUnit}`, figure })),
    strips,
    rowUnits.map(String),
  );
  const { errorDegreesOfFreedom } = fit;
  if (errorDegreesOfFreedom < 1) {
    return insufficient(
      'no-error-degrees-of-freedom',
      '1 degree of freedom for error',
      `${errorDegreesOfFreedom}`,
    );
  }
  if (fit.isExact) {
    return insufficient(
      'no-variation',
      'row units that vary between strips',
      'the same differences in every strip',
    );
  }
  const meanSquareError = fit.residualSquares / errorDegreesOfFreedom;
  const estimates = rowUnits.map((rowUnit) => estimateLessOthers(fit, rowUnits, rowUnit, meanSquareError));
  const ps = holm(
    estimates.map((each) => studentTwoSidedP(each.lessOthers / each.standardError, errorDegreesOfFreedom)),
  );
  const quantile = studentQuantile(0.975, errorDegreesOfFreedom);
  const fRatio = fit.settingSquares / (rowUnits.length - 1) / meanSquareError;
  const allStrips = new Set(figures.map(({ strip }) => strip)).size;
  const effects = estimates.map((estimate, index) => {
    const { rowUnit, lessOthers, standardError } = estimate;
    const p = ps[index] as number;
    const laterInAllStrips = isLaterInAllStrips(used, rowUnit);
    return {
      ...estimate,
      strips: stripsOf(rowUnit),
      settings: settingsMet(used, rowUnit),
      lower: lessOthers - quantile * standardError,
      upper: lessOthers + quantile * standardError,
      p,
      laterInAllStrips,
      isLateUnit: laterInAllStrips && lessOthers > 0 && p <= TOLD_APART_P,
    };
  });
  const lateUnits = effects.filter(({ isLateUnit }) => isLateUnit).length;
  return value({
    rowUnits:
      lateUnits > rowUnits.length / 2 ? effects.map((effect) => ({ ...effect, isLateUnit: false })) : effects,
    leftOut: all.filter((rowUnit) => stripsOf(rowUnit) === 1),
    strips: strips.length,
    fRatio,
    p: upperTailF(fRatio, rowUnits.length - 1, errorDegreesOfFreedom),
    errorDegreesOfFreedom,
    sameUnitsInEveryStrip: all.every((rowUnit) => stripsOf(rowUnit) === allStrips),
  });
}

function estimateLessOthers(
  fit: BlockLeastSquares,
  rowUnits: readonly number[],
  rowUnit: number,
  meanSquareError: number,
) {
  const weights = rowUnits.map((each) => (each === rowUnit ? 1 : -1 / (rowUnits.length - 1)));
  const weighted = (of: (name: string) => number) =>
    rowUnits.reduce((sum, each, index) => sum + (weights[index] as number) * of(`${each}`), 0);
  const contrast = fit.inverse.map((_, column) =>
    weighted((name) => fit.meanContrast(name)[column] as number),
  );
  return {
    rowUnit,
    lessOthers: weighted(fit.mean),
    standardError: Math.sqrt(meanSquareError * symmetricForm(fit.inverse, contrast)),
  };
}
