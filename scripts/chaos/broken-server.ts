// A small server with a broken way of taking operations, for the harness alone: tsx scripts/chaos/broken-server.ts <way> <port>
import { createServer, type IncomingMessage } from 'node:http';
import { connect } from '@/db/connection';
import { checkThenInsert, receiptBeforeChange } from './broken-apply';

const ways = { 'receipt-first': receiptBeforeChange, 'check-then-insert': checkThenInsert };
const [way, port] = process.argv.slice(2);
const apply = ways[way as keyof typeof ways];
const db = connect(process.env.DATABASE_URL ?? '');

async function operationsOf(incoming: IncomingMessage): Promise<{ deviceSequence: number }[]> {
  const parts: Buffer[] = [];
  for await (const part of incoming) parts.push(part as Buffer);
  const { operations } = JSON.parse(Buffer.concat(parts).toString('utf8')) as { operations: { deviceSequence: number }[] };
  return operations.sort((a, b) => a.deviceSequence - b.deviceSequence);
}

createServer(async (incoming, outgoing) => {
  const respond = (status: number, body: unknown) => outgoing.writeHead(status, { 'Content-Type': 'application/json' }).end(JSON.stringify(body));
  try {
    if (incoming.method === 'GET') return respond(200, {});
    const answers = [];
    for (const operation of await operationsOf(incoming)) answers.push(await apply(db, operation));
    return respond(200, { answers });
  } catch {
    return respond(503, {});
  }
}).listen(Number(port), '127.0.0.1');
