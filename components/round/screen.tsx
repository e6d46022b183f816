'use client';

import { useState, type ReactNode } from 'react';
import { goTo, useAddress, type RoundAddress } from '@/lib/client/round/round-place';
import { Button } from '@/components/ui/button';
import { roundTexts, screenTexts } from '@/lib/texts/round-texts';
import { RoundBar } from './round-bar';

type ScreenProps = {
  title: string;
  /** Where the thing is: "S1-1, strip 1". */
  where?: string;
  caution?: string;
  children: ReactNode;
  keepText?: string;
  /** Keeps what was typed; what is wrong with it comes back as sentences and nothing is kept; 'stay' where it has led on by itself. Left out where each press keeps by itself. */
  onKeep?: () => Promise<readonly string[] | 'stay'>;
  /** Where keeping leads; back to where one came from unless said. */
  after?: Partial<RoundAddress>;
};

/** The frame of a field form: way back, place, caution, the form, and one press that keeps it. */
export function Screen({ title, where, caution, children, keepText, onKeep, after }: ScreenProps) {
  const address = useAddress();
  const [problems, setProblems] = useState<readonly string[]>([]);
  const [keeping, setKeeping] = useState(false);
  const leave = (to: Partial<RoundAddress> = {}) => goTo({ ...address, at: address.row ? 'row' : 'today', ...(address.row ? {} : { planting: null }), ...to });
  const keep = async () => {
    if (!onKeep || keeping) return;
    setKeeping(true);
    try {
      const found = await onKeep();
      if (found === 'stay') return setProblems([]);
      setProblems(found);
      if (found.length === 0) leave(after);
    } catch {
      // What the phone refused stands on the bar; what was typed stays.
    } finally {
      setKeeping(false);
    }
  };
  return (
    <RoundBar back={{ label: roundTexts.back, onPress: () => leave() }}>
      <div className="flex grow flex-col gap-4 px-3 pt-3 pb-4">
        <div>
          <h1 className="text-27 leading-tight">{title}</h1>
          {where ? <p className="text-15">{where}</p> : null}
        </div>
        {caution ? (
          <p role="note" className="border-l-6 border-flag pl-3 text-15 font-bold">
            {caution}
          </p>
        ) : null}
        {children}
      </div>
      {problems.length > 0 ? (
        <ul role="alert" className="border-t-2 border-ink bg-bone px-3 py-2 text-18 font-bold">
          {problems.map((problem) => (
            <li key={problem}>{problem}</li>
          ))}
        </ul>
      ) : null}
      {onKeep ? (
        <div className="sticky bottom-0 border-t-2 border-ink bg-paper px-3 py-3">
          <Button wide onClick={() => void keep()} pending={keeping}>
            {keepText ?? screenTexts.keep}
          </Button>
        </div>
      ) : null}
    </RoundBar>
  );
}
