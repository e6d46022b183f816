import type { ComponentProps } from 'react';
import { controlClass } from './control-class';

/**
 * A text input with a numeric keyboard. Not the number type: that one swallows "17 ft 5 in", "5 1/4" and a decimal
 * comma, and turns with the mouse wheel; a reading is kept as it was typed.
 */
export function NumberInput({
  inputMode = 'decimal',
  ...rest
}: Omit<ComponentProps<'input'>, 'className' | 'type'>) {
  return (
    <input
      {...rest}
      type="text"
      inputMode={inputMode}
      autoComplete="off"
      spellCheck={false}
      className={`${controlClass} font-mono`}
    />
  );
}
