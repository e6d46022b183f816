'use client';

import { useEffect, useRef } from 'react';
import { segmentsRead } from '@/lib/schemas/tape-laid';
import type { TapeDraft, TapePress } from '@/lib/client/round/tape-draft';
import { tapeTexts } from '@/lib/texts/round-tape-texts';

/** The places read so far; pressed, one is changed, taken out, or the tape is cut before it. */
export function TapePlaces({ draft, onPress }: { draft: TapeDraft; onPress: (pressed: TapePress) => void }) {
  const list = useRef<HTMLOListElement>(null);
  const { places, changing } = draft;
  const segments = segmentsRead(places.length, draft.segmentStarts);
  useEffect(() => {
    // The newest stays in sight.
    if (changing === null) list.current?.scrollTo(0, list.current.scrollHeight);
  }, [places.length, changing]);
  if (places.length === 0) return <p className="grow px-3 pt-2 text-18">{tapeTexts.none}</p>;
  return (
    <ol ref={list} aria-label={tapeTexts.places} className="flex min-h-16 grow flex-wrap content-start gap-1 overflow-y-auto px-3 py-1">
      {places.map((place, index) => (
        <li key={index} className={index > 0 && segments[index] !== segments[index - 1] ? 'border-l-4 border-dashed border-ink pl-1' : ''}>
          <button
            type="button"
            aria-label={tapeTexts.place(place.typed, place.kind, place.marker)}
            aria-pressed={changing === index}
            onClick={() => onPress({ press: 'select', index })}
            className={`flex min-h-press min-w-press cursor-pointer flex-col items-center justify-center rounded-press border px-2 font-mono text-18 leading-none font-bold ${changing === index ? 'border-ink bg-ink text-paper' : 'border-rule'} ${place.kind === 'missing' ? 'line-through' : ''}`}
          >
            {place.typed}
            <span className="text-13 font-normal">{[place.kind === 'plant' ? null : tapeTexts.kinds[place.kind].toLowerCase(), place.marker].filter(Boolean).join(' ') || '\u00a0'}</span>
          </button>
        </li>
      ))}
    </ol>
  );
}
