'use client';

import { useEffect, useState } from 'react';
import { v7 } from 'uuid';
import { afterPress, emptyCount, type CountDraft, type CountPress } from '@/lib/client/round/count-draft';
import { checkCountOfRow, countEntry, countOfDraft, noneNew, type CountToKeep } from '@/lib/client/round/count-visit';
import { dueOf, usedCounts } from '@/lib/client/round/due-row';
import type { RoundPlace } from '@/lib/client/round/round';
import { goTo, useAddress } from '@/lib/client/round/round-place';
import { useRound } from '@/lib/client/round/use-round';
import { walkingOrder } from '@/lib/client/round/walking-order';
import type { Question } from '@/lib/errors/app-error';
import { Button } from '@/components/ui/button';
import { roundCountTexts, roundTexts } from '@/lib/texts/round-texts';
import { CountKeys } from './count-keys';
import { CountNumber } from './count-number';
import { LastKept } from './last-kept';
import { MarkerPress } from './marker-press';
import { RoundBar } from './round-bar';
import { RowBefore } from './row-before';
import { ScreenLock } from './screen-lock';
import { whereText } from './today-screen';

type Asking = { count: CountToKeep; thingId: string; questions: Question[]; problems: string[] };

/** Counting one row: the number fills the screen, the keypad comes first, and keeping it leads to the next row in one press. */
export function CountScreen({ planting, field, row }: RoundPlace) {
  const round = useRound();
  const address = useAddress();
  const draftName = `count ${row.id}`;
  const draft = round.draft<CountDraft>(draftName) ?? emptyCount;
  const today = round.now().date;
  const [asking, setAsking] = useState<Asking>();
  const [keeping, setKeeping] = useState(false);
  const lastPlantsUp = usedCounts(row).at(-1)?.plantsUp ?? 0;
  const order = walkingOrder(planting.rows);
  const { rows } = planting;
  const marker = round.markerOf(planting);
  const after = order.slice(order.findIndex((each) => each.id === row.id) + 1);
  const next = after.find((each) => dueOf(each, planting, today).do !== 'nothing');

  const press = (pressed: CountPress) => {
    setAsking(undefined);
    const standing = round.draft<CountDraft>(draftName) ?? emptyCount;
    void round.setDraft(draftName, afterPress(standing, pressed, lastPlantsUp));
  };

  const keep = async (count: CountToKeep | undefined, thingId: string, answered: Question[]) => {
    if (!count) return setAsking({ count: { countedAs: 'so-far', plants: 0, doubtful: 0 }, thingId, questions: [], problems: [roundCountTexts.nothingTyped] });
    if (keeping || !round.me) return;
    const visit = round.visit(row, marker);
    const checked = checkCountOfRow(row, count, thingId, visit, round.me);
    const isAnswered = (question: Question) => answered.some((each) => each.rule === question.rule && each.about === question.about);
    const open = checked?.questions.filter((question) => !isAnswered(question)) ?? [];
    if (checked && (checked.fields.length > 0 || open.length > 0)) {
      setAsking({ count, thingId, questions: checked.questions, problems: checked.fields.map((problem) => problem.message) });
      return;
    }
    setKeeping(true);
    try {
      const confirmations = answered.map(({ rule, about }) => ({ rule, about, answer: 'yes' as const }));
      await round.keep([countEntry(row, planting.id, count, thingId, visit, confirmations)], { clearDrafts: [draftName] });
      setAsking(undefined);
      if (next) goTo({ ...address, at: dueOf(next, planting, today).do === 'count' ? 'count' : 'row', row: next.id }, 'replace');
      else goTo({ ...address, at: 'today', planting: null, row: null }, 'replace');
    } catch {
      // What went wrong stands on the bar, and the number stays where it was.
    } finally {
      setKeeping(false);
    }
  };

  const ready = asking === undefined;
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      if (event.ctrlKey || event.metaKey || event.altKey || (event.target instanceof HTMLElement && event.target.matches('input, select, textarea, button, summary, a'))) return;
      if (/^\d$/.test(event.key)) press({ press: 'digit', digit: Number(event.key) });
      else if (event.key === 'Backspace') press({ press: 'back' });
      else if (event.key === '+') press({ press: 'more' });
      else if (event.key === '-') press({ press: 'fewer' });
      else if (event.key === 'Enter') void keep(countOfDraft(round.draft<CountDraft>(draftName) ?? emptyCount), v7(), []);
      else return;
      event.preventDefault();
    };
    window.addEventListener('keydown', onKey);
    return () => window.removeEventListener('keydown', onKey);
  });

  return (
    <RoundBar back={{ label: roundTexts.today, onPress: () => goTo({ ...address, at: 'today', planting: null, row: null }) }} lock={<ScreenLock />}>
      <div className="flex items-baseline justify-between gap-3 px-3 pt-2">
        <h1 className="text-27 leading-none">{row.label}</h1>
        <button type="button" className="min-h-press cursor-pointer px-2 text-15 font-bold underline underline-offset-4" onClick={() => goTo({ ...address, at: 'row' })}>
          {roundCountTexts.moreHere}
        </button>
      </div>
      <p className="px-3 text-15 leading-snug">{[field.name, whereText(row)].filter(Boolean).join(', ')}</p>
      <RowBefore row={row} planting={planting} today={today} />
      <CountNumber draft={draft} lastPlantsUp={lastPlantsUp} onPress={press} />
      <MarkerPress planting={planting} rows={rows} marker={marker} today={today} />
      {asking ? (
        <div role="alertdialog" aria-label={roundCountTexts.asked} className="flex flex-col gap-2 border-t-2 border-ink bg-bone px-3 py-3">
          {[...asking.problems, ...asking.questions.map((question) => question.sentence)].map((sentence) => (
            <p key={sentence} className="text-18 font-bold">
              {sentence}
            </p>
          ))}
          <div className="grid grid-cols-2 gap-2">
            <Button look="secondary" onClick={() => setAsking(undefined)}>
              {roundCountTexts.no}
            </Button>
            {asking.problems.length === 0 ? <Button onClick={() => void keep(asking.count, asking.thingId, asking.questions)}>{roundCountTexts.yes}</Button> : null}
          </div>
        </div>
      ) : null}
      {ready ? (
        <div className="flex flex-col gap-2 px-3 pt-2 pb-3">
          <CountKeys onPress={press} />
          <div className="grid grid-cols-[1fr_1.5fr] gap-2">
            <Button look="secondary" onClick={() => void keep(noneNew(draft, row), v7(), [])}>
              {roundCountTexts.noneNew}
            </Button>
            <Button onClick={() => void keep(countOfDraft(draft), v7(), [])}>{next ? roundCountTexts.keepNext(next.label) : roundCountTexts.keepLast}</Button>
          </div>
          <LastKept planting={planting} />
        </div>
      ) : null}
    </RoundBar>
  );
}
