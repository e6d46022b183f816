import { readFileSync, readdirSync } from 'node:fs';
import { join, relative, sep } from 'node:path';

const methods = ['GET', 'HEAD', 'POST', 'PUT', 'PATCH', 'DELETE', 'OPTIONS'] as const;
export type Method = (typeof methods)[number];

const app = join(process.cwd(), 'app');

function filesNamed(name: RegExp): string[] {
  return readdirSync(app, { recursive: true, encoding: 'utf8' })
    .filter((path) => name.test(path.split(sep).at(-1) ?? ''))
    .map((path) => join(app, path));
}

/** The address that a file of `app/` answers at, with its parameters in brackets and without the groups. */
function addressOf(file: string): string {
  const folders = relative(app, file).split(sep).slice(0, -1).filter((folder) => !folder.startsWith('('));
  return `/${folders.join('/')}`;
}

/** Every page there is, found in the folder itself so that nobody has to remember to list one. */
export const discoveredPages = (): string[] => filesNamed(/^page\.[jt]sx?$/).map(addressOf).sort();

/** Every route there is with each method that its file exports. */
export const discoveredRoutes = (): string[] =>
  filesNamed(/^route\.[jt]sx?$/)
    .flatMap((file) => {
      const source = readFileSync(file, 'utf8');
      const exported = methods.filter((method) => new RegExp(`export\\s+(?:const|let|var|(?:async\\s+)?function\\*?)\\s+${method}\\b|export\\s*\\{[^}]*\\b${method}\\b`).test(source));
      return exported.map((method) => `${method} ${addressOf(file)}`);
    })
    .sort();
