'use client';

import type { TapeDraft, TapePress, TapeStep } from '@/lib/client/round/tape-draft';
import { tapeReadFroms, tapeUnits, tapeZeros } from '@/lib/schemas/vocabulary';
import { Button } from '@/components/ui/button';
import { tapeTexts } from '@/lib/texts/round-tape-texts';
import { Choice } from './choice';

const steps: readonly TapeStep[] = ['half', 'quarter', 'tenth'];

/** Which tape is in hand and how it lies: asked once, and remembered for the next row. */
export function TapeSetup({ draft, onPress, onDone }: { draft: TapeDraft; onPress: (pressed: TapePress) => void; onDone: () => void }) {
  return (
    <div className="flex flex-col gap-4 px-3 pt-2 pb-4">
      <Choice
        legend={tapeTexts.which}
        columns={2}
        options={tapeUnits.map((value) => ({ value, label: tapeTexts.units[value] }))}
        chosen={draft.unit ? [draft.unit] : []}
        onPress={(unit) => onPress({ press: 'setup', setup: { unit, step: unit === 'in' || unit === 'ft-in' ? (draft.step === 'tenth' ? 'half' : draft.step) : 'tenth' } })}
      />
      {draft.unit === 'in' || draft.unit === 'ft-in' ? (
        <Choice legend={tapeTexts.step} options={steps.map((value) => ({ value, label: tapeTexts.steps[value] }))} chosen={[draft.step]} onPress={(step) => onPress({ press: 'setup', setup: { step } })} />
      ) : null}
      <Choice legend={tapeTexts.zeroAt} columns={2} options={tapeZeros.map((value) => ({ value, label: tapeTexts.zeros[value] }))} chosen={[draft.zeroAt]} onPress={(zeroAt) => onPress({ press: 'setup', setup: { zeroAt } })} />
      <Choice legend={tapeTexts.readFrom} columns={2} options={tapeReadFroms.map((value) => ({ value, label: tapeTexts.ends[value] }))} chosen={[draft.readFrom]} onPress={(readFrom) => onPress({ press: 'setup', setup: { readFrom } })} />
      <Button wide disabled={draft.unit === null} onClick={onDone}>
        {draft.places.length === 0 ? tapeTexts.begin : tapeTexts.goOn}
      </Button>
    </div>
  );
}
