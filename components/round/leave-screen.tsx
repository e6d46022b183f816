'use client';

import { useState } from 'react';
import { keptFile, keptFileName } from '@/lib/client/round/kept-file';
import { goTo, useAddress } from '@/lib/client/round/round-place';
import { useMinute } from '@/lib/client/round/use-minute';
import { useRound } from '@/lib/client/round/use-round';
import { waitingState } from '@/lib/client/round/waiting-state';
import { Button } from '@/components/ui/button';
import { saveFile } from '@/components/ui/save-file';
import { keptTexts } from '@/lib/texts/kept-texts';
import { roundTexts } from '@/lib/texts/round-texts';
import { RoundBar } from './round-bar';

/** Signing out with unsent work: send it, save it to a file, or leave it waiting under one's name. */
export function LeaveScreen() {
  const round = useRound();
  const address = useAddress();
  const now = useMinute();
  const [saved, setSaved] = useState(false);
  const { kept, needsLook } = waitingState(round, now);
  const waiting = kept + needsLook;
  const texts = keptTexts.leave;
  const toToday = () => goTo({ ...address, at: 'today' });
  const save = async () => {
    saveFile(keptFileName(round.now()), await keptFile(round.store, round.me, now), 'application/json');
    setSaved(true);
  };
  const leave = async () => {
    await round.signOut();
    goTo({ at: 'today', org: null, planting: null, row: null }, 'replace');
  };
  return (
    <RoundBar back={{ label: roundTexts.today, onPress: toToday }}>
      <div className="flex flex-col gap-4 px-4 pt-4 pb-8">
        <h1 className="text-27">{waiting === 0 ? texts.title : texts.waiting(waiting)}</h1>
        <p className="text-18">{waiting === 0 ? texts.nothing : texts.stays}</p>
        {waiting > 0 ? (
          <>
            <Button wide onClick={() => void round.wake()} pending={round.sending.now.size > 0}>
              {texts.sendFirst}
            </Button>
            <p className="text-15">{keptTexts.last[round.sending.last]}</p>
            <Button wide look="secondary" onClick={() => void save()}>
              {texts.save}
            </Button>
            {saved ? <p role="status" className="text-15">{keptTexts.saved}</p> : null}
          </>
        ) : null}
        <Button wide look="secondary" onClick={() => void leave()}>
          {waiting === 0 ? texts.signOut : texts.leaveWaiting}
        </Button>
        <Button wide look="quiet" onClick={toToday}>
          {texts.stay}
        </Button>
      </div>
    </RoundBar>
  );
}
