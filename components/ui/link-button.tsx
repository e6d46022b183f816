import Link from 'next/link';
import type { ReactNode } from 'react';
import { pressClass, type PressLook } from './press-class';

type LinkButtonProps = { href: string; look?: PressLook; wide?: boolean; children: ReactNode };

/** A link that looks like a button, for the one step that leads on. */
export function LinkButton({ href, look = 'primary', wide = false, children }: LinkButtonProps) {
  return (
    <Link href={href} className={pressClass(look, wide)}>
      {children}
    </Link>
  );
}
