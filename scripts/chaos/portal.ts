import { createServer, request, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import type { Chance } from './chance';

/** The page a network at a fuel station puts in the place of any answer: status 200, and no receipt in it. */
const page = '<!doctype html><html><head><title>Welcome</title></head><body><h1>Sign in to this network</h1></body></html>';

/** A small proxy in front of a server that answers a share of the requests with its own page, some of them after the server had them. */
export async function openPortal(target: string, share: number, chance: Chance): Promise<{ address: string; close: () => Promise<void> }> {
  const { hostname, port, host } = new URL(target);
  const server = createServer((incoming, outgoing) => {
    const showPage = () => outgoing.writeHead(200, { 'Content-Type': 'text/html; charset=utf-8' }).end(page);
    const instead = chance.happens(share);
    if (instead && chance.happens(0.5)) {
      incoming.resume();
      return showPage();
    }
    const onward = request({ hostname, port, path: incoming.url, method: incoming.method, headers: { ...incoming.headers, host } }, (answer) => {
      if (instead) {
        answer.resume();
        return showPage();
      }
      outgoing.writeHead(answer.statusCode ?? 502, answer.headers);
      return answer.pipe(outgoing);
    });
    onward.on('error', () => outgoing.destroy());
    outgoing.on('error', () => onward.destroy());
    incoming.on('aborted', () => onward.destroy());
    return incoming.pipe(onward);
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  return { address: `http://127.0.0.1:${(server.address() as AddressInfo).port}`, close: () => closed(server) };
}

export function closed(server: Server): Promise<void> {
  server.closeAllConnections();
  return new Promise((resolve) => server.close(() => resolve()));
}
