/** One entry as a phone keeps it until its receipt: the envelope it sends, and what the server must make of it. */
export type Entry = {
  operationId: string;
  organisationId: string;
  personId: string;
  deviceId: string;
  deviceSequence: number;
  kind: string;
  version: number;
  thingId: string;
  baseVersion: null;
  follows: null;
  body: Record<string, unknown>;
  occurred: { date: string; time: string; zone: string };
  confirmations: [];
};

export type Made = {
  entry: Entry;
  /** The operation that has to stand before this one can: what is corrected or taken back. */
  restsOn: string | null;
  /** Values that the server works out from what was typed, worked out here without its code. */
  meant: Record<string, unknown>;
};
