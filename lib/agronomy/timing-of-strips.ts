import type { EmergenceSpread } from './emergence-spread';
import type { DaysFigure, Figures } from './figures';
import { insufficient, value, type Outcome } from './outcome';
import { timingFigures } from './timing-figures';
import { poolEmergence } from './emergence-pool';
import type { RowSample } from './row-sample';
import { sortedCounts } from './sorted-counts';

export type TimingOfStrips = {
  figures: Pick<Figures, 'daysTo10' | 'daysTo50' | 'daysTo90' | 'spreadDays'>;
  stripsTimed: number;
};

/**
 * How did several strips come up on average?
 *
 * Takes the row samples of each strip. Returns days to 10, 50 and 90 % and the spread, each the mean of the
 * strips that have it, and how many strips have a curve. A figure is insufficient when no strip has it.
 * Throws ImpossibleInput as poolEmergence does.
 * Method: one curve a strip, fitted once from the pooled counts of its row samples; then the plain mean of the
 * strips' figures (two steps: the strip is the unit). The mean is "at latest" or "at least" when any strip's is.
 * It is narrower than a curve of all plants would be where strips differ.
 * Example: strips with spreads of 3.2 and 3.6 days have 3.4.
 */
export function timingOfStrips(strips: readonly (readonly RowSample[])[]): TimingOfStrips {
  const curves = strips.map((samples) => poolEmergence(samples.map(sortedCounts)));
  const timings = curves.map(timingFigures);
  return {
    figures: {
      daysTo10: meanDays(timings.map((timing) => timing.daysTo10)),
      daysTo50: meanDays(timings.map((timing) => timing.daysTo50)),
      daysTo90: meanDays(timings.map((timing) => timing.daysTo90)),
      spreadDays: meanSpread(timings.map((timing) => timing.spreadDays)),
    },
    stripsTimed: curves.filter((curve) => curve.kind === 'value').length,
  };
}

function meanDays(figures: readonly Outcome<DaysFigure>[]): Outcome<DaysFigure> {
  const days = figures.flatMap((figure) => (figure.kind === 'value' ? [figure.value] : []));
  if (days.length === 0) return figures[0] ?? noStrip();
  return value({
    days: days.reduce((sum, figure) => sum + figure.days, 0) / days.length,
    bound: days.some((figure) => figure.bound === 'at-latest') ? 'at-latest' : 'exact',
  });
}

function meanSpread(figures: readonly Outcome<EmergenceSpread>[]): Outcome<EmergenceSpread> {
  const spreads = figures.flatMap((figure) => (figure.kind === 'value' ? [figure.value] : []));
  if (spreads.length === 0) return figures[0] ?? noStrip();
  const boundReasons = [...new Set(spreads.flatMap((spread) => spread.boundReasons))];
  return value({
    days: spreads.reduce((sum, spread) => sum + spread.days, 0) / spreads.length,
    bound: boundReasons.length > 0 ? 'at-least' : 'exact',
    boundReasons,
  });
}

function noStrip() {
  return insufficient('no-counts', '1 counted strip', 'no strip');
}
