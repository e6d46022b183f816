import type { CountKind } from '@/lib/schemas/vocabulary';
import { plantsMost } from '@/lib/schemas/field-limits';

/** A count as it is being typed. The doubtful stand apart; null says that nobody has typed a number yet. */
export type CountDraft = { countedAs: CountKind; plants: number | null; doubtful: number | null; typing: 'plants' | 'doubtful' };
export type CountPress =
  | { press: 'digit'; digit: number }
  | { press: 'back' }
  | { press: 'clear' }
  | { press: 'more' }
  | { press: 'fewer' }
  | { press: 'as'; countedAs: CountKind }
  | { press: 'typing'; typing: CountDraft['typing'] };

export const emptyCount: CountDraft = { countedAs: 'so-far', plants: null, doubtful: null, typing: 'plants' };

/**
 * The draft after one press; never a number that cannot be. One more and one fewer begin at the last visit's number where
 * nothing was typed: people who click along count on from it.
 */
export function afterPress(draft: CountDraft, pressed: CountPress, lastPlantsUp: number): CountDraft {
  const { typing } = draft;
  const number = draft[typing];
  const put = (next: number | null): CountDraft => (next !== null && (next < 0 || next > plantsMost) ? draft : { ...draft, [typing]: next });
  switch (pressed.press) {
    case 'digit':
      return put((number ?? 0) * 10 + pressed.digit);
    case 'back':
      return put(number === null || number < 10 ? null : Math.floor(number / 10));
    case 'clear':
      return put(null);
    case 'more':
      return put((number ?? base(draft, lastPlantsUp)) + 1);
    case 'fewer':
      return put(Math.max(0, (number ?? base(draft, lastPlantsUp)) - 1));
    case 'as':
      return pressed.countedAs === draft.countedAs ? draft : { ...draft, countedAs: pressed.countedAs, plants: null, typing: 'plants' };
    case 'typing':
      return { ...draft, typing: pressed.typing };
  }
}

const base = (draft: CountDraft, lastPlantsUp: number) => (draft.typing === 'plants' && draft.countedAs === 'so-far' ? lastPlantsUp : 0);
