'use client';

import { fieldError } from '@/components/form/problem-summary';
import { Refusal } from '@/components/form/refusal';
import { TapeRow } from '@/components/tape/tape-row';
import { Button } from '@/components/ui/button';
import { RadioGroup } from '@/components/ui/radio-group';
import { useAskedOperation } from '@/lib/client/use-asked-operation';
import { useWho } from '@/lib/client/who';
import { countText } from '@/lib/format/count-text';
import { dateText } from '@/lib/format/date-text';
import { tapeUnits, type TapeUnit } from '@/lib/schemas/vocabulary';
import { tapeSheetTexts } from '@/lib/texts/tape-sheet-texts';
import type { RowSheetData } from '../count/row-sheet-types';
import { drawnPlants, seenByMarker } from './drawn-plants';
import { NextPlace } from './next-place';
import { PasteReadings } from './paste-readings';
import { PlaceList } from './place-list';
import { SpacingFigures } from './spacing-figures';
import { inTapeOrder, isInOrder, laidPlaces, tapeSheetOperation, withoutPlace, type PlaceDraft, type TapeSheetDraft } from './tape-sheet-draft';
import { TapeVisit } from './tape-visit';

type TapeSheetEntryProps = {
  data: RowSheetData;
  draft: TapeSheetDraft;
  onChange: (draft: TapeSheetDraft) => void;
  /** Empties the sheet, after it was saved or when it is given up. */
  onClear: () => void;
  onSaved: () => void;
};

const tapeOptions = tapeUnits.map((unit) => ({ value: unit, ...tapeSheetTexts.tapes[unit] }));

/** A tape sheet being typed in, drawn on the tape as it grows. */
export function TapeSheetEntry({ data, draft, onChange, onClear, onSaved }: TapeSheetEntryProps) {
  const { units } = useWho();
  const operation = useAskedOperation({ onApplied: onSaved });
  const { row, counts } = data;
  const markers = [...new Set(counts.flatMap((count) => (count.used && count.marker !== null ? [count.marker] : [])))];
  const read = laidPlaces(draft, row.lengthInches);
  const setPlaces = (places: PlaceDraft[]) => onChange({ ...draft, places });
  const add = (readings: readonly PlaceDraft[]) => setPlaces([...draft.places, ...readings]);
  return (
    <form
      noValidate
      className="flex flex-col gap-6"
      onSubmit={(event) => {
        event.preventDefault();
        operation.send(tapeSheetOperation(draft, row.id, counts));
      }}
    >
      <h3 className="text-18">{draft.replaces ? tapeSheetTexts.correctTitle(dateText(draft.replaces.date)) : tapeSheetTexts.enterTitle}</h3>
      <div className="grid gap-6 lg:grid-cols-2">
        <RadioGroup
          legend={tapeSheetTexts.tapeInHand}
          name="tape-unit"
          inline
          options={tapeOptions}
          value={draft.tapeUnit}
          onChange={(event) => onChange({ ...draft, tapeUnit: event.target.value as TapeUnit })}
        />
        <TapeVisit data={data} draft={draft} onChange={onChange} error={fieldError(operation.error, 'visit.visitedOn')} />
      </div>
      <TapeRow
        lengthInches={row.lengthInches}
        plants={drawnPlants(read.map((place) => ({ ...place, seenBy: seenByMarker(place.marker, counts) })), counts)}
        units={units}
        startEnd={row.startEnd}
        farEnd={row.farEnd}
        orientation="horizontal"
        label={tapeSheetTexts.label(row.label)}
      />
      <SpacingFigures plants={read.filter((place) => place.kind !== 'missing')} units={units} />
      <div className="grid items-start gap-6 lg:grid-cols-2">
        <NextPlace tapeUnit={draft.tapeUnit} markers={markers} onAdd={(place) => add([place])} />
        <PasteReadings tapeUnit={draft.tapeUnit} onAdd={(readings) => add(readings.map((typed) => ({ typed, kind: 'plant', marker: '', leafStage: '' })))} />
      </div>
      <div className="flex flex-col gap-2">
        <p className="text-18 font-bold">{tapeSheetTexts.places(countText(draft.places.length, 'place'))}</p>
        {isInOrder(draft) ? null : (
          <div className="flex flex-wrap items-center gap-3 border-l-4 border-flag pl-3">
            <p className="font-bold text-flag-text">{tapeSheetTexts.outOfOrder}</p>
            <Button look="secondary" onClick={() => onChange(inTapeOrder(draft))}>
              {tapeSheetTexts.inOrder}
            </Button>
          </div>
        )}
        <PlaceList
          places={draft.places}
          markers={markers}
          errorOf={(index, field) => fieldError(operation.error, `places.${index}.${field}`)}
          onChange={(index, place) => setPlaces(draft.places.map((each, at) => (at === index ? place : each)))}
          onRemove={(index) => setPlaces(withoutPlace(draft.places, index))}
        />
      </div>
      <Refusal operation={operation} />
      <div className="flex flex-wrap gap-3">
        <Button type="submit" pending={operation.isPending} pendingText={tapeSheetTexts.saving}>
          {draft.replaces ? tapeSheetTexts.saveCorrection : tapeSheetTexts.save}
        </Button>
        {draft.places.length > 0 || draft.replaces ? (
          <Button look="quiet" onClick={onClear}>
            {draft.replaces ? tapeSheetTexts.stopCorrecting : tapeSheetTexts.clear}
          </Button>
        ) : null}
      </div>
    </form>
  );
}
