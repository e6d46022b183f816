'use client';

import { useCallback, useEffect, useMemo, useState } from 'react';
import { dayNumber, usedCounts } from '@/lib/client/round/due-row';
import { checkSheetOfRow, markersOfSheet } from '@/lib/client/round/tape-sheet-of-row';
import { afterTapePress, isPending, type TapeDraft, type TapePress } from '@/lib/client/round/tape-draft';
import type { EntryVisit } from '@/lib/client/round/visit-of-row';
import type { Question } from '@/lib/errors/app-error';
import type { Confirmation } from '@/lib/schemas/operation';
import type { RoundPlanting, RoundRow } from '@/lib/schemas/round-day';
import { GrowingTape } from '@/components/tape/growing-tape';
import { Button } from '@/components/ui/button';
import { tapeTexts } from '@/lib/texts/round-tape-texts';
import { roundCountTexts } from '@/lib/texts/round-texts';
import { grownPlants } from './grown-plants';
import { TapeAsked } from './tape-asked';
import { TapeKeys } from './tape-keys';
import { TapeLine } from './tape-line';
import { TapeNotes } from './tape-notes';
import { TapePlaces } from './tape-places';

type TapeScreenProps = {
  row: RoundRow;
  planting: RoundPlanting;
  draft: TapeDraft;
  /** The draft as it stands at this moment, which quick presses may have carried beyond what was drawn last. */
  standing: () => TapeDraft | undefined;
  me: { id: string; name: string };
  visit: () => EntryVisit;
  onDraft: (next: TapeDraft) => void;
  onKeep: (sheet: TapeDraft, confirmations: Confirmation[]) => Promise<void>;
  onTape: () => void;
};

type Asking = { questions: Question[]; problems: string[]; toGo: boolean };

