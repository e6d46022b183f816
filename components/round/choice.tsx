'use client';

import { useId } from 'react';

type ChoiceProps<Value extends string> = {
  legend: string;
  options: readonly { value: Value; label: string }[];
  chosen: readonly Value[];
  onPress: (value: Value) => void;
  /** Several may hold at once. */
  several?: boolean;
  columns?: 1 | 2 | 3;
};

const columnClass = { 1: 'grid-cols-1', 2: 'grid-cols-2', 3: 'grid-cols-3' };

/** Large presses for one or several of a few words. */
export function Choice<Value extends string>({ legend, options, chosen, onPress, several = false, columns = 3 }: ChoiceProps<Value>) {
  const id = useId();
  return (
    <div role={several ? 'group' : 'radiogroup'} aria-labelledby={id}>
      <p id={id} className="pb-1 text-18 font-bold">
        {legend}
      </p>
      <div className={`grid gap-2 ${columnClass[columns]}`}>
        {options.map(({ value, label }) => {
          const on = chosen.includes(value);
          return (
            <button
              key={value}
              type="button"
              role={several ? 'checkbox' : 'radio'}
              aria-checked={on}
              onClick={() => onPress(value)}
              className={`min-h-press cursor-pointer touch-manipulation rounded-press border-2 border-ink px-2 py-1 text-15 leading-tight font-bold ${columns === 1 ? 'text-left' : ''} ${on ? 'bg-ink text-paper' : ''}`}
            >
              {label}
            </button>
          );
        })}
      </div>
    </div>
  );
}
