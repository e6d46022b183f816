import type { ComponentProps } from 'react';
import { controlClass } from './control-class';

/** The device's own date picker; the value is a calendar day such as 2026-05-18. */
export function DateInput(props: Omit<ComponentProps<'input'>, 'className' | 'type'>) {
  return <input {...props} type="date" className={`${controlClass} font-mono`} />;
}
