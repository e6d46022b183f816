'use client';

import type { ComponentProps } from 'react';
import { pressClass, type PressLook } from './press-class';

type ButtonProps = Omit<ComponentProps<'button'>, 'className'> & {
  look?: PressLook;
  wide?: boolean;
  /** While the work runs: the button keeps its size and its words, cannot be pressed again, and says so. */
  pending?: boolean;
  /** What it says while pending, for instance "Saving"; without it the words stay and only soften. */
  pendingText?: string;
};

export function Button({
  look = 'primary',
  wide = false,
  pending = false,
  pendingText,
  type = 'button',
  disabled,
  onClick,
  children,
  ...rest
}: ButtonProps) {
  return (
    <button
      {...rest}
      type={type}
      disabled={disabled}
      // Not the disabled attribute: that would drop the focus while the work runs.
      aria-disabled={pending || undefined}
      aria-busy={pending || undefined}
      onClick={(event) => {
        if (pending) event.preventDefault();
        else onClick?.(event);
      }}
      className={`${pressClass(look, wide)} cursor-pointer disabled:cursor-not-allowed disabled:border-dashed disabled:border-ink-soft disabled:bg-transparent disabled:text-ink-soft aria-disabled:cursor-wait`}
    >
      {/* Both texts share one grid cell, so that the button is always as wide as the wider one. */}
      <span className="grid">
        <span className={`col-start-1 row-start-1 ${pending && pendingText ? 'invisible' : ''}`}>
          {children}
        </span>
        {pendingText ? (
          <span className={`col-start-1 row-start-1 ${pending ? '' : 'invisible'}`}>{pendingText}</span>
        ) : null}
      </span>
    </button>
  );
}
