'use client';

import type { KeptEntry } from '@/lib/client/round/entry';
import { useRound } from '@/lib/client/round/use-round';
import { keptTexts } from '@/lib/texts/kept-texts';
import { entryWords } from './entry-words';

/** One entry that waits. */
export function KeptLine({ entry, sending }: { entry: KeptEntry; sending: boolean }) {
  const { what, where, number } = entryWords(useRound(), entry);
  return (
    <li className="flex items-baseline justify-between gap-3 border-b border-rule py-2 text-15">
      <span className="min-w-0">
        <span className="font-bold">{what}</span>
        {where ? `, ${where}` : ''}
        <span className="block">
          {[entry.occurred.date, entry.occurred.time].filter(Boolean).join(' ')}, {sending ? keptTexts.sending : keptTexts.kept}
        </span>
      </span>
      <span className="font-mono text-18 font-bold">{number}</span>
    </li>
  );
}
