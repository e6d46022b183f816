import { useId } from 'react';

type ProgressProps = {
  label: string;
  /** How far, from 0 to 1; null while the amount of work is not known. */
  share: number | null;
  /** The same in words: "1,200 of 2,000 lines". */
  text: string;
};

export function Progress({ label, share, text }: ProgressProps) {
  const id = useId();
  return (
    <div className="flex max-w-form flex-col gap-1">
      <label htmlFor={id} className="text-15 font-bold">
        {label}
      </label>
      <progress id={id} max={1} value={share ?? undefined} className="h-4 w-full" />
      <p role="status" className="font-mono text-13">
        {text}
      </p>
    </div>
  );
}
