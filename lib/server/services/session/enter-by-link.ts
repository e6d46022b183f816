import 'server-only';
import type { OpenLinkInput } from '@/lib/schemas/session';
import type { Caller } from '../../http/person-route';
import { openLink } from './open-link';
import { startSession } from './start-session';

/** Opens a one-time link and signs its person in. */
export async function enterByLink(input: OpenLinkInput, caller: Caller): Promise<void> {
  await startSession(await openLink(input, caller));
}
