import { createServer } from 'node:net';
import { Stop } from './say.mjs';

function canListen(port, host) {
  return new Promise((resolve) => {
    const server = createServer();
    server.once('error', (error) =>
      resolve(error.code === 'EADDRINUSE' || error.code === 'EACCES' ? false : error),
    );
    server.listen({ port, host, exclusive: true }, () => server.close(() => resolve(true)));
  });
}

/** The wanted port, or the next one above it that is free on this address. */
export async function freePort(wanted, host) {
  for (let port = wanted; port < wanted + 200 && port < 65_536; port += 1) {
    const answer = await canListen(port, host);
    if (answer instanceof Error)
      throw new Stop(`The address ${host} cannot be used on this machine (${answer.code}).`);
    if (answer) return port;
  }
  throw new Stop(`No free port was found from ${wanted} upwards.`);
}

/** Any free port on loopback, chosen by the system. */
export function anyFreePort() {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', reject);
    server.listen({ port: 0, host: '127.0.0.1' }, () => {
      const { port } = server.address();
      server.close(() => resolve(port));
    });
  });
}
