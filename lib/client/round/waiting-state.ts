import type { Round } from './round';

/** How things stand between this phone and the server, for the line that is on every screen. */
export type WaitingState = { kept: number; sending: number; needsLook: number; oldestAgeMinutes: number | null };

export function waitingState(round: Round, now: number): WaitingState {
  let kept = 0;
  let needsLook = 0;
  let oldest: number | null = null;
  const note = (state: string, keptAt: number) => {
    if (state === 'sent') return;
    if (state === 'kept') kept += 1;
    else needsLook += 1;
    if (oldest === null || keptAt < oldest) oldest = keptAt;
  };
  for (const entry of round.entriesIn('kept', 'needs-look')) note(entry.state, entry.keptAt);
  for (const photo of round.photos) note(photo.state, photo.keptAt);
  return { kept, needsLook, sending: round.sending.now.size, oldestAgeMinutes: oldest === null ? null : Math.max(0, Math.floor((now - oldest) / 60_000)) };
}
