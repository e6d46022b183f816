'use client';

import type { TapeDraft, TapePress } from '@/lib/client/round/tape-draft';
import { tapeEntryKinds } from '@/lib/schemas/vocabulary';
import { tapeTexts } from '@/lib/texts/round-tape-texts';
import { todayTexts } from '@/lib/texts/round-texts';
import { Key } from './keypad';

type TapeKeysProps = { draft: TapeDraft; markers: readonly { marker: string; day: number }[]; problem: string | undefined; onPress: (pressed: TapePress) => void };

/** The place being typed and its keys, at the bottom where the thumb is. */
export function TapeKeys({ draft, markers, problem, onPress }: TapeKeysProps) {
  const { unit, step, current, changing } = draft;
  const withFraction = (unit === 'in' || unit === 'ft-in') && step !== 'tenth';
  const digit = (number: number) => (
    <Key key={number} onPress={() => onPress({ press: 'key', text: String(number) })}>
      {number}
    </Key>
  );
  const isCut = draft.segmentStarts.includes(changing ?? draft.places.length);
  return (
    <div className="flex flex-col gap-2 border-t-2 border-ink px-3 pt-1 pb-3">
      <div className="flex items-center gap-2">
        <output className="min-w-0 grow font-mono text-[3rem] leading-none font-bold">{current.typed || '–'}</output>
        <button type="button" aria-label={tapeTexts.leafLess} onClick={() => onPress({ press: 'leaf', by: -0.5 })} className="size-14 cursor-pointer rounded-press border-2 border-ink font-mono text-21">
          −
        </button>
        <span className="w-12 text-center font-mono text-18 font-bold">{current.leafStage === null ? tapeTexts.noLeaf : tapeTexts.leaf(String(current.leafStage))}</span>
        <button type="button" aria-label={tapeTexts.leafMore} onClick={() => onPress({ press: 'leaf', by: 0.5 })} className="size-14 cursor-pointer rounded-press border-2 border-ink font-mono text-21">
          +
        </button>
      </div>
      {problem ? (
        <p role="alert" className="text-15 font-bold">
          {problem}
        </p>
      ) : null}
      <div role="radiogroup" aria-label={tapeTexts.title} className="grid grid-cols-4 gap-2">
        {tapeEntryKinds.map((kind) => (
          <button
            key={kind}
            type="button"
            role="radio"
            aria-checked={current.kind === kind}
            onClick={() => onPress({ press: 'kind', kind })}
            className={`min-h-press cursor-pointer touch-manipulation rounded-press border-2 border-ink px-1 text-15 font-bold ${current.kind === kind ? 'bg-ink text-paper' : ''}`}
          >
            {tapeTexts.kinds[kind]}
          </button>
        ))}
      </div>
      {markers.length > 0 ? (
        <div role="radiogroup" aria-label={tapeTexts.marker} className="-mx-3 flex gap-2 overflow-x-auto px-3">
          {[null, ...markers].map((each) => {
            const on = current.marker === (each?.marker ?? null);
            return (
              <button
                key={each?.marker ?? ''}
                type="button"
                role="radio"
                aria-checked={on}
                onClick={() => onPress({ press: 'marker', marker: each?.marker ?? null })}
                className={`min-h-press shrink-0 cursor-pointer touch-manipulation rounded-press border-2 border-ink px-3 text-15 leading-tight font-bold ${on ? 'bg-ink text-paper' : ''}`}
              >
                {each?.marker ?? tapeTexts.noMarker}
                {each ? <span className="block text-13 font-normal">{todayTexts.day(each.day)}</span> : null}
              </button>
            );
          })}
        </div>
      ) : null}
      <div className="grid grid-cols-4 gap-2">
        {[1, 2, 3].map(digit)}
        {withFraction ? (
          <Key label={step === 'quarter' ? '1/4 1/2 3/4' : '1/2'} onPress={() => onPress({ press: 'fraction' })}>
            {step === 'quarter' ? '¼½¾' : '½'}
          </Key>
        ) : (
          <Key onPress={() => onPress({ press: 'key', text: '.' })}>.</Key>
        )}
        {[4, 5, 6].map(digit)}
        {unit === 'ft-in' ? (
          <Key label="feet" onPress={() => onPress({ press: 'key', text: "'" })}>
            ft
          </Key>
        ) : (
          <Key look="word" onPress={() => onPress({ press: 'cut' })}>
            {isCut ? tapeTexts.cutGone : tapeTexts.cut}
          </Key>
        )}
        {[7, 8, 9].map(digit)}
        {changing === null ? (
          <Key look="word" onPress={() => onPress({ press: 'back' })}>
            {tapeTexts.back}
          </Key>
        ) : (
          <Key look="word" onPress={() => onPress({ press: 'delete' })}>
            {tapeTexts.remove}
          </Key>
        )}
        <Key look="word" onPress={() => onPress({ press: 'undo' })}>
          {tapeTexts.undo}
        </Key>
        {digit(0)}
        <button type="button" onClick={() => onPress({ press: 'next' })} className="col-span-2 min-h-press cursor-pointer touch-manipulation rounded-press border-2 border-ink bg-ink text-21 font-bold text-paper select-none active:bg-bone active:text-ink">
          {changing === null ? tapeTexts.next : tapeTexts.put}
        </button>
      </div>
    </div>
  );
}
