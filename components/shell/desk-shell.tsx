import Link from 'next/link';
import type { ReactNode } from 'react';
import { Wordmark } from '@/components/tape/wordmark';
import { interfaceTexts } from '@/lib/texts/interface-texts';
import { ThemeChoice } from './theme-choice';

export type ShellLink = { label: string; href: string; current: boolean };

type DeskShellProps = {
  homeHref: string;
  navigation: readonly ShellLink[];
  personName: string;
  organisationName: string;
  /** A form with the button that ends the session. */
  signOut: ReactNode;
  /** "Demo, all invented. Today is 18 May 2026 here." */
  demoNotice?: string | undefined;
  /** The season of a planting, right under the header. */
  season?: ReactNode;
  children: ReactNode;
};

/** The frame of every desk page: who is signed in, where one can go, and that a demo is a demo. */
export function DeskShell({
  homeHref,
  navigation,
  personName,
  organisationName,
  signOut,
  demoNotice,
  season,
  children,
}: DeskShellProps) {
  const texts = interfaceTexts.shell;
  return (
    <div className="flex min-h-dvh flex-col">
      <a
        href="#content"
        className="sr-only bg-ink p-3 text-paper focus:not-sr-only focus:absolute focus:z-30 focus:inline-block focus:p-3"
      >
        {texts.skipToContent}
      </a>
      {demoNotice ? (
        <p role="note" className="bg-bone px-4 py-1.5 text-center text-13 print:border print:border-ink">
          {demoNotice}
        </p>
      ) : null}
      <header className="border-b-2 border-ink">
        <div className="mx-auto flex max-w-page flex-wrap items-center gap-x-4 gap-y-1 px-4 sm:gap-x-8 py-2 md:px-6">
          <Link href={homeHref} className="flex min-h-press items-center no-underline">
            <Wordmark />
          </Link>
          <nav
            aria-label={texts.primaryNavigation}
            className="order-last w-full sm:order-none sm:w-auto"
            data-print="leave-out"
          >
            <ul className="flex flex-wrap gap-x-5">
              {navigation.map((link) => (
                <li key={link.href}>
                  <Link
                    href={link.href}
                    aria-current={link.current ? 'page' : undefined}
                    className="flex min-h-press items-center text-15 text-ink underline-offset-8 hover:underline aria-[current=page]:font-bold aria-[current=page]:underline aria-[current=page]:decoration-4"
                  >
                    {link.label}
                  </Link>
                </li>
              ))}
            </ul>
          </nav>
          <div className="ml-auto flex min-w-0 flex-1 basis-0 items-center justify-end gap-x-1 text-right">
            <p className="min-w-0 text-13">
              <span className="block font-bold">{personName}</span>
              <span className="block text-ink-soft">{organisationName}</span>
            </p>
            <div className="whitespace-nowrap" data-print="leave-out">{signOut}</div>
          </div>
        </div>
        {season ? <div className="mx-auto max-w-page border-t border-rule px-4 md:px-6">{season}</div> : null}
      </header>
      <main
        id="content"
        tabIndex={-1}
        className="mx-auto w-full max-w-page grow px-4 py-6 outline-none md:px-6"
      >
        {children}
      </main>
      <footer className="border-t border-rule" data-print="leave-out">
        <div className="mx-auto flex max-w-page justify-end px-4 py-3 md:px-6">
          <ThemeChoice />
        </div>
      </footer>
    </div>
  );
}
