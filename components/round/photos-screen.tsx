'use client';

import type { RoundPlace } from '@/lib/client/round/round';
import { roundPhotoTexts } from '@/lib/texts/round-photo-texts';
import { PhotosOf } from './photos-of';
import { Screen } from './screen';
import { whereText } from './today-screen';

/** Photos of one row sample. */
export function PhotosScreen({ planting, row }: RoundPlace) {
  return (
    <Screen title={roundPhotoTexts.title} where={[row.label, whereText(row)].filter(Boolean).join(', ')}>
      <PhotosOf plantingId={planting.id} rowSampleId={row.id} digId={null} />
    </Screen>
  );
}
