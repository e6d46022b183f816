'use client';

import { usePathname } from 'next/navigation';
import type { ReactNode } from 'react';
import { SignOutButton } from '@/components/session/sign-out-button';
import { useWho } from '@/lib/client/who';
import { dateText } from '@/lib/format/date-text';
import { paths } from '@/lib/paths/paths';
import type { Role } from '@/lib/schemas/vocabulary';
import { navigationTexts } from '@/lib/texts/navigation-texts';
import { sessionTexts } from '@/lib/texts/session-texts';
import { DeskShell } from './desk-shell';

type OrganisationShellProps = {
  personName: string;
  organisationName: string;
  demoToday: string | null;
  children: ReactNode;
};

const placesOf = (org: string, role: Role) => [
  { label: navigationTexts.start, href: paths.organisation(org) },
  { label: navigationTexts.farms, href: paths.farms(org) },
  ...(role === 'owner' || role === 'agronomist'
    ? [
        { label: navigationTexts.settings, href: paths.settings(org) },
        { label: navigationTexts.people, href: paths.people(org) },
        { label: navigationTexts.changes, href: paths.changes(org) },
      ]
    : []),
  { label: navigationTexts.methods, href: paths.methods },
  { label: navigationTexts.preferences, href: paths.preferences },
];

/** The frame of an organisation's pages, with the places this person's role has. */
export function OrganisationShell({ personName, organisationName, demoToday, children }: OrganisationShellProps) {
  const { organisationId, role } = useWho();
  const here = usePathname();
  const start = paths.organisation(organisationId);
  const navigation = placesOf(organisationId, role).map((place) => ({
    ...place,
    current: place.href === start ? here === start : here.startsWith(place.href),
  }));
  return (
    <DeskShell
      homeHref={start}
      navigation={navigation}
      personName={personName}
      organisationName={organisationName}
      signOut={<SignOutButton />}
      demoNotice={demoToday ? sessionTexts.demoNotice(dateText(demoToday)) : undefined}
    >
      {children}
    </DeskShell>
  );
}
