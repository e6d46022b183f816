import { randomUUID } from 'node:crypto';
import { demoPeople } from './demo-people';

export const baseUrl = () => process.env.ROWRISE_URL ?? 'http://127.0.0.1:3000';

/** A hard limit on every request, so that a server that hangs fails a test instead of stopping it. */
const deadlineMilliseconds = 30_000;

export type Reply = { status: number; text: string; headers: Headers; setCookies: string[] };

/** Somebody at the door with a cookie or without one; plain requests, so that nothing a page hides is missed. */
export class Visitor {
  cookie = '';
  readonly deviceId = randomUUID();
  private sequence = 0;

  constructor(readonly personId = '') {}

  async get(path: string): Promise<Reply> {
    return this.request(path, { method: 'GET' });
  }

  async request(path: string, init: RequestInit): Promise<Reply> {
    const response = await fetch(new URL(path, baseUrl()), {
      redirect: 'manual',
      signal: AbortSignal.timeout(deadlineMilliseconds),
      ...init,
      headers: { ...(this.cookie ? { cookie: this.cookie } : {}), ...init.headers },
    });
    return { status: response.status, text: await response.text(), headers: response.headers, setCookies: response.headers.getSetCookie() };
  }

  /** Sends JSON the way our own pages do. */
  post(path: string, body: unknown, headers: Record<string, string> = { origin: baseUrl() }): Promise<Reply> {
    return this.request(path, { method: 'POST', body: JSON.stringify(body), headers: { 'content-type': 'application/json', ...headers } });
  }

  /** Sends one operation, under this person's name unless `more` says otherwise. */
  send(path: string, organisationId: string, operation: { kind: string; thingId: string; body: unknown }, more: Record<string, unknown> = {}) {
    this.sequence += 1;
    return this.post(path, {
      operationId: randomUUID(),
      organisationId,
      personId: this.personId,
      deviceId: this.deviceId,
      deviceSequence: this.sequence,
      version: 1,
      baseVersion: null,
      follows: null,
      occurred: { date: '2026-05-26', time: null, zone: 'America/Chicago' },
      confirmations: [],
      ...operation,
      ...more,
    });
  }

  async signIn(email: string): Promise<Reply> {
    const person = demoPeople().find((each) => each.email === email);
    if (!person) throw new Error(`The demo has nobody under ${email}.`);
    const reply = await this.post('/api/sign-in', { email, password: person.password });
    this.cookie = reply.setCookies.map((each) => each.split(';')[0]).join('; ');
    return reply;
  }
}
