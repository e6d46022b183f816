import type { Metadata } from 'next';
import { SignInForm } from '@/components/session/sign-in-form';
import { Wordmark } from '@/components/tape/wordmark';
import { sessionTexts } from '@/lib/texts/session-texts';

export const metadata: Metadata = { title: sessionTexts.signIn };

export default function SignInPage() {
  return (
    <main id="content" className="mx-auto flex max-w-reading flex-col gap-8 px-4 py-10">
      <Wordmark />
      <h1 className="text-27">{sessionTexts.signIn}</h1>
      <SignInForm />
    </main>
  );
}
