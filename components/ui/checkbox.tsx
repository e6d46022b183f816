import { useId, type ComponentProps, type ReactNode } from 'react';
import { FieldMessage } from './field-message';

type CheckboxProps = Omit<ComponentProps<'input'>, 'className' | 'type'> & {
  label: ReactNode;
  hint?: ReactNode;
  error?: string | undefined;
};

export function Checkbox({ label, hint, error, id, ...rest }: CheckboxProps) {
  const generated = useId();
  const controlId = id ?? generated;
  const describedBy = [hint ? `${controlId}-hint` : null, error ? `${controlId}-error` : null]
    .filter(Boolean)
    .join(' ');
  return (
    <div className="flex flex-col gap-1">
      <label
        htmlFor={controlId}
        className="flex min-h-press cursor-pointer items-center gap-3 text-15 in-data-[place=field]:text-18"
      >
        <input
          {...rest}
          id={controlId}
          type="checkbox"
          aria-describedby={describedBy || undefined}
          aria-invalid={error ? true : undefined}
          className="size-6 shrink-0 accent-ink"
        />
        <span className="py-2">{label}</span>
      </label>
      {hint ? (
        <div
          id={`${controlId}-hint`}
          className="-mt-2 pl-9 text-13 text-ink-soft in-data-[place=field]:text-15"
        >
          {hint}
        </div>
      ) : null}
      <FieldMessage id={`${controlId}-error`} error={error} />
    </div>
  );
}
