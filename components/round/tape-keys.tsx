'use client';

import type { TapeDraft, TapePress, TapeStep } from '@/lib/client/round/tape-draft';
import type { TapeUnit } from '@/lib/schemas/vocabulary';
import { tapeTexts } from '@/lib/texts/round-tape-texts';
import { Key } from './keypad';

const spoken = { '¼': 'one quarter', '½': 'one half', '¾': 'three quarters', '.': 'point' };
type Part = keyof typeof spoken;

/** The part of a whole that this tape is read to, one key each. */
function partsOf(unit: TapeUnit, step: TapeStep): readonly Part[] {
  if (unit === 'ft-tenths' || step === 'tenth') return ['.'];
  return step === 'quarter' ? ['¼', '½', '¾'] : ['½'];
}

/** The keys of a tape sheet, at the bottom where the thumb is: a place takes its digits, its part and Next. */
export function TapeKeys({ draft, onPress }: { draft: TapeDraft; onPress: (pressed: TapePress) => void }) {
  const { unit, step, current, at, fresh, places, toGo } = draft;
  const parts = partsOf(unit, step);
  const digit = (number: number) => (
    <Key key={number} onPress={() => onPress({ press: 'key', text: String(number) })}>
      {number}
    </Key>
  );
  const part = (text: Part | undefined) =>
    text === undefined ? null : (
      <Key key={text} label={spoken[text]} tall={parts.length === 1 ? 3 : 1} onPress={() => onPress(text === '.' ? { press: 'key', text } : { press: 'fraction', text })}>
        {text}
      </Key>
    );
  const untouched = fresh ? (at.put === 'change' && toGo > 0 && at.index === places.length - toGo ? tapeTexts.stands : tapeTexts.done) : tapeTexts.put;
  return (
    <div role="group" aria-label={tapeTexts.keys} className="grid grid-cols-[repeat(4,minmax(var(--press),1fr))_minmax(min-content,1fr)] gap-[6px]">
      {[1, 2, 3].map(digit)}
      {part(parts[0])}
      <Key look="word" onPress={() => onPress({ press: 'back' })}>
        {tapeTexts.back}
      </Key>
      {[4, 5, 6].map(digit)}
      {part(parts[1])}
      <Key look="word" onPress={() => onPress({ press: 'undo' })}>
        {tapeTexts.undo}
      </Key>
      {[7, 8, 9].map(digit)}
      {part(parts[2])}
      <button
        type="button"
        onClick={() => onPress({ press: 'next' })}
        className="row-span-2 min-h-press cursor-pointer touch-manipulation rounded-press border-2 border-ink bg-ink px-1 text-18 leading-tight font-bold text-paper [overflow-wrap:normal] select-none active:bg-bone active:text-ink"
      >
        {at.put === 'end' ? tapeTexts.next : untouched}
      </button>
      {unit === 'ft-in' ? (
        <Key label={tapeTexts.feet} onPress={() => onPress({ press: 'key', text: "'" })}>
          ′
        </Key>
      ) : null}
      <Key wide={unit === 'ft-in' ? 1 : 2} onPress={() => onPress({ press: 'key', text: '0' })}>
        0
      </Key>
      <Key look="word" wide={2} onPress={() => onPress({ press: 'cut' })}>
        {current.cutBefore ? tapeTexts.cutGone : tapeTexts.cut}
      </Key>
    </div>
  );
}
