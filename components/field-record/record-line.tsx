import type { ReactNode } from 'react';
import { TakeBack } from '@/components/count/take-back';
import type { WithdrawableKind } from '@/lib/schemas/vocabulary';

type RecordLineProps = {
  children: ReactNode;
  /** Day, time and person, and what else is said small. */
  detail: readonly string[];
  /** Left out for who may not take it back. */
  takeBack?: { targetKind: WithdrawableKind; targetId: string; what: string } | undefined;
};

/** One record of the field: what it says, when and by whom, and that it can be taken back. */
export function RecordLine({ children, detail, takeBack }: RecordLineProps) {
  return (
    <li className="flex flex-wrap items-center justify-between gap-x-4 border-t border-rule py-2">
      <div className="min-w-0 flex-1 basis-64">
        <div className="text-18 break-words whitespace-pre-line first-letter:uppercase">{children}</div>
        <p className="text-15">{detail.join(', ')}</p>
      </div>
      {takeBack ? <TakeBack {...takeBack} /> : null}
    </li>
  );
}
