import type { ReactNode } from 'react';

type DisclosureProps = { label: string; children: ReactNode; openAtFirst?: boolean };

/** Evidence that is one press away: the browser's own details, so that it opens before any script has loaded. */
export function Disclosure({ label, children, openAtFirst = false }: DisclosureProps) {
  return (
    <details open={openAtFirst}>
      <summary className="flex min-h-press w-fit cursor-pointer items-center text-15 font-bold underline underline-offset-4">
        {label}
      </summary>
      <div className="pt-2 pb-4">{children}</div>
    </details>
  );
}
