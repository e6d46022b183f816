import type { ReactNode } from 'react';

/** Figures that belong together, under a name where one helps. */
export function FormPart({ title, children }: { title?: string; children: ReactNode }) {
  return (
    <div className="flex flex-col gap-4">
      {title ? <h3 className="border-b border-rule pb-1 text-15 text-ink-soft">{title}</h3> : null}
      {children}
    </div>
  );
}
