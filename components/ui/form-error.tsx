'use client';

import { useEffect, useRef } from 'react';

export type FormErrorItem = { text: string; fieldId?: string };

type FormErrorProps = {
  /** What happened and what was kept, as a sentence. */
  title: string;
  items?: readonly FormErrorItem[];
  /** Changes with each attempt, so that a second failure brings the reader back here. */
  attempt?: number;
};

/** Stands above a form that was refused, takes the focus, and leads to the fields that need a look. */
export function FormError({ title, items = [], attempt = 0 }: FormErrorProps) {
  const box = useRef<HTMLDivElement>(null);
  useEffect(() => {
    box.current?.focus();
  }, [attempt]);
  return (
    <div ref={box} tabIndex={-1} role="alert" className="border-l-8 border-flag py-2 pl-4 outline-none">
      <p className="text-18 font-bold text-flag-text">{title}</p>
      {items.length > 0 ? (
        <ul className="mt-1 flex flex-col gap-1">
          {items.map((item) => (
            <li key={`${item.fieldId ?? ''} ${item.text}`}>
              {item.fieldId ? <a href={`#${item.fieldId}`}>{item.text}</a> : item.text}
            </li>
          ))}
        </ul>
      ) : null}
    </div>
  );
}
