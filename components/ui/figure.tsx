import type { ReactNode } from 'react';

type FigureProps = {
  label: string;
  /** The number with its unit, or a NumberSource that opens it. */
  value: ReactNode;
  /** Its interval, or what it is out of. */
  detail?: ReactNode;
  needsAttention?: boolean;
};

/** One large number with its name above and its uncertainty below. */
export function Figure({ label, value, detail, needsAttention = false }: FigureProps) {
  return (
    <div className="flex min-w-0 flex-col">
      <p className="text-15 font-bold">{label}</p>
      <div className={`text-34 font-bold ${needsAttention ? 'text-flag-text' : ''}`}>{value}</div>
      {detail ? <div className="pt-1 text-13 text-ink-soft">{detail}</div> : null}
    </div>
  );
}
