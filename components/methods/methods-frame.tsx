import Link from 'next/link';
import type { ReactNode } from 'react';
import { ThemeChoice } from '@/components/shell/theme-choice';
import { Wordmark } from '@/components/tape/wordmark';
import { paths } from '@/lib/paths/paths';
import { interfaceTexts } from '@/lib/texts/interface-texts';
import { methodTexts } from '@/lib/texts/method-texts';

/** The frame of a page that anyone may read: nothing of an account stands in it. */
export function MethodsFrame({ children }: { children: ReactNode }) {
  return (
    <div className="flex min-h-dvh flex-col">
      <a
        href="#content"
        className="sr-only bg-ink p-3 text-paper focus:not-sr-only focus:absolute focus:z-30 focus:inline-block focus:p-3"
      >
        {interfaceTexts.shell.skipToContent}
      </a>
      <header className="border-b-2 border-ink">
        <div className="mx-auto flex max-w-page items-center justify-between gap-x-6 px-4 py-2 md:px-6">
          <Link href={paths.home} className="flex min-h-press items-center no-underline">
            <Wordmark />
          </Link>
          <Link href={paths.home} className="flex min-h-press items-center text-15 underline underline-offset-4">
            {methodTexts.toStart}
          </Link>
        </div>
      </header>
      <main id="content" tabIndex={-1} className="mx-auto w-full max-w-page grow px-4 py-6 outline-none md:px-6">
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
