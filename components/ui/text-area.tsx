import type { ComponentProps } from 'react';
import { controlClass } from './control-class';

export function TextArea({ rows = 4, ...rest }: Omit<ComponentProps<'textarea'>, 'className'>) {
  return <textarea {...rest} rows={rows} className={controlClass} />;
}
