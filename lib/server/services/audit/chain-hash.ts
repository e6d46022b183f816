import { contentHash } from '../../operations/content-hash';

/** The hash of one link of an organisation's chain: over the link before and the whole event. */
export const chainHash = (before: string, event: Record<string, unknown>) => contentHash({ before, event });

/** What stands before the first link. */
export const chainStart = 'rowrise-audit-chain';
