import { contentHash } from '../../operations/content-hash';

/**
 * The hash of one link of an organisation's chain: over the link before and the whole event. Who read a file in is part of
 * an event only where somebody did, so that links made before there was such a column still hold.
 */
export function chainHash(before: string, { readInBy, ...event }: Record<string, unknown>): string {
  return contentHash({ before, event: readInBy === null || readInBy === undefined ? event : { ...event, readInBy } });
}

/** What stands before the first link. */
export const chainStart = 'rowrise-audit-chain';
