import { Agent, request, type IncomingHttpHeaders } from 'node:http';

export type Asked = { method: string; headers: Record<string, string>; body: string | Buffer; hangUpAfterMs: number };
export type Replied = { status: number; headers: IncomingHttpHeaders; text: string };

const agent = new Agent({ keepAlive: true, maxSockets: 64 });

/**
 * One request with a hard deadline over all of it, headers and body: the socket is destroyed and the promise rejects. The
 * built-in fetch is not used because a body under way can outlive the signal that should abort it.
 */
export function httpRequest(address: string, { method, headers, body, hangUpAfterMs }: Asked): Promise<Replied> {
  return new Promise((resolve, reject) => {
    const asked = request(address, { method, headers: { ...headers, 'Content-Length': String(Buffer.byteLength(body)) }, agent });
    const timer = setTimeout(() => fail(new Error('The phone hung up.')), hangUpAfterMs);
    const fail = (error: Error) => {
      clearTimeout(timer);
      asked.destroy();
      reject(error);
    };
    asked.on('error', fail);
    asked.on('response', (answer) => {
      const parts: Buffer[] = [];
      answer.on('data', (part: Buffer) => parts.push(part));
      answer.on('error', fail);
      answer.on('close', () => (answer.complete ? undefined : fail(new Error('The answer was cut short.'))));
      answer.on('end', () => {
        if (!answer.complete) return;
        clearTimeout(timer);
        resolve({ status: answer.statusCode ?? 0, headers: answer.headers, text: Buffer.concat(parts).toString('utf8') });
      });
    });
    asked.end(body);
  });
}
