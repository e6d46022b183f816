'use client';

import type { CountPress } from '@/lib/client/round/count-draft';
import { roundCountTexts } from '@/lib/texts/round-texts';
import { Key } from './keypad';

/** The keypad, and beside it one more and one fewer for whoever clicks along. */
export function CountKeys({ onPress }: { onPress: (pressed: CountPress) => void }) {
  const digit = (number: number) => (
    <Key key={number} onPress={() => onPress({ press: 'digit', digit: number })}>
      {number}
    </Key>
  );
  return (
    <div role="group" aria-label={roundCountTexts.digits} className="grid grid-cols-[1fr_1fr_1fr_1.1fr] gap-2">
      {[1, 2, 3].map(digit)}
      <Key look="word" onPress={() => onPress({ press: 'more' })}>
        {roundCountTexts.more}
      </Key>
      {[4, 5, 6].map(digit)}
      <Key look="word" onPress={() => onPress({ press: 'fewer' })}>
        {roundCountTexts.fewer}
      </Key>
      {[7, 8, 9].map(digit)}
      <Key look="word" onPress={() => onPress({ press: 'back' })}>
        {roundCountTexts.back}
      </Key>
      <Key look="word" onPress={() => onPress({ press: 'clear' })}>
        {roundCountTexts.clear}
      </Key>
      {digit(0)}
      <Key look="word" wide={2} onPress={() => onPress({ press: 'typing', typing: 'doubtful' })}>
        {roundCountTexts.typeDoubtful}
      </Key>
    </div>
  );
}
