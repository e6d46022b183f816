import type { Metadata } from 'next';
import { InviteForm } from '@/components/people/invite-form';
import { MemberList } from '@/components/people/member-list';
import { OpenLinks } from '@/components/people/open-links';
import { PageHead } from '@/components/shell/page-head';
import { Section } from '@/components/ui/section';
import { can } from '@/lib/access/can';
import { readPage } from '@/lib/server/http/read-page';
import { readPeople } from '@/lib/server/services/people/read-people';
import { peopleTexts } from '@/lib/texts/people-texts';

export const metadata: Metadata = { title: peopleTexts.title };

export default async function PeoplePage({ params }: { params: Promise<{ org: string }> }) {
  const { org } = await params;
  const { actor, organisation, data } = await readPage(org, 'people.read', readPeople);
  const mayWrite = can(actor, 'people.write');
  return (
    <>
      <PageHead title={peopleTexts.title} kicker={organisation.name} />
      <MemberList members={data.members} farms={data.farms} mayWrite={mayWrite} />
      <div className="pt-8">
        <Section title={peopleTexts.openLinks}>
          <OpenLinks links={data.links} mayWrite={mayWrite} />
        </Section>
        {mayWrite ? (
          <Section title={peopleTexts.inviteTitle} lead={peopleTexts.inviteLead}>
            <InviteForm farms={data.farms} />
          </Section>
        ) : null}
      </div>
    </>
  );
}
