'use client';

import { useState } from 'react';
import { v7 } from 'uuid';
import { afterCoverPress, coverFigures, emptyCover, marksFew, marksUsual, type CoverDraft, type CoverPress } from '@/lib/client/round/cover-draft';
import { useRound } from '@/lib/client/round/use-round';
import { decimalText } from '@/lib/format/decimal-text';
import type { RoundField, RoundPlanting, RoundRow } from '@/lib/schemas/round-day';
import { Field } from '@/components/ui/field';
import { Select } from '@/components/ui/select';
import { coverTexts } from '@/lib/texts/round-cover-texts';
import { Screen } from './screen';

/** Cover read mark by mark: along the seed row of a row sample, or by a line across the field. */
export function CoverScreen({ planting, field, row }: { planting: RoundPlanting; field: RoundField; row: RoundRow | null }) {
  const round = useRound();
  const [askedAt, setAskedAt] = useState<number>();
  const name = row ? `cover ${row.id}` : `transect ${planting.id}`;
  const standing = () => round.draft<CoverDraft>(name) ?? emptyCover;
  const draft = standing();
  const press = (pressed: CoverPress) => void round.setDraft(name, afterCoverPress(standing(), pressed));
  const { marksRead, marksCovered, percent } = coverFigures(draft);
  const keep = async () => {
    if (marksRead === 0) return [coverTexts.needOne];
    if (marksRead < marksFew && askedAt !== marksRead) {
      setAskedAt(marksRead);
      return [coverTexts.few(marksRead)];
    }
    const { date } = round.now();
    const entry = row
      ? { kind: 'residue.record', body: { rowSampleId: row.id, readOn: date, marksRead, marksCovered } }
      : { kind: 'transect.record', body: { plantingId: planting.id, stripId: draft.stripId, readOn: date, marksRead, marksCovered, replacesId: null } };
    await round.keep([{ ...entry, thingId: v7(), about: { plantingId: planting.id, rowSampleId: row?.id ?? null } }], { clearDrafts: [name] });
    return [];
  };
  return (
    <Screen title={row ? coverTexts.inRow : coverTexts.transect} where={[row?.label, field.name].filter(Boolean).join(', ')} onKeep={keep} keepText={coverTexts.keep(marksRead)}>
      <p className="text-15">
        {row ? coverTexts.howInRow : coverTexts.howTransect} {coverTexts.whatCounts}
      </p>
      {row ? null : (
        <>
          <p className="text-15">{coverTexts.taken(planting.transects.length)}</p>
          {planting.strips.length > 0 ? (
            <Field label={coverTexts.strip}>
              {(wiring) => (
                <Select
                  {...wiring}
                  value={draft.stripId ?? ''}
                  emptyLabel={coverTexts.whole}
                  onChange={(event) => void round.setDraft(name, { ...standing(), stripId: event.target.value || null })}
                  options={planting.strips.map((strip) => ({ value: strip.id, label: coverTexts.ofStrip(strip.number) }))}
                />
              )}
            </Field>
          ) : null}
        </>
      )}
      <p role="status" className="mt-auto text-center font-mono text-34 font-bold">
        {percent === null ? coverTexts.none : coverTexts.soFar(marksCovered, marksRead, decimalText(percent, 0))}
      </p>
      <p className="text-center text-15">{marksRead < marksUsual ? coverTexts.toGo(marksUsual - marksRead) : coverTexts.enough}</p>
      <div className="grid grid-cols-2 gap-2">
        <button type="button" onClick={() => press('residue')} className="min-h-40 cursor-pointer touch-manipulation rounded-press border-2 border-ink bg-ink text-27 font-bold text-paper select-none active:bg-bone active:text-ink">
          {coverTexts.residue}
        </button>
        <button type="button" onClick={() => press('bare')} className="min-h-40 cursor-pointer touch-manipulation rounded-press border-2 border-ink text-27 font-bold select-none active:bg-ink active:text-paper">
          {coverTexts.bare}
        </button>
        <button type="button" onClick={() => press('undo')} className="col-span-2 min-h-press cursor-pointer text-18 font-bold underline underline-offset-4">
          {coverTexts.undo}
        </button>
      </div>
    </Screen>
  );
}
