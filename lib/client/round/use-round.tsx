'use client';

import { createContext, use, useSyncExternalStore } from 'react';
import type { Round } from './round';

const RoundContext = createContext<Round | undefined>(undefined);
export const RoundProvider = RoundContext.Provider;

/** The phone's state; whoever asks is drawn again when it changes. */
export function useRound(): Round {
  const round = use(RoundContext);
  if (!round) throw new Error('useRound stands below the round page.');
  useSyncExternalStore(round.subscribe, round.version, round.version);
  return round;
}
