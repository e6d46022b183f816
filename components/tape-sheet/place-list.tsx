'use client';

import { useState } from 'react';
import { FieldMessage } from '@/components/ui/field-message';
import { tapeSheetTexts } from '@/lib/texts/tape-sheet-texts';
import { PlaceFields } from './place-fields';
import type { PlaceDraft } from './tape-sheet-draft';

type PlaceListProps = {
  places: readonly PlaceDraft[];
  markers: readonly string[];
  /** What is wrong with each place, by its number and field. */
  errorOf: (index: number, field: 'typed' | 'marker' | 'leafStage') => string | undefined;
  onChange: (index: number, place: PlaceDraft) => void;
  onRemove: (index: number) => void;
};

/** Every place of the sheet in its order, one line each; a press opens it to be changed. One that was refused stands open. */
export function PlaceList({ places, markers, errorOf, onChange, onRemove }: PlaceListProps) {
  const [open, setOpen] = useState<number>();
  if (places.length === 0) return <p className="text-18">{tapeSheetTexts.empty}</p>;
  return (
    <ol className="gap-x-8 sm:columns-2 xl:columns-3">
      {places.map((place, index) => {
        const errors = (['typed', 'marker', 'leafStage'] as const).flatMap((field) => errorOf(index, field) ?? []);
        if (open === index) {
          return (
            <li key={index} className="break-inside-avoid border-t border-rule py-3">
              <PlaceFields
                place={place}
                index={index}
                markers={markers}
                errorOf={(field) => errorOf(index, field)}
                onChange={(changed) => onChange(index, changed)}
                onDone={() => setOpen(undefined)}
                onRemove={() => {
                  setOpen(undefined);
                  onRemove(index);
                }}
              />
            </li>
          );
        }
        return (
          <li key={index} className="break-inside-avoid border-t border-rule">
            <button
              type="button"
              aria-label={tapeSheetTexts.changeOf(`${place.typed}, ${notesOf(place).join(', ')}`)}
              onClick={() => setOpen(index)}
              className="flex min-h-press w-full cursor-pointer items-baseline gap-4 py-3 text-left hover:bg-bone"
            >
              <span className="w-8 shrink-0 text-right font-mono text-15">{index + 1}</span>
              <span className="w-24 shrink-0 font-mono text-21 font-bold">{place.typed}</span>
              <span className="min-w-0 flex-1 text-18">{notesOf(place).join(', ')}</span>
              <span className="text-15 underline underline-offset-4">{tapeSheetTexts.change}</span>
            </button>
            <FieldMessage id={`place-${index}-error`} error={errors.length > 0 ? errors.join(' ') : undefined} />
          </li>
        );
      })}
    </ol>
  );
}

function notesOf(place: PlaceDraft): string[] {
  return [
    ...(place.kind === 'plant' ? [] : [tapeSheetTexts.kinds[place.kind].toLowerCase()]),
    ...(place.marker === '' ? [] : [place.marker]),
    ...(place.leafStage === '' ? [] : [tapeSheetTexts.collars(place.leafStage)]),
  ];
}
