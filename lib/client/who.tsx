'use client';

import { createContext, use, type ReactNode } from 'react';
import type { Role, UnitSystem } from '@/lib/schemas/vocabulary';

/** Who sits before the screen, in which organisation, on which day: what a write names and a number is shown in. */
export type Who = {
  organisationId: string;
  personId: string;
  role: Role;
  units: UnitSystem;
  timeZone: string;
  today: string;
};

const WhoContext = createContext<Who | undefined>(undefined);

export function WhoProvider({ who, children }: { who: Who; children: ReactNode }) {
  return <WhoContext value={who}>{children}</WhoContext>;
}

export function useWho(): Who {
  const who = use(WhoContext);
  if (!who) throw new Error('useWho stands below the organisation layout.');
  return who;
}
