'use client';

import { memo, useEffect, useRef } from 'react';
import type { DraftPlace, TapeDraft, TapePress } from '@/lib/client/round/tape-draft';
import { tapeTexts } from '@/lib/texts/round-tape-texts';

type TapePlacesProps = Pick<TapeDraft, 'places' | 'at' | 'toGo'> & { wrong: ReadonlySet<number>; onPress: (pressed: TapePress) => void };

const press = 'min-h-press cursor-pointer touch-manipulation rounded-press border-2 border-ink bg-paper px-1 text-15 leading-tight font-bold select-none';

/** Every place read so far, the newest on top as the row goes away from the scout. Pressed, one is changed, taken out, or another put before it. */
export const TapePlaces = memo(function TapePlaces({ places, at, toGo, wrong, onPress }: TapePlacesProps) {
  const chosen = at.put === 'end' ? null : at.index;
  const list = useRef<HTMLOListElement>(null);
  useEffect(() => {
    const shown = list.current?.querySelector('[data-chosen]');
    // The list alone scrolls: the keys stay where the thumb expects them.
    if (shown && list.current) list.current.scrollTop = (shown as HTMLElement).offsetTop - list.current.clientHeight / 3;
    else list.current?.scrollTo(0, 0);
  }, [places.length, chosen]);
  if (places.length === 0) return <p className="grow py-2 text-18">{tapeTexts.empty}</p>;
  const rows = places.map((place, index) => ({ place, index })).reverse();
  return (
    <ol ref={list} reversed aria-label={tapeTexts.places} className="relative min-h-0 min-w-32 grow overflow-y-auto overscroll-contain">
      {rows.map(({ place, index }) => (
        <li key={index} data-chosen={index === chosen ? '' : undefined} className={`border-b ${index > 0 && place.cutBefore ? 'border-b-4 border-dashed border-ink' : 'border-rule'} ${index === chosen ? 'bg-bone' : ''}`}>
          <button type="button" aria-pressed={at.put === 'change' && at.index === index} onClick={() => onPress({ press: 'select', index })} className="flex min-h-press w-full cursor-pointer touch-manipulation flex-wrap items-center gap-x-2 px-1 text-left [overflow-wrap:normal]">
            <span className="w-6 shrink-0 text-right font-mono text-13">{index + 1}</span>
            <span className={`shrink-0 font-mono text-21 leading-none ${index >= places.length - toGo ? '' : 'font-bold'}`}>{place.typed}</span>
            <span className="min-w-0 text-15 leading-tight">
              {notesOf(place)}
              {wrong.has(index) ? <span className="font-bold text-flag-text"> {tapeTexts.wrong}</span> : null}
            </span>
          </button>
          {at.put === 'change' && at.index === index ? (
            <div className="grid grid-cols-2 gap-1.5 px-1 pb-1.5">
              <button type="button" aria-label={tapeTexts.removeOf(place.typed)} onClick={() => onPress({ press: 'remove' })} className={press}>
                {tapeTexts.remove}
              </button>
              <button type="button" aria-label={tapeTexts.insertBefore(place.typed)} onClick={() => onPress({ press: 'insert' })} className={press}>
                {tapeTexts.insert}
              </button>
            </div>
          ) : null}
          {index > 0 && place.cutBefore ? <p className="px-1 pb-1 text-13 leading-tight">{tapeTexts.laidAnew}</p> : null}
        </li>
      ))}
    </ol>
  );
});

function notesOf({ kind, marker, leafStage }: DraftPlace): string {
  return [kind === 'plant' ? null : tapeTexts.noted[kind].toLowerCase(), marker, leafStage === null ? null : tapeTexts.leaf(leafStage)].filter(Boolean).join(', ');
}
