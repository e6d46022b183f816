export type UnstorablePlace = { path: (string | number)[]; message: string };

/** No form of ours is anywhere near as deep; deeper is made to break whoever reads it. */
const deepest = 12;

// PostgreSQL keeps neither a null character nor half of a surrogate pair; both come from broken keyboards and from attacks.
const unstorable = /[\u0000\p{Surrogate}]/u;

/**
 * Which texts of a body could not be kept as they are, and which parts lie too deep? Field names count as texts.
 */
export function unstorablePlaces(value: unknown, path: (string | number)[] = []): UnstorablePlace[] {
  if (typeof value === 'string') {
    return unstorable.test(value)
      ? [{ path, message: 'There is a character in this that cannot be kept. Type it again.' }]
      : [];
  }
  if (value === null || typeof value !== 'object') return [];
  if (path.length >= deepest)
    return [{ path: path.slice(0, 1), message: 'This is nested too deeply to be read.' }];
  const entries: [string | number, unknown][] = Array.isArray(value)
    ? value.map((each, index) => [index, each])
    : Object.entries(value);
  return entries.flatMap(([key, each]) =>
    typeof key === 'string' && unstorable.test(key)
      ? [{ path: [...path, 'field name'], message: 'There is a field here whose name cannot be read.' }]
      : unstorablePlaces(each, [...path, key]),
  );
}
