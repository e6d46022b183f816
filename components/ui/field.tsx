import { useId, type ReactNode } from 'react';
import { FieldMessage } from './field-message';

/** What a field hands to its control, so that label, hint and error are read out with it. */
export type ControlWiring = {
  id: string;
  'aria-describedby': string | undefined;
  'aria-invalid': true | undefined;
};

type FieldProps = {
  label: string;
  /** Stands in the label, so that nobody types feet where inches are meant. */
  unit?: string;
  hint?: ReactNode;
  error?: string | undefined;
  /** Said after the label of a field that may stay empty. */
  optionalText?: string;
  /** Give one when an error summary has to link here. */
  id?: string;
  children: (wiring: ControlWiring) => ReactNode;
};

export function Field({ label, unit, hint, error, optionalText, id, children }: FieldProps) {
  const generated = useId();
  const controlId = id ?? generated;
  const hintId = `${controlId}-hint`;
  const errorId = `${controlId}-error`;
  const describedBy = [hint ? hintId : null, error ? errorId : null].filter(Boolean).join(' ');
  return (
    <div className="flex flex-col gap-1">
      <label htmlFor={controlId} className="text-15 font-bold in-data-[place=field]:text-18">
        {label}
        {unit ? <span className="font-normal">, {unit}</span> : null}
        {optionalText ? <span className="font-normal text-ink-soft"> ({optionalText})</span> : null}
      </label>
      {hint ? (
        <div id={hintId} className="text-13 text-ink-soft in-data-[place=field]:text-15">
          {hint}
        </div>
      ) : null}
      {children({
        id: controlId,
        'aria-describedby': describedBy || undefined,
        'aria-invalid': error ? true : undefined,
      })}
      <FieldMessage id={errorId} error={error} />
    </div>
  );
}
