'use client';

import { useSyncExternalStore } from 'react';

const minute = 60_000;

function subscribe(onChange: () => void) {
  const timer = setInterval(onChange, 15_000);
  return () => clearInterval(timer);
}

/** The phone's clock to the minute, for ages that grow while one looks; 0 while the page is made ahead of time. */
export function useMinute(): number {
  return useSyncExternalStore(
    subscribe,
    () => Math.floor(Date.now() / minute) * minute + minute,
    () => 0,
  );
}
