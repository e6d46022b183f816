'use client';

import { useState } from 'react';
import { v7 } from 'uuid';
import { markersLeft, markersSet, markersTakenUp } from '@/lib/client/round/markers-left';
import { useRound } from '@/lib/client/round/use-round';
import { useScreenDraft } from '@/lib/client/round/use-screen-draft';
import { walkingOrder } from '@/lib/client/round/walking-order';
import { wholeNumber } from '@/lib/client/round/whole-number';
import { markersMost } from '@/lib/schemas/field-limits';
import type { RoundField, RoundPlanting, RoundRow } from '@/lib/schemas/round-day';
import { Button } from '@/components/ui/button';
import { NumberInput } from '@/components/ui/number-input';
import { markersTexts } from '@/lib/texts/round-markers-texts';
import { Screen } from './screen';

/** Markers set against markers taken up, row by row, before the next machine comes. */
export function MarkersScreen({ planting, field }: { planting: RoundPlanting; field: RoundField }) {
  const rows = walkingOrder(planting.rows);
  return (
    <Screen title={markersTexts.title} where={field.name}>
      <p role="status" className="text-21 font-bold">
        {markersTexts.left(markersLeft(rows))}
      </p>
      <p className="text-15">{markersTexts.how}</p>
      <ul>
        {rows.map((row) => (
          <MarkerLine key={row.id} row={row} plantingId={planting.id} />
        ))}
      </ul>
    </Screen>
  );
}

function MarkerLine({ row, plantingId }: { row: RoundRow; plantingId: string }) {
  const round = useRound();
  const [problem, setProblem] = useState(false);
  const set = markersSet(row);
  const out = markersTakenUp(row);
  const name = `markers-out ${row.id}`;
  const { draft, change } = useScreenDraft(name, { set: String(set.markers), out: '' });
  const keep = async () => {
    const [setNow, outNow] = [wholeNumber(draft.set, markersMost), draft.out.trim() === '' ? out : wholeNumber(draft.out, markersMost)];
    setProblem(setNow === undefined || outNow === undefined);
    if (setNow === undefined || outNow === undefined) return;
    const entry = (event: 'set' | 'taken-up', markers: number) => ({
      kind: 'markers.record', thingId: v7(), about: { plantingId, rowSampleId: row.id },
      body: { rowSampleId: row.id, happenedOn: round.now().date, event, markers, replacesId: row.markers.findLast((each) => each.event === event)?.id ?? null },
    });
    const entries = [...(set.recorded && set.markers === setNow ? [] : [entry('set', setNow)]), ...(outNow === out && row.markers.some((each) => each.event === 'taken-up') ? [] : [entry('taken-up', outNow)])];
    if (entries.length > 0) await round.keep(entries, { clearDrafts: [name] });
  };
  return (
    <li className="border-b border-rule py-2">
      <div className="grid grid-cols-[4.5rem_1fr_1fr_5.5rem] items-end gap-2">
        <span className="flex min-h-press items-center text-18 font-bold">{row.label}</span>
        <label className="text-15">
          {markersTexts.set}
          <NumberInput aria-label={markersTexts.setLabel(row.label)} inputMode="numeric" value={draft.set} onChange={(event) => change({ set: event.target.value })} />
        </label>
        <label className="text-15">
          {markersTexts.out}
          <NumberInput aria-label={markersTexts.outLabel(row.label)} inputMode="numeric" placeholder={out > 0 ? String(out) : ''} value={draft.out} onChange={(event) => change({ out: event.target.value })} />
        </label>
        <Button look="secondary" onClick={() => void keep().catch(() => undefined)}>
          {markersTexts.keepRow}
        </Button>
      </div>
      {set.recorded ? null : <p className="text-15">{markersTexts.suggested(set.markers)}</p>}
      {problem ? (
        <p role="alert" className="text-15 font-bold">
          {markersTexts.needNumber}
        </p>
      ) : null}
    </li>
  );
}
