// Makes the one-time link with which the first owner of an empty database comes in, and prints it.
import { v7 } from 'uuid';
import { connect } from '../db/connection';
import { insertLink } from '../lib/server/data/one-time-link';
import { hasPeople } from '../lib/server/data/person';
import { hashOfSecret, newSecret } from '../lib/server/secret';

const days = 7;
const place = process.argv.indexOf('--address');
const address = place > 0 ? process.argv[place + 1] : undefined;
const url = process.env.DATABASE_URL;

if (!address || !url) {
  process.stderr.write('Usage: DATABASE_URL=… first-owner-link.ts --address http://127.0.0.1:3000\n');
  process.exit(1);
}

const db = connect(url, 1);
if (await hasPeople(db)) {
  process.stdout.write('Somebody has an account here already; new people are invited by an owner.\n');
} else {
  const secret = newSecret();
  const expiresAt = new Date(Date.now() + days * 86_400_000).toISOString();
  await insertLink(db, { id: v7(), secretHash: hashOfSecret(secret), purpose: 'first-owner', expiresAt });
  process.stdout.write(`${address.replace(/\/$/, '')}/link/${secret}\n`);
}
await db.$client.end();
