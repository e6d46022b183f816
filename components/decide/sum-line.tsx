import type { ReactNode } from 'react';
import { NumberSource, type FormulaEntry, type NumberInputFact } from '@/components/ui/number-source';

export type SumLineProps = {
  label: ReactNode;
  /** What the number is called where it is opened; the label unless that holds more than words. */
  name: string;
  text: string;
  entry?: FormulaEntry | undefined;
  inputs: readonly NumberInputFact[];
  note?: string | undefined;
  /** The line that the ones above it add up to. */
  total?: boolean;
};

/** One line of the sum: what it is, and the number, which opens. */
export function SumLine({ label, name, text, entry, inputs, note, total = false }: SumLineProps) {
  return (
    <div
      className={`flex min-h-press items-center justify-between gap-x-4 py-1 ${total ? 'border-t-2 border-ink font-bold' : 'border-t border-rule'}`}
    >
      <dt className="min-w-0">{label}</dt>
      <dd className="shrink-0 text-right font-mono">
        <NumberSource
          label={name}
          text={text}
          inputs={inputs}
          {...(entry ? { entry } : {})}
          {...(note ? { note } : {})}
        />
      </dd>
    </div>
  );
}
