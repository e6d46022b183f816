'use client';

import { useRound } from './use-round';

/** What is being typed on a screen, stored at every press, and the press that keeps it. */
export function useScreenDraft<Draft extends object>(name: string, empty: Draft): { draft: Draft; change: (part: Partial<Draft>) => void; clear: () => void } {
  const round = useRound();
  return {
    draft: { ...empty, ...round.draft<Partial<Draft>>(name) },
    // On what stands at this moment, which may be newer than what was drawn last.
    change: (part) => void round.setDraft(name, { ...empty, ...round.draft<Partial<Draft>>(name), ...part }),
    clear: () => void round.setDraft(name, undefined),
  };
}
