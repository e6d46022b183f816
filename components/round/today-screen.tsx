'use client';

import { dueOf, dayNumber, usedCounts, type Due } from '@/lib/client/round/due-row';
import { goTo, useAddress } from '@/lib/client/round/round-place';
import { useRound } from '@/lib/client/round/use-round';
import { walkingOrder } from '@/lib/client/round/walking-order';
import type { RoundField, RoundPlanting, RoundRow } from '@/lib/schemas/round-day';
import { Button } from '@/components/ui/button';
import { pressClass } from '@/components/ui/press-class';
import { roundTexts, todayTexts } from '@/lib/texts/round-texts';
import { paths } from '@/lib/paths/paths';
import { ThemeChoice } from '@/components/shell/theme-choice';
import { RoundBar } from './round-bar';

export type WalkedRow = { row: RoundRow; due: Due };

/** What is due, in the order it is walked. */
export function TodayScreen() {
  const round = useRound();
  const address = useAddress();
  const today = round.now().date;
  const plantings = round
    .plantingIds()
    .flatMap((id) => round.planting(id) ?? [])
    .map((each) => ({ ...each, merged: round.whole(each.planting) }))
    .map((each) => ({ ...each, rows: walkingOrder(each.planting.rows).map((row): WalkedRow => ({ row: round.row(row), due: dueOf(round.row(row), each.merged, today) })) }))
    .sort((a, b) => dueCount(b.rows) - dueCount(a.rows));
  const due = plantings.reduce((sum, each) => sum + dueCount(each.rows), 0);
  const organisation = round.day?.organisation;
  return (
    <RoundBar title={organisation?.name}>
      <div className="px-4 pt-4">
        <h1 className="text-27">{plantings.length === 0 ? todayTexts.noPlantings : todayTexts.headline(due)}</h1>
        {plantings.length === 0 ? <p className="mt-2 text-18">{todayTexts.noPlantingsHint}</p> : null}
      </div>
      <div className="flex flex-col gap-6 px-4 pt-4 pb-8">
        {plantings.map(({ planting, field, rows }) => (
          <PlantingRows key={planting.id} planting={planting} field={field} rows={rows} today={today} farmName={round.day?.farms.find((farm) => farm.id === field.farmId)?.name} />
        ))}
        <div className="flex flex-col gap-2 border-t-2 border-ink pt-3">
          <Button look="secondary" wide onClick={() => goTo({ ...address, at: 'spot', planting: null, row: null })}>
            {todayTexts.spot}
          </Button>
          <div className="flex flex-wrap items-center justify-between gap-2">
            <ThemeChoice />
            {organisation ? (
              <a href={paths.organisation(organisation.id)} className={pressClass('quiet', false)}>
                {todayTexts.toDesk}
              </a>
            ) : null}
            <button type="button" className={`${pressClass('quiet', false)} cursor-pointer`} onClick={() => goTo({ ...address, at: 'leave', planting: null, row: null })}>
              {roundTexts.signOut}
            </button>
          </div>
        </div>
      </div>
    </RoundBar>
  );
}

const isDue = ({ due }: WalkedRow) => due.do !== 'nothing';
const dueCount = (rows: readonly WalkedRow[]) => rows.filter(isDue).length;

