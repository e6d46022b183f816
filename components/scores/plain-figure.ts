import type { FigureId } from '@/lib/agronomy/figures';
import { daysText } from '@/lib/format/days-text';
import { spacingText } from '@/lib/format/spacing-text';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import type { FigureSubject } from './figure-subject';
import { isOneRow, shownFigure, standText } from './shown-figure';

/** A figure for a column whose head holds the unit: "30,748", "at least 3.6", "by 20.0". */
export function plainFigure(id: FigureId, subject: FigureSubject, units: UnitSystem): string {
  const { figures } = subject;
  if (id === 'plantsPerAcre' && figures.plantsPerAcre.kind === 'value') {
    return standText(figures.plantsPerAcre.value.plantsPerAcre, isOneRow(subject), units);
  }
  if (id === 'spreadDays' && figures.spreadDays.kind === 'value') {
    const { days, bound } = figures.spreadDays.value;
    return `${bound === 'at-least' ? 'at least ' : ''}${daysText(days, { withUnit: false })}`;
  }
  if (id === 'daysTo50' && figures.daysTo50.kind === 'value') {
    const { days, bound } = figures.daysTo50.value;
    return `${bound === 'at-latest' ? 'by ' : ''}${daysText(days, { withUnit: false })}`;
  }
  if (id === 'spacingInchesSd' && figures.spacingInchesSd.kind === 'value') {
    return spacingText(figures.spacingInchesSd.value, units, { withUnit: false });
  }
  return shownFigure(id, subject, units).text;
}
