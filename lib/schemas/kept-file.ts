/** What a phone saves of its unsent work, and the office reads in. The mark and the version tell it from any other file. */
export const keptFileMark = 'rowrise-kept';
export const keptFileVersion = 1;

export type KeptFile = {
  what: typeof keptFileMark;
  version: typeof keptFileVersion;
  savedAt: string;
  person: { id: string; name: string };
  /** Envelopes as they would have been sent, in the phone's own order. */
  operations: Record<string, unknown>[];
  photos: { photoId: string; organisationId: string; sha256: string; byteLength: number; base64: string }[];
};
