import { describe, expect, it } from 'vitest';
import { importsOf, sourceFiles } from './source-files';

const files = sourceFiles('app', 'components', 'db', 'lib', 'scripts');

describe('house rules that a reader can break without noticing', () => {
  it('keeps routes short, without queries, arithmetic or try', () => {
    const routes = files.filter(({ path }) => path.endsWith('/route.ts'));
    expect(routes.length).toBeGreaterThan(10);
    const broken = routes.filter(({ text }) => text.split('\n').length > 40 || /\btry\b|request\.json|cookies\(|drizzle/.test(text));
    expect(broken.map(({ path }) => path)).toEqual([]);
  });

  it('names colours in the token file only', () => {
    const broken = files.filter(
      ({ path, text }) =>
        /^(app|components)\//.test(path) &&
        /#[0-9a-fA-F]{6}\b|\b(bg|text|border|stroke|fill)-(red|green|blue|gray|slate|zinc|stone|amber|yellow|emerald|orange|white|black)(-\d+)?\b/.test(text),
    );
    expect(broken.map(({ path }) => path)).toEqual([]);
  });

  it('makes no page or layout a client component', () => {
    const broken = files.filter(({ path, text }) => /\/(page|layout)\.tsx$/.test(path) && /^['"]use client/.test(text));
    expect(broken.map(({ path }) => path)).toEqual([]);
  });

  it('rounds for readers in lib/format only', () => {
    // Charts and the tape cut the coordinates of a drawing short; those are no numbers anybody reads.
    const drawing = /^components\/(charts|tape)\//;
    const broken = files.filter(
      ({ path, text }) =>
        /^(app|components)\//.test(path) &&
        (/toLocaleString\(|Intl\.NumberFormat/.test(text) || (!drawing.test(path) && text.includes('.toFixed('))),
    );
    expect(broken.map(({ path }) => path)).toEqual([]);
  });

  it('has no barrel and no drawer for odds and ends', () => {
    expect(files.filter(({ path }) => /(^|\/)(index|utils|helpers)\.(ts|tsx)$/.test(path)).map(({ path }) => path)).toEqual([]);
  });

  it('keeps the database behind the data functions', () => {
    const broken = files.filter(
      (file) =>
        !/^(db|lib\/server\/data|lib\/server\/database|scripts)/.test(file.path) &&
        importsOf(file).some((each) => each.startsWith('drizzle-orm') || each === 'pg' || each.startsWith('db/schema')) &&
        !/import type [^;]*db\/schema/.test(file.text),
    );
    expect(broken.map(({ path }) => path)).toEqual([]);
  });

  it('reads the wall clock in one place', () => {
    const broken = files.filter(({ path, text }) => /^lib\/server\//.test(path) && path !== 'lib/server/clock.ts' && /Date\.now\(|new Date\(\)/.test(text));
    expect(broken.map(({ path }) => path)).toEqual([]);
  });

  it('leaves nothing half done behind', () => {
    const pattern = new RegExp(['TO' + 'DO', 'FIX' + 'ME', 'eslint-dis' + 'able', '@ts-ig' + 'nore', '\\b(it|test|describe)\\.(sk' + 'ip|on' + 'ly)\\b'].join('|'));
    const broken = [...files, ...sourceFiles('tests')].filter(({ text }) => pattern.test(text));
    expect(broken.map(({ path }) => path)).toEqual([]);
  });
});