function PlantingRows({ planting, field, rows, today, farmName }: { planting: RoundPlanting; field: RoundField; rows: readonly WalkedRow[]; today: string; farmName: string | undefined }) {
  const address = useAddress();
  const open = (row: WalkedRow) => goTo({ ...address, at: screenOf(row.due), planting: planting.id, row: row.row.id });
  const next = rows.find(isDue);
  const seen = rows.filter(({ row }) => row.counts.some((count) => count.visitedOn === today)).length;
  const toField = (at: 'transect' | 'condition' | 'note' | 'markers' | 'spraying' | 'spot') => goTo({ ...address, at, planting: planting.id, row: null });
  return (
    <section className="border-t-2 border-ink pt-3">
      <h2 className="text-21">{field.name}</h2>
      <p className="text-15">
        {[farmName, todayTexts.dayOf(dayNumber(planting.plantedOn, today)), rows.length > 0 ? todayTexts.done(seen, rows.length) : null].filter(Boolean).join(', ')}
      </p>
      {next ? (
        <div className="mt-3">
          <Button wide onClick={() => open(next)}>
            {seen > 0 ? todayTexts.goOn(next.row.label) : todayTexts.start(next.row.label)}
          </Button>
        </div>
      ) : null}
      <RowList rows={rows.filter(isDue)} planting={planting} onOpen={open} />
      {rows.every(isDue) ? null : (
        <details className="mt-1">
          <summary className="flex min-h-press cursor-pointer items-center text-15 font-bold underline underline-offset-4">{todayTexts.notDue(rows.filter((each) => !isDue(each)).length)}</summary>
          <RowList rows={rows.filter((each) => !isDue(each))} planting={planting} onOpen={open} />
        </details>
      )}
      <details className="mt-1">
        <summary className="flex min-h-press cursor-pointer items-center text-15 font-bold underline underline-offset-4">{todayTexts.more}</summary>
        <div className="grid grid-cols-2 gap-2 pb-2">
          {planting.hasTrial ? null : <Button look="secondary" onClick={() => toField('spot')}>{todayTexts.addPlace}</Button>}
          <Button look="secondary" onClick={() => toField('transect')}>{todayTexts.transect}</Button>
          <Button look="secondary" onClick={() => toField('condition')}>{todayTexts.condition}</Button>
          <Button look="secondary" onClick={() => toField('note')}>{todayTexts.note}</Button>
          <Button look="secondary" onClick={() => toField('markers')}>{todayTexts.markersOut}</Button>
          <Button look="secondary" onClick={() => toField('spraying')}>{todayTexts.spraying}</Button>
        </div>
      </details>
    </section>
  );
}

function RowList({ rows, planting, onOpen }: { rows: readonly WalkedRow[]; planting: RoundPlanting; onOpen: (walked: WalkedRow) => void }) {
  return (
    <ul className="mt-2">
      {rows.map((walked) => (
        <li key={walked.row.id} className="border-b border-rule">
          <button type="button" onClick={() => onOpen(walked)} className="flex min-h-press w-full cursor-pointer items-center gap-3 py-2 text-left">
            <span className={`w-16 shrink-0 text-18 ${isDue(walked) ? 'font-bold' : ''}`}>{walked.row.label}</span>
            <span className="min-w-0 grow text-15 leading-snug">
              <span className={`block ${isDue(walked) ? 'font-bold' : ''}`}>{todayTexts.due[walked.due.do === 'nothing' || walked.due.do === 'count' ? walked.due.why : walked.due.do]}</span>
              <span className="block">{whereText(walked.row)}</span>
            </span>
            <LastSeen row={walked.row} planting={planting} />
          </button>
        </li>
      ))}
    </ul>
  );
}

const screenOf = (due: Due) => (due.do === 'tape' ? 'tape' : due.do === 'depth' ? 'depth' : 'count');

/** Where the peg stands: a phone finds a field, not a thirty-inch row. */
export function whereText(row: RoundRow): string {
  return [
    row.stripNumber === null ? null : todayTexts.place(row.stripNumber),
    row.planterRow === null ? null : todayTexts.planterRow(row.planterRow),
    row.zoneName,
  ]
    .filter((part) => part !== null)
    .join(', ');
}

function LastSeen({ row, planting }: { row: RoundRow; planting: RoundPlanting }) {
  const last = usedCounts(row).at(-1);
  return (
    <span className="shrink-0 text-right font-mono text-15">
      {last ? (
        <>
          <span className="block text-18 font-bold">{last.plantsUp}</span>
          <span className="block text-13">{todayTexts.day(dayNumber(planting.plantedOn, last.visitedOn))}</span>
        </>
      ) : (
        <span className="text-13">{todayTexts.notSeen}</span>
      )}
    </span>
  );
}
