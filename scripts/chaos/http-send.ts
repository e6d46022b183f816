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
    return { status, contentType: headers['content-type'] ?? '', text };
  };
}
