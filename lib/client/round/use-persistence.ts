'use client';

import { useEffect, useState } from 'react';

export type PersistenceAnswer = 'asking' | 'yes' | 'no' | 'not-asked' | 'unknown';

/** Whether this browser has promised to keep what is stored, and the press that asks it. */
export function usePersistence() {
  const [answer, setAnswer] = useState<PersistenceAnswer>('asking');
  useEffect(() => {
    void Promise.resolve(navigator.storage?.persisted?.()).then((kept) => setAnswer(kept === undefined ? 'unknown' : kept ? 'yes' : 'not-asked'));
  }, []);
  const ask = async () => {
    const granted = await navigator.storage?.persist?.();
    setAnswer(granted === undefined ? 'unknown' : granted ? 'yes' : 'no');
  };
  const installed = typeof window !== 'undefined' && window.matchMedia('(display-mode: standalone)').matches;
  const safari = typeof navigator !== 'undefined' && /^((?!chrome|android|crios|fxios).)*safari/i.test(navigator.userAgent);
  return { answer, ask, installed, safari };
}
