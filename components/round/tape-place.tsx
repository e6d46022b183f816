'use client';

import { useCallback, useState } from 'react';
import { v7 } from 'uuid';
import type { RoundPlace } from '@/lib/client/round/round';
import { goTo, useAddress } from '@/lib/client/round/round-place';
import { afterTapePress, sheetBody, type TapeDraft, type TapeHand } from '@/lib/client/round/tape-draft';
import { sheetOfToday } from '@/lib/client/round/tape-sheet-of-row';
import { useRound } from '@/lib/client/round/use-round';
import { visitOfRow } from '@/lib/client/round/visit-of-row';
import type { Confirmation } from '@/lib/schemas/operation';
import { roundTexts } from '@/lib/texts/round-texts';
import { tapeTexts } from '@/lib/texts/round-tape-texts';
import { RoundBar } from './round-bar';
import { ScreenLock } from './screen-lock';
import { TapeScreen } from './tape-screen';
import { TapeSetup } from './tape-setup';

const handPreference = 'tape-in-hand phone';

/** The tape sheet of one row: which tape first, then plant after plant. Every press is stored, so that a dead phone loses none. */
export function TapePlace({ planting, row }: RoundPlace) {
  const round = useRound();
  const address = useAddress();
  const name = `tape-sheet ${row.id}`;
  const draft = round.draft<TapeDraft>(name);
  const [choosing, setChoosing] = useState(false);
  const { me } = round;
  const standing = useCallback(() => round.draft<TapeDraft>(name), [round, name]);
  // At the visit of this walk, so that a count and its sheet are one stop; without one, at a visit that set no marker.
  const visit = useCallback(() => visitOfRow(round.entriesOf(row.id), round.now(), round.markerOf(planting)) ?? round.visit(row, null), [round, row, planting]);
  const store = useCallback(
    (next: TapeDraft) => {
      void round.setDraft(name, next);
      const before = round.draft<Pick<TapeHand, 'unit' | 'step'>>(handPreference);
      if (next.unit !== before?.unit || next.step !== before.step) void round.setPreference(handPreference, { unit: next.unit, step: next.step });
    },
    [round, name],
  );
  if (!me) return null;
  const remembered = round.draft<Pick<TapeHand, 'unit' | 'step'>>(handPreference);
  const hand = draft ?? { unit: null, step: 'half' as const, readFrom: 'start' as const, zeroAt: row.startEnd, ...remembered };
  const keep = async (sheet: TapeDraft, confirmations: Confirmation[]) => {
    await round.keep(
      [{
        kind: 'tape-sheet.record',
        version: 2,
        thingId: v7(),
        body: { rowSampleId: row.id, visit: visit(), ...sheetBody(sheet), replacesId: sheet.replacesId },
        about: { plantingId: planting.id, rowSampleId: row.id },
        confirmations,
      }],
      { clearDrafts: [name] },
    );
    goTo({ ...address, at: 'row' }, 'replace');
  };
  const back = { label: roundTexts.back, onPress: () => goTo({ ...address, at: 'row' }) };
  if (!draft || choosing) {
    return (
      <RoundBar back={back}>
        <h1 className="px-3 pt-3 text-27 leading-tight">{tapeTexts.title(row.label)}</h1>
        <TapeSetup
          hand={hand}
          planting={planting}
          last={row.tapeSheets.at(-1)}
          todays={sheetOfToday(row, me, round.now().date)}
          reading={draft !== undefined}
          onHand={(next) => {
            const reading = round.draft<TapeDraft>(name);
            if (reading) store(afterTapePress(reading, { press: 'hand', hand: next }));
            setChoosing(false);
          }}
          onBegin={store}
        />
      </RoundBar>
    );
  }
  return (
    <RoundBar back={back} lock={<ScreenLock />}>
      <TapeScreen
        row={row}
        planting={planting}
        draft={draft}
        standing={standing}
        me={me}
        visit={visit}
        onDraft={store}
        onKeep={keep}
        onTape={() => setChoosing(true)}
      />
    </RoundBar>
  );
}
