'use client';

import { inchesFromLast, type TapeDraft, type TapePress } from '@/lib/client/round/tape-draft';
import { lengthText } from '@/lib/format/length-text';
import { tapeTexts } from '@/lib/texts/round-tape-texts';

type TapeLineProps = { draft: TapeDraft; onPress: (pressed: TapePress) => void };

const step = 'min-h-press min-w-press shrink-0 cursor-pointer touch-manipulation rounded-press border-2 border-ink font-mono text-21 select-none active:bg-ink active:text-paper';

/** The place being read: its number as large as fits, how far on it lies, and its leaf stage. */
export function TapeLine({ draft, onPress }: TapeLineProps) {
  const { at, current, places, toGo, fresh } = draft;
  const order = (at.put === 'end' ? places.length : at.index) + 1;
  const which =
    at.put === 'before'
      ? tapeTexts.before(places[at.index]?.typed ?? '')
      : at.put === 'end'
        ? tapeTexts.place(order)
        : toGo > 0 && at.index === places.length - toGo
          ? tapeTexts.ofAll(order, places.length)
          : tapeTexts.changing(order);
  const distance = inchesFromLast(draft);
  const on = distance === undefined || distance < 0 ? null : tapeTexts.onFrom(lengthText(distance, draft.unit === 'cm' ? 'metric' : 'us'));
  return (
    <div className="flex flex-wrap items-center gap-x-1.5">
      <div className="min-w-36 grow basis-0">
        <p className="text-15 leading-tight">{[which, current.cutBefore ? tapeTexts.cutNext : null, on].filter(Boolean).join(', ')}</p>
        <output aria-label={`${tapeTexts.here}: ${current.typed || tapeTexts.nothingTyped}`} className={`block truncate font-mono text-[2.5rem] leading-none font-bold ${fresh ? 'underline decoration-2 underline-offset-4' : ''}`}>
          {current.typed || '–'}
        </output>
      </div>
      <div className="flex items-center gap-1.5">
        <button type="button" aria-label={tapeTexts.leafLess} onClick={() => onPress({ press: 'leaf', by: -0.5 })} className={step}>
          −
        </button>
        <p role="status" aria-label={tapeTexts.leafIs(current.leafStage)} className="min-w-11 shrink-0 text-center text-18 font-bold">
          {tapeTexts.leaf(current.leafStage)}
        </p>
        <button type="button" aria-label={tapeTexts.leafMore} onClick={() => onPress({ press: 'leaf', by: 0.5 })} className={step}>
          +
        </button>
      </div>
    </div>
  );
}
