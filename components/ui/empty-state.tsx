import type { ReactNode } from 'react';

type EmptyStateProps = {
  /** What is not here yet, as a sentence. */
  title: string;
  /** What to do first. */
  children: ReactNode;
  action?: ReactNode;
};

export function EmptyState({ title, children, action }: EmptyStateProps) {
  return (
    <div className="flex max-w-reading flex-col items-start gap-3 border-t border-rule py-6">
      <p className="text-18 font-bold">{title}</p>
      <div className="flex flex-col gap-2">{children}</div>
      {action}
    </div>
  );
}
