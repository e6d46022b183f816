'use client';

import { ShallowLink } from '@/components/ui/shallow-link';
import { useWho } from '@/lib/client/who';
import { unitName } from '@/lib/format/unit-name';
import { scoreTexts } from '@/lib/texts/score-texts';
import { FigureOpener } from './figure-opener';
import { plainFigure } from './plain-figure';
import type { ScoredThing } from './scored-things';
import { SeriesName } from '@/components/charts/series-name';
import { shownFigure, withoutBound } from './shown-figure';

type LevelListProps = { things: readonly ScoredThing[]; hrefOf: (id: string) => string };

const important = ['plantsPerAcre', 'spreadDays', 'lateShare', 'score'] as const;

/** The same things for a phone: the four figures that matter first, and everything one press away. */
export function LevelList({ things, hrefOf }: LevelListProps) {
  const { units } = useWho();
  const head = (id: (typeof important)[number]) =>
    id === 'plantsPerAcre' ? unitName('plants-per-area', units) : scoreTexts.columns[id];
  return (
    <ul className="border-t border-rule">
      {things.map((thing) => {
        const { subject } = thing;
        return (
          <li key={thing.id} className="border-b border-rule py-2">
            <ShallowLink
              href={hrefOf(thing.id)}
              className="flex min-h-press flex-wrap items-baseline gap-x-3 pt-2 text-18 font-bold underline underline-offset-4"
            >
              {thing.seriesIndex === null ? thing.name : <SeriesName index={thing.seriesIndex} name={thing.name} />}
            </ShallowLink>
            {thing.detail ? <p className="text-13 text-ink-soft">{thing.detail}</p> : null}
            {subject ? (
              <dl className="grid grid-cols-[1.5fr_1.2fr_1fr_1fr] gap-x-3 pt-1 pb-2">
                {important.map((id) => {
                  const shown = shownFigure(id, subject, units);
                  return (
                    <div key={id}>
                      <dt className="text-13 text-ink-soft">{head(id)}</dt>
                      <dd className="font-mono text-15">
                        <FigureOpener id={id} subject={subject} text={shown.sort === null ? undefined : withoutBound(plainFigure(id, subject, units), shown.bound)} />
                        {shown.bound ? <span className="block font-sans text-13 text-ink-soft">{shown.bound}</span> : null}
                      </dd>
                    </div>
                  );
                })}
              </dl>
            ) : (
              <p className="pb-2 text-15">{thing.without}</p>
            )}
          </li>
        );
      })}
    </ul>
  );
}
