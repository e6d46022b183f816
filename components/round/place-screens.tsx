'use client';

import type { RoundAddress } from '@/lib/client/round/round-place';
import { useRound } from '@/lib/client/round/use-round';
import { ConditionScreen } from './condition-screen';
import { CountScreen } from './count-screen';
import { CoverScreen } from './cover-screen';
import { CrustScreen } from './crust-screen';
import { DepthScreen } from './depth-screen';
import { DigScreen } from './dig-screen';
import { EntryGate } from './entry-gate';
import { MarkersScreen } from './markers-screen';
import { NoteScreen } from './note-screen';
import { PhotosOf } from './photos-of';
import { PhotosScreen } from './photos-screen';
import { RowScreen } from './row-screen';
import { SpotScreen } from './spot-screen';
import { SprayingScreen } from './spraying-screen';
import { TapePlace } from './tape-place';
import { TodayScreen } from './today-screen';

/** Screens that are read or typed at the truck: nobody has entered the field for them. */
const outside = new Set<RoundAddress['at']>(['spraying', 'note']);

/** The screens of one row sample or planting. An address that names nothing here leads to today's rows. */
export function PlaceScreens({ address }: { address: RoundAddress }) {
  const round = useRound();
  const found = address.planting ? round.planting(address.planting) : undefined;
  if (!found) return address.at === 'spot' ? <SpotScreen plantingId={null} /> : <TodayScreen />;
  const { field } = found;
  const passed = `entered ${field.id} ${round.now().date}`;
  if (!outside.has(address.at) && (round.isClosed(field) || round.draft(passed) === undefined)) {
    return <EntryGate key={field.id} field={field} onPassed={() => void round.setPreference(passed, { at: round.now().time })} />;
  }
  if (address.at === 'spot') return <SpotScreen plantingId={address.planting} />;
  const planting = round.whole(found.planting);
  const row = planting.rows.find((each) => each.id === address.row) ?? null;
  const ofPlanting = { planting, field, row };
  // A key a row: what is typed for one row never shows under the next.
  const key = row?.id ?? planting.id;
  switch (address.at) {
    case 'condition':
      return <ConditionScreen key={key} {...ofPlanting} />;
    case 'note':
      return <NoteScreen key={key} {...ofPlanting} />;
    case 'transect':
      return <CoverScreen key={key} {...ofPlanting} row={null} />;
    case 'markers':
      return <MarkersScreen planting={planting} field={field} />;
    case 'spraying':
      return <SprayingScreen key={key} field={field} />;
  }
  if (!row) return <TodayScreen />;
  const place = { planting, field, row };
  switch (address.at) {
    case 'count':
      return <CountScreen key={key} {...place} />;
    case 'tape':
      return <TapePlace key={key} {...place} />;
    case 'depth':
      return <DepthScreen key={key} {...place} />;
    case 'cover':
      return <CoverScreen key={key} {...place} />;
    case 'crust':
      return <CrustScreen key={key} {...place} />;
    case 'photos':
      return <PhotosScreen key={key} {...place} />;
    case 'dig':
      return <DigScreen key={key} {...place} photos={(digId) => <PhotosOf plantingId={planting.id} rowSampleId={row.id} digId={digId} />} />;
    default:
      return <RowScreen {...place} />;
  }
}
