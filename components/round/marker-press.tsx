'use client';

import { useState } from 'react';
import { markerColors, markersUsed } from '@/lib/client/round/markers';
import { useRound } from '@/lib/client/round/use-round';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Field } from '@/components/ui/field';
import { TextInput } from '@/components/ui/text-input';
import { dayNumber } from '@/lib/client/round/due-row';
import type { RoundPlanting, RoundRow } from '@/lib/schemas/round-day';
import { roundCountTexts, todayTexts } from '@/lib/texts/round-texts';

const markerLettersMost = 20;

/** Today's marker, chosen once for the whole planting and day; which visit had which color stands beside it. */
export function MarkerPress({ planting, rows, marker, today }: { planting: RoundPlanting; rows: readonly RoundRow[]; marker: string | null; today: string }) {
  const round = useRound();
  const [open, setOpen] = useState(false);
  const [own, setOwn] = useState('');
  const used = markersUsed(rows);
  const choose = (chosen: string | null) => {
    void round.setPreference(`marker ${planting.id} ${today}`, { marker: chosen });
    setOpen(false);
  };
  const dayOf = (color: string) => used.find((each) => each.marker === color && each.on !== today)?.on;
  const choices = [...new Set([...(marker ? [marker] : []), ...markerColors, ...used.map((each) => each.marker)])];
  return (
    <>
      <div className="px-3">
        <button type="button" onClick={() => setOpen(true)} className="min-h-press w-full cursor-pointer border-y border-ink px-1 text-left text-18 font-bold">
          {marker ? roundCountTexts.marker(marker) : roundCountTexts.noMarker}
          <span className="float-right font-normal underline underline-offset-4">{roundCountTexts.change}</span>
        </button>
      </div>
      <Dialog open={open} onClose={() => setOpen(false)} title={roundCountTexts.chooseMarker}>
        <p className="text-15">{roundCountTexts.chooseMarkerHint}</p>
        <div className="grid grid-cols-2 gap-2" data-place="field">
          {choices.map((color) => {
            const on = dayOf(color);
            return (
              <Button key={color} look={color === marker ? 'primary' : 'secondary'} onClick={() => choose(color)}>
                {color}
                {on ? `, ${todayTexts.day(dayNumber(planting.plantedOn, on))}` : ''}
              </Button>
            );
          })}
          <Button look={marker === null ? 'primary' : 'secondary'} onClick={() => choose(null)}>
            {roundCountTexts.noMarker}
          </Button>
        </div>
        <form
          className="flex items-end gap-2"
          data-place="field"
          onSubmit={(event) => {
            event.preventDefault();
            const name = own.trim();
            if (name !== '') choose(name);
          }}
        >
          <Field label={roundCountTexts.ownMarker}>{(wiring) => <TextInput {...wiring} maxLength={markerLettersMost} value={own} onChange={(event) => setOwn(event.target.value)} />}</Field>
          <Button type="submit" look="secondary">
            {roundCountTexts.take}
          </Button>
        </form>
      </Dialog>
    </>
  );
}
