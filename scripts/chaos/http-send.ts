import type { Chance } from './chance';
import { httpRequest } from './http-request';
import type { Reply, Send } from './phone';
import { password, type Scene } from './scene';

/** No request may hang: what has not come by then is given up, and the entries go again. */
const requestMsMost = 20_000;

const headersFor = (cookie: string) => ({ 'Content-Type': 'application/json', 'Sec-Fetch-Site': 'same-origin', ...(cookie === '' ? {} : { Cookie: cookie }) });

/** Signs a scout in the way a phone does; the cookie is good at every server. */
export async function signIn(address: string, email: string): Promise<string> {
  const { status, headers } = await httpRequest(`${address}/api/sign-in`, { method: 'POST', headers: headersFor(''), body: JSON.stringify({ email, password }), hangUpAfterMs: requestMsMost });
  const cookie = headers['set-cookie']?.find((each) => each.startsWith('rowrise_session='))?.split(';')[0];
  if (status >= 300 || !cookie) throw new Error(`A scout of the harness could not sign in: ${status}.`);
  return cookie;
}

/** Sends batches to the addresses as a phone does, hanging up in flight where told to. */
export function sendingTo(addresses: readonly string[], scene: Scene, cookie: string, chance: Chance): Send {
  return async (operations, { way, abandon }): Promise<Reply> => {
    const { status, headers, text } = await httpRequest(`${addresses[way % addresses.length]}/api/o/${scene.organisationId}/operations`, {
      method: 'POST',
      headers: headersFor(cookie),
      body: JSON.stringify({ from: 'field', operations }),
      hangUpAfterMs: abandon ? chance.whole(0, 400) : requestMsMost,
    });
    return { status, contentType: headers['content-type'] ?? '', text, retryAfter: headers['retry-after'] ?? null };
  };
}

/** What came back over all phones: how often each status, and whether every 503 said when to come again. */
export type Watch = { statuses: Record<string, number>; withoutRetryAfter: number; slowestMs: number };

export const watched =
  (send: Send, watch: Watch): Send =>
  async (operations, by) => {
    const startedAt = performance.now();
    try {
      const reply = await send(operations, by);
      watch.statuses[reply.status] = (watch.statuses[reply.status] ?? 0) + 1;
      if (reply.status === 503 && !reply.retryAfter) watch.withoutRetryAfter += 1;
      return reply;
    } catch (error) {
      watch.statuses.none = (watch.statuses.none ?? 0) + 1;
      throw error;
    } finally {
      watch.slowestMs = Math.max(watch.slowestMs, performance.now() - startedAt);
    }
  };
