import { useId, type ComponentProps, type ReactNode } from 'react';
import { FieldMessage } from './field-message';

export type RadioOption = { value: string; label: string; hint?: string };

type RadioGroupProps = {
  legend: string;
  hint?: ReactNode;
  error?: string | undefined;
  options: readonly RadioOption[];
  /** Chosen value when the caller holds it; with `initialValue` the browser holds it. */
  value?: string;
  initialValue?: string;
  /** Options beside each other where the words are short. */
  inline?: boolean;
  id?: string;
  name: string;
} & Pick<ComponentProps<'input'>, 'onChange' | 'onBlur' | 'ref' | 'required' | 'disabled'>;

export function RadioGroup({
  legend,
  hint,
  error,
  options,
  value,
  initialValue,
  inline = false,
  id,
  ...input
}: RadioGroupProps) {
  const generated = useId();
  const groupId = id ?? generated;
  const describedBy = [hint ? `${groupId}-hint` : null, error ? `${groupId}-error` : null]
    .filter(Boolean)
    .join(' ');
  return (
    <fieldset aria-describedby={describedBy || undefined} className="flex min-w-0 flex-col gap-1">
      <legend className="pb-1 text-15 font-bold in-data-[place=field]:text-18">{legend}</legend>
      {hint ? (
        <div id={`${groupId}-hint`} className="text-13 text-ink-soft in-data-[place=field]:text-15">
          {hint}
        </div>
      ) : null}
      <div className={inline ? 'flex flex-wrap gap-2' : 'flex flex-col gap-2'}>
        {options.map((option, index) => (
          <label
            key={option.value}
            className="flex min-h-press cursor-pointer items-center gap-3 rounded-press border-2 border-ink px-3 py-2 has-checked:bg-bone has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-ink"
          >
            <input
              {...input}
              // The first one carries the group's id, so that an error summary can lead here.
              id={index === 0 ? groupId : undefined}
              type="radio"
              value={option.value}
              checked={value === undefined ? undefined : value === option.value}
              defaultChecked={initialValue === undefined ? undefined : initialValue === option.value}
              className="size-5 shrink-0 accent-ink outline-none"
            />
            <span className="flex flex-col">
              <span className="text-15 in-data-[place=field]:text-18">{option.label}</span>
              {option.hint ? <span className="text-13 text-ink-soft">{option.hint}</span> : null}
            </span>
          </label>
        ))}
      </div>
      <FieldMessage id={`${groupId}-error`} error={error} />
    </fieldset>
  );
}
