import Link from 'next/link';
import { redirect } from 'next/navigation';
import { SignOutButton } from '@/components/session/sign-out-button';
import { PageHead } from '@/components/shell/page-head';
import { paths } from '@/lib/paths/paths';
import { readOrganisations } from '@/lib/server/services/session/read-organisations';
import { sessionTexts } from '@/lib/texts/session-texts';

/** Where a person goes first: to their one organisation, or to the choice among several. */
export default async function StartPage() {
  const organisations = await readOrganisations();
  if (!organisations) redirect(paths.signIn);
  const [only, another] = organisations;
  if (only && !another) redirect(paths.organisation(only.organisationId));
  return (
    <main id="content" className="mx-auto max-w-page px-4 py-10">
      <PageHead
        title={only ? sessionTexts.chooseOrganisation : sessionTexts.noOrganisation}
        sub={only ? undefined : sessionTexts.noOrganisationHelp}
      />
      <ul className="flex flex-col gap-2 pb-8">
        {organisations.map((each) => (
          <li key={each.organisationId}>
            <Link className="text-21" href={paths.organisation(each.organisationId)}>
              {each.name}
            </Link>{' '}
            <span className="text-ink-soft">{each.role}</span>
          </li>
        ))}
      </ul>
      <SignOutButton />
    </main>
  );
}
