import { ImpossibleInput, insufficient } from '../outcome';
import type { Insufficient } from '../outcome';
import { requiredCount } from '../required-count';
import { requiredNumber } from '../required-number';
import { blockConnection } from './block-connection';

/** A figure of which more is later: days to half up, late share. One for each planter row sampled in a strip. */
export type RowUnitFigure = { strip: string; setting: string; rowUnit: number; figure: number };

/** Refuses figures that cannot be: no number, no planter row, two of one row unit in one strip. */
export function requiredRowUnitFigures(figures: readonly RowUnitFigure[]): void {
  const seen = new Set<string>();
  for (const { strip, rowUnit, figure } of figures) {
    requiredNumber(figure, 'figure');
    requiredCount(rowUnit, 'rowUnit', { atLeast: 1 });
    const key = JSON.stringify([strip, rowUnit]);
    if (seen.has(key)) {
      throw new ImpossibleInput(
        `Row unit ${rowUnit} has two figures in one strip; pool them first.`,
        'rowUnit',
      );
    }
    seen.add(key);
  }
}

/** Why row units cannot be compared with one another, or null when they can. `used` are the units with two strips. */
export function tooFewRowUnits(
  figures: readonly RowUnitFigure[],
  used: readonly RowUnitFigure[],
): Insufficient | null {
  const strips = new Set(figures.map(({ strip }) => strip)).size;
  if (strips < 2) return insufficient('one-strip', '2 strips', `${strips}`);
  const rowUnits = new Set(used.map(({ rowUnit }) => rowUnit));
  if (rowUnits.size < 2) {
    return insufficient('too-few-row-units', '2 row units sampled in 2 strips each', `${rowUnits.size}`);
  }
  const settings = new Set(used.map(({ setting }) => setting)).size;
  if (settings > 1 && [...rowUnits].every((rowUnit) => settingsMet(used, rowUnit) === 1)) {
    return insufficient(
      'row-unit-mixed-with-setting',
      'row units that ran under 2 settings',
      'each row unit under one setting only',
    );
  }
  if (!blockConnection(used.map(({ strip, rowUnit }) => ({ block: strip, setting: `${rowUnit}` })))) {
    return insufficient('not-connected', 'row units that share strips', 'groups with no strip in common');
  }
  return null;
}

/** Under how many settings did this row unit run? */
export function settingsMet(figures: readonly RowUnitFigure[], rowUnit: number): number {
  return new Set(figures.filter((each) => each.rowUnit === rowUnit).map(({ setting }) => setting)).size;
}

/** Was this row unit later than the mean of the others in every strip it shares with others? */
export function isLaterInAllStrips(figures: readonly RowUnitFigure[], rowUnit: number): boolean {
  return figures
    .filter((each) => each.rowUnit === rowUnit)
    .every((own) => {
      const others = figures.filter((each) => each.strip === own.strip && each.rowUnit !== rowUnit);
      const sum = others.reduce((total, each) => total + each.figure, 0);
      return others.length === 0 || own.figure > sum / others.length;
    });
}
