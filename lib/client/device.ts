import { v7 } from 'uuid';

const deviceKey = 'rowrise-device';
const sequenceKey = 'rowrise-device-sequence';

/** This browser's own id, made once and kept; without storage it lasts as long as the page. */
let fallbackId: string | undefined;
let fallbackSequence = 0;

export function deviceId(): string {
  try {
    const standing = localStorage.getItem(deviceKey);
    if (standing) return standing;
    const made = v7();
    localStorage.setItem(deviceKey, made);
    return made;
  } catch {
    fallbackId ??= v7();
    return fallbackId;
  }
}

/** The next number in this browser's own order of writes. */
export function nextDeviceSequence(): number {
  try {
    const next = Number(localStorage.getItem(sequenceKey) ?? 0) + 1;
    localStorage.setItem(sequenceKey, String(next));
    return next;
  } catch {
    fallbackSequence += 1;
    return fallbackSequence;
  }
}
