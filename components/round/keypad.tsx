'use client';

import type { ReactNode } from 'react';

const tallClass = { 1: '', 2: 'row-span-2', 3: 'row-span-3' };

/** One key of a field keypad: as wide as its column, never lower than a gloved thumb. Quick presses in a row all count. */
export function Key({ label, onPress, children, look = 'plain', wide = 1, tall = 1 }: { label?: string; onPress: () => void; children: ReactNode; look?: 'plain' | 'word'; wide?: 1 | 2; tall?: 1 | 2 | 3 }) {
  return (
    <button
      type="button"
      aria-label={label}
      onClick={onPress}
      className={`min-h-press cursor-pointer touch-manipulation rounded-press border-2 border-ink px-1 leading-tight select-none active:bg-ink active:text-paper ${look === 'plain' ? 'font-mono text-27' : 'text-15 font-bold [overflow-wrap:normal]'} ${wide === 2 ? 'col-span-2' : ''} ${tallClass[tall]}`}
    >
      {children}
    </button>
  );
}
