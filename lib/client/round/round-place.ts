'use client';

import { useSyncExternalStore } from 'react';
import { paths } from '@/lib/paths/paths';

export const roundScreens = [
  'today', 'enter', 'count', 'row', 'tape', 'depth', 'cover', 'dig', 'crust', 'photos', 'note', 'condition', 'transect', 'markers', 'spraying', 'spot', 'kept', 'leave',
] as const;
export type RoundScreen = (typeof roundScreens)[number];

/** Where on the phone's one page somebody is. It stands in the query, so that going back and opening again lead there. */
export type RoundAddress = { at: RoundScreen; org: string | null; planting: string | null; row: string | null };

const moved = 'rowrise-round-moved';

export function readAddress(search: string): RoundAddress {
  const query = new URLSearchParams(search);
  const at = query.get('at');
  return {
    at: roundScreens.find((screen) => screen === at) ?? 'today',
    org: query.get('org'),
    planting: query.get('planting'),
    row: query.get('row'),
  };
}

export function addressText({ at, org, planting, row }: RoundAddress): string {
  const query = new URLSearchParams();
  if (org) query.set('org', org);
  if (at !== 'today') query.set('at', at);
  if (planting) query.set('planting', planting);
  if (row) query.set('row', row);
  const text = query.toString();
  return text === '' ? paths.round : `${paths.round}?${text}`;
}

/** Goes to another place of the page. Going on from a count replaces it, so that Back leads out of the row and not through all of them. */
export function goTo(address: RoundAddress, how: 'push' | 'replace' = 'push'): void {
  const text = addressText(address);
  if (how === 'push') window.history.pushState(null, '', text);
  else window.history.replaceState(null, '', text);
  window.dispatchEvent(new Event(moved));
  window.scrollTo(0, 0);
}

function subscribe(onChange: () => void) {
  window.addEventListener('popstate', onChange);
  window.addEventListener(moved, onChange);
  return () => {
    window.removeEventListener('popstate', onChange);
    window.removeEventListener(moved, onChange);
  };
}

/** The query as it stands, empty while the page is made ahead of time. */
export function useAddress(): RoundAddress {
  return readAddress(
    useSyncExternalStore(
      subscribe,
      () => window.location.search,
      () => '',
    ),
  );
}
