'use client';

import type { TapeDraft, TapePress } from '@/lib/client/round/tape-draft';
import { tapeTexts } from '@/lib/texts/round-tape-texts';

export type SheetMarker = { marker: string; day: number | null };
type TapeNotesProps = { draft: TapeDraft; markers: readonly SheetMarker[]; onPress: (pressed: TapePress) => void };

const press = 'min-h-press cursor-pointer touch-manipulation rounded-press border-2 border-ink px-0.5 text-15 leading-tight font-bold [overflow-wrap:normal] select-none';
const kinds = ['late', 'double', 'missing'] as const;

/** What is noted of the place in the entry line: its marker, and late, double or missing. Each is one press, and all are in sight. */
export function TapeNotes({ draft, markers, onPress }: TapeNotesProps) {
  const { current } = draft;
  const choices: (SheetMarker | null)[] = markers.length > 0 ? [...markers, null] : [];
  return (
    <>
      {choices.length > 0 ? (
        <div role="radiogroup" aria-label={tapeTexts.marker} className="grid grid-cols-[repeat(auto-fit,minmax(3.5rem,1fr))] gap-[6px]">
          {choices.map((each) => {
            const on = current.marker?.toLowerCase() === each?.marker.toLowerCase();
            return (
              <button
                key={each?.marker ?? ''}
                type="button"
                role="radio"
                aria-checked={on}
                onClick={() => onPress({ press: 'marker', marker: each?.marker ?? null })}
                className={`${press} overflow-hidden ${on ? 'bg-ink text-paper' : ''}`}
              >
                {each?.marker ?? tapeTexts.noMarker}
                {each && each.day !== null ? (
                  <>
                    <span className="sr-only">, </span>
                    <span className="block text-13 leading-tight font-normal">{tapeTexts.markerDay(each.day)}</span>
                  </>
                ) : null}
              </button>
            );
          })}
        </div>
      ) : null}
      <div role="group" aria-label={tapeTexts.whatIs} className="grid grid-cols-[repeat(3,minmax(min-content,1fr))] gap-[6px]">
        {kinds.map((kind) => (
          <button
            key={kind}
            type="button"
            aria-pressed={current.kind === kind}
            onClick={() => onPress({ press: 'kind', kind })}
            className={`${press} ${current.kind === kind ? 'bg-ink text-paper' : ''}`}
          >
            {tapeTexts.noted[kind]}
          </button>
        ))}
      </div>
    </>
  );
}
