'use client';

import { useState } from 'react';
import { goTo, useAddress } from '@/lib/client/round/round-place';
import { keptFile, keptFileName } from '@/lib/client/round/kept-file';
import { useMinute } from '@/lib/client/round/use-minute';
import { usePersistence } from '@/lib/client/round/use-persistence';
import { useRound } from '@/lib/client/round/use-round';
import { waitingState } from '@/lib/client/round/waiting-state';
import { Button } from '@/components/ui/button';
import { saveFile } from '@/components/ui/save-file';
import { paths } from '@/lib/paths/paths';
import { ageText } from '@/lib/format/age-text';
import { keptTexts } from '@/lib/texts/kept-texts';
import { roundTexts } from '@/lib/texts/round-texts';
import { KeptLine } from './kept-line';
import { NeedsLook } from './needs-look';
import { RoundBar } from './round-bar';

const linesShown = 100;

/** Everything that waits on this phone: what was sent, what waits, what needs a look, and how to carry it elsewhere. */
export function KeptScreen() {
  const round = useRound();
  const address = useAddress();
  const now = useMinute();
  const persistence = usePersistence();
  const [saved, setSaved] = useState(false);
  const { kept, needsLook, oldestAgeMinutes } = waitingState(round, now);
  const waiting = round.entriesIn('kept');
  const look = round.entriesIn('needs-look');
  const photos = round.photos.filter((photo) => photo.state === 'kept');
  const refusedPhotos = round.photos.filter((photo) => photo.state === 'needs-look');
  const save = async () => {
    const text = await keptFile(round.store, round.me, now);
    saveFile(keptFileName(round.now()), text, 'application/json');
    setSaved(true);
  };
  const last = round.sending.last;
  return (
    <RoundBar back={{ label: roundTexts.today, onPress: () => goTo({ ...address, at: 'today' }) }}>
      <div className="flex flex-col gap-4 px-4 pt-4 pb-8">
        <h1 className="text-27">{keptTexts.headline(kept, needsLook)}</h1>
        {oldestAgeMinutes !== null ? <p className="text-18">{keptTexts.oldest(ageText(oldestAgeMinutes))}</p> : null}
        <p className="text-15">{keptTexts.last[last]}</p>
        <div className="grid grid-cols-2 gap-2">
          <Button onClick={() => void round.wake()} pending={round.sending.now.size > 0}>
            {keptTexts.sendNow}
          </Button>
          <Button look="secondary" onClick={() => void save()}>
            {keptTexts.save}
          </Button>
        </div>
        {last === 'signed-out' ? (
          <a href={`${paths.signIn}?to=round`} className="min-h-press text-18 font-bold underline underline-offset-4">
            {keptTexts.signInToSend}
          </a>
        ) : null}
        {saved ? <p role="status" className="text-15">{keptTexts.saved}</p> : null}
        {look.length + refusedPhotos.length > 0 ? (
          <section className="border-t-2 border-ink pt-3">
            <h2 className="text-21">{roundTexts.status.needsLook(look.length + refusedPhotos.length)}</h2>
            <ul className="flex flex-col gap-4 pt-2">
              {refusedPhotos.map((photo) => (
                <li key={photo.photoId} className="flex flex-col gap-2 border-l-6 border-flag pl-3">
                  <p className="text-18 font-bold">{[keptTexts.kinds['photo.record'], photo.takenOn, photo.takenAt].filter(Boolean).join(', ')}</p>
                  <p className="text-18">{photo.sentence ?? keptTexts.notSent}</p>
                  <div className="flex flex-wrap gap-2">
                    <Button look="secondary" onClick={() => void round.settlePhoto(photo, 'send-again')}>
                      {keptTexts.again}
                    </Button>
                    <Button look="secondary" onClick={() => void round.settlePhoto(photo, 'let-go')}>
                      {keptTexts.letGo}
                    </Button>
                  </div>
                </li>
              ))}
              {look.map((entry) => (
                <li key={entry.operationId}>
                  <NeedsLook entry={entry} />
                </li>
              ))}
            </ul>
          </section>
        ) : null}
        {waiting.length + photos.length > 0 ? (
          <section className="border-t-2 border-ink pt-3">
            <h2 className="text-21">{roundTexts.status.kept(waiting.length + photos.length)}</h2>
            <ul>
              {waiting.slice(0, linesShown).map((entry) => (
                <KeptLine key={entry.operationId} entry={entry} sending={round.sending.now.has(entry.operationId)} />
              ))}
            </ul>
            {waiting.length > linesShown ? <p className="text-15">{keptTexts.andMore(waiting.length - linesShown)}</p> : null}
            {photos.length > 0 ? <p className="py-2 text-15">{keptTexts.photos(photos.length)}</p> : null}
          </section>
        ) : null}
        <section className="border-t-2 border-ink pt-3">
          <h2 className="text-21">{keptTexts.howSafe}</h2>
          <p className="pt-2 text-18">{keptTexts.persistence[persistence.answer]}</p>
          {persistence.answer === 'not-asked' || persistence.answer === 'no' ? (
            <div className="pt-2">
              <Button look="secondary" onClick={() => void persistence.ask()}>
                {keptTexts.askToKeep}
              </Button>
            </div>
          ) : null}
          {persistence.installed ? null : <p className="pt-2 text-15">{persistence.safari ? keptTexts.homeScreenSafari : keptTexts.homeScreen}</p>}
        </section>
      </div>
    </RoundBar>
  );
}
