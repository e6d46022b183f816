import type { ReactNode } from 'react';

type PageHeadProps = {
  /** Where one is: field, crop, row spacing, seeds, as one line. */
  kicker?: ReactNode;
  /** The finding as a sentence, or on a page without one the name of the thing. */
  title: ReactNode;
  /** How sure, from how much, and what it does not say. */
  sub?: ReactNode;
  actions?: ReactNode;
};

/** A page opens with its finding. */
export function PageHead({ kicker, title, sub, actions }: PageHeadProps) {
  return (
    <div className="flex flex-col gap-2 pb-8">
      {kicker ? <p className="text-13 text-ink-soft">{kicker}</p> : null}
      <h1 className="max-w-[52rem] text-27 md:text-34">{title}</h1>
      {sub ? <div className="max-w-reading text-15 md:text-18">{sub}</div> : null}
      {actions ? <div className="flex flex-wrap gap-2 pt-2">{actions}</div> : null}
    </div>
  );
}
