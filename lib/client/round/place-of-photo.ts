import { photoAccuracyMetersMost } from '@/lib/schemas/field-limits';

export type PhotoPlace = { latitude: number; longitude: number; accuracyMeters: number };

const patienceMilliseconds = 5_000;

/** Where the phone is, as far as it says so within a few seconds; null where it does not or may not. */
export function placeOfPhoto(): Promise<PhotoPlace | null> {
  if (typeof navigator === 'undefined' || !navigator.geolocation) return Promise.resolve(null);
  return new Promise((done) => {
    navigator.geolocation.getCurrentPosition(
      ({ coords }) => done({ latitude: coords.latitude, longitude: coords.longitude, accuracyMeters: Math.min(photoAccuracyMetersMost, Math.round(coords.accuracy)) }),
      () => done(null),
      { timeout: patienceMilliseconds, maximumAge: 60_000, enableHighAccuracy: true },
    );
  });
}
