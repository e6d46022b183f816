'use client';

import { useEffect, useState } from 'react';
import { v7 } from 'uuid';
import { dayNumber, usedCounts } from '@/lib/client/round/due-row';
import type { RoundPlace } from '@/lib/client/round/round';
import { goTo, useAddress } from '@/lib/client/round/round-place';
import { afterTapePress, emptyTape, fromSheet, placeProblem, sheetBody, type TapeDraft, type TapePress } from '@/lib/client/round/tape-draft';
import { useRound } from '@/lib/client/round/use-round';
import type { Question } from '@/lib/errors/app-error';
import { checkTapeSheet } from '@/lib/schemas/check-tape-sheet';
import { looksLikeFeetAndTenths } from '@/lib/schemas/tape-in-hand';
import { Button } from '@/components/ui/button';
import { roundCountTexts, roundTexts } from '@/lib/texts/round-texts';
import { tapeTexts } from '@/lib/texts/round-tape-texts';
import { RoundBar } from './round-bar';
import { ScreenLock } from './screen-lock';
import { TapeKeys } from './tape-keys';
import { TapePlaces } from './tape-places';
import { TapeSetup } from './tape-setup';
import { TapeStrip } from './tape-strip';

const handPreference = 'tape-in-hand phone';

/** Reading where each plant stands, plant after plant, with the tape that is in hand. */
export function TapePlace({ planting, row }: RoundPlace) {
  const round = useRound();
  const address = useAddress();
  const name = `tape ${row.id}`;
  const hand = round.draft<Pick<TapeDraft, 'unit' | 'step' | 'zeroAt' | 'readFrom'>>(handPreference);
  const last = row.tapeSheets.at(-1);
  const begun = () => round.draft<TapeDraft>(name) ?? (last ? fromSheet(last, hand?.step ?? 'half') : { ...emptyTape, ...hand });
  const draft = begun();
  const [setup, setSetup] = useState(draft.unit === null || (round.draft(name) === undefined && !last && hand === undefined));
  const [asking, setAsking] = useState<{ questions: Question[]; problems: string[] }>();
  const press = (pressed: TapePress) => {
    setAsking(undefined);
    const next = afterTapePress(begun(), pressed);
    void round.setDraft(name, next);
    if (pressed.press === 'setup') void round.setPreference(handPreference, { unit: next.unit, step: next.step, zeroAt: next.zeroAt, readFrom: next.readFrom });
  };
  const counts = usedCounts(row);
  const markers = [...new Map(counts.flatMap((count) => (count.marker === null ? [] : [[count.marker, count.visitedOn] as const]))).entries()];
  const latest = counts.at(-1);
  const plants = draft.places.filter((place) => place.kind !== 'missing').length;
  // The earlier a plant's marker, the taller it stands; without days nobody knows.
  const earlinessOf = (marker: string | null) => {
    const at = markers.findIndex(([each]) => each === marker);
    return at === -1 ? null : markers.length === 1 ? 1 : 1 - at / (markers.length - 1);
  };
  const keep = async (answered: readonly Question[]) => {
    const sheet = begun();
    if (!round.me) return;
    if (sheet.current.typed !== '') return setAsking({ questions: [], problems: [placeProblem(sheet) ?? tapeTexts.unfinished] });
    if (sheet.places.length === 0) return setAsking({ questions: [], problems: [tapeTexts.needPlaces] });
    const visit = round.visit(row, round.markerOf(planting));
    const body = sheetBody(sheet);
    const twin = row.tapeSheets.find((each) => each.personId === round.me?.id && each.visitedOn === visit.visitedOn);
    const known = [...markers.map(([marker]) => marker), ...(visit.marker === null ? [] : [visit.marker])];
    const checked = checkTapeSheet(body.places, body.tapeUnit, { label: row.label, lengthInches: row.length.inches, seeds: row.seeds, markers: known, tapedBy: twin ? round.me.name : null }, body);
    const open = checked.questions.filter((question) => !answered.some((each) => each.rule === question.rule && each.about === question.about));
    if (checked.fields.length > 0 || open.length > 0) return setAsking({ questions: checked.questions, problems: checked.fields.map((field) => field.message) });
    const confirmations = answered.map(({ rule, about }) => ({ rule, about, answer: 'yes' as const }));
    try {
      await round.keep(
        [{ kind: 'tape-sheet.record', version: 2, thingId: v7(), body: { rowSampleId: row.id, visit, ...body, replacesId: null }, about: { plantingId: planting.id, rowSampleId: row.id }, confirmations }],
        { clearDrafts: [name] },
      );
      goTo({ ...address, at: 'row' }, 'replace');
    } catch {
      // The bar says what the phone refused; the sheet stays.
    }
  };
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      if (setup || event.ctrlKey || event.metaKey || event.altKey || (event.target instanceof HTMLElement && event.target.matches('input, select, textarea, button, summary, a'))) return;
      if (/^[\d.,']$/.test(event.key)) press({ press: 'key', text: event.key });
      else if (event.key === '/') press({ press: 'fraction' });
      else if (event.key === 'Backspace') press({ press: 'back' });
      else if (event.key === 'Enter') press({ press: 'next' });
      else return;
      event.preventDefault();
    };
    window.addEventListener('keydown', onKey);
    return () => window.removeEventListener('keydown', onKey);
  });
  const tenths = looksLikeFeetAndTenths(draft.places.map((place) => place.typed), draft.unit ?? 'cm', row.length.inches);
  const problem = placeProblem(draft);
  const back = { label: roundTexts.back, onPress: () => goTo({ ...address, at: 'row' }) };
  if (setup) {
    return (
      <RoundBar back={back}>
        <h1 className="px-3 pt-3 text-27 leading-tight">
          {row.label}, {tapeTexts.title.toLowerCase()}
        </h1>
        <TapeSetup draft={draft} onPress={press} onDone={() => setSetup(false)} />
      </RoundBar>
    );
  }
  return (
    <RoundBar back={back} lock={<ScreenLock />}>
      <div className="flex h-0 min-h-[44rem] grow flex-col">
        <div className="flex items-center justify-between gap-2 px-3 pt-1">
          <h1 className="text-21 leading-tight">{row.label}</h1>
          <button type="button" onClick={() => setSetup(true)} className="min-h-press cursor-pointer px-1 text-15 leading-tight font-bold underline underline-offset-4">
            {draft.unit ? tapeTexts.units[draft.unit] : tapeTexts.change}
          </button>
          <Button onClick={() => void keep([])}>{tapeTexts.keep(draft.places.length)}</Button>
        </div>
        <div className="px-3 pt-1">
          <TapeStrip draft={draft} lengthInches={row.length.inches} earlinessOf={earlinessOf} />
          <p role="status" className="text-15 leading-tight font-bold">
            {tapeTexts.plants(plants, latest?.plantsUp ?? null)}
          </p>
          {last && round.draft(name) === undefined ? <p className="text-15">{tapeTexts.fromLast(dayNumber(planting.plantedOn, last.visitedOn))}</p> : null}
        </div>
        <TapePlaces draft={draft} onPress={press} />
        {asking ? (
          <div role="alertdialog" aria-label={roundCountTexts.asked} className="flex flex-col gap-2 border-t-2 border-ink bg-bone px-3 py-2">
            {[...asking.problems, ...asking.questions.map((question) => question.sentence)].map((sentence) => (
              <p key={sentence} className="text-18 font-bold">
                {sentence}
              </p>
            ))}
            <div className="grid grid-cols-2 gap-2">
              <Button look="secondary" onClick={() => setAsking(undefined)}>
                {roundCountTexts.no}
              </Button>
              {asking.problems.length === 0 ? <Button onClick={() => void keep(asking.questions)}>{roundCountTexts.yes}</Button> : null}
            </div>
          </div>
        ) : tenths ? (
          <div role="alertdialog" aria-label={tapeTexts.feetAndTenths} className="flex flex-col gap-2 border-t-2 border-ink bg-bone px-3 py-2">
            <p className="text-18 font-bold">{tapeTexts.feetAndTenths}</p>
            <div className="grid grid-cols-2 gap-2">
              <Button onClick={() => press({ press: 'setup', setup: { unit: 'ft-tenths', step: 'tenth' } })}>{tapeTexts.areTenths}</Button>
              <Button look="secondary" onClick={() => setSetup(true)}>
                {tapeTexts.change}
              </Button>
            </div>
          </div>
        ) : (
          <TapeKeys draft={draft} markers={markers.map(([marker, on]) => ({ marker, day: dayNumber(planting.plantedOn, on) }))} problem={problem} onPress={press} />
        )}
      </div>
    </RoundBar>
  );
}
