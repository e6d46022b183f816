'use client';

import { useEffect, useId, useRef, type ReactNode } from 'react';
import { interfaceTexts } from '@/lib/texts/interface-texts';
import { Button } from './button';

type DialogProps = {
  open: boolean;
  onClose: () => void;
  title: string;
  children: ReactNode;
  /** The buttons that answer the question; without them there is one that closes. */
  actions?: ReactNode;
};

/** The browser's own modal: it holds the focus, closes with Escape and gives the focus back. */
export function Dialog({ open, onClose, title, children, actions }: DialogProps) {
  const dialog = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  useEffect(() => {
    const element = dialog.current;
    if (!element) return;
    if (open && !element.open) element.showModal();
    if (!open && element.open) element.close();
  }, [open]);
  return (
    <dialog
      ref={dialog}
      aria-labelledby={titleId}
      onClose={onClose}
      onClick={(event) => {
        // A press on the backdrop lands on the dialog element itself.
        if (event.target === dialog.current) dialog.current?.close();
      }}
      className="m-auto w-[min(36rem,calc(100vw-2rem))] border-2 border-ink bg-paper p-0 text-left font-sans text-ink whitespace-normal"
    >
      {open ? (
        <div className="flex flex-col gap-4 p-5">
          <h2 id={titleId} className="text-21">
            {title}
          </h2>
          {children}
          <div className="flex flex-wrap gap-2">
            {actions ?? (
              <Button look="secondary" onClick={() => dialog.current?.close()}>
                {interfaceTexts.controls.close}
              </Button>
            )}
          </div>
        </div>
      ) : null}
    </dialog>
  );
}
