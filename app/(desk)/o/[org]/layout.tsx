import type { ReactNode } from 'react';
import { OrganisationShell } from '@/components/shell/organisation-shell';
import { WhoProvider } from '@/lib/client/who';
import { readPage } from '@/lib/server/http/read-page';

type LayoutProps = { params: Promise<{ org: string }>; children: ReactNode };

/** Every page of an organisation stands below this. It frames; each page decides for itself who may read it. */
export default async function OrganisationLayout({ params, children }: LayoutProps) {
  const { org } = await params;
  const { actor, organisation, units, today } = await readPage(org, 'farms.read', async () => null);
  return (
    <WhoProvider
      who={{ organisationId: org, personId: actor.personId, role: actor.role, units, timeZone: organisation.timeZone, today }}
    >
      <OrganisationShell
        personName={actor.name}
        organisationName={organisation.name}
        demoToday={organisation.demoToday}
      >
        {children}
      </OrganisationShell>
    </WhoProvider>
  );
}
