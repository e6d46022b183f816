import { IncomingMessage, Server } from 'node:http';

const header = 'x-rowrise-socket-address';

/**
 * Writes each request's socket address over whatever a client sent under the same name. Route handlers are given headers
 * only, and the usual forwarding headers are the client's to choose, so no limit may rest on those.
 */
export function nameSocketAddresses(): void {
  const original = Server.prototype.emit;
  Server.prototype.emit = function emit(this: Server, event: string | symbol, ...rest: unknown[]) {
    const request = rest[0];
    if (event === 'request' && request instanceof IncomingMessage) {
      request.headers[header] = request.socket.remoteAddress ?? 'unknown';
    }
    return Reflect.apply(original, this, [event, ...rest]) as boolean;
  };
}
