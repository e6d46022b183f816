import { readdirSync, readFileSync } from 'node:fs';
import { join, relative } from 'node:path';
import { fileURLToPath } from 'node:url';

const root = fileURLToPath(new URL('../..', import.meta.url));

export type SourceFile = { path: string; text: string };

/** The project's own TypeScript below a folder, by path from the project's root. */
export function sourceFiles(...folders: string[]): SourceFile[] {
  return folders.flatMap((folder) =>
    readdirSync(join(root, folder), { recursive: true, withFileTypes: true })
      .filter((entry) => entry.isFile() && /\.(ts|tsx|mjs|js)$/.test(entry.name))
      .map((entry) => {
        const full = join(entry.parentPath, entry.name);
        return { path: relative(root, full), text: readFileSync(full, 'utf8') };
      }),
  );
}

/** What a file imports, as paths from the root for the project's own files and bare names for packages. */
export function importsOf({ path, text }: SourceFile): string[] {
  const found = [...text.matchAll(/(?:from|import)\s*\(?\s*['"]([^'"]+)['"]/g)].map((match) => match[1] ?? '');
  return found.map((each) => {
    if (each.startsWith('@/')) return each.slice(2);
    return each.startsWith('.') ? join(path, '..', each) : each;
  });
}
