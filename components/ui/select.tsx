import type { ComponentProps } from 'react';
import { controlClass } from './control-class';

export type SelectOption = { value: string; label: string };

type SelectProps = Omit<ComponentProps<'select'>, 'className' | 'children'> & {
  options: readonly SelectOption[];
  /** The first, empty choice; leave it out where one of the options always holds. */
  emptyLabel?: string;
};

export function Select({ options, emptyLabel, ...rest }: SelectProps) {
  return (
    <select {...rest} className={controlClass}>
      {emptyLabel === undefined ? null : <option value="">{emptyLabel}</option>}
      {options.map((option) => (
        <option key={option.value} value={option.value}>
          {option.label}
        </option>
      ))}
    </select>
  );
}
