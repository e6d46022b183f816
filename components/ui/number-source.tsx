'use client';

import { useState } from 'react';
import { interfaceTexts } from '@/lib/texts/interface-texts';
import { Dialog } from './dialog';

/** Where a formula comes from: its name, what it says in a sentence, its equation, its source and its limits. */
export type FormulaEntry = {
  name: string;
  sentence: string;
  equation: string;
  source: string;
  limits: string;
};

export type NumberInputFact = { name: string; text: string };

type NumberSourceProps = {
  /** What the number is: "Plants per acre". */
  label: string;
  /** The number as it is shown, already rounded and with its unit. */
  text: string;
  entry?: FormulaEntry;
  inputs: readonly NumberInputFact[];
  note?: string;
};

/** A number that can be opened: what it was made from, by which formula, from which source, and what it does not tell. */
export function NumberSource({ label, text, entry, inputs, note }: NumberSourceProps) {
  const [open, setOpen] = useState(false);
  const texts = interfaceTexts.controls;
  return (
    <>
      <button
        type="button"
        onClick={() => setOpen(true)}
        aria-label={texts.openNumber(label, text)}
        aria-haspopup="dialog"
        // The target reaches past the line without moving the number out of it.
        className="relative cursor-pointer text-left font-[inherit] underline decoration-dotted decoration-2 underline-offset-[0.25em] before:absolute before:-inset-x-2 before:top-1/2 before:h-11 before:-translate-y-1/2 before:content-[''] hover:bg-bone"
      >
        {text}
      </button>
      <Dialog open={open} onClose={() => setOpen(false)} title={label}>
        <p className="font-mono text-27 font-bold">{text}</p>
        {entry ? <p>{entry.sentence}</p> : null}
        {note ? <p>{note}</p> : null}
        {inputs.length > 0 ? (
          <Part title={texts.inputs}>
            <dl className="border-t border-rule">
              {inputs.map((input) => (
                <div
                  key={input.name}
                  className="flex flex-wrap justify-between gap-x-4 border-b border-rule py-1"
                >
                  <dt>{input.name}</dt>
                  <dd className="font-mono">{input.text}</dd>
                </div>
              ))}
            </dl>
          </Part>
        ) : null}
        {entry ? (
          <>
            <Part title={`${texts.formula}: ${entry.name}`}>
              <p className="font-mono text-15">{entry.equation}</p>
            </Part>
            <Part title={texts.source}>
              <p>{entry.source}</p>
            </Part>
            <Part title={texts.limits}>
              <p>{entry.limits}</p>
            </Part>
          </>
        ) : null}
      </Dialog>
    </>
  );
}

function Part({ title, children }: { title: string; children: React.ReactNode }) {
  return (
    <div className="flex flex-col gap-1">
      <h3 className="text-15">{title}</h3>
      {children}
    </div>
  );
}
