'use client';

import { useEffect, useId, useRef, type ReactNode } from 'react';
import { createPortal } from 'react-dom';
import { interfaceTexts } from '@/lib/texts/interface-texts';
import { Button } from './button';

type DialogContent = {
  onClose: () => void;
  title: string;
  children: ReactNode;
  /** The buttons that answer the question; without them there is one that closes. */
  actions?: ReactNode;
};

/** A question or an explanation over the page. It hangs from the body, so that it may be asked for inside a sentence. */
export function Dialog({ open, ...content }: DialogContent & { open: boolean }) {
  return open ? createPortal(<OpenDialog {...content} />, document.body) : null;
}

/** The browser's own modal: it holds the focus, closes with Escape and gives the focus back. */
function OpenDialog({ onClose, title, children, actions }: DialogContent) {
  const dialog = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  useEffect(() => {
    const element = dialog.current;
    element?.showModal();
    // The first thing that takes the focus may be a button at the end; reading begins at the top.
    element?.scrollTo(0, 0);
    return () => element?.close();
  }, []);
  return (
    <dialog
      ref={dialog}
      aria-labelledby={titleId}
      onClose={() => {
        // The event comes late: by then the same element may be open again.
        if (!dialog.current?.open) onClose();
      }}
      onClick={(event) => {
        // A press on the backdrop lands on the dialog element itself.
        if (event.target === dialog.current) dialog.current.close();
      }}
      className="m-auto max-h-[90dvh] w-[min(36rem,calc(100vw-2rem))] overflow-auto border-2 border-ink bg-paper p-0 text-15 text-ink"
    >
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
    </dialog>
  );
}
