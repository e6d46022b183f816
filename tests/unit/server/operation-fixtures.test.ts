import { readdirSync, readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { allOperations } from '@/lib/server/operations/all-operations';
import { actions } from '@/lib/access/can';
import { changeTexts } from '@/lib/texts/change-texts';

const folder = fileURLToPath(new URL('../../fixtures/operations/', import.meta.url));
const fixtures = readdirSync(folder).map((file) => ({ name: file.replace(/\.json$/, ''), body: JSON.parse(readFileSync(`${folder}${file}`, 'utf8')) as unknown }));
const nameOf = ({ kind, version }: { kind: string; version: number }) => `${kind}.v${version}`;

describe('every payload that has landed', () => {
  it('stands as a fixture, and none is left over', () => {
    expect(fixtures.map(({ name }) => name).sort()).toEqual(allOperations.map(nameOf).sort());
  });

  it.each(fixtures)('stays accepted: $name', ({ name, body }) => {
    const handler = allOperations.find((each) => nameOf(each) === name);
    const parsed = handler?.body.safeParse(body);
    expect(parsed?.error?.issues ?? []).toEqual([]);
  });
});

describe('every kind of write', () => {
  it('is registered once and under an action of the access table', () => {
    expect(new Set(allOperations.map(nameOf)).size).toBe(allOperations.length);
    expect(allOperations.filter(({ action }) => !actions.includes(action))).toEqual([]);
  });

  it('has its words on the page of changes', () => {
    expect(allOperations.map(({ kind }) => kind).filter((kind) => !(kind in changeTexts.kinds))).toEqual([]);
  });
});
