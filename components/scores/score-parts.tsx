'use client';

import { useWho } from '@/lib/client/who';
import { percentText } from '@/lib/format/percent-text';
import { scoreTexts } from '@/lib/texts/score-texts';
import { FigureOpener } from './figure-opener';
import type { FigureSubject } from './figure-subject';
import { shownFigure } from './shown-figure';

const parts = [
  { name: 'stand', id: 'scoreStand' },
  { name: 'timing', id: 'scoreTiming' },
  { name: 'spacing', id: 'scoreSpacing' },
] as const;

/** The three parts of the score on one scale from 0 to 100, each with its weight; a part left out has no bar. */
export function ScoreParts({ subject }: { subject: FigureSubject }) {
  const { units } = useWho();
  const { score } = subject.figures;
  const whole = score.kind === 'value' ? score.value : null;
  return (
    <div className="flex flex-col gap-3">
      <ul className="grid grid-cols-[auto_minmax(0,1fr)_auto] items-center gap-x-3 gap-y-2">
        {parts.map(({ name, id }) => {
          const part = subject.figures[id];
          const leftOut = whole === null || whole.leftOut.includes(name);
          return (
            <li key={name} className="contents">
              <span className="text-15">
                {scoreTexts.parts[name]}
                <span className="block text-13 text-ink-soft">
                  {leftOut || !whole ? scoreTexts.leftOut : scoreTexts.weight(percentText(whole.weights[name]))}
                </span>
              </span>
              <svg aria-hidden="true" width="100%" height={18} className="block">
                <line x1={0} x2="100%" y1={17} y2={17} strokeWidth={1} className="stroke-rule" />
                {[0, 25, 50, 75, 100].map((tick) => (
                  <line key={tick} x1={`${tick}%`} x2={`${tick}%`} y1={11} y2={18} strokeWidth={tick % 50 === 0 ? 2 : 1} className="stroke-rule" />
                ))}
                {part.kind === 'value' ? <rect x={0} y={3} width={`${part.value.points}%`} height={9} className="fill-ink" /> : null}
              </svg>
              <span className="text-right font-mono text-15 whitespace-nowrap">
                <FigureOpener id={id} subject={subject} text={part.kind === 'value' ? shownFigure(id, subject, units).text : undefined} />
              </span>
            </li>
          );
        })}
      </ul>
      <p className="text-13 text-ink-soft">
        {whole ? `${scoreTexts.scoreLead(whole.version)} ` : ''}
        {scoreTexts.missingWeigh} {scoreTexts.daysUsed}
      </p>
    </div>
  );
}
