import type { ReactNode } from 'react';

/** One kind of record under its name; nothing at all where there is none. */
export function RecordBlock({ title, records, summary, children }: { title: string; records: number; summary?: ReactNode; children: ReactNode }) {
  if (records === 0) return null;
  return (
    <div className="min-w-0">
      <h3 className="text-18 font-bold">{title}</h3>
      {summary}
      <ul className="mt-1 flex flex-col">{children}</ul>
    </div>
  );
}
