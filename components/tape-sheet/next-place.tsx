'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { NumberInput } from '@/components/ui/number-input';
import { RadioGroup } from '@/components/ui/radio-group';
import { parseTapePlace } from '@/lib/schemas/tape-place';
import { tapeEntryKinds, type TapeEntryKind, type TapeUnit } from '@/lib/schemas/vocabulary';
import { tapeSheetTexts } from '@/lib/texts/tape-sheet-texts';
import type { PlaceDraft } from './tape-sheet-draft';

type NextPlaceProps = { tapeUnit: TapeUnit; markers: readonly string[]; onAdd: (place: PlaceDraft) => void };

const kindOptions = tapeEntryKinds.map((kind) => ({ value: kind, label: tapeSheetTexts.kinds[kind] }));

/** One place after the other: type it, press Enter, and the field waits for the next. What was noted beside one plant is not carried to the next. */
export function NextPlace({ tapeUnit, markers, onAdd }: NextPlaceProps) {
  const [typed, setTyped] = useState('');
  const [kind, setKind] = useState<TapeEntryKind>('plant');
  const [marker, setMarker] = useState('');
  const [error, setError] = useState<string>();
  const add = () => {
    const read = parseTapePlace(typed, tapeUnit);
    if (!read.ok) {
      setError(read.message);
    } else {
      onAdd({ typed: typed.trim(), kind, marker, leafStage: '' });
      setTyped('');
      setKind('plant');
      setMarker('');
      setError(undefined);
    }
    document.getElementById('next-place')?.focus();
  };
  return (
    <div className="flex flex-col gap-3">
      <RadioGroup
        legend={tapeSheetTexts.kind}
        name="next-kind"
        inline
        options={kindOptions}
        value={kind}
        onChange={(event) => {
          setKind(event.target.value as TapeEntryKind);
          document.getElementById('next-place')?.focus();
        }}
      />
      {markers.length > 0 ? (
        <RadioGroup
          legend={tapeSheetTexts.marker}
          name="next-marker"
          inline
          options={[{ value: '', label: tapeSheetTexts.noMarker }, ...markers.map((each) => ({ value: each, label: each }))]}
          value={marker}
          onChange={(event) => {
            setMarker(event.target.value);
            document.getElementById('next-place')?.focus();
          }}
        />
      ) : null}
      <div className="flex items-end gap-3">
        <div
          className="min-w-0 flex-1"
          onKeyDown={(event) => {
            if (event.key !== 'Enter') return;
            event.preventDefault();
            add();
          }}
        >
          <Field label={tapeSheetTexts.next} hint={tapeSheetTexts.nextHelp(tapeSheetTexts.tapes[tapeUnit].hint)} id="next-place" error={error}>
            {(wiring) => (
              <NumberInput
                {...wiring}
                // The decimal keyboard has no letters; feet and inches need them.
                inputMode={tapeUnit === 'ft-in' ? 'text' : 'decimal'}
                enterKeyHint="next"
                value={typed}
                onChange={(event) => setTyped(event.target.value)}
              />
            )}
          </Field>
        </div>
        <Button onClick={add}>{tapeSheetTexts.add}</Button>
      </div>
    </div>
  );
}
