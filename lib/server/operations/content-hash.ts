import { createHash } from 'node:crypto';

/** JSON with its keys in one order at every depth, so that equal content has one text and one hash. */
export function canonicalJson(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map(canonicalJson).join(',')}]`;
  if (value !== null && typeof value === 'object') {
    const entries = Object.entries(value).filter(([, each]) => each !== undefined).sort(([a], [b]) => (a < b ? -1 : a > b ? 1 : 0));
    return `{${entries.map(([key, each]) => `${JSON.stringify(key)}:${canonicalJson(each)}`).join(',')}}`;
  }
  return JSON.stringify(value) ?? 'null';
}

export const contentHash = (value: unknown) => createHash('sha256').update(canonicalJson(value)).digest('hex');
