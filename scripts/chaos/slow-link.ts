import { connect, createServer, type AddressInfo, type Socket } from 'node:net';
import { Transform } from 'node:stream';

/** A line to the database whose answers can be held back for as long as is wished. */
export async function slowLink(port: number): Promise<{ port: number; delayBy: (ms: number) => void; close: () => Promise<void> }> {
  let delayMs = 0;
  const open = new Set<Socket>();
  const held = () =>
    new Transform({
      transform: (part, _encoding, passOn) => {
        setTimeout(() => passOn(null, part), delayMs);
      },
    });
  const server = createServer((client) => {
    const database = connect(port, '127.0.0.1');
    for (const [socket, other] of [[client, database], [database, client]] as const) {
      open.add(socket);
      socket.on('error', () => other.destroy());
      socket.on('close', () => {
        open.delete(socket);
        other.destroy();
      });
    }
    client.pipe(database);
    database.pipe(held()).pipe(client);
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  return {
    port: (server.address() as AddressInfo).port,
    delayBy: (ms) => {
      delayMs = ms;
    },
    close: () => {
      for (const socket of open) socket.destroy();
      return new Promise((resolve) => server.close(() => resolve()));
    },
  };
}
