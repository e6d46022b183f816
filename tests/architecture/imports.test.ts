import { describe, expect, it } from 'vitest';
import { importsOf, sourceFiles } from './source-files';

const universal = ['lib/schemas', 'lib/access', 'lib/errors', 'lib/format', 'lib/paths', 'lib/texts'];
const own = ['app', 'components', 'db', 'fonts', 'lib', 'instrumentation', 'proxy', 'tests', 'scripts'];

/** What each folder may import of the project's own; everything not listed is refused. */
const allowed: [folder: string, mayImport: string[]][] = [
  ['app', ['app', 'components', 'lib/server', 'lib/client', 'lib/agronomy', ...universal, 'fonts']],
  ['components/ui', ['components/ui', ...universal]],
  ['components', ['components', 'lib/client', 'lib/agronomy', ...universal]],
  ['db', ['db', 'lib/schemas', 'lib/agronomy', 'lib/server', 'lib/texts', 'lib/access', 'lib/errors']],
  ['db/schema', ['db/schema', 'lib/schemas']],
  ['lib/agronomy', ['lib/agronomy']],
  ['lib/schemas', ['lib/schemas', 'lib/agronomy', 'lib/errors', 'lib/format']],
  ['lib/access', ['lib/access', 'lib/schemas']],
  ['lib/errors', ['lib/errors', 'lib/schemas']],
  ['lib/format', ['lib/format', 'lib/schemas', 'lib/agronomy', 'lib/texts']],
  ['lib/paths', ['lib/paths', 'lib/schemas']],
  ['lib/texts', ['lib/texts', 'lib/schemas', 'lib/format', 'lib/agronomy', 'lib/errors']],
  ['lib/client', ['lib/client', ...universal, 'lib/agronomy']],
  ['lib/server', ['lib/server', 'db', 'lib/agronomy', ...universal]],
  ['lib/server/services', ['lib/server', 'db/connection', 'lib/agronomy', ...universal]],
];

const below = (path: string, folder: string) => path === folder || path.startsWith(`${folder}/`);

function ruleFor(path: string) {
  return allowed
    .filter(([folder]) => below(path, folder))
    .sort(([a], [b]) => b.length - a.length)[0];
}

describe('the direction of imports', () => {
  it('lets every file import only what its folder may', () => {
    const broken = sourceFiles('app', 'components', 'db', 'lib').flatMap((file) => {
      const rule = ruleFor(file.path);
      return importsOf(file)
        .filter((each) => own.some((folder) => below(each, folder)))
        .filter((each) => !rule?.[1].some((folder) => below(each, folder)))
        .map((each) => `${file.path} imports ${each}`);
    });
    expect(broken).toEqual([]);
  });

  it('keeps the core to itself and numeric libraries', () => {
    const packages = new Set(
      sourceFiles('lib/agronomy')
        .flatMap(importsOf)
        .filter((each) => !below(each, 'lib/agronomy')),
    );
    expect([...packages].filter((name) => name !== 'simple-statistics' && !name.startsWith('@stdlib/'))).toEqual([]);
  });

  it('keeps clock, chance and locale out of the core', () => {
    const broken = sourceFiles('lib/agronomy').filter(({ text }) =>
      /Math\.random|Date\.now|new Date\(\)|process\.|toLocale|Intl\./.test(text),
    );
    expect(broken.map(({ path }) => path)).toEqual([]);
  });

  it('keeps inference out of every file that can reach the browser', () => {
    // Followed through all imports from each client file, so that a pure file in between cannot carry it along.
    const files = new Map(sourceFiles('app', 'components', 'lib').map((file) => [file.path.replace(/\.(ts|tsx)$/, ''), file]));
    const reaches = (start: string) => {
      const seen = new Set<string>();
      const open = [start];
      for (let path = open.pop(); path !== undefined; path = open.pop()) {
        if (seen.has(path)) continue;
        seen.add(path);
        const file = files.get(path);
        if (file) open.push(...valueImportsOf(file.text, file.path).filter((each) => files.has(each)));
      }
      return [...seen].filter((path) => below(path, 'lib/agronomy/inference') || below(path, 'lib/server') || below(path, 'db'));
    };
    const clients = [...files].filter(([, { text }]) => /^\s*['"]use client['"]/.test(text)).map(([path]) => path);
    expect(clients.length).toBeGreaterThan(10);
    expect(clients.flatMap((path) => reaches(path).map((reached) => `${path} reaches ${reached}`))).toEqual([]);
  });
});

/** Imports that remain after types are erased. */
function valueImportsOf(text: string, path: string): string[] {
  const withoutTypes = text.replace(/(?:import|export) type [^;]+;/g, '');
  return importsOf({ path, text: withoutTypes });
}
