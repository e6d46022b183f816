import { requiredCount } from './required-count';
import { requiredNumber } from './required-number';

export type AdjustmentAsked = {
  rowUnits: number;
  minutesPerRowUnit: number;
  minutesPerChangeFromCab: number;
  changesPerYear: number;
  wageDollarsPerHour: number;
  /** How many work on it, all paid and all standing still from the cab. */
  people: number;
};

type Labor = { hoursPerYear: number; dollarsPerYear: number };
export type AdjustmentLabor = { rowByRow: Labor; fromCab: Labor; saved: Labor };

/**
 * What does adjusting row by row cost in a year, against adjusting from the cab?
 *
 * Takes row units (1 or more), minutes for one of them, minutes for one change from the cab, changes a year, the wage in
 * dollars an hour (each 0 or more) and people (1 or more). Returns hours of the work and dollars a year for both, and what
 * is saved, below 0 where the cab takes longer. Never insufficient; throws ImpossibleInput outside those limits.
 * Equation: minutes × row units × changes / 60 hours; × people × wage.
 * Acres not planted while the planter stands are not in it, nor the changes nobody makes because they take too long.
 * Example: 12 rows of 4 minutes, 6 changes, $22 an hour: 4.8 hours, $105.60; from the cab at 2 minutes 0.2 hours, $4.40.
 */
export function adjustmentLabor(asked: AdjustmentAsked): AdjustmentLabor {
  const rowUnits = requiredCount(asked.rowUnits, 'rowUnits', { atLeast: 1 });
  const changes = requiredCount(asked.changesPerYear, 'changesPerYear', { atLeast: 0 });
  const people = requiredCount(asked.people, 'people', { atLeast: 1 });
  const minutes = requiredNumber(asked.minutesPerRowUnit, 'minutesPerRowUnit', { atLeast: 0 });
  const cabMinutes = requiredNumber(asked.minutesPerChangeFromCab, 'minutesPerChangeFromCab', { atLeast: 0 });
  const wage = requiredNumber(asked.wageDollarsPerHour, 'wageDollarsPerHour', { atLeast: 0 });
  const labor = (minutesPerChange: number): Labor => {
    const hoursPerYear = (minutesPerChange * changes) / 60;
    return { hoursPerYear, dollarsPerYear: hoursPerYear * people * wage };
  };
  const [rowByRow, fromCab] = [labor(minutes * rowUnits), labor(cabMinutes)];
  return {
    rowByRow,
    fromCab,
    saved: {
      hoursPerYear: rowByRow.hoursPerYear - fromCab.hoursPerYear,
      dollarsPerYear: rowByRow.dollarsPerYear - fromCab.dollarsPerYear,
    },
  };
}
