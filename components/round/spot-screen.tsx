'use client';

import { goTo, useAddress } from '@/lib/client/round/round-place';
import { useRound } from '@/lib/client/round/use-round';
import { SpotPlaces } from './spot-places';
import { SpotStart } from './spot-start';

/** A spot count from nothing: the field and its planting first, then place after place. */
export function SpotScreen({ plantingId }: { plantingId: string | null }) {
  const round = useRound();
  const address = useAddress();
  const found = plantingId ? round.planting(plantingId) : undefined;
  if (found) return <SpotPlaces planting={round.whole(found.planting)} field={found.field} />;
  return <SpotStart onBegun={(planting) => goTo({ ...address, at: 'spot', planting, row: null }, 'replace')} />;
}
