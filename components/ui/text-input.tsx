import type { ComponentProps } from 'react';
import { controlClass } from './control-class';

export function TextInput({ type = 'text', ...rest }: Omit<ComponentProps<'input'>, 'className'>) {
  return <input {...rest} type={type} className={controlClass} />;
}