/** Reading where each plant stands: type the place, press Next. The row grows beside its places, the keys stay where they are. */
export function TapeScreen({ row, planting, draft, standing, me, visit, onDraft, onKeep, onTape }: TapeScreenProps) {
  const [asking, setAsking] = useState<Asking>();
  const [keeping, setKeeping] = useState(false);
  const press = useCallback(
    (pressed: TapePress) => {
      setAsking(undefined);
      const before = standing();
      if (before) onDraft(afterTapePress(before, pressed));
    },
    [standing, onDraft],
  );
  const counted = usedCounts(row).at(-1)?.plantsUp ?? null;
  const plants = draft.places.filter((place) => place.kind !== 'missing').length;
  // Held as they are while a number is being typed: a key then draws its line anew and nothing else.
  const { places, unit, readFrom, zeroAt, surelyInches, replacesId } = draft;
  const { marker } = draft.current;
  const markers = useMemo(
    () => markersOfSheet(row, [...places, { marker }]).map((each) => ({ marker: each.marker, day: each.on === null ? null : dayNumber(planting.plantedOn, each.on) })),
    [row, places, marker, planting.plantedOn],
  );
  const sheet = useMemo(() => ({ places, unit, readFrom, zeroAt, surelyInches, replacesId }), [places, unit, readFrom, zeroAt, surelyInches, replacesId]);
  const checked = useMemo(() => checkSheetOfRow(row, sheet, visit(), me), [row, sheet, visit, me]);
  const wrong = useMemo(() => new Set(checked.fields.map((field) => Number(field.path.split('.')[1]))), [checked]);
  const grown = useMemo(() => grownPlants(sheet, markers, row.length.inches), [sheet, markers, row.length.inches]);
  const tape = surelyInches ? undefined : checked.tape;

  const keep = async (answered: readonly Question[], wentThrough: boolean) => {
    let sheet = standing();
    if (keeping || !sheet) return;
    if (isPending(sheet)) {
      sheet = afterTapePress(sheet, { press: 'next' });
      onDraft(sheet);
      if (sheet.refused !== null) return;
    }
    if (sheet.places.length === 0) return setAsking({ questions: [], problems: [tapeTexts.needPlaces], toGo: false });
    const { fields, questions } = checkSheetOfRow(row, sheet, visit(), me);
    const open = questions.filter((question) => !answered.some((each) => each.rule === question.rule && each.about === question.about));
    const toGo = sheet.toGo > 0 && !wentThrough;
    if (fields.length > 0 || open.length > 0 || toGo) return setAsking({ questions, problems: fields.map((field) => field.message), toGo });
    setKeeping(true);
    try {
      // What was answered while it was typed travels as well.
      const given = [...answered, ...(sheet.surelyInches ? checkSheetOfRow(row, { ...sheet, surelyInches: false }, visit(), me).questions.filter(({ rule }) => rule === 'feet-and-tenths') : [])];
      await onKeep(sheet, given.map(({ rule, about }) => ({ rule, about, answer: 'yes' as const })));
    } catch {
      // The bar says what the phone refused; the sheet stays as it was.
    } finally {
      setKeeping(false);
    }
  };

  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      if (event.ctrlKey || event.metaKey || event.altKey || (event.target instanceof HTMLElement && event.target.matches('input, select, textarea, button, summary, a'))) return;
      if (/^[\d.,']$/.test(event.key)) press({ press: 'key', text: event.key });
      else if (event.key === '/') press({ press: 'fraction', text: '½' });
      else if (event.key === 'Backspace') press({ press: 'back' });
      else if (event.key === 'Enter') press({ press: 'next' });
      else return;
      event.preventDefault();
    };
    window.addEventListener('keydown', onKey);
    return () => window.removeEventListener('keydown', onKey);
  });

  return (
    <div className="flex min-h-0 grow flex-col">
      <div className="flex flex-wrap items-center justify-end gap-x-2 border-b border-ink px-3 py-1">
        <h1 aria-label={tapeTexts.title(row.label)} className="mr-auto text-21 leading-tight [overflow-wrap:normal]">
          {row.label}
        </h1>
        <button type="button" aria-label={tapeTexts.change(draft.unit)} onClick={onTape} className="min-h-press min-w-press max-w-28 cursor-pointer px-1 text-15 leading-tight font-bold underline underline-offset-4">
          {tapeTexts.inHand(draft.unit)}
        </button>
        <Button aria-label={tapeTexts.keepLabel(draft.places.length)} pending={keeping} onClick={() => void keep([], false)}>
          {tapeTexts.keep(draft.places.length)}
        </Button>
        <p role="status" className="w-full text-15 leading-tight">
          {tapeTexts.plants(plants, counted)}
        </p>
      </div>
      <div className="flex h-0 min-h-36 grow gap-2 [@media(max-height:700px)]:min-h-24 px-3">
        <GrowingTape
          plants={grown}
          inHand={draft.at.put === 'end' ? places.length - 1 : draft.at.index}
          lengthInches={row.length.inches}
          startEnd={row.startEnd}
          farEnd={row.farEnd}
          units={unit === 'cm' ? 'metric' : 'us'}
          label={tapeTexts.drawing(places.length)}
        />
        <TapePlaces places={places} at={draft.at} toGo={draft.toGo} wrong={wrong} onPress={press} />
      </div>
      {asking ? (
        <TapeAsked label={roundCountTexts.asked} sentences={[...asking.problems, ...asking.questions.map((question) => question.sentence), ...(asking.toGo ? [tapeTexts.toGo(draft.toGo)] : [])]}>
          <Button look="secondary" onClick={() => setAsking(undefined)}>
            {roundCountTexts.no}
          </Button>
          {asking.problems.length === 0 ? <Button onClick={() => void keep(asking.questions, true)}>{roundCountTexts.yes}</Button> : null}
        </TapeAsked>
      ) : tape ? (
        <TapeAsked label={tapeTexts.which} sentences={[tapeTexts.feetAndTenths]}>
          <Button onClick={() => press({ press: 'hand', hand: { unit: 'ft-tenths', step: 'tenth' } })}>{tapeTexts.units['ft-tenths']}</Button>
          <Button look="secondary" onClick={() => press({ press: 'surely-inches' })}>
            {tapeTexts.areInches}
          </Button>
        </TapeAsked>
      ) : (
        <div className="flex flex-col gap-[6px] border-t-2 border-ink px-[12px] pt-1 pb-2">
          <TapeLine draft={draft} onPress={press} />
          {draft.refused === null ? null : (
            <div role="alert" className="flex items-center gap-2">
              <p className="min-w-0 grow text-15 leading-tight font-bold">{draft.refused === 'unread' ? tapeTexts.unread(tapeTexts.examples[draft.unit]) : tapeTexts.order(draft.current.typed)}</p>
              {draft.refused === 'order' ? (
                <Button look="secondary" onClick={() => press({ press: 'in-order' })}>
                  {tapeTexts.inOrder}
                </Button>
              ) : null}
            </div>
          )}
          <TapeNotes draft={draft} markers={markers} onPress={press} />
          <TapeKeys draft={draft} onPress={press} />
        </div>
      )}
    </div>
  );
}
