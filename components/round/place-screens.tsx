'use client';

import { goTo, type RoundAddress } from '@/lib/client/round/round-place';
import { useRound } from '@/lib/client/round/use-round';
import { roundTexts } from '@/lib/texts/round-texts';
import { CountScreen } from './count-screen';
import { RoundBar } from './round-bar';
import { RowScreen } from './row-screen';
import { TodayScreen } from './today-screen';

/** The screens of one row sample or planting. An address that names nothing here leads to today's rows. */
export function PlaceScreens({ address }: { address: RoundAddress }) {
  const round = useRound();
  const found = address.planting && address.row ? round.place(address.planting, address.row) : undefined;
  if (!found) return <TodayScreen />;
  // A key a row: what is typed for one row never shows under the next.
  if (address.at === 'count') return <CountScreen key={found.row.id} {...found} />;
  if (address.at === 'row') return <RowScreen {...found} />;
  return (
    <RoundBar back={{ label: roundTexts.today, onPress: () => goTo({ ...address, at: 'today', planting: null, row: null }) }}>
      <p className="p-4">{roundTexts.back}</p>
    </RoundBar>
  );
}
