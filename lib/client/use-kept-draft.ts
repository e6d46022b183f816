'use client';

import { useCallback, useMemo, useSyncExternalStore } from 'react';
import type { z } from 'zod';
import { useWho } from './who';

const changeEvent = 'rowrise-draft';
/** Where the browser refuses storage, a draft lives as long as the page. */
const memory = new Map<string, string>();

function readDraft(key: string): string {
  try {
    return window.sessionStorage.getItem(key) ?? '';
  } catch {
    return memory.get(key) ?? '';
  }
}

function writeDraft(key: string, text: string): void {
  try {
    if (text === '') window.sessionStorage.removeItem(key);
    else window.sessionStorage.setItem(key, text);
  } catch {
    memory.set(key, text);
  }
  window.dispatchEvent(new Event(changeEvent));
}

function subscribe(onChange: () => void): () => void {
  window.addEventListener(changeEvent, onChange);
  return () => window.removeEventListener(changeEvent, onChange);
}

function parsed<Draft>(text: string, schema: z.ZodType<Draft>): Draft | undefined {
  if (text === '') return undefined;
  try {
    return schema.safeParse(JSON.parse(text)).data;
  } catch {
    return undefined;
  }
}

/** Makes the next draft out of the one that stands at that moment, which may be newer than the one last drawn. */
export type KeepDraft<Draft> = (change: (standing: Draft | undefined) => Draft | undefined) => void;

/**
 * A draft that outlives the form: closed by mistake or reloaded, what was typed is there again, in this tab and for this
 * person. Undefined where there is none; a change to undefined clears it.
 */
export function useKeptDraft<Draft>(name: string, schema: z.ZodType<Draft>): [Draft | undefined, KeepDraft<Draft>] {
  const { personId } = useWho();
  const key = `rowrise-draft ${personId} ${name}`;
  const text = useSyncExternalStore(
    subscribe,
    () => readDraft(key),
    () => '',
  );
  const draft = useMemo(() => parsed(text, schema), [text, schema]);
  const keep = useCallback<KeepDraft<Draft>>(
    (change) => {
      const next = change(parsed(readDraft(key), schema));
      writeDraft(key, next === undefined ? '' : JSON.stringify(next));
    },
    [key, schema],
  );
  return [draft, keep];
}
