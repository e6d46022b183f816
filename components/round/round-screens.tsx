'use client';

import { useEffect } from 'react';
import { goTo, type RoundAddress } from '@/lib/client/round/round-place';
import { useRound } from '@/lib/client/round/use-round';
import { paths } from '@/lib/paths/paths';
import { roundTexts } from '@/lib/texts/round-texts';
import { Button } from '@/components/ui/button';
import { pressClass } from '@/components/ui/press-class';
import { KeptScreen } from './kept-screen';
import { LeaveScreen } from './leave-screen';
import { PlaceScreens } from './place-screens';
import { RoundBar } from './round-bar';
import { TodayScreen } from './today-screen';

function Said({ title, hint, children }: { title: string; hint: string; children?: React.ReactNode }) {
  return (
    <div className="flex grow flex-col justify-center gap-4 px-4 py-8">
      <h1 className="text-27">{title}</h1>
      <p className="text-18">{hint}</p>
      {children}
    </div>
  );
}

/** Which screen stands, by how far the phone has come and where on it one is. */
export function RoundScreens({ address }: { address: RoundAddress }) {
  const round = useRound();
  const { phase, organisationId } = round;
  const wanted = address.org;
  useEffect(() => {
    if (phase !== 'ready' && phase !== 'no-day') return;
    if (wanted && wanted !== organisationId && round.organisations.some((each) => each.id === wanted)) void round.enter(wanted);
    else if (!wanted && organisationId) goTo({ ...address, org: organisationId }, 'replace');
  }, [round, phase, organisationId, wanted, address]);

  if (phase === 'store-away') return <Said title={roundTexts.storeAway} hint={roundTexts.storeAwayHint} />;
  if (phase === 'nobody') {
    return (
      <Said title={roundTexts.nobody} hint={roundTexts.nobodyHint}>
        {round.othersWaiting > 0 ? <p className="text-18 font-bold">{roundTexts.othersWait(round.othersWaiting)}</p> : null}
        {/* A plain link: the page it leads to needs the network and a server of its own. */}
        <a href={`${paths.signIn}?to=round`} className={pressClass('primary', true)}>
          {roundTexts.toSignIn}
        </a>
      </Said>
    );
  }
  if (phase === 'no-organisation') {
    return (
      <RoundBar>
        <div className="flex flex-col gap-3 px-4 py-6">
          <h1 className="text-27">{roundTexts.chooseOrganisation}</h1>
          {round.organisations.map((organisation) => (
            <Button
              key={organisation.id}
              look="secondary"
              wide
              onClick={() => {
                goTo({ ...address, org: organisation.id }, 'replace');
                void round.enter(organisation.id);
              }}
            >
              {organisation.name}
            </Button>
          ))}
        </div>
      </RoundBar>
    );
  }
  if (address.at === 'leave') return <LeaveScreen />;
  if (address.at === 'kept') return <KeptScreen />;
  if (phase === 'update-needed') {
    return (
      <RoundBar>
        <Said title={roundTexts.updateNeeded} hint={roundTexts.updateNeededHint} />
      </RoundBar>
    );
  }
  if (phase === 'no-day') {
    return (
      <RoundBar>
        <Said title={roundTexts.noDay} hint={roundTexts.noDayHint}>
          <Button onClick={() => void round.wake()}>{roundTexts.tryNow}</Button>
        </Said>
      </RoundBar>
    );
  }
  if (address.at === 'today') return <TodayScreen />;
  return <PlaceScreens address={address} />;
}
