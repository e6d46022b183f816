import { createHash, createHmac, timingSafeEqual } from 'node:crypto';
import { createServer, type IncomingMessage, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';

const sha256 = (bytes: string | Buffer) => createHash('sha256').update(bytes).digest('hex');
const hmac = (key: string | Buffer, text: string) => createHmac('sha256', key).update(text).digest();

export type S3Keys = { region: string; accessKeyId: string; secretAccessKey: string };

/** What a request must be signed with, worked out anew from the request itself, as AWS Signature Version 4 is specified. */
export function signatureOf(request: { method: string; path: string; query: string; headers: Record<string, string>; signedHeaders: string[]; payloadHash: string }, date: string, keys: S3Keys, service = 's3'): string {
  const canonical = [
    request.method, request.path, request.query, ...request.signedHeaders.map((name) => `${name}:${(request.headers[name] ?? '').trim().replace(/\s+/g, ' ')}`), '',
    request.signedHeaders.join(';'), request.payloadHash,
  ].join('\n');
  const scope = `${date.slice(0, 8)}/${keys.region}/${service}/aws4_request`;
  const text = ['AWS4-HMAC-SHA256', date, scope, sha256(canonical)].join('\n');
  const key = ['aws4_request'].reduce(hmac, hmac(hmac(hmac(`AWS4${keys.secretAccessKey}`, date.slice(0, 8)), keys.region), service));
  return hmac(key, text).toString('hex');
}

const clockSkewMost = 15 * 60_000;
const instantOf = (date: string) => Date.parse(`${date.slice(0, 4)}-${date.slice(4, 6)}-${date.slice(6, 8)}T${date.slice(9, 11)}:${date.slice(11, 13)}:${date.slice(13, 15)}Z`);

/** A store on loopback that keeps what is signed rightly and refuses everything else. */
export class FakeS3 {
  readonly kept = new Map<string, Buffer>();
  /** While true, it answers like a store in trouble. */
  away = false;
  private server: Server | undefined;

  constructor(readonly keys: S3Keys) {}

  async start(): Promise<string> {
    this.server = createServer((request, response) => {
      const parts: Buffer[] = [];
      request.on('data', (part: Buffer) => parts.push(part));
      request.on('end', () => {
        const { status, body } = this.answer(request, Buffer.concat(parts));
        response.writeHead(status).end(body);
      });
    });
    await new Promise<void>((listening) => this.server?.listen(0, '127.0.0.1', listening));
    return `http://127.0.0.1:${(this.server.address() as AddressInfo).port}`;
  }

  stop = () => new Promise<void>((stopped) => (this.server ? this.server.close(() => stopped()) : stopped()));

  private answer(request: IncomingMessage, body: Buffer): { status: number; body?: Buffer | string } {
    if (this.away) return { status: 503, body: 'SlowDown' };
    const refused = this.refusal(request, body);
    if (refused) return { status: 403, body: refused };
    const key = request.url ?? '';
    if (request.method === 'PUT') this.kept.set(key, body);
    else if (request.method === 'DELETE') this.kept.delete(key);
    const kept = this.kept.get(key);
    if (request.method === 'GET') return kept ? { status: 200, body: kept } : { status: 404, body: 'NoSuchKey' };
    return { status: request.method === 'DELETE' ? 204 : 200 };
  }

  private refusal(request: IncomingMessage, body: Buffer): string | undefined {
    const headers = Object.fromEntries(Object.entries(request.headers).map(([name, value]) => [name, String(value)]));
    const found = /^AWS4-HMAC-SHA256 Credential=([^/]+)\/(\d{8})\/([^/]+)\/s3\/aws4_request, ?SignedHeaders=([^,]+), ?Signature=([0-9a-f]{64})$/.exec(headers.authorization ?? '');
    if (!found) return 'MissingSecurityHeader';
    const [, accessKeyId, , region, signed = '', signature = ''] = found;
    if (accessKeyId !== this.keys.accessKeyId || region !== this.keys.region) return 'InvalidAccessKeyId';
    const date = headers['x-amz-date'] ?? '';
    if (!(Math.abs(instantOf(date) - Date.now()) < clockSkewMost)) return 'RequestTimeTooSkewed';
    const payloadHash = headers['x-amz-content-sha256'] ?? sha256(body);
    if (payloadHash !== 'UNSIGNED-PAYLOAD' && payloadHash !== sha256(body)) return 'XAmzContentSHA256Mismatch';
    const [path = '', query = ''] = (request.url ?? '').split('?');
    const expected = signatureOf({ method: request.method ?? '', path, query, headers, signedHeaders: signed.split(';'), payloadHash }, date, this.keys);
    return timingSafeEqual(Buffer.from(expected), Buffer.from(signature)) ? undefined : 'SignatureDoesNotMatch';
  }
}
