import type { ReactNode } from 'react';

type SectionProps = {
  title: string;
  id?: string;
  /** Beside the title: a link or a button that concerns the whole section. */
  aside?: ReactNode;
  /** One sentence under the title. */
  lead?: ReactNode;
  children: ReactNode;
};

/** A section opens with a 2-px ink rule; nothing else frames it. */
export function Section({ title, id, aside, lead, children }: SectionProps) {
  return (
    <section id={id} className="min-w-0 border-t-2 border-ink pt-3 pb-8">
      <div className="flex flex-wrap items-baseline justify-between gap-x-4">
        <h2 className="text-18">{title}</h2>
        {aside}
      </div>
      {lead ? <div className="mt-1 max-w-reading text-15 text-ink-soft">{lead}</div> : null}
      <div className="mt-3 flex flex-col gap-4">{children}</div>
    </section>
  );
}
