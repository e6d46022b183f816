import type { Metadata } from 'next';
import Link from 'next/link';
import { redirect } from 'next/navigation';
import { PasswordForm } from '@/components/session/password-form';
import { UnitsForm } from '@/components/session/units-form';
import { PageHead } from '@/components/shell/page-head';
import { ThemeChoice } from '@/components/shell/theme-choice';
import { Wordmark } from '@/components/tape/wordmark';
import { Section } from '@/components/ui/section';
import { paths } from '@/lib/paths/paths';
import { currentPerson } from '@/lib/server/session/current-person';
import { preferencesTexts } from '@/lib/texts/link-texts';

export const metadata: Metadata = { title: preferencesTexts.title };

export default async function PreferencesPage() {
  const person = await currentPerson();
  if (!person) redirect(paths.signIn);
  return (
    <main id="content" className="mx-auto flex max-w-page flex-col gap-4 px-4 py-6">
      <Link href={paths.home} className="self-start no-underline" aria-label={preferencesTexts.back}>
        <Wordmark />
      </Link>
      <PageHead title={preferencesTexts.title} sub={preferencesTexts.lead} kicker={person.name} />
      <Section title={preferencesTexts.units}>
        <UnitsForm units={person.units} />
        <div className="max-w-form">
          <ThemeChoice />
        </div>
      </Section>
      <Section title={preferencesTexts.passwordTitle}>
        <PasswordForm email={person.email} />
      </Section>
    </main>
  );
}
