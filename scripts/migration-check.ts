// What the migrator itself does not check: that history on disk and history in the database are the same one.
import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import type { Client } from 'pg';

interface JournalEntry {
  tag: string;
  when: number;
}

interface Applied {
  hash: string;
  created_at: string;
}

function readJournal(folder: string): (JournalEntry & { hash: string })[] {
  const journal = JSON.parse(readFileSync(`${folder}/meta/_journal.json`, 'utf8')) as {
    entries: JournalEntry[];
  };
  return journal.entries.map(({ tag, when }) => {
    const hash = createHash('sha256')
      .update(readFileSync(`${folder}/${tag}.sql`, 'utf8'))
      .digest('hex');
    return { tag, when, hash };
  });
}

async function readApplied(client: Client): Promise<Applied[]> {
  const known = await client.query<{ found: string | null }>(
    `select to_regclass('drizzle.__drizzle_migrations') as found`,
  );
  if (known.rows[0]?.found === undefined || known.rows[0].found === null) return [];
  const applied = await client.query<Applied>(
    'select hash, created_at from drizzle.__drizzle_migrations order by created_at',
  );
  return applied.rows;
}

/**
 * Refuses an edited migration that was applied before, one that is older than what was applied (both would be passed
 * over without a word), and a database that is ahead of this code.
 */
export async function assertMigrationsAgree(client: Client, folder: string): Promise<void> {
  const journal = readJournal(folder);
  journal.forEach((entry, index) => {
    const before = journal[index - 1];
    if (before && before.when >= entry.when) {
      throw new Error(
        `Migration ${entry.tag} carries an older time than ${before.tag} before it. Generate it again.`,
      );
    }
  });
  const applied = await readApplied(client);
  const lastAppliedAt = Number(applied.at(-1)?.created_at ?? -1);
  const appliedAt = new Map(applied.map((row) => [Number(row.created_at), row.hash]));
  for (const entry of journal) {
    const hash = appliedAt.get(entry.when);
    if (hash !== undefined && hash !== entry.hash) {
      throw new Error(
        `Migration ${entry.tag} was edited after this database had applied it. Put it back, and add a new one.`,
      );
    }
    if (hash === undefined && entry.when < lastAppliedAt) {
      throw new Error(
        `Migration ${entry.tag} is older than what this database has applied already. Generate it again.`,
      );
    }
    appliedAt.delete(entry.when);
  }
  if (appliedAt.size > 0) {
    throw new Error(
      'This database has migrations that this version of Rowrise does not know. Use the newer version.',
    );
  }
}
