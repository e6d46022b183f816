'use client';

import { NumberSource } from '@/components/ui/number-source';
import type { FigureId } from '@/lib/agronomy/figures';
import { register } from '@/lib/agronomy/register';
import { useWho } from '@/lib/client/who';
import { scoreTexts } from '@/lib/texts/score-texts';
import { figureInputs } from './figure-inputs';
import type { FigureSubject } from './figure-subject';
import { shownFigure } from './shown-figure';

type FigureOpenerProps = {
  id: FigureId;
  subject: FigureSubject;
  /** Written instead of the whole figure, where a column head already holds its unit. */
  text?: string | undefined;
  /** Whose figure it is, where several stand side by side. */
  of?: string;
};

/** A figure that opens to what it was made from, its formula, its source, and what it does not tell. */
export function FigureOpener({ id, subject, text, of }: FigureOpenerProps) {
  const { units } = useWho();
  const shown = shownFigure(id, subject, units);
  const pooled = subject.pooled;
  const taken = pooled && !isPenalty(id) ? scoreTexts.pooled[isTiming(id) ? pooled.definition.timing : pooled.definition.stand] : null;
  // A column head holds the unit; opened, the number stands by itself.
  const whole = text !== undefined && text !== shown.text && shown.sort !== null ? `${shown.text}.` : null;
  const note = [whole, shown.detail, isTiming(id) || id === 'plantsPerAcre' ? taken : null].filter(Boolean).join(' ');
  return (
    <NumberSource
      label={of ? `${of}: ${shown.label}` : shown.label}
      text={text ?? shown.text}
      entry={register[id]}
      inputs={figureInputs(id, subject, units)}
      {...(note ? { note: capital(note) } : {})}
    />
  );
}

const timing: readonly FigureId[] = ['emergenceCurve', 'daysTo10', 'daysTo50', 'daysTo90', 'spreadDays'];
const isTiming = (id: FigureId) => timing.includes(id);
const isPenalty = (id: FigureId) => id.includes('-');

const capital = (words: string) => words.charAt(0).toUpperCase() + words.slice(1);
