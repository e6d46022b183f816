'use client';

import type { ReactNode } from 'react';
import { goTo, useAddress } from '@/lib/client/round/round-place';
import { useMinute } from '@/lib/client/round/use-minute';
import { useRound } from '@/lib/client/round/use-round';
import { waitingState } from '@/lib/client/round/waiting-state';
import { ageText } from '@/lib/format/age-text';
import { dateText } from '@/lib/format/date-text';
import { roundTexts } from '@/lib/texts/round-texts';

const clockOffMinutesShown = 10;

/** What is kept, sent, or needs a look: true at every moment and on every screen; pressed, it opens the list. */
function WaitingLine() {
  const round = useRound();
  const address = useAddress();
  const now = useMinute();
  const { kept, sending, needsLook, oldestAgeMinutes } = waitingState(round, now);
  const texts = roundTexts.status;
  const parts = [
    sending > 0 ? texts.sending(sending) : null,
    kept - sending > 0 ? texts.kept(kept - sending) : null,
    needsLook > 0 ? texts.needsLook(needsLook) : null,
  ].filter((part) => part !== null);
  if (parts.length > 0 && oldestAgeMinutes !== null) parts.push(texts.oldest(ageText(oldestAgeMinutes)));
  return (
    <button
      type="button"
      aria-label={`${texts.label}: ${parts.join(', ') || texts.allSent}`}
      onClick={() => goTo({ ...address, at: 'kept', planting: null, row: null })}
      className={`min-h-press min-w-32 flex-1 cursor-pointer px-2 text-right text-15 leading-tight underline underline-offset-4 ${needsLook > 0 ? 'font-bold text-flag-text' : ''}`}
    >
      <span role="status">{parts.join(', ') || texts.allSent}</span>
    </button>
  );
}

/** The frame of every field screen: the way back, and what is kept on this phone. */
export function RoundBar({ back, title, lock, children }: { back?: { label: string; onPress: () => void } | undefined; title?: string | undefined; lock?: ReactNode; children: ReactNode }) {
  const round = useRound();
  const demoToday = round.day?.organisation.demoToday;
  const offMinutes = round.clockOffset === null ? 0 : Math.round(Math.abs(round.clockOffset) / 60_000);
  return (
    <div className="mx-auto flex min-h-dvh w-full max-w-form flex-col pb-[env(safe-area-inset-bottom)]">
      {demoToday ? <p className="bg-bone px-3 py-0.5 text-center text-13">{roundTexts.demo(dateText(demoToday))}</p> : null}
      <header className="flex items-center gap-1 border-b-2 border-ink px-1">
        {back ? (
          <button type="button" onClick={back.onPress} className="min-h-press min-w-press cursor-pointer px-2 text-18 font-bold underline underline-offset-4">
            {back.label}
          </button>
        ) : null}
        {title ? <p className="min-w-0 px-2 text-18 font-bold">{title}</p> : null}
        <WaitingLine />
        {lock}
      </header>
      {round.trouble ? (
        <p role="alert" className="border-b-2 border-ink bg-bone px-3 py-2 text-15 font-bold">
          {round.trouble === 'storage-full' ? roundTexts.storageFull : roundTexts.storageRefused}
        </p>
      ) : null}
      {offMinutes >= clockOffMinutesShown ? <p className="border-b border-ink px-3 py-1 text-15">{roundTexts.clockOff(offMinutes)}</p> : null}
      <main className="flex min-h-0 grow flex-col">{children}</main>
    </div>
  );
}
