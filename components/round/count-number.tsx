'use client';

import type { CountDraft, CountPress } from '@/lib/client/round/count-draft';
import { countKinds } from '@/lib/schemas/vocabulary';
import { roundCountTexts } from '@/lib/texts/round-texts';

const asText = { 'so-far': roundCountTexts.soFar, new: roundCountTexts.newSince };

/** The number being typed, as large as fits; what it means above it, the doubtful apart. */
export function CountNumber({ draft, lastPlantsUp, onPress }: { draft: CountDraft; lastPlantsUp: number; onPress: (pressed: CountPress) => void }) {
  const { countedAs, plants, doubtful, typing } = draft;
  return (
    <div className="flex min-h-0 grow flex-col px-3 pt-2">
      <div role="radiogroup" aria-label={roundCountTexts.plants} className="grid grid-cols-2">
        {countKinds.map((kind) => (
          <button
            key={kind}
            type="button"
            role="radio"
            aria-checked={countedAs === kind}
            onClick={() => onPress({ press: 'as', countedAs: kind })}
            className={`min-h-press cursor-pointer border-2 border-ink text-15 font-bold first:rounded-l-press first:border-r-0 last:rounded-r-press ${countedAs === kind ? 'bg-ink text-paper' : ''}`}
          >
            {asText[kind]}
          </button>
        ))}
      </div>
      <div className="flex min-h-24 grow items-center justify-center gap-3">
        <button
          type="button"
          aria-label={`${roundCountTexts.plants}: ${plants ?? roundCountTexts.notTyped}`}
          aria-pressed={typing === 'plants'}
          onClick={() => onPress({ press: 'typing', typing: 'plants' })}
          className={`min-h-press grow cursor-pointer font-mono text-[clamp(4.5rem,26vw,8.5rem)] leading-none font-bold tracking-tight ${typing === 'plants' ? '' : 'opacity-100'}`}
        >
          <output aria-live="polite">{plants ?? '–'}</output>
        </button>
        <button
          type="button"
          aria-label={`${roundCountTexts.doubtful}: ${doubtful ?? 0}`}
          aria-pressed={typing === 'doubtful'}
          onClick={() => onPress({ press: 'typing', typing: typing === 'doubtful' ? 'plants' : 'doubtful' })}
          className={`flex min-h-24 w-24 shrink-0 cursor-pointer flex-col items-center justify-center rounded-press border-2 ${typing === 'doubtful' ? 'border-ink bg-bone' : 'border-transparent'}`}
        >
          <span className="font-mono text-34 font-bold">{doubtful ?? 0}</span>
          <span className="text-13 leading-tight">{roundCountTexts.doubtfulHint}</span>
        </button>
      </div>
      {countedAs === 'new' && plants !== null ? <p className="text-center text-15">{roundCountTexts.asSum(lastPlantsUp, plants)}</p> : null}
    </div>
  );
}
