import type { Confirmation } from '@/lib/schemas/operation';

/** One write of the scout, before the phone has given it a place in its order. */
export type NewEntry = {
  kind: string;
  version?: number;
  thingId: string;
  body: Record<string, unknown>;
  /** What it belongs to on the screens. */
  about: { plantingId: string | null; rowSampleId: string | null };
  confirmations?: Confirmation[];
  /** The entry of this phone that made the thing which this one changes, while that one may still be unsent. */
  follows?: string | null;
  baseVersion?: number | null;
};

export const entryStates = ['kept', 'sent', 'needs-look'] as const;
export type EntryState = (typeof entryStates)[number];

/** How the server answered an entry that needs a look. */
export type EntryAnswer = {
  outcome: string;
  code?: string;
  sentence?: string;
  fields?: { path: string; message: string }[];
  questions?: { rule: string; about: string; sentence: string }[];
  standingVersion?: number;
  /** What stands in the place of an edit that lost: who, when, how many. */
  standing?: Record<string, unknown>;
  result?: Record<string, unknown>;
};

/** One write as the phone keeps it until the receipt for it has come, and then until a newer day holds it. */
export type KeptEntry = {
  operationId: string;
  personId: string;
  organisationId: string;
  deviceId: string;
  deviceSequence: number;
  kind: string;
  version: number;
  thingId: string;
  baseVersion: number | null;
  follows: string | null;
  body: Record<string, unknown>;
  occurred: { date: string; time: string | null; zone: string };
  confirmations: Confirmation[];
  plantingId: string | null;
  rowSampleId: string | null;
  state: EntryState;
  /** Whether it has ever left the phone: one that has may have arrived although no answer came. */
  tried: boolean;
  /** The phone's clock when it was kept and when its receipt came, in milliseconds. */
  keptAt: number;
  sentAt: number | null;
  answer: EntryAnswer | null;
};
