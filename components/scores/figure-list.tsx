'use client';

import type { FigureId } from '@/lib/agronomy/figures';
import { useWho } from '@/lib/client/who';
import { FigureOpener } from './figure-opener';
import type { FigureSubject } from './figure-subject';
import { shownFigure } from './shown-figure';

type FigureListProps = { ids: readonly FigureId[]; subject: FigureSubject };

/** Figures under each other, each with its name, its number and how sure or of what it is. */
export function FigureList({ ids, subject }: FigureListProps) {
  const { units } = useWho();
  return (
    <dl className="border-t border-rule">
      {ids.map((id) => {
        const shown = shownFigure(id, subject, units);
        return (
          <div key={id} className="grid grid-cols-[minmax(0,1fr)_auto] items-baseline gap-x-4 border-b border-rule py-2">
            <dt className="text-15">{shown.label}</dt>
            <dd className="text-right font-mono text-15">
              <FigureOpener id={id} subject={subject} />
            </dd>
            {shown.detail ? <dd className="col-span-2 text-13 text-ink-soft">{shown.detail}</dd> : null}
          </div>
        );
      })}
    </dl>
  );
}
