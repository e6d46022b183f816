'use client';

import { goTo, useAddress } from '@/lib/client/round/round-place';
import { useRound } from '@/lib/client/round/use-round';
import type { RoundPlanting } from '@/lib/schemas/round-day';
import { roundCountTexts } from '@/lib/texts/round-texts';

/** The count kept last, with the press that takes it back and leads to its row again. */
export function LastKept({ planting }: { planting: RoundPlanting }) {
  const round = useRound();
  const address = useAddress();
  const last = round.lastCount(planting.id);
  if (!last) return null;
  const row = planting.rows.find((each) => each.id === last.rowSampleId);
  if (!row) return null;
  const standing = round.row(row).counts.find((count) => count.id === last.thingId);
  if (!standing) return null;
  const undo = async () => {
    const { countedAs, plants, doubtful } = last.body as { countedAs: 'so-far' | 'new'; plants: number; doubtful: number };
    await round.undo(last, roundCountTexts.undone);
    // The number comes back as it was typed, ready to be mended.
    await round.setDraft(`count ${row.id}`, { countedAs, plants, doubtful: doubtful === 0 ? null : doubtful, typing: 'plants' });
    goTo({ ...address, at: 'count', planting: planting.id, row: row.id }, 'replace');
  };
  return (
    <div className="flex items-center justify-between gap-2">
      <p role="status" className="text-15">
        {roundCountTexts.kept(row.label, standing.plantsUp)}
      </p>
      <button type="button" onClick={() => void undo()} className="min-h-press min-w-24 cursor-pointer text-18 font-bold underline underline-offset-4">
        {roundCountTexts.undo}
      </button>
    </div>
  );
}
