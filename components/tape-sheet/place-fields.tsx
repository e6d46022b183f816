import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { NumberInput } from '@/components/ui/number-input';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import { tapeEntryKinds, type TapeEntryKind } from '@/lib/schemas/vocabulary';
import { tapeSheetTexts } from '@/lib/texts/tape-sheet-texts';
import type { PlaceDraft } from './tape-sheet-draft';

type PlaceFieldsProps = {
  place: PlaceDraft;
  index: number;
  markers: readonly string[];
  errorOf: (field: 'typed' | 'marker' | 'leafStage') => string | undefined;
  onChange: (place: PlaceDraft) => void;
  onDone: () => void;
  onRemove: () => void;
};

const kindOptions = tapeEntryKinds.map((kind) => ({ value: kind, label: tapeSheetTexts.kinds[kind] }));

/** One place opened to be changed. */
export function PlaceFields({ place, index, markers, errorOf, onChange, onDone, onRemove }: PlaceFieldsProps) {
  const listId = `place-${index}-markers`;
  return (
    <div
      className="grid grid-cols-[minmax(0,1fr)_minmax(0,1.2fr)] items-start gap-3"
      onKeyDown={(event) => {
        if (event.key !== 'Enter' || !(event.target instanceof HTMLInputElement)) return;
        event.preventDefault();
        onDone();
      }}
    >
      <Field label={tapeSheetTexts.place} error={errorOf('typed')}>
        {(wiring) => <NumberInput {...wiring} autoFocus inputMode="text" value={place.typed} onChange={(event) => onChange({ ...place, typed: event.target.value })} />}
      </Field>
      <Field label={tapeSheetTexts.kind}>
        {(wiring) => (
          <Select {...wiring} options={kindOptions} value={place.kind} onChange={(event) => onChange({ ...place, kind: event.target.value as TapeEntryKind })} />
        )}
      </Field>
      <Field label={tapeSheetTexts.marker} error={errorOf('marker')}>
        {(wiring) => (
          <>
            <TextInput {...wiring} list={listId} maxLength={20} value={place.marker} onChange={(event) => onChange({ ...place, marker: event.target.value })} />
            <datalist id={listId}>
              {markers.map((marker) => (
                <option key={marker} value={marker} />
              ))}
            </datalist>
          </>
        )}
      </Field>
      <Field label={tapeSheetTexts.leaf} error={errorOf('leafStage')}>
        {(wiring) => <NumberInput {...wiring} value={place.leafStage} onChange={(event) => onChange({ ...place, leafStage: event.target.value })} />}
      </Field>
      <div className="col-span-2 flex justify-end gap-2">
        <Button look="quiet" aria-label={tapeSheetTexts.removePlaceOf(place.typed)} onClick={onRemove}>
          {tapeSheetTexts.removePlace}
        </Button>
        <Button look="secondary" onClick={onDone}>
          {tapeSheetTexts.done}
        </Button>
      </div>
    </div>
  );
}
