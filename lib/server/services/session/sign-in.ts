import 'server-only';
import type { Caller } from '../../http/person-route';
import { checkCredentials } from './check-credentials';
import { startSession } from './start-session';

/** Signs a person in. */
export async function signIn(input: { email: string; password: string }, caller: Caller): Promise<void> {
  await startSession(await checkCredentials(input, caller));
}
