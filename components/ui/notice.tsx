import type { ReactNode } from 'react';

type NoticeProps = { title?: string; children: ReactNode };

/** A caution, shown where the person is about to act. */
export function Notice({ title, children }: NoticeProps) {
  return (
    <div role="note" className="max-w-reading border-l-6 border-flag py-1 pl-4">
      {title ? <p className="font-bold">{title}</p> : null}
      <div className="flex flex-col gap-2">{children}</div>
    </div>
  );
}
