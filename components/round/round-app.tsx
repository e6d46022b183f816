'use client';

import { useEffect, useState } from 'react';
import { readAddress, useAddress } from '@/lib/client/round/round-place';
import { Round } from '@/lib/client/round/round';
import { RoundProvider } from '@/lib/client/round/use-round';
import { watchWorker } from '@/lib/client/round/watch-worker';
import { roundTexts } from '@/lib/texts/round-texts';
import { RoundScreens } from './round-screens';

/** Before the store is open there is nothing true to say but that it is being opened. */
function Opening() {
  return (
    <main className="mx-auto flex min-h-dvh max-w-form flex-col justify-center px-4">
      <h1 className="text-21">{roundTexts.opening}</h1>
    </main>
  );
}

/** The phone's one page: opens the store, shows what it holds, and sends what waits. */
export function RoundApp() {
  const [round, setRound] = useState<Round>();
  const address = useAddress();
  useEffect(() => {
    const made = new Round({ fetch: window.fetch.bind(window), now: Date.now });
    void made.open(readAddress(window.location.search).org).then(() => setRound(made));
    const stopWatching = watchWorker(made);
    const wake = () => {
      if (document.visibilityState === 'visible') void made.wake();
    };
    window.addEventListener('online', wake);
    document.addEventListener('visibilitychange', wake);
    return () => {
      window.removeEventListener('online', wake);
      document.removeEventListener('visibilitychange', wake);
      stopWatching();
      made.close();
    };
  }, []);
  if (!round) return <Opening />;
  return (
    <RoundProvider value={round}>
      <RoundScreens address={address} />
    </RoundProvider>
  );
}
