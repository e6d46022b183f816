import { createServer, request, type Server } from 'node:http';
import type { AddressInfo, Socket } from 'node:net';

export type GateMode = 'open' | 'closed' | 'portal';
export type Gate = { address: string; set: (mode: GateMode) => void; stop: () => Promise<void> };

/** What lies between a phone and the server: open, away, or a network that answers everything with its own page. */
export async function makeGate(target: () => string): Promise<Gate> {
  let mode: GateMode = 'open';
  const sockets = new Set<Socket>();
  const server: Server = createServer((asked, answered) => {
    if (mode === 'portal') {
      answered.writeHead(200, { 'Content-Type': 'text/html' }).end('<html><body>Welcome. Sign in to this network.</body></html>');
      return;
    }
    const { hostname, port } = new URL(target());
    const onward = request({ hostname, port, path: asked.url, method: asked.method, headers: asked.headers }, (reply) => {
      answered.writeHead(reply.statusCode ?? 502, reply.headers);
      reply.pipe(answered);
    });
    onward.on('error', () => answered.destroy());
    asked.pipe(onward);
  });
  server.on('connection', (socket) => {
    if (mode === 'closed') return socket.destroy();
    sockets.add(socket);
    socket.on('close', () => sockets.delete(socket));
  });
  await new Promise<void>((listening) => server.listen(0, '127.0.0.1', listening));
  return {
    address: `http://127.0.0.1:${(server.address() as AddressInfo).port}`,
    set: (next) => {
      mode = next;
      if (next !== 'open') for (const socket of sockets) socket.destroy();
    },
    stop: () =>
      new Promise((stopped) => {
        for (const socket of sockets) socket.destroy();
        server.close(() => stopped());
      }),
  };
}
