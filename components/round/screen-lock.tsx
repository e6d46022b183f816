'use client';

import { useEffect, useRef, useState } from 'react';
import { createPortal } from 'react-dom';
import { roundCountTexts } from '@/lib/texts/round-texts';

const holdMilliseconds = 800;

/** Calls back once something has been held down long enough; drops of water come and go sooner. */
function useHold(onHeld: () => void) {
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  const end = () => clearTimeout(timer.current);
  useEffect(() => end, []);
  return {
    onPointerDown: () => {
      end();
      timer.current = setTimeout(onHeld, holdMilliseconds);
    },
    onPointerUp: end,
    onPointerLeave: end,
    onPointerCancel: end,
    // Water presses no keys: with a keyboard one press is enough.
    onKeyDown: (event: React.KeyboardEvent) => {
      if (event.key === 'Enter' || event.key === ' ') {
        event.preventDefault();
        onHeld();
      }
    },
    onContextMenu: (event: React.MouseEvent) => event.preventDefault(),
  };
}

/** A long press locks the screen against wet glass, and another one opens it. */
export function ScreenLock() {
  const [locked, setLocked] = useState(false);
  const lock = useHold(() => setLocked(true));
  return (
    <>
      <button
        type="button"
        aria-label={roundCountTexts.lockHint}
        {...lock}
        className="min-h-press min-w-press cursor-pointer touch-none px-2 text-15 font-bold select-none active:bg-bone"
      >
        {roundCountTexts.lock}
      </button>
      {locked ? createPortal(<Locked onOpen={() => setLocked(false)} />, document.body) : null}
    </>
  );
}

function Locked({ onOpen }: { onOpen: () => void }) {
  const dialog = useRef<HTMLDialogElement>(null);
  const hold = useHold(onOpen);
  useEffect(() => {
    const element = dialog.current;
    element?.showModal();
    return () => element?.close();
  }, []);
  return (
    <dialog
      ref={dialog}
      aria-label={roundCountTexts.locked}
      data-place="field"
      onCancel={(event) => event.preventDefault()}
      className="m-0 flex h-dvh max-h-none w-screen max-w-none touch-none flex-col items-center justify-between bg-paper px-6 py-24 text-ink select-none"
    >
      <p className="text-27 font-bold">{roundCountTexts.locked}</p>
      <button type="button" {...hold} className="min-h-40 w-full cursor-pointer touch-none rounded-press border-4 border-ink text-21 font-bold active:bg-bone">
        {roundCountTexts.unlock}
      </button>
    </dialog>
  );
}
