import type { RoundField, RoundRestriction } from '@/lib/schemas/round-day';
import { wallTimeAt, type WallTime } from './field-time';

/** A day as the clocks of a zone say it, as an instant in milliseconds; of an hour that comes twice, the later one. */
export function instantOf(wall: WallTime, zone: string): number {
  const naive = Date.parse(`${wall.date}T${wall.time}:00Z`);
  const offsetAt = (instant: number) => {
    const there = wallTimeAt(instant, zone);
    return Date.parse(`${there.date}T${there.time}:00Z`) - Math.floor(instant / 60_000) * 60_000;
  };
  // Both offsets near that day are tried; the later instant is the safer one where people may not enter yet.
  const candidates = [naive - offsetAt(naive - 86_400_000), naive - offsetAt(naive + 86_400_000)];
  const exact = candidates.filter((instant) => {
    const there = wallTimeAt(instant, zone);
    return there.date === wall.date && there.time === wall.time;
  });
  return Math.max(...(exact.length > 0 ? exact : candidates));
}

export type Restricted = { restriction: RoundRestriction; until: WallTime };

/**
 * Which application still keeps people out of a field, and until when by the farm's clocks: its end plus the hours of the
 * label's interval, real hours also through a night in which the clocks change. An exception recorded by this person today
 * opens the field for them. Undefined where nothing stands in the way; of several, the one that ends last.
 */
export function restrictedUntil(field: RoundField, now: WallTime & { zone: string }, personId: string): Restricted | undefined {
  const present = instantOf(now, now.zone);
  const standing = field.restrictions
    .map((restriction) => ({ restriction, ends: instantOf({ date: restriction.endedOn, time: restriction.endedAt }, now.zone) + restriction.hours * 3_600_000 }))
    .filter(({ ends }) => ends > present)
    .filter(({ restriction }) => !restriction.exceptions.some((exception) => exception.personId === personId && exception.enteredOn === now.date))
    .sort((a, b) => b.ends - a.ends)[0];
  return standing && { restriction: standing.restriction, until: wallTimeAt(Math.ceil(standing.ends / 60_000) * 60_000, now.zone) };
}
