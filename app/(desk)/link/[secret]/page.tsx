import type { Metadata } from 'next';
import { LinkForm } from '@/components/session/link-form';
import { PageHead } from '@/components/shell/page-head';
import { Wordmark } from '@/components/tape/wordmark';
import { readLink } from '@/lib/server/services/session/read-link';
import { linkTexts } from '@/lib/texts/link-texts';

export const metadata: Metadata = { title: linkTexts.firstOwnerTitle };

export default async function LinkPage({ params }: { params: Promise<{ secret: string }> }) {
  const { secret } = await params;
  const link = await readLink(secret);
  const { title, lead } = headOf(link);
  return (
    <main id="content" className="mx-auto flex max-w-reading flex-col gap-6 px-4 py-10">
      <Wordmark />
      <PageHead title={title} sub={lead} />
      {link ? <LinkForm secret={secret} purpose={link.purpose} name={link.name ?? ''} hasAccount={link.hasAccount} /> : null}
    </main>
  );
}

function headOf(link: Awaited<ReturnType<typeof readLink>>): { title: string; lead: string } {
  if (!link) return { title: linkTexts.goneTitle, lead: linkTexts.goneLead };
  if (link.purpose === 'first-owner') return { title: linkTexts.firstOwnerTitle, lead: linkTexts.firstOwnerLead };
  if (link.purpose === 'password-reset') return { title: linkTexts.resetTitle, lead: linkTexts.resetLead };
  const email = link.email ?? '';
  return {
    title: linkTexts.invitationTitle(link.name ?? email),
    lead: link.hasAccount ? linkTexts.joinLead(email) : linkTexts.invitationLead(email),
  };
}
