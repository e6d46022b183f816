import type { Chance } from './chance';
import { password, type Scene } from './scene';
import type { Reply, Send } from './phone';

/** No request may hang: what has not come by then is given up, and the entries go again. */
const requestSecondsMost = 20;

const headersFor = (cookie: string) => ({ 'Content-Type': 'application/json', 'Sec-Fetch-Site': 'same-origin', ...(cookie === '' ? {} : { Cookie: cookie }) });

/** Signs a scout in the way a phone does; the cookie is good at every server. */
export async function signIn(address: string, email: string): Promise<string> {
  const answer = await fetch(`${address}/api/sign-in`, {
    method: 'POST', headers: headersFor(''), body: JSON.stringify({ email, password }), signal: AbortSignal.timeout(requestSecondsMost * 1000), redirect: 'manual',
  });
  const cookie = answer.headers.getSetCookie().find((each) => each.startsWith('rowrise_session='))?.split(';')[0];
  await answer.arrayBuffer();
  if (!answer.ok || !cookie) throw new Error(`A scout of the harness could not sign in: ${answer.status}.`);
  return cookie;
}

/** Sends batches to the addresses as a phone does, hanging up in flight where told to. */
export function sendingTo(addresses: readonly string[], scene: Scene, cookie: string, chance: Chance): Send {
  return async (operations, { way, abandon }): Promise<Reply> => {
    const abort = new AbortController();
    const hangUp = setTimeout(() => abort.abort(), abandon ? chance.whole(0, 400) : requestSecondsMost * 1000);
    try {
      const answer = await fetch(`${addresses[way % addresses.length]}/api/o/${scene.organisationId}/operations`, {
        method: 'POST', headers: headersFor(cookie), body: JSON.stringify({ from: 'field', operations }), signal: abort.signal, redirect: 'manual',
      });
      const text = await answer.text();
      return { status: answer.status, contentType: answer.headers.get('content-type') ?? '', text };
    } finally {
      clearTimeout(hangUp);
    }
  };
}
