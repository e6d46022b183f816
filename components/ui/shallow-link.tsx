'use client';

import type { MouseEvent, ReactNode } from 'react';

type ShallowLinkProps = {
  href: string;
  current?: boolean | undefined;
  className?: string | undefined;
  children: ReactNode;
};

/**
 * A link to another view of the page one is on. The address changes and the back button works, but the server is not asked
 * for the page again: what it shows is in the browser already, or is fetched by itself. Without a script it is a link.
 */
export function ShallowLink({ href, current, className, children }: ShallowLinkProps) {
  function follow(event: MouseEvent) {
    if (event.metaKey || event.ctrlKey || event.shiftKey || event.altKey || event.button !== 0) return;
    event.preventDefault();
    window.history.pushState(null, '', href);
  }
  return (
    <a href={href} onClick={follow} aria-current={current ? 'page' : undefined} className={className}>
      {children}
    </a>
  );
}
