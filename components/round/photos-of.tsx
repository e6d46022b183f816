'use client';

import { useEffect, useId, useMemo, useState } from 'react';
import { v7 } from 'uuid';
import { placeOfPhoto } from '@/lib/client/round/place-of-photo';
import type { KeptPhoto } from '@/lib/client/round/round-store';
import { shrinkPhoto } from '@/lib/client/round/shrink-photo';
import { useRound } from '@/lib/client/round/use-round';
import { pressClass } from '@/components/ui/press-class';
import { roundPhotoTexts } from '@/lib/texts/round-photo-texts';

type PhotosOfProps = { plantingId: string; rowSampleId: string | null; digId: string | null };

/** Takes a photo of a row or a dig and shows those that wait on this phone. */
export function PhotosOf({ plantingId, rowSampleId, digId }: PhotosOfProps) {
  const round = useRound();
  const id = useId();
  const [making, setMaking] = useState(false);
  const [failed, setFailed] = useState(false);
  const take = async (file: File | undefined) => {
    const { me, organisationId } = round;
    if (!file || !me || !organisationId) return;
    setMaking(true);
    setFailed(false);
    // The moment of the press, not of the seconds it takes to make the picture smaller.
    const { date, time } = round.now();
    try {
      const [shrunk, place] = await Promise.all([shrinkPhoto(file), placeOfPhoto()]);
      const photoId = v7();
      const about = { plantingId, rowSampleId };
      const photo: KeptPhoto = { photoId, personId: me.id, organisationId, ...about, digId, ...shrunk, takenOn: date, takenAt: time, place, state: 'kept', keptAt: Date.now() };
      await round.keep([{ kind: 'photo.record', thingId: photoId, body: { ...about, digId, takenOn: date, takenAt: time, place, sha256: shrunk.sha256, bytes: shrunk.byteLength }, about }], { photo });
    } catch {
      // A store that refused says so on the bar; a picture that cannot be read is said here.
      setFailed(true);
    } finally {
      setMaking(false);
    }
  };
  const photos = round.photos.filter((photo) => photo.plantingId === plantingId && photo.rowSampleId === rowSampleId && (digId === null || photo.digId === digId));
  return (
    <div className="flex flex-col gap-2">
      <label htmlFor={id} className={`${pressClass('secondary', true)} cursor-pointer has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-ink`}>
        {making ? roundPhotoTexts.making : roundPhotoTexts.take}
        <input
          id={id}
          type="file"
          accept="image/*"
          capture="environment"
          className="sr-only"
          onChange={(event) => {
            void take(event.target.files?.[0]);
            event.target.value = '';
          }}
        />
      </label>
      <p className="text-15">{roundPhotoTexts.hint}</p>
      {failed ? (
        <p role="alert" className="text-18 font-bold">
          {roundPhotoTexts.failed}
        </p>
      ) : null}
      <ul className="grid grid-cols-3 gap-2">
        {photos.map((photo) => (
          <KeptPicture key={photo.photoId} photo={photo} />
        ))}
      </ul>
    </div>
  );
}

function KeptPicture({ photo }: { photo: KeptPhoto }) {
  const address = useMemo(() => URL.createObjectURL(new Blob([photo.bytes], { type: 'image/jpeg' })), [photo.bytes]);
  useEffect(() => () => URL.revokeObjectURL(address), [address]);
  return (
    <li className="text-13">
      <span aria-hidden="true" className="block aspect-square border-2 border-ink bg-cover bg-center" style={{ backgroundImage: `url("${address}")` }} />
      {photo.state === 'needs-look' ? <span className="font-bold text-flag-text">{photo.sentence ?? roundPhotoTexts.needsLook}</span> : roundPhotoTexts.kept(photo.takenAt, photo.place !== null)}
    </li>
  );
}
