'use client';

import { useState } from 'react';
import { dayNumber } from '@/lib/client/round/due-row';
import { beginTape, correctTape, goThrough, tapeSteps, type TapeDraft, type TapeHand, type TapeStep } from '@/lib/client/round/tape-draft';
import type { RoundPlanting, RoundTapeSheet } from '@/lib/schemas/round-day';
import { tapeReadFroms, tapeUnits, tapeZeros, type TapeUnit } from '@/lib/schemas/vocabulary';
import { Button } from '@/components/ui/button';
import { tapeTexts } from '@/lib/texts/round-tape-texts';
import { Choice } from './choice';

type TapeSetupProps = {
  /** What is known of the tape so far; the unit is missing until somebody has said it once. */
  hand: Omit<TapeHand, 'unit'> & { unit: TapeUnit | null };
  planting: RoundPlanting;
  last: RoundTapeSheet | undefined;
  /** A sheet of this person and day, which is corrected and not doubled. */
  todays: RoundTapeSheet | undefined;
  /** A sheet is being read already: then only the tape is said anew. */
  reading: boolean;
  onHand: (hand: TapeHand) => void;
  onBegin: (draft: TapeDraft) => void;
};

/** Which divisions there are to choose from on each tape; feet and tenths has its own. */
const stepsOf: Record<TapeUnit, readonly TapeStep[]> = { in: tapeSteps, 'ft-in': tapeSteps, 'ft-tenths': ['tenth'], cm: ['half', 'tenth'] };

/** Which tape is in hand and how it lies, asked before the first plant and remembered for the next row. */
export function TapeSetup({ hand, planting, last, todays, reading, onHand, onBegin }: TapeSetupProps) {
  const [chosen, setChosen] = useState(hand);
  const { unit } = chosen;
  const steps = unit === null ? [] : stepsOf[unit];
  const whole: TapeHand | null = unit === null ? null : { ...chosen, unit, step: steps.includes(chosen.step) ? chosen.step : (steps[0] ?? 'half') };
  const start = (make: (hand: TapeHand) => TapeDraft) => whole && onBegin(make(whole));
  return (
    <div className="flex grow flex-col gap-4 px-3 pt-2 pb-4">
      <Choice
        legend={tapeTexts.which}
        columns={2}
        options={tapeUnits.map((value) => ({ value, label: `${tapeTexts.units[value]}, ${tapeTexts.examples[value]}` }))}
        chosen={unit === null ? [] : [unit]}
        onPress={(next) => setChosen({ ...chosen, unit: next })}
      />
      {whole && steps.length > 1 ? (
        <Choice legend={tapeTexts.step} options={steps.map((value) => ({ value, label: tapeTexts.steps[value] }))} chosen={[whole.step]} onPress={(step) => setChosen({ ...chosen, step })} />
      ) : null}
      <Choice legend={tapeTexts.zeroAt} columns={2} options={tapeZeros.map((value) => ({ value, label: tapeTexts.zeros[value] }))} chosen={[chosen.zeroAt]} onPress={(zeroAt) => setChosen({ ...chosen, zeroAt })} />
      <Choice legend={tapeTexts.readFrom} columns={2} options={tapeReadFroms.map((value) => ({ value, label: tapeTexts.ends[value] }))} chosen={[chosen.readFrom]} onPress={(readFrom) => setChosen({ ...chosen, readFrom })} />
      <div className="mt-auto flex flex-col gap-2">
        {whole === null ? <p className="text-18 font-bold">{tapeTexts.chooseFirst}</p> : null}
        {whole && reading ? (
          <Button wide onClick={() => onHand(whole)}>
            {tapeTexts.goOn}
          </Button>
        ) : null}
        {whole && !reading && todays ? (
          <Button wide onClick={() => start((ready) => correctTape(todays, ready))}>
            {tapeTexts.correctToday(todays.places.length)}
          </Button>
        ) : null}
        {whole && !reading && !todays && last ? (
          <Button wide onClick={() => start((ready) => goThrough(last, ready))}>
            {tapeTexts.goThrough(dayNumber(planting.plantedOn, last.visitedOn), last.places.length)}
          </Button>
        ) : null}
        {whole && !reading ? (
          <Button wide look={last ? 'secondary' : 'primary'} onClick={() => start(beginTape)}>
            {last ? tapeTexts.beginNew : tapeTexts.begin}
          </Button>
        ) : null}
      </div>
    </div>
  );
}
