import type { ReactNode } from 'react';

/** What is said or asked before a sheet is kept, in the place of the keys, with its answers. */
export function TapeAsked({ label, sentences, children }: { label: string; sentences: readonly string[]; children: ReactNode }) {
  return (
    <div role="alertdialog" aria-label={label} className="flex max-h-[60dvh] flex-col gap-2 overflow-y-auto border-t-2 border-ink bg-bone px-3 py-3">
      {sentences.map((sentence) => (
        <p key={sentence} className="text-18 font-bold">
          {sentence}
        </p>
      ))}
      <div className="grid grid-cols-2 gap-2">{children}</div>
    </div>
  );
}
