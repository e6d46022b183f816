'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { countText } from '@/lib/format/count-text';
import { dateText } from '@/lib/format/date-text';
import { daysAfter } from '@/lib/format/days-after';
import { countTexts } from '@/lib/texts/count-texts';
import type { SheetCount } from './row-sheet-types';
import { TakeBack } from './take-back';

type StandingCountsProps = {
  counts: readonly SheetCount[];
  plantedOn: string;
  fallingOn: readonly string[];
  datedAheadOn: readonly string[];
  mayWrite: boolean;
  onCorrect: (count: SheetCount, said: string) => void;
};

/** The counts that stand, in the order of visits; each can be corrected or taken back. */
export function StandingCounts({ counts, plantedOn, fallingOn, datedAheadOn, mayWrite, onCorrect }: StandingCountsProps) {
  const [open, setOpen] = useState<string>();
  if (counts.length === 0) return <p className="text-18">{countTexts.noCounts}</p>;
  return (
    <ul className="flex flex-col">
      {counts.map((count) => {
        const date = dateText(count.visitedOn);
        const plants = countText(count.plantsUp, 'plant');
        return (
          <li key={count.id} className="flex flex-wrap items-center gap-x-4 gap-y-1 border-t border-rule py-3">
            <p className={`w-16 shrink-0 text-right font-mono text-34 leading-none font-bold ${count.used ? '' : 'line-through decoration-2'}`}>
              {count.plantsUp}
              <span className="sr-only"> {countTexts.up}</span>
            </p>
            <div className="min-w-0 flex-1 basis-40">
              <p className="text-18 font-bold">
                {[dateText(count.visitedOn, 'day-and-month'), countTexts.day(String(daysAfter(plantedOn, count.visitedOn))), ...(count.visitedAt ? [count.visitedAt] : [])].join(', ')}
              </p>
              <p className="text-15">{detailsOf(count).join(', ')}</p>
              {notesOf(count, fallingOn, datedAheadOn).map((note) => (
                <p key={note} className="text-15 font-bold text-flag-text">
                  {note}
                </p>
              ))}
            </div>
            {mayWrite && open !== count.id ? (
              <Button look="quiet" aria-label={countTexts.changeOf(countTexts.countOf(date, plants))} onClick={() => setOpen(count.id)}>
                {countTexts.change}
              </Button>
            ) : null}
            {mayWrite && open === count.id ? (
              <div className="flex basis-full flex-wrap justify-end gap-2">
                <Button
                  look="secondary"
                  autoFocus
                  aria-label={countTexts.correctOf(`${date}, ${plants}`)}
                  onClick={() => {
                    setOpen(undefined);
                    onCorrect(count, countTexts.correcting(date, plants));
                  }}
                >
                  {countTexts.correct}
                </Button>
                <TakeBack look="secondary" targetKind="count" targetId={count.id} what={countTexts.countOf(date, plants)} />
              </div>
            ) : null}
          </li>
        );
      })}
    </ul>
  );
}

function detailsOf(count: SheetCount): string[] {
  return [
    ...(count.countedAs === 'new' ? [countTexts.newHere(String(count.plants))] : []),
    ...(count.doubtful > 0 ? [countTexts.doubtfulOf(String(count.doubtful))] : []),
    ...(count.marker === null ? [] : [countTexts.markerIs(count.marker)]),
    countTexts.by(count.personName),
    ...(count.originKind === 'import' ? [countTexts.fromFile] : []),
  ];
}

function notesOf(count: SheetCount, fallingOn: readonly string[], datedAheadOn: readonly string[]): string[] {
  const other = count.alsoCountedBy;
  return [
    ...(other === null ? [] : [count.used ? countTexts.alsoCounted(other) : countTexts.notUsed(other)]),
    ...(count.used && fallingOn.includes(count.visitedOn) ? [countTexts.fewerThanBefore] : []),
    ...(datedAheadOn.includes(count.visitedOn) ? [countTexts.datedAhead] : []),
  ];
}
