// Fills an empty database with the demo: node --conditions=react-server --import tsx db/demo/fill.ts
import { mkdirSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';
import { connect } from '@/db/connection';
import { fillDemo } from './fill-demo';

const { DATABASE_URL, ROWRISE_DEMO_PEOPLE_FILE = '.rowrise/demo-people.json' } = process.env;

try {
  if (!DATABASE_URL) throw new Error('DATABASE_URL is needed: the address of the database for the application role.');
  const startedAt = performance.now();
  const people = await fillDemo(connect(DATABASE_URL));
  mkdirSync(dirname(ROWRISE_DEMO_PEOPLE_FILE), { recursive: true });
  writeFileSync(ROWRISE_DEMO_PEOPLE_FILE, `${JSON.stringify(people, null, 2)}\n`, { mode: 0o600 });
  console.log(`The demo is filled in (${((performance.now() - startedAt) / 1000).toFixed(1)} s).`);
  process.exit(0);
} catch (error) {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
  process.exit(1);
}
